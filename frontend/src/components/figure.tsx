import { chakra } from '@chakra-ui/react';
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

const Unit = chakra('span', {
  base: { color: 'fg.muted', fontWeight: 'normal', fontSize: '0.92em' },
});

/** A number with its unit, the unit lighter than the figure. */
export function Figure({ value, quantity, significantDigits = 4, aligned = false }: FigureProps) {
  if (value === null || value === undefined) return <chakra.span color="fg.muted">not stated</chakra.span>;
  const { figure, unit } = formatQuantityParts(value, quantity, { significantDigits });
  if (!aligned) {
    return (
      <chakra.span whiteSpace="nowrap">
        {figure}
        {unit !== '' && <Unit> {unit}</Unit>}
      </chakra.span>
    );
  }
  const point = figure.indexOf('.');
  const whole = point < 0 ? figure : figure.slice(0, point);
  const rest = point < 0 ? '' : figure.slice(point);
  return (
    <chakra.span display="inline-grid" gridTemplateColumns="1fr 4.9ch" width="full" whiteSpace="nowrap">
      <chakra.span textAlign="right">{whole}</chakra.span>
      <chakra.span textAlign="left">
        {rest}
        {unit !== '' && <Unit> {unit}</Unit>}
      </chakra.span>
    </chakra.span>
  );
}
