import { ratingWordsInLine } from '../../../wording/rating-words';
import type { Alternate } from '../requests/get-alternates';

export type Difference = Alternate['differences'][number];

const kinds = { features: 'feature', certificates: 'certificate' } as const;

/** One difference of an alternate: `TCR 100 ppm/K → 50 ppm/K`, `without the feature “automotive”`. */
export function differenceWords({ field, mode, own, alternate }: Difference): string {
  if (field === 'features' || field === 'certificates') {
    return own === undefined
      ? `with the ${kinds[field]} “${alternate ?? ''}”`
      : `without the ${kinds[field]} “${own}”`;
  }
  if (field === 'pulses' && own !== undefined && alternate !== undefined) return 'other pulse curves';
  const inMode = mode === undefined ? '' : ` in the mode “${mode}”`;
  return `${ratingWordsInLine(field)} ${own ?? 'not stated'} → ${alternate ?? 'not stated'}${inMode}`;
}
