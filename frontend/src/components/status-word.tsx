import type { Status } from '@resistry/engineering/checks/check';
import type { Approval, SupplyStatus } from '@resistry/engineering/ratings/technology';
import type { ReactNode } from 'react';
import type { Schema } from '../api/schema';
import { statusWords } from '../wording/check-words';
import { approvalWords, supplyWords } from '../wording/standing-words';
import { approvalShapes, supplyShapes, verdictShapes } from './status-shapes';

type Judgement = Schema<'AlternateDto'>['judgement'];

export type StatusWordProps =
  | { kind: 'approval'; status: Approval }
  | { kind: 'supply'; status: SupplyStatus }
  | { kind: 'verdict'; status: Status }
  | { kind: 'judgement'; status: Judgement };

/** What a colour says here; see row-styles. */
type Tone = 'preferred' | 'met' | 'unmet' | 'unrated' | 'caution' | 'quiet';

interface Appearance {
  shape: ReactNode;
  word: string;
  tone: Tone;
  strong: boolean;
}

const approvalTones: Record<Approval, Tone> = {
  preferred: 'preferred',
  approved: 'preferred',
  'in-review': 'caution',
  draft: 'quiet',
  restricted: 'caution',
  withdrawn: 'unmet',
};

const supplyTones: Record<SupplyStatus, Tone> = {
  active: 'met',
  'not-recommended': 'caution',
  'last-time-buy': 'caution',
  discontinued: 'unmet',
};

/** An alternate that is equal is shown like a check that is met; one that nobody can judge, like one that is unrated. */
const verdictOfJudgement: Record<Judgement, Status> = { equal: 'met', lesser: 'unmet', undecided: 'unrated' };
const judgementWords: Record<Judgement, string> = {
  equal: 'Equal',
  lesser: 'Not equal',
  undecided: 'Undecided',
};

function appearance(props: StatusWordProps): Appearance {
  switch (props.kind) {
    case 'approval':
      return {
        shape: approvalShapes[props.status],
        word: approvalWords[props.status],
        tone: approvalTones[props.status],
        strong: props.status === 'preferred',
      };
    case 'supply':
      return {
        shape: supplyShapes[props.status],
        word: supplyWords[props.status],
        tone: supplyTones[props.status],
        strong: false,
      };
    case 'verdict':
      return {
        shape: verdictShapes[props.status],
        word: statusWords[props.status],
        tone: props.status,
        strong: props.status === 'unmet',
      };
    case 'judgement': {
      const verdict = verdictOfJudgement[props.status];
      return {
        shape: verdictShapes[verdict],
        word: judgementWords[props.status],
        tone: verdict,
        strong: false,
      };
    }
  }
}

/** The state of a thing as shape and word; the colour only repeats them. */
export function StatusWord(props: StatusWordProps) {
  const { shape, word, tone, strong } = appearance(props);
  return (
    <span className="status-word" data-tone={tone} data-strong={strong || undefined}>
      <svg viewBox="0 0 12 12" aria-hidden="true">
        {shape}
      </svg>
      <span>{word}</span>
    </span>
  );
}
