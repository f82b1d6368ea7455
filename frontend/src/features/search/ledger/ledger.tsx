import { chakra } from '@chakra-ui/react';
import { useState } from 'react';
import { checkWords } from '../../../wording/check-words';
import type { DutyText } from '../duty/duty-text';
import type { ChangeDuty } from '../panel/change-duty';
import type { SearchAnswer } from '../requests/search-parts';
import { type ReadyRelaxation, readyRelaxations } from './relaxation-words';

const count = new Intl.NumberFormat('en');

const Strip = chakra('ul', {
  base: {
    display: 'grid',
    gridAutoFlow: 'column',
    gridAutoColumns: 'minmax(8.4rem, 1fr)',
    overflowX: 'auto',
    borderBlock: '1px solid',
    borderColor: 'border',
    fontSize: '2xs',
    '& > li': { px: 3, py: 2, borderInlineStart: '1px solid', borderColor: 'border' },
    '& > li:first-of-type': { ps: 0, borderInlineStart: 0 },
  },
});

const Relax = chakra('button', {
  base: {
    color: 'accent',
    display: 'block',
    textAlign: 'start',
    minHeight: 6,
    _hover: { textDecoration: 'underline', textUnderlineOffset: '3px' },
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
          <chakra.span color="fg.muted">{checkWords[check].toLowerCase()} removes</chakra.span>
          <chakra.span display="block" fontSize="sm" color="fg.muted">
            <chakra.b color="fg" fontWeight="semibold">
              {count.format(removes)}
            </chakra.b>{' '}
            {count.format(removesAlone)} alone
          </chakra.span>
          <Offers offers={relaxations.filter((each) => each.under === check)} onChange={onChange} />
        </li>
      ))}
      {homeless.length > 0 && (
        <li>
          <chakra.span color="fg.muted" display="block">
            asking less
          </chakra.span>
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
        <Relax key={words} type="button" onClick={() => onChange(relaxed)}>
          {words} brings {count.format(gains)}
        </Relax>
      ))}
      {rest > 0 && (
        <Relax type="button" color="fg.muted" aria-expanded={all} onClick={() => setAll(!all)}>
          {all ? 'fewer' : `${rest} more`}
        </Relax>
      )}
    </>
  );
}
