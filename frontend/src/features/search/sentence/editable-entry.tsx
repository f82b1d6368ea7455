import { chakra } from '@chakra-ui/react';
import { type KeyboardEvent, memo, useEffect, useRef, useState } from 'react';
import { type EntryName, entryDefinitions } from '../duty/duty-entry';
import { entryWords } from '../duty/entry-words';
import { PhraseButton, phrase } from './phrase';

const PhraseInput = chakra('input', {
  base: {
    ...phrase,
    bg: 'bg.field',
    border: 0,
    borderBottom: '2px solid',
    borderColor: 'accent',
    borderRadius: 0,
    px: 1,
    py: 0,
    height: '1.6em',
    fieldSizing: 'content',
    minWidth: '4ch',
    maxWidth: 'full',
  },
});

export interface EditableEntryProps {
  name: EntryName;
  /** As it was typed. */
  text: string;
  error?: string;
  onText: (name: EntryName, text: string) => void;
}

/** A number of the sentence: press it and type another. Enter keeps it, Escape brings the old one back. */
export const EditableEntry = memo(function EditableEntry(props: EditableEntryProps) {
  const { name, text, error } = props;
  const [editing, setEditing] = useState(false);
  const buttonRef = useRef<HTMLButtonElement>(null);
  if (editing) {
    const done = (byKeyboard: boolean): void => {
      setEditing(false);
      if (byKeyboard) requestAnimationFrame(() => buttonRef.current?.focus());
    };
    return <EntryEditor {...props} onDone={done} />;
  }
  return (
    <PhraseButton
      ref={buttonRef}
      type="button"
      color={error === undefined ? undefined : 'unmet'}
      aria-label={`${entryDefinitions[name].label}: ${entryWords(name, text)}. Change it`}
      onClick={() => setEditing(true)}
    >
      {entryWords(name, text)}
    </PhraseButton>
  );
});

function EntryEditor({
  name,
  text,
  error,
  onText,
  onDone,
}: EditableEntryProps & { onDone: (byKeyboard: boolean) => void }) {
  // The text of its own lets the field be empty for a moment without the whole clause leaving the sentence.
  const [draft, setDraft] = useState(text);
  const [before] = useState(text);
  const inputRef = useRef<HTMLInputElement>(null);
  useEffect(() => inputRef.current?.select(), []);

  const type = (typed: string): void => {
    setDraft(typed);
    if (typed.trim() !== '') onText(name, typed);
  };
  const finish = (kept: string, byKeyboard: boolean): void => {
    onText(name, kept);
    onDone(byKeyboard);
  };
  const press = (event: KeyboardEvent): void => {
    if (event.key !== 'Enter' && event.key !== 'Escape') return;
    event.stopPropagation();
    finish(event.key === 'Enter' ? draft : before, true);
  };

  return (
    <PhraseInput
      ref={inputRef}
      value={draft}
      aria-label={entryDefinitions[name].label}
      aria-invalid={error === undefined ? undefined : true}
      title={error}
      spellCheck={false}
      autoComplete="off"
      onChange={(event) => type(event.target.value)}
      onKeyDown={press}
      onBlur={() => finish(draft, false)}
    />
  );
}
