import { chakra } from '@chakra-ui/react';
import { Link, useParams } from 'react-router-dom';
import type { Schema } from '../../api/schema';
import { Answered } from '../../components/answered';
import { Facts } from '../../components/facts';
import { Page } from '../../components/page';
import { momentWords } from '../../wording/date-words';
import { letterPieces } from './letter-pieces';
import { useLetter } from './requests/read-mail';

function Letter({ letter }: { letter: Schema<'MailLetter'> }) {
  return (
    <>
      <Facts
        facts={[
          ['From', letter.from],
          ['To', letter.to],
          ['When', letter.date === '' ? 'not stated' : momentWords(letter.date)],
        ]}
      />
      <chakra.div
        whiteSpace="pre-wrap"
        overflowWrap="anywhere"
        maxWidth="prose"
        mt={5}
        pt={4}
        borderTop="1px solid"
        borderColor="border"
      >
        {letterPieces(letter.text, letter.links).map((piece, place) =>
          piece.isLink ? (
            <a key={`${place} ${piece.text}`} href={piece.text} rel="noreferrer">
              {piece.text}
            </a>
          ) : (
            piece.text
          ),
        )}
      </chakra.div>
    </>
  );
}

/** One letter, its addresses to be followed. */
export function Component() {
  const letter = useLetter(useParams().id ?? '');
  return (
    <Page
      title={letter.data === undefined ? 'Letter' : letter.data.subject || 'No subject'}
      actions={<Link to="/mail">All letters</Link>}
    >
      <Answered query={letter} label="Reading the letter">
        {(read) => <Letter letter={read} />}
      </Answered>
    </Page>
  );
}
