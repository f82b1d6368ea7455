import { chakra } from '@chakra-ui/react';
import type { ReactNode } from 'react';

export interface FieldRowProps {
  label: string;
  /** Id of the control; its messages bear `${controlId}-echo` and `${controlId}-error`. */
  controlId: string;
  /** What was understood, shown while it is being typed. */
  echo?: string;
  error?: string;
  /** The label above the control, as in forms, instead of beside it. */
  stacked?: boolean;
  children: ReactNode;
}

const Row = chakra('div', {
  base: { display: 'grid', alignItems: 'baseline', columnGap: 3, rowGap: 0.5 },
  variants: {
    stacked: {
      true: {
        gridTemplateColumns: 'minmax(0, 1fr)',
        '& > label': { fontWeight: 'semibold', fontSize: 'sm' },
      },
      false: { gridTemplateColumns: 'minmax(5rem, 1fr) minmax(7.9rem, 1.4fr)', '& > p': { gridColumn: 2 } },
    },
  },
});

/** Label, control and what there is to say about the entry. */
export function FieldRow({ label, controlId, echo, error, stacked = false, children }: FieldRowProps) {
  return (
    <Row stacked={stacked}>
      <chakra.label htmlFor={controlId} fontSize="sm">
        {label}
      </chakra.label>
      {children}
      {echo !== undefined && error === undefined && (
        <chakra.p id={`${controlId}-echo`} role="status" fontSize="xs" color="fg.muted" m={0}>
          {echo}
        </chakra.p>
      )}
      {error !== undefined && (
        <chakra.p
          id={`${controlId}-error`}
          role="alert"
          fontSize="xs"
          color="unmet"
          m={0}
          overflowWrap="anywhere"
        >
          {error}
        </chakra.p>
      )}
    </Row>
  );
}

/** The id of whichever message stands under the control, for `aria-describedby`. */
export function describedBy(
  controlId: string,
  echo: string | undefined,
  error: string | undefined,
): string | undefined {
  if (error !== undefined) return `${controlId}-error`;
  return echo === undefined ? undefined : `${controlId}-echo`;
}
