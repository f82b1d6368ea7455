import type { Status } from '@resistry/engineering/checks/check';
import { statusWords } from '../wording/check-words';
import { marginWords, shortfallWords } from '../wording/percent';

export interface MarginWordProps {
  status: Status;
  margin: number | null;
}

/** What the margin rule shows, in words. A shortfall says that it is one. */
function words({ status, margin }: MarginWordProps): string {
  if (margin === null || status === 'unrated') return statusWords[status];
  return status === 'unmet' ? (shortfallWords(margin) ?? statusWords.unmet) : marginWords(margin);
}

export function MarginWord({ status, margin }: MarginWordProps) {
  return (
    <span className="margin-word" data-status={status}>
      {words({ status, margin })}
    </span>
  );
}
