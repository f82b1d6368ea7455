import { chakra } from '@chakra-ui/react';
import type { Status } from '@resistry/engineering/checks/check';
import type { Approval, SupplyStatus } from '@resistry/engineering/ratings/technology';
import type { ReactNode } from 'react';
import { statusWords } from '../wording/check-words';
import { approvalWords, supplyWords } from '../wording/standing-words';
import { approvalShapes, supplyShapes, verdictShapes } from './status-shapes';

export type StatusWordProps =
  | { kind: 'approval'; status: Approval }
  | { kind: 'supply'; status: SupplyStatus }
  | { kind: 'verdict'; status: Status };

interface Appearance {
  shape: ReactNode;
  word: string;
  colour: string;
  strong: boolean;
}

const approvalColours: Record<Approval, string> = {
  preferred: 'preferred',
  approved: 'preferred',
  'in-review': 'caution',
  draft: 'fg.muted',
  restricted: 'caution',
  withdrawn: 'unmet',
};

const supplyColours: Record<SupplyStatus, string> = {
  active: 'met',
  'not-recommended': 'caution',
  'last-time-buy': 'caution',
  discontinued: 'unmet',
};

function appearance(props: StatusWordProps): Appearance {
  switch (props.kind) {
    case 'approval':
      return {
        shape: approvalShapes[props.status],
        word: approvalWords[props.status],
        colour: approvalColours[props.status],
        strong: props.status === 'preferred',
      };
    case 'supply':
      return {
        shape: supplyShapes[props.status],
        word: supplyWords[props.status],
        colour: supplyColours[props.status],
        strong: false,
      };
    case 'verdict':
      return {
        shape: verdictShapes[props.status],
        word: statusWords[props.status],
        colour: props.status,
        strong: props.status === 'unmet',
      };
  }
}

/** The state of a thing as shape and word; the colour only repeats them. */
export function StatusWord(props: StatusWordProps) {
  const { shape, word, colour, strong } = appearance(props);
  return (
    <chakra.span display="inline-flex" alignItems="center" gap={1.5} whiteSpace="nowrap">
      <chakra.svg viewBox="0 0 12 12" width="0.75rem" height="0.75rem" color={colour} aria-hidden="true">
        {shape}
      </chakra.svg>
      <chakra.span fontWeight={strong ? 'semibold' : 'normal'}>{word}</chakra.span>
    </chakra.span>
  );
}
