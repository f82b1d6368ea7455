import { chakra } from '@chakra-ui/react';
import type { Quantity } from '@resistry/engineering/notation/quantity';
import type { AnsweredAssessment } from '../../../components/assessment/answered-assessment';
import { BasisView } from '../../../components/assessment/basis-view';
import { Formula } from '../../../components/assessment/formula';
import { Figure } from '../../../components/figure';

interface Line {
  words: string;
  value: number | null;
  quantity: Quantity;
  formula: string;
  /** The check whose basis says where the number comes from. */
  check: AnsweredAssessment['checks'][number] | undefined;
}

const Lines = chakra('div', {
  base: {
    borderTop: '1px solid',
    borderColor: 'border',
    fontSize: 'sm',
    '& details': { borderBottom: '1px solid', borderColor: 'border' },
    '& summary': {
      display: 'flex',
      justifyContent: 'space-between',
      gap: 3,
      minHeight: 8,
      alignItems: 'center',
      cursor: 'pointer',
      listStyle: 'none',
    },
    '& summary::-webkit-details-marker': { display: 'none' },
    '& summary:hover': { color: 'accent' },
  },
});

function linesOf({ permitted, checks }: AnsweredAssessment, link: boolean): Line[] {
  const find = (name: string) => checks.find(({ check }) => check === name);
  const dissipation = find('dissipation');
  if (link) {
    const formula = 'the rated current of the link';
    return [
      {
        words: 'Current',
        value: permitted.current,
        quantity: 'current',
        formula,
        check: find('link-current'),
      },
    ];
  }
  return [
    {
      words: 'Dissipation',
      value: permitted.dissipation,
      quantity: 'power',
      formula: 'P_allowed = P_rated · min(policy line, curve) · altitude factor',
      check: dissipation,
    },
    {
      words: 'Voltage',
      value: permitted.voltage,
      quantity: 'voltage',
      formula: 'min(voltage ratio · U_limiting, √(P_allowed · R))',
      check: find('voltage'),
    },
    {
      words: 'Current',
      value: permitted.current,
      quantity: 'current',
      formula: '√(P_allowed / R)',
      check: dissipation,
    },
  ];
}

/** What the part could bear in this place at its nominal value, each with where it comes from. */
export function PermittedValues({ assessment, link }: { assessment: AnsweredAssessment; link: boolean }) {
  return (
    <Lines>
      {linesOf(assessment, link).map(({ words, value, quantity, formula, check }) => (
        <details key={words}>
          <summary>
            <span>{words}</span>
            {value === null ? (
              <chakra.span color="unrated">unrated</chakra.span>
            ) : (
              <b>
                <Figure value={value} quantity={quantity} />
              </b>
            )}
          </summary>
          <chakra.p fontSize="xs" fontWeight="semibold" bg="bg.basis" px={3} pt={2}>
            <Formula text={formula} />
          </chakra.p>
          {check === undefined ? (
            <chakra.p fontSize="xs" bg="bg.basis" px={3} pb={2}>
              State the load to see the check that bounds it.
            </chakra.p>
          ) : (
            <BasisView basis={check.basis} missing={check.missing} />
          )}
        </details>
      ))}
    </Lines>
  );
}
