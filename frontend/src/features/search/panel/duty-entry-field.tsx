import { IntervalField } from '../../../components/interval-field';
import { QuantityField } from '../../../components/quantity-field';
import type { ChangeDuty } from './change-duty';
import { type EntryName, entryDefinitions } from '../duty/duty-entry';
import type { DutyText } from '../duty/duty-text';
import type { EntryErrors } from '../duty/entry-reader';
import { entryPlace } from './panel-places';

export interface DutyEntryFieldProps {
  name: EntryName;
  duty: DutyText;
  errors: EntryErrors;
  onChange: ChangeDuty;
  /** In place of the definition's, where the context says more. */
  placeholder?: string;
}

/** One entry of the duty in the panel. */
export function DutyEntryField({ name, duty, errors, onChange, placeholder }: DutyEntryFieldProps) {
  const definition = entryDefinitions[name];
  const common = {
    id: entryPlace(name),
    label: definition.label,
    quantity: definition.quantity,
    unit: definition.unit === '' ? undefined : definition.unit,
    placeholder: placeholder ?? definition.placeholder,
    text: duty.entries[name] ?? '',
    error: errors[name],
    onText: (text: string) =>
      onChange((before) => ({ ...before, entries: { ...before.entries, [name]: text } })),
  };
  return definition.interval === undefined ? (
    <QuantityField {...common} />
  ) : (
    <IntervalField {...common} single={definition.interval} />
  );
}
