import { type Mounting, mountings } from '@resistry/engineering/ratings/technology';
import { SelectField } from '../../../components/select-field';
import { mountingWords } from '../../../wording/technology-words';
import { Entries, type DutyGroupProps, summaryOf, wrongIn } from './duty-entries';
import { FoldedGroup } from './panel-group';
import { panelPlaces } from './panel-places';
import { PulseEditor } from './pulse-editor';

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
