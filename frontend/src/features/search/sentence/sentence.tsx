import { chakra } from '@chakra-ui/react';
import { Fragment, memo, useCallback } from 'react';
import type { PolicySummary } from '../../policies/requests/list-policies';
import type { EntryName } from '../duty/duty-entry';
import type { DutyText } from '../duty/duty-text';
import type { EntryErrors } from '../duty/entry-reader';
import type { ChangeDuty } from '../panel/change-duty';
import { goToPlace } from '../panel/panel-places';
import { policyNameOf, policyOptions } from '../policy-name';
import { EditableEntry } from './editable-entry';
import { PhraseButton } from './phrase';
import { PolicyPhrase } from './policy-phrase';
import { type Piece, sentencePieces } from './sentence-pieces';

export interface SentenceProps {
  duty: DutyText;
  policies: readonly PolicySummary[];
  errors: EntryErrors;
  onChange: ChangeDuty;
  /** Called before leading to a control of the panel, which may be folded away. */
  onGoTo?: () => void;
}

const Words = chakra('p', {
  base: {
    fontSize: { base: 'md', md: 'lg' },
    lineHeight: 1.65,
    maxWidth: '60rem',
    '& > span': { whiteSpace: 'nowrap' },
  },
});

/** The marks at the start of some words, which belong to what stands before them. */
const leadingMarks = /^[,.;]*/;

/** The duty as one sentence. Its numbers and its policy are edited in place; its other choices lead to where they are made. */
export const Sentence = memo(function Sentence(props: SentenceProps) {
  const { duty, policies, errors, onChange, onGoTo } = props;
  const pieces = sentencePieces(duty, policyNameOf(duty.policy, policies));
  const setEntry = useCallback(
    (name: EntryName, text: string) =>
      onChange((before) => ({ ...before, entries: { ...before.entries, [name]: text } })),
    [onChange],
  );

  const phraseOf = (piece: Exclude<Piece, { kind: 'words' }>) => {
    switch (piece.kind) {
      case 'entry':
        return (
          <EditableEntry
            name={piece.name}
            text={duty.entries[piece.name] ?? ''}
            error={errors[piece.name]}
            onText={setEntry}
          />
        );
      case 'policy':
        return (
          <PolicyPhrase
            words={piece.words}
            value={duty.policy ?? ''}
            options={policyOptions(policies)}
            onValue={(value) =>
              onChange((before) => ({ ...before, policy: value === '' ? undefined : value }))
            }
          />
        );
      case 'choice':
        return (
          <PhraseButton
            type="button"
            onClick={() => {
              onGoTo?.();
              requestAnimationFrame(() => goToPlace(piece.place));
            }}
          >
            {piece.words}
          </PhraseButton>
        );
    }
  };

  return (
    <Words>
      {pieces.map((piece, index) => {
        const next = pieces[index + 1];
        if (piece.kind === 'words') {
          const marksShown = pieces[index - 1]?.kind !== undefined && pieces[index - 1]?.kind !== 'words';
          return (
            <Fragment key={index}>
              {marksShown ? piece.words.replace(leadingMarks, '') : piece.words}
            </Fragment>
          );
        }
        // Browsers break a line between a control and the comma behind it unless the two are held together.
        const marks = next?.kind === 'words' ? leadingMarks.exec(next.words)?.[0] : '';
        const key = piece.kind === 'entry' ? piece.name : piece.kind === 'choice' ? piece.place : 'policy';
        return (
          <span key={`${key} ${piece.kind === 'entry' ? '' : index}`}>
            {phraseOf(piece)}
            {marks}
          </span>
        );
      })}
    </Words>
  );
});
