import { chakra } from '@chakra-ui/react';
import type { Duty } from '@resistry/engineering/duty/duty';
import type { AnsweredAssessment } from '../../../components/assessment/answered-assessment';
import { BudgetBar } from '../../../components/assessment/budget-bar';
import { Cautions } from '../../../components/assessment/cautions';
import { CheckLines } from '../../../components/assessment/check-lines';
import { DeratingChart } from '../../../components/charts/derating-chart';
import { StatusWord } from '../../../components/status-word';
import { checkWords } from '../../../wording/check-words';
import { usePolicyEntry } from '../../policies/use-policy-entry';
import { operatingOf } from '../operating-of';
import type { PartDetails } from '../requests/get-part';
import { PermittedValues } from './permitted-values';
import { Quiet, Section } from './section';

export interface AssessmentSectionProps {
  part: PartDetails;
  assessment: AnsweredAssessment;
  duty: Duty;
  policyName: string;
}

/** From how many times its demand a rating is called more than is needed; the server names it from there too. */
const worthNaming = 3;

function excessWords({ excess }: AnsweredAssessment): string {
  return Object.entries(excess)
    .filter(([, times]) => times >= worthNaming)
    .sort(([, first], [, second]) => second - first)
    .map(([check, times]) => {
      const name = checkWords[check as keyof typeof checkWords].toLowerCase();
      return `${name} ${times >= 10 ? Math.floor(times) : Math.floor(times * 10) / 10}\u202f×`;
    })
    .join(', ');
}

const Columns = chakra('div', {
  base: {
    display: 'grid',
    gap: { base: 6, lg: 10 },
    gridTemplateColumns: { base: 'minmax(0, 1fr)', lg: 'minmax(0, 1.25fr) minmax(0, 1fr)' },
    '& > div': { display: 'grid', gap: 6, alignContent: 'start', minWidth: 0 },
  },
});

/** The part held against the duty: every check, the budget, what it could bear here, and what to beware of. */
export function AssessmentSection({ part, assessment, duty, policyName }: AssessmentSectionProps) {
  const mode = part.modes.find((each) => each.name === assessment.mode) ?? part.modes[0];
  const { derating, ratedDissipation } = mode?.ratings ?? {};
  const entry = usePolicyEntry(assessment.policy, mode?.ratings);
  const link = part.resistance === 0;
  const excess = excessWords(assessment);
  const window = assessment.checks.find(({ check }) => check === 'value');
  return (
    <Columns>
      <div>
        <Section title="Checks">
          <chakra.p display="flex" gap={4} fontSize="sm" flexWrap="wrap" mb={2}>
            <StatusWord kind="verdict" status={assessment.verdict} />
            {assessment.mode !== undefined && <span>in the operating mode “{assessment.mode}”</span>}
            {excess !== '' && <span>more than is asked: {excess}</span>}
          </chakra.p>
          <CheckLines checks={assessment.checks} />
        </Section>
        <Section title="Deviation budget">
          {link ? (
            <Quiet>A link has no value to deviate from.</Quiet>
          ) : assessment.budget.length === 0 ? (
            <Quiet>State the lowest and the highest value to have the deviations added up.</Quiet>
          ) : (
            <BudgetBar
              lines={assessment.budget}
              allowance={window?.allowance ?? null}
              adds={duty.deviation !== 'root-sum-square'}
            />
          )}
        </Section>
      </div>
      <div>
        {derating !== undefined && ratedDissipation !== undefined && !link && (
          <DeratingChart
            title="Derating"
            ratedDissipation={ratedDissipation}
            curve={derating}
            entry={entry}
            policyName={policyName}
            operating={operatingOf(duty, assessment, derating.axis)}
          />
        )}
        <Section title="Permitted here">
          <PermittedValues assessment={assessment} link={link} />
        </Section>
        <Cautions cautions={assessment.cautions} notice={assessment.notice} />
      </div>
    </Columns>
  );
}
