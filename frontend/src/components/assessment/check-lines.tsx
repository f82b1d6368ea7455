import { chakra } from '@chakra-ui/react';
import { AnimatePresence, m } from 'framer-motion';
import { useId, useState } from 'react';
import { checkWords } from '../../wording/check-words';
import { MarginRule } from '../margin-rule';
import { MarginWord } from '../margin-word';
import type { AnsweredCheck } from './answered-assessment';
import { unitWords } from './basis-units';
import { BasisView } from './basis-view';

const Line = chakra('button', {
  base: {
    display: 'grid',
    width: 'full',
    gridTemplateColumns: {
      base: 'minmax(0, 8.6rem) minmax(2.5rem, 1fr) 4.4rem',
      sm: '8.6rem minmax(4rem, 1fr) 4.9rem',
    },
    alignItems: 'center',
    columnGap: 3,
    minHeight: 8,
    py: 1,
    fontSize: 'sm',
    textAlign: 'start',
    lineHeight: 'tight',
    _hover: { color: 'accent' },
    '& > span:last-of-type': { textAlign: 'end' },
  },
});

function accessibleWords(check: AnsweredCheck): string {
  if (check.demand === null || check.allowance === null || check.unit === '') return '';
  return `, ${unitWords(check.demand, check.unit)} asked, ${unitWords(check.allowance, check.unit)} allowed`;
}

function CheckLine({ check }: { check: AnsweredCheck }) {
  const [open, setOpen] = useState(false);
  const basisId = useId();
  return (
    <chakra.li borderBottom="1px solid" borderColor="border">
      <Line
        type="button"
        aria-expanded={open}
        aria-controls={basisId}
        onClick={() => setOpen((before) => !before)}
      >
        <span>
          {checkWords[check.check]}
          <chakra.span srOnly>{accessibleWords(check)}</chakra.span>
        </span>
        <MarginRule status={check.status} margin={check.margin} />
        <MarginWord status={check.status} margin={check.margin} />
      </Line>
      <div id={basisId}>
        <AnimatePresence initial={false}>
          {open && (
            <m.div
              initial={{ height: 0, opacity: 0 }}
              animate={{ height: 'auto', opacity: 1 }}
              exit={{ height: 0, opacity: 0 }}
              transition={{ duration: 0.15 }}
              style={{ overflow: 'hidden' }}
            >
              <BasisView basis={check.basis} missing={check.missing} />
            </m.div>
          )}
        </AnimatePresence>
      </div>
    </chakra.li>
  );
}

/** An assessment line by line; each opens to its basis. */
export function CheckLines({ checks }: { checks: readonly AnsweredCheck[] }) {
  return (
    <chakra.ul borderTop="1px solid" borderColor="border">
      {checks.map((check) => (
        <CheckLine key={check.check} check={check} />
      ))}
    </chakra.ul>
  );
}
