import type { BodyMarking } from '@resistry/engineering/marking/body-marking';
import { type BodyStyle, type DrawnBody, type Frame, bodyFrame, markingWords } from './drawn-body';
import { CementedBody, ChipBody, HousedBody, RadialBody, StripBody } from './flat-bodies';
import { AxialBody, MelfBody } from './round-bodies';

const boxes = {
  row: { width: 62, height: 26 },
  sheet: { width: 84, height: 42 },
  page: { width: 168, height: 72 },
};

const bodies: Record<BodyStyle, (props: { frame: Frame; marking: BodyMarking }) => React.ReactNode> = {
  chip: ChipBody,
  melf: MelfBody,
  axial: AxialBody,
  cemented: CementedBody,
  housed: HousedBody,
  strip: StripBody,
  radial: RadialBody,
};

export interface DrawnPartProps {
  body: DrawnBody;
  /** How much room it gets: in a table row, at the head of a side sheet or of a page. */
  size?: keyof typeof boxes;
  /** Says it to screen readers as well; left out where the row says the same in words. */
  labelled?: boolean;
}

/** A part as it lies on the bench: its body in true proportion with the marking it bears. */
export function DrawnPart({ body, size = 'row', labelled = false }: DrawnPartProps) {
  const box = boxes[size];
  const Body = bodies[body.style];
  const label = labelled
    ? { role: 'img', 'aria-label': markingWords(body.marking) }
    : { 'aria-hidden': true };
  return (
    <svg
      viewBox={`0 0 ${box.width} ${box.height}`}
      width={`${box.width}px`}
      height={`${box.height}px`}
      {...label}
    >
      <Body frame={bodyFrame(body, box)} marking={body.marking} />
    </svg>
  );
}
