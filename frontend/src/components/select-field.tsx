import { useId } from 'react';
import { FieldRow } from './field-row';
import { NativeSelect } from './text-input';

export interface SelectFieldProps {
  id?: string;
  label: string;
  value: string;
  options: readonly { value: string; words: string }[];
  onValue: (value: string) => void;
  stacked?: boolean;
}

/** One of a list, by the browser's own control. */
export function SelectField({ id, label, value, options, onValue, stacked }: SelectFieldProps) {
  const ownId = useId();
  const controlId = id ?? ownId;
  return (
    <FieldRow label={label} controlId={controlId} stacked={stacked}>
      <NativeSelect
        id={controlId}
        value={value}
        size={stacked === true ? 'form' : 'dense'}
        onChange={(event) => onValue(event.target.value)}
      >
        {options.map((option) => (
          <option key={option.value} value={option.value}>
            {option.words}
          </option>
        ))}
      </NativeSelect>
    </FieldRow>
  );
}
