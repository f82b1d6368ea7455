import { chakra } from '@chakra-ui/react';
import { type FocusEvent, type KeyboardEvent, type Ref, useState } from 'react';
import { FieldRow, describedBy } from './field-row';
import { TextInput } from './text-input';

export interface EntryInputProps {
  id: string;
  label: string;
  text: string;
  onText: (text: string) => void;
  /** Shown lighter inside the field; the person may type another one. */
  unit?: string;
  placeholder?: string;
  /** What was understood; shown only while the field has the focus, so that a filled panel stays calm. */
  echo?: string;
  error?: string;
  stacked?: boolean;
  inputRef?: Ref<HTMLInputElement>;
  onKeyDown?: (event: KeyboardEvent<HTMLInputElement>) => void;
  onBlur?: (event: FocusEvent<HTMLInputElement>) => void;
}

/** A text entry for a number in the notation engineers type: plain, because spinners swallow what is typed (4k7). */
export function EntryInput(props: EntryInputProps) {
  const { id, label, text, onText, unit, placeholder, echo, error, stacked, inputRef, onKeyDown, onBlur } =
    props;
  const [focused, setFocused] = useState(false);
  const shownEcho = focused ? echo : undefined;
  return (
    <FieldRow label={label} controlId={id} echo={shownEcho} error={error} stacked={stacked}>
      <chakra.div position="relative" minWidth={0}>
        <TextInput
          id={id}
          ref={inputRef}
          value={text}
          placeholder={placeholder}
          autoComplete="off"
          autoCapitalize="off"
          autoCorrect="off"
          spellCheck={false}
          size={stacked === true ? 'form' : 'dense'}
          pe={unit === undefined ? undefined : `calc(${Math.max(unit.length, 1)}ch + 1rem)`}
          aria-invalid={error === undefined ? undefined : true}
          aria-describedby={describedBy(id, shownEcho, error)}
          onChange={(event) => onText(event.target.value)}
          onFocus={() => setFocused(true)}
          onKeyDown={onKeyDown}
          onBlur={(event) => {
            setFocused(false);
            onBlur?.(event);
          }}
        />
        {unit !== undefined && (
          <chakra.span
            aria-hidden="true"
            position="absolute"
            insetEnd={2}
            top="50%"
            transform="translateY(-50%)"
            color="fg.muted"
            fontSize="sm"
            pointerEvents="none"
          >
            {unit}
          </chakra.span>
        )}
      </chakra.div>
    </FieldRow>
  );
}
