import type { Frame } from './drawn-body';

/** Width of a character against its height in the typeface used, bold tabular figures. */
const characterShare = 0.6;

/** Printed characters as large as the body leaves room for. */
export function Characters({ text, frame, colour }: { text: string; frame: Frame; colour: string }) {
  const size = Math.min(frame.height * 0.62, frame.width / (characterShare * text.length + 0.3));
  return (
    <text
      x={frame.x + frame.width / 2}
      y={frame.y + frame.height / 2}
      dy="0.36em"
      textAnchor="middle"
      fontSize={size}
      fontWeight={600}
      letterSpacing="0.02em"
      fill={colour}
    >
      {text}
    </text>
  );
}
