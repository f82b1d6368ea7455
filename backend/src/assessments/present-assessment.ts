import type { Assessment } from '@resistry/engineering/assessment/assess';
import { generalCaution } from '@resistry/engineering/cautions/cautions';
import type { AssessmentDto, CheckResultDto, PolicyUsed } from './dto/assessment.dto';
import type { BasisCitationDto } from './dto/basis.dto';

/** Finds the place in a datasheet where a field of the ratings is cited. */
export type CitationOf = (field: string) => BasisCitationDto | undefined;

/** An assessment as the API gives it: plain numbers, citations beside the inputs that have one. */
export function presentAssessment(
  assessment: Assessment,
  policy: PolicyUsed,
  citationOf: CitationOf = () => undefined,
): AssessmentDto {
  const { operating } = assessment;
  return {
    verdict: assessment.verdict,
    checks: assessment.checks.map((check) => presentCheck(check, citationOf)),
    budget: assessment.budget,
    permitted: assessment.permitted,
    excess: assessment.excess,
    cautions: assessment.cautions,
    ...(operating === undefined || !operating.settled
      ? {}
      : {
          operating: {
            low: operating.low,
            high: operating.high,
            dissipation: operating.dissipation,
            elementTemperature: Number.isNaN(operating.hot) ? null : operating.hot,
            steps: operating.steps,
          },
        }),
    ...(assessment.mode === undefined ? {} : { mode: assessment.mode }),
    policy,
    notice: generalCaution,
  };
}

function presentCheck(check: Assessment['checks'][number], citationOf: CitationOf): CheckResultDto {
  return {
    check: check.check,
    demand: check.demand,
    allowance: check.allowance,
    unit: check.unit,
    margin: check.margin,
    status: check.status,
    missing: check.missing,
    basis: {
      ...check.basis,
      inputs: check.basis.inputs.map((input) => {
        const citation =
          input.from === 'ratings' && input.field !== undefined ? citationOf(input.field) : undefined;
        return citation === undefined ? input : { ...input, citation };
      }),
    },
  };
}
