import { approvals, features, supplyStatuses } from '@resistry/engineering/ratings/technology';
import { memo, useCallback, useMemo } from 'react';
import { ChoiceGroup } from '../../../components/choice-group';
import { approvalWords, supplyWords } from '../../../wording/standing-words';
import { featureWords } from '../../../wording/technology-words';
import type { DutyText } from '../duty/duty-text';
import type { ChangeDuty } from './change-duty';
import { type DutyGroupProps, Entries, summaryOf, wrongIn } from './duty-entries';
import { FoldedGroup } from './panel-group';
import { panelPlaces } from './panel-places';

/** Drawn again only when the choice changes, not with each key typed elsewhere in the duty. */
const Choices = memo(ChoiceGroup) as typeof ChoiceGroup;

/** Sets one field of the duty to what was chosen. */
function useSet<Field extends keyof DutyText>(
  onChange: ChangeDuty,
  field: Field,
): (value: DutyText[Field]) => void {
  return useCallback((value) => onChange((before) => ({ ...before, [field]: value })), [onChange, field]);
}

export function FeaturesGroup({ duty, onChange }: DutyGroupProps) {
  const summary = duty.features.map((feature) => featureWords[feature].toLowerCase()).join(', ');
  const onFeatures = useSet(onChange, 'features');
  return (
    <FoldedGroup title="Features" summary={summary || 'none'}>
      <Choices
        id={panelPlaces.features}
        legend="The family must claim"
        choices={features}
        words={featureWords}
        chosen={duty.features}
        onChosen={onFeatures}
      />
    </FoldedGroup>
  );
}

const safetyWords = { mains: 'Connected to the mains', safetyFunction: 'Has a safety function' };
const safetyChoices = ['mains', 'safetyFunction'] as const;
type SafetyChoice = (typeof safetyChoices)[number];

export function SafetyGroup(props: DutyGroupProps) {
  const { onChange } = props;
  const { mains, safetyFunction } = props.duty;
  const chosen = useMemo(() => {
    const holds = { mains, safetyFunction };
    return safetyChoices.filter((choice) => holds[choice]);
  }, [mains, safetyFunction]);
  const onChosen = useCallback(
    (next: SafetyChoice[]) =>
      onChange((before) => ({
        ...before,
        mains: next.includes('mains'),
        safetyFunction: next.includes('safetyFunction'),
      })),
    [onChange],
  );
  const words = chosen.map((choice) => safetyWords[choice].toLowerCase());
  const insulation = summaryOf(props.duty, ['insulation'], '');
  return (
    <FoldedGroup
      title="Safety"
      summary={[...words, ...(insulation === '' ? [] : [insulation])].join(', ') || 'no safety function'}
      wrong={wrongIn(props.read, ['insulation'])}
    >
      <Choices
        id={panelPlaces.safety}
        legend="The position"
        choices={safetyChoices}
        words={safetyWords}
        chosen={chosen}
        onChosen={onChosen}
      />
      <Entries names={['insulation']} {...props} />
    </FoldedGroup>
  );
}

const secondSourceWords = { secondSource: 'A second source under its number' };
const secondSourceChoices = ['secondSource'] as const;
const chosenSecondSource = { yes: [...secondSourceChoices], no: [] };

export function StandingGroup({ duty, onChange }: DutyGroupProps) {
  const words = [
    ...duty.approvals.map((approval) => approvalWords[approval].toLowerCase()),
    ...duty.supply.map((status) => supplyWords[status].toLowerCase()),
  ];
  const onApprovals = useSet(onChange, 'approvals');
  const onSupply = useSet(onChange, 'supply');
  const setSecondSource = useSet(onChange, 'secondSource');
  const onSecondSource = useCallback(
    (chosen: string[]) => setSecondSource(chosen.length > 0),
    [setSecondSource],
  );
  return (
    <FoldedGroup title="Approval and supply" summary={words.join(', ') || 'none'}>
      <Choices
        id={panelPlaces.approval}
        legend="Approval"
        choices={approvals}
        words={approvalWords}
        chosen={duty.approvals}
        onChosen={onApprovals}
      />
      <Choices
        id={panelPlaces.supply}
        legend="Supply"
        choices={supplyStatuses}
        words={supplyWords}
        chosen={duty.supply}
        onChosen={onSupply}
      />
      <Choices
        id={panelPlaces.secondSource}
        legend="Sources"
        choices={secondSourceChoices}
        words={secondSourceWords}
        chosen={duty.secondSource ? chosenSecondSource.yes : chosenSecondSource.no}
        onChosen={onSecondSource}
      />
    </FoldedGroup>
  );
}
