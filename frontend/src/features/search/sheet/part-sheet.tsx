import { chakra } from '@chakra-ui/react';
import type { Duty } from '@resistry/engineering/duty/duty';
import { Suspense, lazy } from 'react';
import { Link } from 'react-router-dom';
import type { AnsweredAssessment } from '../../../components/assessment/answered-assessment';
import { Cautions } from '../../../components/assessment/cautions';
import { CheckLines } from '../../../components/assessment/check-lines';
import { DrawnPart } from '../../../components/drawn-part/drawn-part';
import { Moving } from '../../../components/moving';
import { SideSheet } from '../../../components/side-sheet';
import { Failed, Loading } from '../../../components/states';
import { usePolicyEntry } from '../../policies/use-policy-entry';
import { operatingOf } from '../../parts/operating-of';
import { usePartAssessment } from '../../parts/requests/assess-part';
import { type PartDetails, usePart } from '../../parts/requests/get-part';
import type { SearchRequest } from '../requests/search-request';
import { leadingNumber } from '../search-part';
import { bodyOfPart, sizeCode, valueWords } from '../results/part-figures';

const DeratingChart = lazy(() =>
  import('../../../components/charts/derating-chart').then((module) => ({ default: module.DeratingChart })),
);

export interface PartSheetProps {
  id: number;
  /** Undefined while the duty cannot be read. */
  duty: Duty | undefined;
  policy?: SearchRequest['policy'];
  policyName: string;
  /** Carries the duty to the part's own page. */
  address: string;
  onClose: () => void;
}

/** A part beside the list: the whole assessment, every line open to its basis. */
export default function PartSheet({ id, duty, policy, policyName, address, onClose }: PartSheetProps) {
  const part = usePart(id);
  const assessment = usePartAssessment(id, duty && { duty, policy });
  const failure = part.error ?? assessment.error;
  return (
    <Moving>
      <SideSheet label="Assessment" onClose={onClose}>
        {part.data !== undefined && <SheetHead part={part.data} address={address} />}
        {failure !== null && (
          <Failed
            error={failure}
            onRetry={() => {
              void part.refetch();
              void assessment.refetch();
            }}
          />
        )}
        {failure === null &&
          (part.data === undefined || (assessment.data === undefined && duty !== undefined)) && (
            <Loading label="Assessing the part" lines={9} />
          )}
        {part.data !== undefined && assessment.data !== undefined && duty !== undefined && (
          <SheetBody part={part.data} assessment={assessment.data} duty={duty} policyName={policyName} />
        )}
      </SideSheet>
    </Moving>
  );
}

function SheetHead({ part, address }: { part: PartDetails; address: string }) {
  const body = bodyOfPart(part);
  return (
    <chakra.div display="flex" gap={3} alignItems="center" pe={8} mb={3}>
      {body !== undefined && <DrawnPart body={body} size="sheet" labelled />}
      <div>
        <chakra.h2 fontSize="lg">{leadingNumber(part)}</chakra.h2>
        <chakra.p fontSize="xs" color="fg.muted" lineHeight={1.35}>
          {part.manufacturer.name} {part.family.code} {sizeCode(part)}, {valueWords(part)}
        </chakra.p>
        <chakra.p fontSize="xs" mt={0.5}>
          <Link to={`/parts/${part.id}${address}`}>Ratings, offers and history</Link>
        </chakra.p>
      </div>
    </chakra.div>
  );
}

interface SheetBodyProps {
  part: PartDetails;
  assessment: AnsweredAssessment;
  duty: Duty;
  policyName: string;
}

function SheetBody({ part, assessment, duty, policyName }: SheetBodyProps) {
  const mode = part.modes.find((each) => (each.name ?? undefined) === assessment.mode) ?? part.modes[0];
  const { derating, ratedDissipation } = mode?.ratings ?? {};
  const entry = usePolicyEntry(assessment.policy, mode?.ratings);
  return (
    <chakra.div display="grid" gap={5}>
      <div>
        <CheckLines checks={assessment.checks} />
        {assessment.mode !== undefined && (
          <chakra.p fontSize="xs" color="fg.muted" mt={1.5}>
            In the operating mode “{assessment.mode}”.
          </chakra.p>
        )}
      </div>
      {derating !== undefined && ratedDissipation !== undefined && (
        <Suspense fallback={<Loading label="Drawing the derating curve" lines={4} />}>
          <DeratingChart
            title="Derating"
            ratedDissipation={ratedDissipation}
            curve={derating}
            entry={entry}
            policyName={policyName}
            operating={operatingOf(duty, assessment, derating.axis)}
          />
        </Suspense>
      )}
      <Cautions cautions={assessment.cautions} notice={assessment.notice} />
    </chakra.div>
  );
}
