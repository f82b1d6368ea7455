import { chakra } from '@chakra-ui/react';
import { useCallback, useMemo } from 'react';
import { Link, useParams } from 'react-router-dom';
import { Failed, Loading, NotReadAgain } from '../../components/states';
import { OffersSection } from '../offers/offers-section';
import { usePolicies } from '../policies/requests/list-policies';
import { readDuty } from '../search/duty/read-duty';
import { type FindState, writeFind } from '../search/find-address';
import type { ChangeDuty } from '../search/panel/change-duty';
import { DutyPanel } from '../search/panel/duty-panel';
import { policyNameOf } from '../search/policy-name';
import { requestOf } from '../search/request-of';
import { SearchFailed } from '../search/results/search-failed';
import { leadingNumber } from '../search/search-part';
import { Sentence } from '../search/sentence/sentence';
import { withServerErrors } from '../search/server-errors';
import { useDebounced } from '../search/use-debounced';
import { type ChangeFind, useFindState } from '../search/use-find-state';
import { PartHead } from './part-head';
import { usePartAssessment } from './requests/assess-part';
import { type PartDetails, usePart } from './requests/get-part';
import { AlternatesSection } from './sections/alternates-section';
import { AssessmentSection } from './sections/assessment-section';
import { HistorySection } from './sections/history-section';
import { MarkingSection } from './sections/marking-section';
import { PapersSection } from './sections/papers-section';
import { SourcesSection } from './sections/sources-section';
import { RatingsSection } from './sections/ratings-section';
import { StandingActions } from './standing/standing-actions';

const typingPauseMilliseconds = 80;

const Frame = chakra('div', {
  base: {
    maxWidth: 'page',
    mx: 'auto',
    px: { base: 4, md: 6 },
    py: 6,
    display: 'grid',
    gridTemplateColumns: 'minmax(0, 1fr)',
    gap: 8,
  },
});

const Pair = chakra('div', {
  base: {
    display: 'grid',
    gap: { base: 6, lg: 10 },
    gridTemplateColumns: { base: 'minmax(0, 1fr)', lg: 'repeat(2, minmax(0, 1fr))' },
  },
});

/** The page of one part, with the duty that the address carries. */
export function Component() {
  const id = Number(useParams().id);
  const part = usePart(id);
  const again = (): void => void part.refetch();
  if (part.data === undefined) {
    return (
      <Frame>
        <title>Part · Resistry</title>
        <chakra.h1 srOnly>Part</chakra.h1>
        {part.isError ? (
          <>
            <Failed error={part.error} onRetry={again} />
            <Link to="/find">To Find</Link>
          </>
        ) : (
          <Loading label="Reading the part" lines={14} />
        )}
      </Frame>
    );
  }
  return (
    <>
      {part.isError && (
        <Frame>
          <NotReadAgain error={part.error} onRetry={again} />
        </Frame>
      )}
      <PartPage key={id} part={part.data} />
    </>
  );
}

function PartPage({ part }: { part: PartDetails }) {
  const [state, change] = useFindState();
  const search = `?${writeFind({ ...state, part: undefined }).toString()}`;
  return (
    <Frame>
      <title>{`${leadingNumber(part)} · Resistry`}</title>
      <chakra.p fontSize="sm">
        <Link to={`/find?${writeFind({ ...state, part: part.id }).toString()}`}>Back to the list</Link>
      </chakra.p>
      <PartHead part={part} />
      <StandingActions part={part} />
      <HeldAgainstDuty part={part} state={state} change={change} />
      <RatingsSection part={part} />
      <Pair>
        <MarkingSection part={part} />
        <PapersSection part={part} />
      </Pair>
      <SourcesSection part={part} search={search} />
      <OffersSection part={part} />
      <AlternatesSection id={part.id} search={search} />
      <Pair>
        <HistorySection part={part} />
      </Pair>
    </Frame>
  );
}

interface HeldAgainstDutyProps {
  part: PartDetails;
  state: FindState;
  change: ChangeFind;
}

/** The duty, to be changed in place, and the part held against it. */
function HeldAgainstDuty({ part, state, change }: HeldAgainstDutyProps) {
  const policies = usePolicies();
  const read = useMemo(() => readDuty(state.duty), [state.duty]);
  const settled = useDebounced(state, typingPauseMilliseconds);
  const request = useMemo(() => requestOf(settled, readDuty(settled.duty).duty), [settled]);
  const assessment = usePartAssessment(part.id, request && { duty: request.duty, policy: request.policy });
  const shownRead = useMemo(() => withServerErrors(read, assessment.error), [read, assessment.error]);
  const changeDuty = useCallback<ChangeDuty>(
    (update) => change((before) => ({ ...before, duty: update(before.duty) })),
    [change],
  );
  const policyList = policies.data ?? [];
  return (
    <chakra.section aria-label="Held against the duty" display="grid" gap={4}>
      <Sentence duty={state.duty} policies={policyList} errors={shownRead.errors} onChange={changeDuty} />
      <chakra.details fontSize="sm">
        <chakra.summary cursor="pointer" color="fg.muted" py={1}>
          All of the duty
        </chakra.summary>
        <chakra.div maxWidth="form" mt={3}>
          <DutyPanel duty={state.duty} read={shownRead} onChange={changeDuty} policies={policyList} />
        </chakra.div>
      </chakra.details>
      {assessment.error !== null && (
        <SearchFailed error={assessment.error} onRetry={() => void assessment.refetch()} />
      )}
      {assessment.isPending && request !== undefined && <Loading label="Assessing the part" lines={9} />}
      {assessment.data !== undefined && request !== undefined && (
        <chakra.div opacity={assessment.isPlaceholderData ? 0.6 : 1} aria-busy={assessment.isPlaceholderData}>
          <AssessmentSection
            part={part}
            assessment={assessment.data}
            duty={request.duty}
            policyName={policyNameOf(settled.duty.policy, policyList)}
          />
        </chakra.div>
      )}
    </chakra.section>
  );
}
