import { chakra } from '@chakra-ui/react';
import type { EntryName } from '../duty/duty-entry';
import type { DutyText } from '../duty/duty-text';
import type { EntryErrors } from '../duty/entry-reader';
import { goToPlace } from '../panel/panel-places';
import { EditableEntry, PhraseButton } from './editable-entry';
import { sentencePieces } from './sentence-pieces';

export interface SentenceProps {
  duty: DutyText;
  policyName: string;
  errors: EntryErrors;
  onText: (name: EntryName, text: string) => void;
  /** Called before leading to a control of the panel, which may be folded away. */
  onGoTo?: () => void;
}

/** The duty as one sentence. Its numbers are edited in place; its choices lead to where they are made. */
export function Sentence({ duty, policyName, errors, onText, onGoTo }: SentenceProps) {
  return (
    <chakra.p fontSize={{ base: 'md', md: 'lg' }} lineHeight={1.65} maxWidth="60rem">
      {sentencePieces(duty, policyName).map((piece, index) => {
        switch (piece.kind) {
          case 'words':
            return <span key={`words ${index}`}>{piece.words}</span>;
          case 'entry':
            return (
              <EditableEntry
                key={piece.name}
                name={piece.name}
                text={duty.entries[piece.name] ?? ''}
                error={errors[piece.name]}
                onText={onText}
              />
            );
          case 'choice':
            return (
              <PhraseButton
                key={piece.place}
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
      })}
    </chakra.p>
  );
}
