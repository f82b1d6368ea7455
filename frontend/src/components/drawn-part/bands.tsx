import { colourSrgb } from '@resistry/engineering/marking/colour-srgb';
import type { Colour } from '@resistry/engineering/marking/colours';
import type { Frame } from './drawn-body';

/** How much wider the gap before the tolerance is than the others: it tells where reading starts. */
const lastGap = 1.7;

/** The index of the band before which the wide gap lies: the tolerance, which follows the multiplier. */
const toleranceIndex = (count: number): number => (count === 4 ? 3 : count >= 5 ? 4 : count);

/** Colour bands across a round body, first digit at the left. */
export function Bands({ bands, frame }: { bands: readonly Colour[]; frame: Frame }) {
  const wide = toleranceIndex(bands.length);
  const slots = Math.max(bands.length, 3) + (wide < bands.length ? lastGap - 1 : 0);
  const pitch = frame.width / slots;
  return bands.map((colour, index) => (
    <rect
      key={`${index} ${colour}`}
      x={frame.x + pitch * (index + 0.22 + (index >= wide ? lastGap - 1 : 0))}
      y={frame.y}
      width={pitch * 0.56}
      height={frame.height}
      fill={colourSrgb[colour]}
    />
  ));
}
