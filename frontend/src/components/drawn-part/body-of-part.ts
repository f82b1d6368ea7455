import { type MarkedBody, bodyMarking } from '@resistry/engineering/marking/body-marking';
import type { BodyStyle, DrawnBody } from './drawn-body';

/** What is known of a part's body; sizes in m, Ω, fraction, 1/K. */
export interface KnownBody {
  style: BodyStyle;
  length?: number;
  width?: number;
  /** Inch code with the metric one where there is one: 1206/3216M. */
  sizeCode: string;
  resistance: number;
  tolerance?: number;
  tcr?: number;
}

const markedStyle: Record<BodyStyle, MarkedBody['style']> = {
  chip: 'chip',
  melf: 'melf',
  axial: 'axial',
  cemented: 'printed',
  housed: 'printed',
  strip: 'printed',
  radial: 'printed',
};

/** The body to draw, or undefined where its proportion is not known: an invented one would be a wrong picture. */
export function drawnBodyOf(part: KnownBody): DrawnBody | undefined {
  const { length, width } = part;
  if (length === undefined || width === undefined) return undefined;
  return {
    style: part.style,
    length,
    width,
    marking: bodyMarking({
      resistance: part.resistance,
      tolerance: part.tolerance,
      tcr: part.tcr,
      style: markedStyle[part.style],
      size: part.sizeCode,
      isLink: part.resistance === 0,
    }),
  };
}
