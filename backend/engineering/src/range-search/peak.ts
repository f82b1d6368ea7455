/** Bounds of the largest value of x · share(x), proven from above, and from below with room to settle in. */
export interface Peak {
  least: number;
  most: number;
  /** Whether it lies at the end of what was looked at, and may rise further beyond. */
  atEnd: boolean;
}

/** Relative step over which a curve is seen to rise or fall. */
const chord = 0.01;

/** How far below the end the peak is looked for, and how narrowly it is enclosed, as factors of x. */
const reach = 1e12;
const narrowness = 1.001;

/** Where the share has fallen this far, a part deviates beyond all measure and may count as without an operating point. */
const leastShare = 1e-5;

/**
 * Where an operating point is only just left, settling creeps: each step is nearly as long as the one before. At a value
 * smaller by this factor every step is at most 1 / 1.01 of the one before (the curve is convex, so its slope there is
 * below that of the chord to the peak), and a few thousand steps settle it.
 */
const roomToSettle = 1.01;

const golden = (Math.sqrt(5) - 1) / 2;

/**
 * Largest value of x · share(x) for x in (0, end]. The share never rises with x, and the product rises to one peak and
 * falls beyond it (it is x / (1 + d) or x · (1 − d) with d convex, rising and not negative). So where it still rises at
 * the end, the end is the largest; else the peak is enclosed by golden sections of the logarithm of x.
 */
export function peakOf(share: (x: number) => number, end: number): Peak {
  const atEnd = share(end);
  const beyond = share(end * (1 + chord));
  if (atEnd > leastShare && beyond * (1 + chord) >= atEnd) {
    const stepRatio = (atEnd / beyond - 1) / chord;
    const room = stepRatio < 1 / roomToSettle ? 1 : roomToSettle;
    return { least: (end * atEnd) / room, most: end * atEnd, atEnd: true };
  }
  const product = (logarithm: number): number => Math.exp(logarithm) * share(Math.exp(logarithm));
  let low = Math.log(end / reach);
  let high = Math.log(end);
  let left = high - golden * (high - low);
  let right = low + golden * (high - low);
  let atLeft = product(left);
  let atRight = product(right);
  while (high - low > Math.log(narrowness)) {
    if (atLeft >= atRight) {
      high = right;
      right = left;
      atRight = atLeft;
      left = high - golden * (high - low);
      atLeft = product(left);
    } else {
      low = left;
      left = right;
      atLeft = atRight;
      right = low + golden * (high - low);
      atRight = product(right);
    }
  }
  const found = Math.max(0, atLeft, atRight) / roomToSettle;
  const shareBelow = share(Math.exp(low));
  return {
    least: shareBelow > leastShare ? found : 0,
    most: Math.max(0, shareBelow) * Math.exp(high) * narrowness,
    atEnd: false,
  };
}
