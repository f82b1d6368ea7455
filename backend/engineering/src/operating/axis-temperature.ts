import type { Duty } from '../duty/duty';
import type { DeratingAxis } from '../ratings/ratings';

/** The hottest temperature on a derating curve's own axis, or the field of the duty that is missing. */
export type AxisTemperature = { known: true; celsius: number } | { known: false; missing: string };

/**
 * Hottest temperature on the axis of the derating curve, °C: the ambient with the rise inside the enclosure, or the
 * terminal or case temperature. A missing one is never replaced by another.
 */
export function axisTemperature(duty: Duty, axis: DeratingAxis): AxisTemperature {
  const ambient = duty.ambient;
  if (ambient === undefined)
    return { known: false, missing: axis === 'ambient' ? 'ambient' : `ambient.${axis}` };
  if (axis === 'ambient') return { known: true, celsius: ambient.max + (ambient.enclosureRise ?? 0) };
  const stated = ambient[axis];
  return stated === undefined
    ? { known: false, missing: `ambient.${axis}` }
    : { known: true, celsius: stated };
}
