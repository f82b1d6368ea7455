import { chakra } from '@chakra-ui/react';
import {
  approvals,
  features,
  mountings,
  supplyStatuses,
  type Mounting,
} from '@resistry/engineering/ratings/technology';
import { ChoiceGroup } from '../../../components/choice-group';
import { SelectField } from '../../../components/select-field';
import { approvalWords, supplyWords } from '../../../wording/standing-words';
import { featureWords, mountingWords } from '../../../wording/technology-words';
import type { EntryName } from '../duty/duty-entry';
import type { DutyText } from '../duty/duty-text';
import { entryWords } from '../duty/entry-words';
import type { ReadDuty } from '../duty/read-duty';
import type { ChangeDuty } from './change-duty';
import { DutyEntryField } from './duty-entry-field';
import { FoldedGroup } from './panel-group';
import { panelPlaces } from './panel-places';
import { PulseEditor } from './pulse-editor';

export interface DutyGroupProps {
  duty: DutyText;
  read: ReadDuty;
  onChange: ChangeDuty;
}

const wrongIn = (read: ReadDuty, names: readonly EntryName[]): boolean =>
  names.some((name) => read.errors[name] !== undefined);

/** The entries of a group that are filled, as words; or what stands for none. */
function summaryOf(duty: DutyText, names: readonly EntryName[], none: string): string {
  const stated = names.flatMap((name) => {
    const text = duty.entries[name]?.trim();
    return text ? [entryWords(name, text)] : [];
  });
  return stated.length === 0 ? none : stated.join(', ');
}

function Entries({ names, duty, read, onChange }: DutyGroupProps & { names: readonly EntryName[] }) {
  return names.map((name) => (
    <DutyEntryField key={name} name={name} duty={duty} errors={read.errors} onChange={onChange} />
  ));
}

export function PulsesGroup({ duty, read, onChange }: DutyGroupProps) {
  const wrong = read.pulseErrors.some((errors) => Object.keys(errors).length > 0);
  return (
    <FoldedGroup
      title="Pulses"
      summary={duty.pulses.length === 0 ? 'none' : String(duty.pulses.length)}
      wrong={wrong}
    >
      <PulseEditor duty={duty} errors={read.pulseErrors} onChange={onChange} />
    </FoldedGroup>
  );
}

const noiseAndFrequency = ['noiseLimit', 'noiseFrom', 'noiseTo', 'noiseBias', 'frequency', 'within'] as const;

export function NoiseAndFrequencyGroup(props: DutyGroupProps) {
  return (
    <FoldedGroup
      title="Noise and frequency"
      summary={summaryOf(props.duty, ['noiseLimit', 'frequency'], 'none')}
      wrong={wrongIn(props.read, noiseAndFrequency)}
    >
      <Entries names={noiseAndFrequency} {...props} />
    </FoldedGroup>
  );
}

const body = ['length', 'width', 'height'] as const;
const anyMounting = { value: '', words: 'any' };

export function BodyGroup(props: DutyGroupProps) {
  const { duty, onChange } = props;
  const mounted = duty.mounting === undefined ? [] : [mountingWords[duty.mounting].toLowerCase()];
  const size = summaryOf(duty, body, '');
  return (
    <FoldedGroup
      title="Body and mounting"
      summary={[...mounted, ...(size === '' ? [] : [size])].join(', ') || 'any'}
      wrong={wrongIn(props.read, body)}
    >
      <SelectField
        id={panelPlaces.mounting}
        label="Mounting"
        value={duty.mounting ?? ''}
        options={[anyMounting, ...mountings.map((value) => ({ value, words: mountingWords[value] }))]}
        onValue={(value) =>
          onChange((before) => ({
            ...before,
            mounting: mountings.find((known): known is Mounting => known === value),
          }))
        }
      />
      <Entries names={body} {...props} />
    </FoldedGroup>
  );
}

export function FeaturesGroup({ duty, onChange }: DutyGroupProps) {
  const summary = duty.features.map((feature) => featureWords[feature].toLowerCase()).join(', ');
  return (
    <FoldedGroup title="Features" summary={summary || 'none'}>
      <ChoiceGroup
        id={panelPlaces.features}
        legend="The family must claim"
        choices={features}
        words={featureWords}
        chosen={duty.features}
        onChosen={(chosen) => onChange((before) => ({ ...before, features: chosen }))}
      />
    </FoldedGroup>
  );
}

const safetyWords = { mains: 'Connected to the mains', safetyFunction: 'Has a safety function' };
const safetyChoices = ['mains', 'safetyFunction'] as const;

export function SafetyGroup(props: DutyGroupProps) {
  const { duty, onChange } = props;
  const chosen = safetyChoices.filter((choice) => duty[choice]);
  const words = chosen.map((choice) => safetyWords[choice].toLowerCase());
  const insulation = summaryOf(duty, ['insulation'], '');
  return (
    <FoldedGroup
      title="Safety"
      summary={[...words, ...(insulation === '' ? [] : [insulation])].join(', ') || 'no safety function'}
      wrong={wrongIn(props.read, ['insulation'])}
    >
      <ChoiceGroup
        id={panelPlaces.safety}
        legend="The position"
        choices={safetyChoices}
        words={safetyWords}
        chosen={chosen}
        onChosen={(next) =>
          onChange((before) => ({
            ...before,
            mains: next.includes('mains'),
            safetyFunction: next.includes('safetyFunction'),
          }))
        }
      />
      <Entries names={['insulation']} {...props} />
    </FoldedGroup>
  );
}

export function StandingGroup({ duty, onChange }: DutyGroupProps) {
  const words = [
    ...duty.approvals.map((approval) => approvalWords[approval].toLowerCase()),
    ...duty.supply.map((status) => supplyWords[status].toLowerCase()),
  ];
  return (
    <FoldedGroup title="Approval and supply" summary={words.join(', ') || 'none'}>
      <ChoiceGroup
        id={panelPlaces.approval}
        legend="Approval"
        choices={approvals}
        words={approvalWords}
        chosen={duty.approvals}
        onChosen={(chosen) => onChange((before) => ({ ...before, approvals: chosen }))}
      />
      <ChoiceGroup
        id={panelPlaces.supply}
        legend="Supply"
        choices={supplyStatuses}
        words={supplyWords}
        chosen={duty.supply}
        onChosen={(chosen) => onChange((before) => ({ ...before, supply: chosen }))}
      />
      <chakra.label
        id={panelPlaces.secondSource}
        display="flex"
        gap={2}
        alignItems="center"
        fontSize="sm"
        minHeight={6}
      >
        <chakra.input
          type="checkbox"
          accentColor="accent"
          checked={duty.secondSource}
          onChange={() => onChange((before) => ({ ...before, secondSource: !before.secondSource }))}
        />
        A second source under its number
      </chakra.label>
    </FoldedGroup>
  );
}
