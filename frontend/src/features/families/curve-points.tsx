import { chakra } from '@chakra-ui/react';
import type { Quantity } from '@resistry/engineering/notation/quantity';
import { Figure } from '../../components/figure';

export interface CurvePointsProps {
  /** Points of (s, `quantity` in SI). */
  points: readonly (readonly [number, number])[];
  quantity: Quantity;
}

/** The points of a pulse curve, as the datasheet's table would print them. */
export function CurvePoints({ points, quantity }: CurvePointsProps) {
  return (
    <chakra.ul fontSize="xs">
      {points.map(([seconds, value]) => (
        <chakra.li key={seconds} display="flex" gap={2} justifyContent="space-between" maxWidth="8rem">
          <Figure value={seconds} quantity="time" />
          <Figure value={value} quantity={quantity} />
        </chakra.li>
      ))}
    </chakra.ul>
  );
}
