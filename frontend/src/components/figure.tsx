import { formatQuantityParts } from '@resistry/engineering/notation/format-quantity-parts';
import type { Quantity } from '@resistry/engineering/notation/quantity';

export interface FigureProps {
  /** SI value; null or undefined is no number and is said to be none. */
  value: number | null | undefined;
  quantity: Quantity;
  /** Four by default: what a datasheet gives and a margin needs. */
  significantDigits?: number;
  /** Aligns the decimal points of figures that stand below each other. */
  aligned?: boolean;
}

/** A number with its unit, the unit lighter than the figure. */
export function Figure({ value, quantity, significantDigits = 4, aligned = false }: FigureProps) {
  if (value === null || value === undefined) return <span className="not-stated">not stated</span>;
  const { figure, unit } = formatQuantityParts(value, quantity, { significantDigits });
  const unitShown = unit !== '' && <span className="unit">{`\u00a0${unit}`}</span>;
  if (!aligned) {
    return (
      <span className="figure">
        {figure}
        {unitShown}
      </span>
    );
  }
  const point = figure.indexOf('.');
  return (
    <span className="figure aligned">
      <span>{point < 0 ? figure : figure.slice(0, point)}</span>
      <span>
        {point < 0 ? '' : figure.slice(point)}
        {unitShown}
      </span>
    </span>
  );
}
