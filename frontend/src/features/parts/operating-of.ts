import type { Duty } from '@resistry/engineering/duty/duty';
import type { DeratingAxis } from '@resistry/engineering/ratings/ratings';

import type { AnsweredAssessment } from '../../components/assessment/answered-assessment';

/**
 * Where the duty lies on a derating chart: from and to in °C on the curve's axis, dissipation in W.
 * @returns undefined where the duty states no temperature on that axis, or no dissipation was found
 */
export function operatingOf(
  duty: Duty,
  assessment: AnsweredAssessment,
  axis: DeratingAxis,
): { from: number; to: number; dissipation: number } | undefined {
  const dissipation = assessment.checks.find((check) => check.check === 'dissipation')?.demand;
  const { ambient } = duty;
  if (dissipation === null || dissipation === undefined || ambient === undefined) return undefined;
  if (axis === 'ambient') {
    const rise = ambient.enclosureRise ?? 0;
    return { from: ambient.min, to: ambient.max + rise, dissipation };
  }
  const temperature = axis === 'terminal' ? ambient.terminal : ambient.case;
  return temperature === undefined ? undefined : { from: temperature, to: temperature, dissipation };
}
