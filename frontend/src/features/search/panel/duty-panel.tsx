import { chakra } from '@chakra-ui/react';
import { deviationRules } from '@resistry/engineering/duty/duty';
import { formatQuantity } from '@resistry/engineering/notation/format-quantity';
import { memo, useCallback, useMemo } from 'react';
import { Button } from '../../../components/button';
import { SelectField } from '../../../components/select-field';
import type { PolicySummary } from '../../policies/requests/list-policies';
import { policyOptions } from '../policy-name';
import type { EntryName } from '../duty/duty-entry';
import { DutyEntryField } from './duty-entry-field';
import { FeaturesGroup, SafetyGroup, StandingGroup } from './chosen-groups';
import type { DutyGroupProps } from './duty-entries';
import { BodyGroup, NoiseAndFrequencyGroup, PulsesGroup } from './folded-groups';
import { FoldedGroup, OpenGroup } from './panel-group';
import { panelPlaces } from './panel-places';

export interface DutyPanelProps extends DutyGroupProps {
  policies: readonly PolicySummary[];
  /** Where Enter in an entry leads; without it, nowhere. */
  onEnter?: () => void;
}

/** In sight while it has the keyboard: past the whole panel, as Enter in any entry leads as well. */
const Onward = chakra('button', {
  base: {
    position: 'absolute',
    opacity: 0,
    pointerEvents: 'none',
    bg: 'bg.panel',
    color: 'accent',
    px: 3,
    py: 1.5,
    borderRadius: 'sm',
    zIndex: 'sticky',
    _focusVisible: { opacity: 1 },
  },
});

const deviationOptions = deviationRules.map((value) => ({
  value,
  words: value === 'worst-case' ? 'worst case' : 'root sum of squares',
}));

/** What a link is asked for at first: the residual resistance that chips of all usual sizes stay within. */
const linkResistance = '50m';

/** Drawn again only when the choice changes, not with each key typed elsewhere in the duty. */
const Select = memo(SelectField);

/** The dissipation that a voltage leaves at the lowest resistance, as a hint in the empty power field. */
function impliedPower({ read }: DutyGroupProps): string | undefined {
  const volt = read.duty?.load?.voltage;
  const ohm = read.duty?.window?.lower;
  if (volt === undefined || ohm === undefined || ohm === 0) return undefined;
  const highest = Math.max(Math.abs(volt.min), Math.abs(volt.max));
  return `implied ${formatQuantity(highest ** 2 / ohm, 'power', { significantDigits: 3 })}`;
}

/** What a position demands, grouped as an engineer thinks: a few fields first, the rest folded. */
export const DutyPanel = memo(function DutyPanel(props: DutyPanelProps) {
  const { duty, read, onChange, policies, onEnter } = props;
  const policyChoices = useMemo(() => policyOptions(policies), [policies]);
  const setPolicy = useCallback(
    (value: string) => onChange((before) => ({ ...before, policy: value === '' ? undefined : value })),
    [onChange],
  );
  const setDeviation = useCallback(
    (value: string) =>
      onChange((before) => ({
        ...before,
        deviation: deviationRules.find((rule) => rule === value) ?? 'worst-case',
      })),
    [onChange],
  );
  const field = (name: EntryName, placeholder?: string) => (
    <DutyEntryField
      name={name}
      duty={duty}
      errors={read.errors}
      onChange={onChange}
      placeholder={placeholder}
    />
  );
  return (
    <form
      aria-label="Duty"
      onSubmit={(event) => {
        event.preventDefault();
        onEnter?.();
      }}
    >
      {onEnter !== undefined && <Onward type="submit">To the parts</Onward>}
      <OpenGroup title="Value over life" note="Ω">
        {field('lower')}
        {field('nominal')}
        {field('upper')}
        {duty.entries.lower?.trim() !== '0' && (
          <Button
            variant="plain"
            justifySelf="start"
            fontSize="xs"
            onClick={() =>
              onChange((before) => ({
                ...before,
                entries: { ...before.entries, lower: '0', nominal: '', upper: linkResistance },
              }))
            }
          >
            A zero-ohm link instead
          </Button>
        )}
      </OpenGroup>
      <OpenGroup title="Load" note="steady, r.m.s.">
        {field('voltage')}
        {field('current')}
        {field('power', impliedPower(props))}
      </OpenGroup>
      <OpenGroup title="Surroundings">
        {field('ambient')}
        <Select
          id={panelPlaces.policy}
          label="Policy"
          value={duty.policy ?? ''}
          options={policyChoices}
          onValue={setPolicy}
        />
      </OpenGroup>
      <OpenGroup title="Life and accuracy">
        {field('life')}
        <Select
          id={panelPlaces.deviation}
          label="Deviations add as"
          value={duty.deviation}
          options={deviationOptions}
          onValue={setDeviation}
        />
      </OpenGroup>
      <PulsesGroup {...props} />
      <FoldedGroup
        title="Value from voltage and current"
        summary={duty.entries.limitVoltage || duty.entries.limitCurrent ? 'in use' : 'no'}
        wrong={read.errors.limitVoltage !== undefined || read.errors.limitCurrent !== undefined}
      >
        {field('limitVoltage')}
        {field('limitCurrent')}
      </FoldedGroup>
      <FoldedGroup
        title="Enclosure, terminals, altitude"
        summary={
          (['rise', 'terminal', 'case', 'altitude'] as const).some((name) => duty.entries[name])
            ? 'stated'
            : 'none'
        }
        wrong={(['rise', 'terminal', 'case', 'altitude'] as const).some(
          (name) => read.errors[name] !== undefined,
        )}
      >
        {field('rise')}
        {field('terminal')}
        {field('case')}
        {field('altitude')}
      </FoldedGroup>
      <NoiseAndFrequencyGroup {...props} />
      <BodyGroup {...props} />
      <FeaturesGroup {...props} />
      <SafetyGroup {...props} />
      <StandingGroup {...props} />
    </form>
  );
});
