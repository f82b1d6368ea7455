import { chakra } from '@chakra-ui/react';
import type { BasisInput } from '@resistry/engineering/checks/basis';
import type { AnsweredBasis, AnsweredInput } from './answered-assessment';
import { unitWords } from './basis-units';
import { Formula } from './formula';

const fromWords: Record<BasisInput['from'], string> = {
  duty: 'the duty',
  ratings: 'the ratings',
  policy: 'the policy',
  derived: 'computed',
  catalogue: 'the catalogue',
};

const Inputs = chakra('dl', {
  base: {
    display: 'grid',
    gridTemplateColumns: 'minmax(0, 1fr) auto auto',
    columnGap: 3,
    rowGap: 0.5,
    mt: 1.5,
    '& dt': { color: 'fg.muted' },
    '& dd': { m: 0, textAlign: 'end', whiteSpace: 'nowrap' },
    '& dd + dd': { textAlign: 'start', color: 'fg.muted', whiteSpace: 'normal' },
  },
});

export interface BasisViewProps {
  basis: AnsweredBasis;
  missing?: readonly string[];
}

/** Why a number is what it is: formula, inputs with where each comes from, source. */
export function BasisView({ basis, missing = [] }: BasisViewProps) {
  return (
    <chakra.div bg="bg.basis" px={3} py={2.5} fontSize="xs" lineHeight={1.45}>
      {basis.formula !== undefined && (
        <chakra.p fontWeight="semibold">
          <Formula text={basis.formula} />
        </chakra.p>
      )}
      <p>{basis.words}</p>
      {missing.length > 0 && (
        <chakra.p color="unrated" fontWeight="semibold" mt={1}>
          Missing: {missing.join(', ')}.
        </chakra.p>
      )}
      {basis.inputs.length > 0 && (
        <Inputs>
          {basis.inputs.map((input) => (
            <InputLine key={`${input.name} ${input.symbol ?? ''}`} input={input} />
          ))}
        </Inputs>
      )}
      {basis.notes.map((note) => (
        <chakra.p key={note} color="fg.muted" mt={1}>
          {note}
        </chakra.p>
      ))}
      <chakra.p color="fg.muted" mt={1}>
        {basis.source}
      </chakra.p>
    </chakra.div>
  );
}

function InputLine({ input }: { input: AnsweredInput }) {
  const { citation } = input;
  return (
    <>
      <dt>
        {input.symbol !== undefined && (
          <chakra.b fontWeight="semibold">
            <Formula text={input.symbol} />{' '}
          </chakra.b>
        )}
        <Formula text={input.name} />
      </dt>
      <dd>{unitWords(input.value, input.unit)}</dd>
      <dd>
        {citation === undefined ? fromWords[input.from] : `${citation.datasheet}, page ${citation.page}`}
      </dd>
    </>
  );
}
