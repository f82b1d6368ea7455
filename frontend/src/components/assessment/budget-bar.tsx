import { chakra } from '@chakra-ui/react';
import type { BudgetLine, Contribution } from '@resistry/engineering/budget/budget';
import { formatQuantity } from '@resistry/engineering/notation/format-quantity';

const contributionWords: Record<Contribution, string> = {
  tolerance: 'Tolerance',
  temperature: 'Temperature',
  voltage: 'Voltage',
  soldering: 'Soldering',
  humidity: 'Humidity',
  pulse: 'Pulses',
  drift: 'Drift over life',
};

export interface BudgetBarProps {
  lines: readonly BudgetLine[];
  /** What the window leaves to the nearer edge, fraction; null where the duty states no window. */
  allowance: number | null;
  /** Worst case: the bar is their sum. Root sum of squares: the parts are shown, and the sum is not drawn. */
  adds: boolean;
}

const Rows = chakra('ol', {
  base: {
    mt: 3,
    '& > li': {
      display: 'grid',
      gridTemplateColumns: { base: '1.2rem minmax(0, 1fr) 4.5rem', sm: '1.2rem 8rem 4.5rem minmax(0, 1fr)' },
      // Where the screen is narrow, where an amount comes from stands beneath it.
      '& > :nth-child(4)': { gridColumn: { base: '2 / -1', sm: 'auto' } },
      columnGap: 2,
      py: 1,
      borderBottom: '1px solid',
      borderColor: 'border',
      fontSize: 'sm',
    },
  },
});

const percent = (fraction: number): string => formatQuantity(fraction, 'fraction', { significantDigits: 3 });

/** The deviation budget: contributions end to end against what the window leaves, and each of them in words. */
export function BudgetBar({ lines, allowance, adds }: BudgetBarProps) {
  const known = lines.filter((line) => line.amount !== null && line.amount > 0);
  const sum = known.reduce((total, line) => total + (line.amount ?? 0), 0);
  const whole = Math.max(sum, allowance ?? 0);
  const missing = lines.filter((line) => line.amount === null);
  return (
    <div>
      {adds && whole > 0 && (
        <>
          <chakra.div display="flex" height={5} position="relative" aria-hidden="true">
            {lines.map((line, index) =>
              line.amount === null || line.amount === 0 ? null : (
                <chakra.div
                  key={line.contribution}
                  style={{ width: `${(100 * line.amount) / whole}%` }}
                  bg={allowance !== null && sum > allowance ? 'unmet' : 'accent'}
                  color="bg"
                  fontSize="2xs"
                  fontWeight="semibold"
                  textAlign="center"
                  overflow="hidden"
                  borderInlineEnd="2px solid"
                  borderColor="bg"
                >
                  {index + 1}
                </chakra.div>
              ),
            )}
            {allowance !== null && (
              <chakra.div
                position="absolute"
                insetBlock="-4px"
                borderInlineStart="2px solid"
                borderColor="fg"
                style={{ insetInlineStart: `calc(${(100 * allowance) / whole}% - 1px)` }}
              />
            )}
          </chakra.div>
          <chakra.p fontSize="xs" color="fg.muted" mt={1.5}>
            {percent(sum)} known{allowance !== null && ` of the ${percent(allowance)} that the window leaves`}
            .
            {missing.length > 0 &&
              ` Incomplete: ${missing.length} of ${lines.length} contributions ${missing.length === 1 ? 'is' : 'are'} not stated.`}
          </chakra.p>
        </>
      )}
      <Rows>
        {lines.map((line, index) => (
          <li key={line.contribution}>
            <chakra.span color="fg.muted">{index + 1}</chakra.span>
            <span>{contributionWords[line.contribution]}</span>
            <chakra.span
              textAlign="end"
              fontWeight="semibold"
              color={line.amount === null ? 'unrated' : undefined}
            >
              {line.amount === null ? 'not stated' : percent(line.amount)}
            </chakra.span>
            <chakra.span color="fg.muted" fontSize="xs">
              {line.basis}
            </chakra.span>
          </li>
        ))}
      </Rows>
    </div>
  );
}
