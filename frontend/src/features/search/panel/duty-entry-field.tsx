import { memo } from 'react';
import { IntervalField } from '../../../components/interval-field';
import { QuantityField } from '../../../components/quantity-field';
import { type EntryName, entryDefinitions } from '../duty/duty-entry';
import type { DutyText } from '../duty/duty-text';
import type { EntryErrors } from '../duty/entry-reader';
import type { ChangeDuty } from './change-duty';
import { entryPlace } from './panel-places';

export interface DutyEntryFieldProps {
  name: EntryName;
  duty: DutyText;
  errors: EntryErrors;
  onChange: ChangeDuty;
  /** In place of the definition's, where the context says more. */
  placeholder?: string;
}

/** One entry of the duty in the panel; drawn again only when it itself changes, so that typing into one is quick. */
export function DutyEntryField({ name, duty, errors, onChange, placeholder }: DutyEntryFieldProps) {
  return (
    <OneEntry
      name={name}
      text={duty.entries[name] ?? ''}
      error={errors[name]}
      placeholder={placeholder}
      onChange={onChange}
    />
  );
}

interface OneEntryProps extends Pick<DutyEntryFieldProps, 'name' | 'onChange' | 'placeholder'> {
  text: string;
  error: string | undefined;
}

const OneEntry = memo(function OneEntry({ name, text, error, placeholder, onChange }: OneEntryProps) {
  const definition = entryDefinitions[name];
  const common = {
    id: entryPlace(name),
    label: definition.label,
    quantity: definition.quantity,
    unit: definition.unit === '' ? undefined : definition.unit,
    placeholder: placeholder ?? definition.placeholder,
    text,
    error,
    onText: (typed: string) =>
      onChange((before) => ({ ...before, entries: { ...before.entries, [name]: typed } })),
  };
  return definition.interval === undefined ? (
    <QuantityField {...common} />
  ) : (
    <IntervalField {...common} single={definition.interval} />
  );
});
