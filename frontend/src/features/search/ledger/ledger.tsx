import { chakra } from '@chakra-ui/react';
import { useState } from 'react';
import { checkWords } from '../../../wording/check-words';
import type { DutyText } from '../duty/duty-text';
import type { ChangeDuty } from '../panel/change-duty';
import type { SearchAnswer } from '../requests/search-parts';
import { type ReadyRelaxation, readyRelaxations } from './relaxation-words';

const count = new Intl.NumberFormat('en');

/** All styles of the strip in one class: it is drawn anew with every answer. */
const Strip = chakra('ul', {
  base: {
    display: 'grid',
    gridAutoFlow: 'column',
    gridAutoColumns: 'minmax(8.4rem, 1fr)',
    overflowX: 'auto',
    borderBlock: '1px solid',
    borderColor: 'border',
    fontSize: '2xs',
    color: 'fg.muted',
    '& > li': { px: 3, py: 2, borderInlineStart: '1px solid', borderColor: 'border' },
    '& > li:first-of-type': { ps: 0, borderInlineStart: 0 },
    '& > li > span': { display: 'block' },
    '& > li > span[data-counts]': { fontSize: 'sm' },
    '& b': { color: 'fg', fontWeight: 'semibold' },
    '& button': { display: 'block', textAlign: 'start', minHeight: 6 },
    '& button[data-offer]': { color: 'accent' },
    '& button:hover': { textDecoration: 'underline', textUnderlineOffset: '3px' },
  },
});

export interface LedgerProps {
  answer: SearchAnswer;
  duty: DutyText;
  onChange: ChangeDuty;
}

/** How many parts each check removes, together with others and alone, and what would bring some back. */
export function Ledger({ answer, duty, onChange }: LedgerProps) {
  const relaxations = readyRelaxations(answer.relaxations, duty);
  const removing = answer.knockouts.filter((knockout) => knockout.removes > 0);
  const homeless = relaxations.filter((each) => !removing.some((knockout) => knockout.check === each.under));
  if (removing.length === 0 && homeless.length === 0) return null;
  return (
    <Strip aria-label="What removes parts">
      {removing.map(({ check, removes, removesAlone }) => (
        <li key={check}>
          <span>{checkWords[check].toLowerCase()} removes</span>
          <span data-counts="">
            <b>{count.format(removes)}</b> {count.format(removesAlone)} alone
          </span>
          <Offers offers={relaxations.filter((each) => each.under === check)} onChange={onChange} />
        </li>
      ))}
      {homeless.length > 0 && (
        <li>
          <span>asking less</span>
          <Offers offers={homeless} onChange={onChange} />
        </li>
      )}
    </Strip>
  );
}

/** How many are shown before one asks for the rest, so that the ledger stays a strip. */
const shownAtFirst = 1;

function Offers({ offers, onChange }: { offers: readonly ReadyRelaxation[]; onChange: ChangeDuty }) {
  const [all, setAll] = useState(false);
  const sorted = [...offers].sort((first, second) => second.gains - first.gains);
  const rest = sorted.length - shownAtFirst;
  return (
    <>
      {(all ? sorted : sorted.slice(0, shownAtFirst)).map(({ words, gains, relaxed }) => (
        <button key={words} type="button" data-offer="" onClick={() => onChange(relaxed)}>
          {words} brings {count.format(gains)}
        </button>
      ))}
      {rest > 0 && (
        <button type="button" aria-expanded={all} onClick={() => setAll(!all)}>
          {all ? 'fewer' : `${rest} more`}
        </button>
      )}
    </>
  );
}
