import { chakra } from '@chakra-ui/react';
import { useEffect, useRef, useState } from 'react';
import { PhraseButton, phrase } from './phrase';

const PhraseSelect = chakra('select', {
  base: {
    ...phrase,
    textDecoration: 'none',
    bg: 'bg.field',
    border: 0,
    borderBottom: '2px solid',
    borderColor: 'accent',
    borderRadius: 0,
    height: '1.6em',
    maxWidth: 'full',
  },
});

export interface PolicyPhraseProps {
  words: string;
  /** As in the duty: an id, `none`, or empty for the company's own. */
  value: string;
  options: readonly { value: string; words: string }[];
  onValue: (value: string) => void;
}

/** The policy of the sentence: press it and choose another. */
export function PolicyPhrase({ words, value, options, onValue }: PolicyPhraseProps) {
  const [editing, setEditing] = useState(false);
  const buttonRef = useRef<HTMLButtonElement>(null);
  const selectRef = useRef<HTMLSelectElement>(null);
  useEffect(() => {
    if (editing) selectRef.current?.focus();
  }, [editing]);
  const done = (): void => {
    setEditing(false);
    requestAnimationFrame(() => buttonRef.current?.focus());
  };
  if (!editing) {
    return (
      <PhraseButton
        ref={buttonRef}
        type="button"
        aria-label={`Policy: ${words}. Change it`}
        onClick={() => setEditing(true)}
      >
        {words}
      </PhraseButton>
    );
  }
  return (
    <PhraseSelect
      ref={selectRef}
      aria-label="Policy"
      value={value}
      onChange={(event) => {
        onValue(event.target.value);
        done();
      }}
      onKeyDown={(event) => {
        if (event.key !== 'Escape') return;
        event.stopPropagation();
        done();
      }}
      onBlur={() => setEditing(false)}
    >
      {options.map((option) => (
        <option key={option.value} value={option.value}>
          {option.words}
        </option>
      ))}
    </PhraseSelect>
  );
}
