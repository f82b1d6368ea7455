import type { BodyMarking } from '@resistry/engineering/marking/body-marking';
import { useId } from 'react';
import { Bands } from './bands';
import { Characters } from './characters';
import type { Frame } from './drawn-body';

interface BodyProps {
  frame: Frame;
  marking: BodyMarking;
}

function Marking({ marking, frame, colour }: BodyProps & { colour: string }) {
  if (marking.kind === 'bands') return <Bands bands={marking.bands} frame={frame} />;
  if (marking.kind === 'characters') return <Characters text={marking.text} frame={frame} colour={colour} />;
  return null;
}

/** A cylinder with metal end caps for surface mounting. */
export function MelfBody({ frame, marking }: BodyProps) {
  const cap = frame.width * 0.17;
  const middle = { ...frame, x: frame.x + cap, width: frame.width - 2 * cap };
  return (
    <>
      <rect {...frame} rx={frame.height * 0.16} fill="#c9c6be" stroke="#8d8a82" strokeWidth={0.5} />
      <rect {...middle} fill="#9db8a6" />
      <Marking marking={marking} frame={middle} colour="#26282a" />
    </>
  );
}

/** Outline of a lacquered body that swells over its end caps. */
function swollenOutline({ x, y, width, height }: Frame): string {
  const end = width * 0.22;
  const waist = height * 0.09;
  const round = Math.min(end * 0.5, height * 0.3);
  return [
    `M${x} ${y + round}Q${x} ${y} ${x + round} ${y}`,
    `H${x + end - round}Q${x + end} ${y} ${x + end} ${y + waist}`,
    `H${x + width - end}Q${x + width - end} ${y} ${x + width - end + round} ${y}`,
    `H${x + width - round}Q${x + width} ${y} ${x + width} ${y + round}`,
    `V${y + height - round}Q${x + width} ${y + height} ${x + width - round} ${y + height}`,
    `H${x + width - end + round}Q${x + width - end} ${y + height} ${x + width - end} ${y + height - waist}`,
    `H${x + end}Q${x + end} ${y + height} ${x + end - round} ${y + height}`,
    `H${x + round}Q${x} ${y + height} ${x} ${y + height - round}Z`,
  ].join('');
}

/** A lacquered body on two leads. */
export function AxialBody({ frame, marking }: BodyProps) {
  const clip = useId();
  const outline = swollenOutline(frame);
  const middle = frame.y + frame.height / 2;
  const banded = { ...frame, x: frame.x + frame.width * 0.07, width: frame.width * 0.86 };
  return (
    <>
      <clipPath id={clip}>
        <path d={outline} />
      </clipPath>
      <path
        d={`M${frame.x - frame.width * 0.42} ${middle}h${frame.width * 1.84}`}
        stroke="#8f9498"
        strokeWidth={Math.max(1, frame.height * 0.1)}
      />
      <path d={outline} fill="#c9a878" />
      <g clipPath={`url(#${clip})`}>
        <Marking marking={marking} frame={banded} colour="#26282a" />
      </g>
    </>
  );
}
