import { useField } from 'formik';
import type { HTMLInputAutoCompleteAttribute, HTMLInputTypeAttribute } from 'react';
import { useId } from 'react';
import { FieldRow, describedBy } from './field-row';
import { TextArea, TextInput } from './text-input';

export interface FormFieldProps {
  /** Its name in the form's values. */
  name: string;
  label: string;
  type?: HTMLInputTypeAttribute;
  autoComplete?: HTMLInputAutoCompleteAttribute;
  placeholder?: string;
  /** Several lines, for words rather than a word. */
  multiline?: boolean;
  /** What was understood, shown while it is being typed. */
  echo?: string;
  /** What the server said about this entry; goes once it is changed. */
  refusal?: string;
}

/** One entry of a Formik form, with its error beneath it. */
export function FormField({
  name,
  label,
  multiline = false,
  echo,
  refusal,
  type = 'text',
  ...attributes
}: FormFieldProps) {
  const id = useId();
  const [field, meta] = useField<string>(name);
  const error = (meta.touched ? meta.error : undefined) ?? refusal;
  const common = {
    ...field,
    ...attributes,
    id,
    'aria-invalid': error === undefined ? undefined : true,
    'aria-describedby': describedBy(id, echo, error),
  };
  return (
    <FieldRow label={label} controlId={id} echo={echo} error={error} stacked>
      {multiline ? <TextArea {...common} rows={4} /> : <TextInput {...common} type={type} size="form" />}
    </FieldRow>
  );
}
