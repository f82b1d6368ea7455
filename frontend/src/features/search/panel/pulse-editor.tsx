import { chakra } from '@chakra-ui/react';
import { Button } from '../../../components/button';
import { QuantityField } from '../../../components/quantity-field';
import { SelectField } from '../../../components/select-field';
import type { DutyText } from '../duty/duty-text';
import {
  type PulseEntry,
  type PulseText,
  entriesOfShape,
  pulseEntries,
  shapeWords,
  typedShapes,
} from '../duty/pulse-text';
import type { ChangeDuty } from './change-duty';
import { panelPlaces } from './panel-places';

const shapeOptions = typedShapes.map((shape) => ({ value: shape, words: shapeWords[shape] }));

export interface PulseEditorProps {
  duty: DutyText;
  errors: Partial<Record<PulseEntry, string>>[];
  onChange: ChangeDuty;
}

/** The pulses of the duty: each with its shape and what that shape is described by. */
export function PulseEditor({ duty, errors, onChange }: PulseEditorProps) {
  const setPulses = (change: (pulses: PulseText[]) => PulseText[]): void =>
    onChange((before) => ({ ...before, pulses: change(before.pulses) }));
  const setPulse = (at: number, pulse: PulseText): void =>
    setPulses((pulses) => pulses.map((each, index) => (index === at ? pulse : each)));

  return (
    <chakra.div id={panelPlaces.pulses} display="grid" gap={3}>
      {duty.pulses.map((pulse, at) => (
        <chakra.fieldset
          key={at}
          display="grid"
          gap={1.5}
          borderBottom="1px solid"
          borderColor="border"
          pb={3}
        >
          <chakra.legend srOnly>{`Pulse ${at + 1}`}</chakra.legend>
          <SelectField
            label="Shape"
            value={pulse.shape}
            options={shapeOptions}
            onValue={(value) => {
              const shape = typedShapes.find((known) => known === value);
              if (shape !== undefined) setPulse(at, { ...pulse, shape });
            }}
          />
          {entriesOfShape[pulse.shape].map((name) => (
            <QuantityField
              key={name}
              label={pulseEntries[name].label}
              quantity={pulseEntries[name].quantity}
              unit={pulseEntries[name].unit === '' ? undefined : pulseEntries[name].unit}
              text={pulse.entries[name] ?? ''}
              error={errors[at]?.[name]}
              onText={(text) => setPulse(at, { ...pulse, entries: { ...pulse.entries, [name]: text } })}
            />
          ))}
          <Button
            variant="plain"
            justifySelf="start"
            aria-label={`Remove pulse ${at + 1}`}
            onClick={() => setPulses((pulses) => pulses.filter((_, index) => index !== at))}
          >
            Remove
          </Button>
        </chakra.fieldset>
      ))}
      <Button
        justifySelf="start"
        minHeight={8}
        onClick={() => setPulses((pulses) => [...pulses, { shape: 'rectangular', entries: {} }])}
      >
        Add a pulse
      </Button>
    </chakra.div>
  );
}
