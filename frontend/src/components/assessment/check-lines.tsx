import { chakra } from '@chakra-ui/react';
import type { CheckResult } from '@resistry/engineering/assessment/assess';
import { AnimatePresence, m } from 'framer-motion';
import { useId, useState } from 'react';
import { checkWords } from '../../wording/check-words';
import { MarginRule } from '../margin-rule';
import { MarginWord } from '../margin-word';
import { unitWords } from './basis-units';
import { BasisView, type Cite } from './basis-view';

const Line = chakra('button', {
  base: {
    display: 'grid',
    width: 'full',
    gridTemplateColumns: 'minmax(7rem, 9rem) minmax(4rem, 1fr) minmax(4.6rem, auto)',
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

function accessibleWords(check: CheckResult): string {
  if (check.demand === null || check.allowance === null || check.unit === '') return '';
  return `, ${unitWords(check.demand, check.unit)} asked, ${unitWords(check.allowance, check.unit)} allowed`;
}

function CheckLine({ check, cite }: { check: CheckResult; cite?: Cite }) {
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
              <BasisView basis={check.basis} missing={check.missing} cite={cite} />
            </m.div>
          )}
        </AnimatePresence>
      </div>
    </chakra.li>
  );
}

/** An assessment line by line; each opens to its basis. */
export function CheckLines({ checks, cite }: { checks: readonly CheckResult[]; cite?: Cite }) {
  return (
    <chakra.ul borderTop="1px solid" borderColor="border">
      {checks.map((check) => (
        <CheckLine key={check.check} check={check} cite={cite} />
      ))}
    </chakra.ul>
  );
}
