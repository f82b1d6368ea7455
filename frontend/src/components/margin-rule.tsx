import type { Status } from '@resistry/engineering/checks/check';
import { useId } from 'react';
import { demandPosition, highestRatio, lowestRatio, positionOf, tickRatios } from './margin-scale';

export interface MarginRuleProps {
  status: Status;
  /** allowance / demand − 1; null where the check is yes-or-no, the demand is 0 or nothing is known. */
  margin: number | null;
}

const trackHeight = 12;
const middle = trackHeight / 2;

function Track() {
  return (
    <g className="track" stroke="currentColor">
      <line x1="0" x2="100%" y1={middle} y2={middle} strokeWidth={2} />
      {tickRatios.map((ratio) => {
        const at = `${positionOf(ratio)}%`;
        return <line key={ratio} x1={at} x2={at} y1={middle - 3} y2={middle + 3} strokeWidth={1} />;
      })}
      <line x1="100%" x2="100%" y1={middle - 3} y2={middle + 3} strokeWidth={1} />
    </g>
  );
}

function DemandTick() {
  const at = `${demandPosition}%`;
  return (
    <line
      className="demand"
      x1={at}
      x2={at}
      y1={0}
      y2={trackHeight}
      stroke="currentColor"
      strokeWidth={1.6}
    />
  );
}

/** Met: a solid bar from the demand to the allowance. Unmet: an open bar from the allowance up to the demand. */
function Allowance({ status, margin }: { status: 'met' | 'unmet'; margin: number }) {
  const ratio = margin + 1;
  const end = positionOf(ratio);
  const from = Math.min(end, demandPosition);
  const bar = { x: `${from}%`, width: `${Math.abs(end - demandPosition)}%`, y: middle - 3, height: 6 };
  if (status === 'met') {
    return (
      <g data-status="met">
        <rect {...bar} fill="currentColor" />
        {ratio > highestRatio && <BeyondEnd at="100%" direction={1} />}
      </g>
    );
  }
  return (
    <g data-status="unmet">
      <rect {...bar} fill="none" stroke="currentColor" strokeWidth={1.4} />
      {ratio < lowestRatio && <BeyondEnd at="0" direction={-1} />}
    </g>
  );
}

/** Says that the allowance lies outside the scale. */
function BeyondEnd({ at, direction }: { at: string; direction: 1 | -1 }) {
  const reach = 5 * direction;
  return (
    <svg x={at} overflow="visible">
      <path d={`M0 ${middle - 4.5}L${reach} ${middle}L0 ${middle + 4.5}Z`} fill="currentColor" />
    </svg>
  );
}

function Unrated() {
  const pattern = useId();
  return (
    <g data-status="unrated">
      <defs>
        <pattern
          id={pattern}
          width="5"
          height="5"
          patternUnits="userSpaceOnUse"
          patternTransform="rotate(45)"
        >
          <line x1="1" x2="1" y1="0" y2="5" stroke="currentColor" strokeWidth="1" />
        </pattern>
      </defs>
      <rect x="0" width="100%" y={middle - 3} height={6} fill={`url(#${pattern})`} />
    </g>
  );
}

/** A check without a number: a tick mark or a cross where the demand stands. */
function YesOrNo({ status }: { status: 'met' | 'unmet' }) {
  return (
    <svg x={`${demandPosition}%`} overflow="visible" data-status={status}>
      <path
        d={status === 'met' ? 'M-5 6.5 -1.5 10 5.5 2' : 'M-4.5 1.5 4.5 10.5M4.5 1.5 -4.5 10.5'}
        fill="none"
        stroke="currentColor"
        strokeWidth={1.8}
      />
    </svg>
  );
}

/**
 * One check on one horizontal logarithmic rule: the demand marked on it, the allowance as length. The figure in words
 * stands beside it and is what screen readers get; see MarginLine and MarginWord.
 */
export function MarginRule({ status, margin }: MarginRuleProps) {
  return (
    <svg className="margin-rule" aria-hidden="true">
      {status === 'unrated' ? (
        <>
          <Unrated />
          <DemandTick />
        </>
      ) : margin === null ? (
        <YesOrNo status={status} />
      ) : (
        <>
          <Track />
          <Allowance status={status} margin={margin} />
          <DemandTick />
        </>
      )}
    </svg>
  );
}
