import { chakra } from '@chakra-ui/react';
import type { Status } from '@resistry/engineering/checks/check';
import { statusWords } from '../wording/check-words';
import { marginWords } from '../wording/percent';

export interface MarginWordProps {
  status: Status;
  margin: number | null;
}

/** What the margin rule shows, in words. A shortfall says that it is one. */
export function MarginWord({ status, margin }: MarginWordProps) {
  const figure = margin === null ? undefined : marginWords(margin);
  const words =
    status === 'unrated' || figure === undefined
      ? statusWords[status]
      : status === 'unmet'
        ? `${figure}, not met`
        : figure;
  return (
    <chakra.span
      color={status === 'met' ? 'fg' : status}
      fontWeight={status === 'unrated' ? 'normal' : 'semibold'}
      whiteSpace="nowrap"
    >
      {words}
    </chakra.span>
  );
}
