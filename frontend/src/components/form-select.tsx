import { useField } from 'formik';
import { useId } from 'react';
import { FieldRow, describedBy } from './field-row';
import { NativeSelect } from './text-input';

export interface FormSelectProps {
  /** Its name in the form's values. */
  name: string;
  label: string;
  options: readonly { value: string; words: string }[];
  /** What the server said about this entry; goes once it is changed. */
  refusal?: string;
}

/** One of a list, as an entry of a Formik form. Nothing is chosen beforehand where the value is empty. */
export function FormSelect({ name, label, options, refusal }: FormSelectProps) {
  const id = useId();
  const [field, meta] = useField<string>(name);
  const error = (meta.touched ? meta.error : undefined) ?? refusal;
  return (
    <FieldRow label={label} controlId={id} error={error} stacked>
      <NativeSelect
        {...field}
        id={id}
        size="form"
        aria-invalid={error === undefined ? undefined : true}
        aria-describedby={describedBy(id, undefined, error)}
      >
        {field.value === '' && <option value="">Choose</option>}
        {options.map((option) => (
          <option key={option.value} value={option.value}>
            {option.words}
          </option>
        ))}
      </NativeSelect>
    </FieldRow>
  );
}
