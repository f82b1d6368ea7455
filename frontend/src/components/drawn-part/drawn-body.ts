import type { BodyMarking } from '@resistry/engineering/marking/body-marking';

/** Bodies that look different; everything in the catalogue is one of them. */
export type BodyStyle = 'chip' | 'melf' | 'axial' | 'cemented' | 'housed' | 'strip' | 'radial';

/** What is needed to draw a part: its body seen from above, and what it bears. */
export interface DrawnBody {
  style: BodyStyle;
  /** m, along the leads or terminations. */
  length: number;
  /** m, across them; the diameter of round bodies. */
  width: number;
  marking: BodyMarking;
}

/** A rectangle to draw into, in the units of the drawing. */
export interface Frame {
  x: number;
  y: number;
  width: number;
  height: number;
}

/** Length of each lead that is drawn, as a share of the body's length. */
const leadShare: Record<BodyStyle, number> = {
  chip: 0,
  melf: 0,
  strip: 0,
  radial: 0,
  housed: 0.16,
  cemented: 0.2,
  axial: 0.42,
};

/**
 * The largest frame of the body's own proportion that fits a box together with its leads.
 * @param body length and width in m; both must be above 0
 * @param box in px
 */
export function bodyFrame(body: DrawnBody, box: { width: number; height: number }): Frame {
  const leads = 2 * leadShare[body.style];
  const scale = Math.min(box.width / (body.length * (1 + leads)), box.height / body.width);
  const width = body.length * scale;
  const height = body.width * scale;
  return { x: (box.width - width) / 2, y: (box.height - height) / 2, width, height };
}

/** What the marking is, for those who do not see it. */
export function markingWords(marking: BodyMarking): string {
  switch (marking.kind) {
    case 'characters':
      return `marked ${marking.text}`;
    case 'bands':
      return `banded ${marking.bands.join(', ')}`;
    case 'none':
      return 'bears no marking';
    case 'unknown':
      return 'marking not known';
  }
}
