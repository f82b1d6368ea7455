import type { BodyMarking } from '@resistry/engineering/marking/body-marking';
import { Characters } from './characters';
import type { Frame } from './drawn-body';

interface BodyProps {
  frame: Frame;
  marking: BodyMarking;
}

const inset = (frame: Frame, share: number): Frame => ({
  ...frame,
  x: frame.x + frame.width * share,
  width: frame.width * (1 - 2 * share),
});

function Printed({ marking, frame, colour }: BodyProps & { colour: string }) {
  return marking.kind === 'characters' ? (
    <Characters text={marking.text} frame={frame} colour={colour} />
  ) : null;
}

/** A rectangular chip: dark protective glaze between tinned end caps. */
export function ChipBody({ frame, marking }: BodyProps) {
  const middle = inset(frame, 0.15);
  return (
    <>
      <rect {...frame} rx={1} fill="#d5d2ca" stroke="#8d8a82" strokeWidth={0.5} />
      <rect {...middle} fill="#26282a" />
      <Printed frame={middle} marking={marking} colour="#f4f1e8" />
    </>
  );
}

/** A metal strip or shunt: copper ends welded to the resistive alloy. */
export function StripBody({ frame, marking }: BodyProps) {
  const middle = inset(frame, 0.2);
  return (
    <>
      <rect {...frame} rx={1} fill="#b9794a" stroke="#7d4d2b" strokeWidth={0.5} />
      <rect {...middle} fill="#5d6063" />
      <Printed frame={middle} marking={marking} colour="#f4f1e8" />
    </>
  );
}

function Leads({ frame, reach }: { frame: Frame; reach: number }) {
  const middle = frame.y + frame.height / 2;
  return (
    <path
      d={`M${frame.x - reach * frame.width} ${middle}H${frame.x + frame.width * (1 + reach)}`}
      stroke="#8f9498"
      strokeWidth={Math.max(1.2, frame.height * 0.09)}
    />
  );
}

/** A cemented wirewound part: a ceramic trough with axial leads. */
export function CementedBody({ frame, marking }: BodyProps) {
  return (
    <>
      <Leads frame={frame} reach={0.2} />
      <rect {...frame} rx={1} fill="#ebe6d8" stroke="#8d8a82" strokeWidth={0.7} />
      <Printed frame={inset(frame, 0.08)} marking={marking} colour="#26282a" />
    </>
  );
}

/** An aluminium-housed part: ribbed profile between two mounting ears. */
export function HousedBody({ frame, marking }: BodyProps) {
  const profile = { ...inset(frame, 0.14), y: frame.y + frame.height * 0.08, height: frame.height * 0.84 };
  const ribs = [0.16, 0.84].map((share) => profile.y + profile.height * share);
  return (
    <>
      <Leads frame={frame} reach={0.16} />
      <rect {...frame} rx={frame.height * 0.12} fill="#a8a294" />
      {[0.07, 0.93].map((share) => (
        <circle
          key={share}
          cx={frame.x + frame.width * share}
          cy={frame.y + frame.height / 2}
          r={Math.min(frame.width * 0.035, frame.height * 0.14)}
          fill="#5b5850"
        />
      ))}
      <rect {...profile} fill="#c8a24c" />
      {ribs.map((y) => (
        <path key={y} d={`M${profile.x} ${y}h${profile.width}`} stroke="#8a6c28" strokeWidth={0.8} />
      ))}
      <Printed frame={profile} marking={marking} colour="#26282a" />
    </>
  );
}

/** An upright part whose two leads leave on one side. */
export function RadialBody({ frame, marking }: BodyProps) {
  const body = { ...frame, height: frame.height * 0.78 };
  return (
    <>
      {[0.25, 0.75].map((share) => (
        <path
          key={share}
          d={`M${frame.x + frame.width * share} ${body.y + body.height}V${frame.y + frame.height}`}
          stroke="#8f9498"
          strokeWidth={Math.max(1.2, frame.width * 0.05)}
        />
      ))}
      <rect {...body} rx={body.height * 0.08} fill="#5b6f86" />
      <Printed frame={inset(body, 0.08)} marking={marking} colour="#f4f1e8" />
    </>
  );
}
