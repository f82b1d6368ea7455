import { chakra } from '@chakra-ui/react';
import { Suspense, lazy, useCallback, useMemo, useRef, useState } from 'react';
import { Button } from '../../components/button';
import { Empty, Loading } from '../../components/states';
import { useElementWidth } from '../../components/use-element-width';
import { usePolicies } from '../policies/requests/list-policies';
import { readDuty } from './duty/read-duty';
import { FilterChips } from './filters/filter-chips';
import { FilterPanel } from './filters/filter-panel';
import { isNarrowed, writeFind } from './find-address';
import { Ledger } from './ledger/ledger';
import type { ChangeDuty } from './panel/change-duty';
import { DutyPanel } from './panel/duty-panel';
import { policyNameOf } from './policy-name';
import { requestOf } from './request-of';
import { useSearch } from './requests/use-search';
import { NothingMeets } from './results/nothing-meets';
import { Results } from './results/results';
import { SearchFailed } from './results/search-failed';
import { Sentence } from './sentence/sentence';
import { withServerErrors } from './server-errors';
import { useDebounced } from './use-debounced';
import { useFindState } from './use-find-state';

// With its charts and motion it is worth loading only once a row is opened.
const PartSheet = lazy(() => import('./sheet/part-sheet'));

/** Long enough to let a number be finished, short enough that rows seem to follow the typing. */
const typingPauseMilliseconds = 80;
/** Below this the table's columns no longer fit, and a row becomes one cell. */
const narrowBelow = 620;

const Desk = chakra('div', {
  base: {
    display: 'grid',
    height: 'full',
    gridTemplateRows: 'minmax(0, 1fr)',
    gridTemplateColumns: { base: 'minmax(0, 1fr)', md: '16.5rem minmax(0, 1fr)' },
    '&[data-sheet=open]': {
      gridTemplateColumns: {
        base: 'minmax(0, 1fr)',
        md: '16.5rem minmax(0, 1fr)',
        xl: '16.5rem minmax(0, 1fr) 23.75rem',
      },
    },
  },
});

const Panel = chakra('div', {
  base: {
    overflowY: 'auto',
    px: 5,
    py: 4,
    borderInlineEnd: '1px solid',
    borderColor: 'border',
    '&[data-open=false]': { display: { base: 'none', md: 'block' } },
    position: { base: 'fixed', md: 'static' },
    insetBlockStart: { base: '3.25rem', md: 'auto' },
    insetBlockEnd: { base: 0, md: 'auto' },
    insetInline: { base: 0, md: 'auto' },
    bg: 'bg',
    zIndex: { base: 'bar', md: 'auto' },
  },
});

/** Find: a duty on one side, the parts that meet it on the other, with why and why not. */
export function Component() {
  const [state, change] = useFindState();
  const [panelOpen, setPanelOpen] = useState(false);
  const scrollRef = useRef<HTMLDivElement>(null);
  const width = useElementWidth(scrollRef);
  const policies = usePolicies();

  const read = useMemo(() => readDuty(state.duty), [state.duty]);
  const settled = useDebounced(state, typingPauseMilliseconds);
  const request = useMemo(() => requestOf(settled, readDuty(settled.duty).duty), [settled]);
  const search = useSearch(request);
  const shownRead = useMemo(() => withServerErrors(read, search.error), [read, search.error]);
  const policyName = policyNameOf(state.duty.policy, policies.data ?? []);

  const changeDuty = useCallback<ChangeDuty>(
    (update) => change((before) => ({ ...before, duty: update(before.duty) })),
    [change],
  );
  const open = useCallback((part: number) => change((before) => ({ ...before, part })), [change]);
  const close = useCallback(() => change((before) => ({ ...before, part: undefined })), [change]);

  return (
    <Desk data-sheet={state.part === undefined ? 'closed' : 'open'}>
      <title>Find · Resistry</title>
      <Panel data-open={panelOpen} id="duty-panel">
        <Button display={{ md: 'none' }} variant="solid" mb={4} onClick={() => setPanelOpen(false)}>
          Show the parts
        </Button>
        <DutyPanel duty={state.duty} read={shownRead} onChange={changeDuty} policies={policies.data ?? []} />
        <FilterPanel state={state} onChange={change} />
      </Panel>
      <chakra.div
        ref={scrollRef}
        overflow="auto"
        px={{ base: 4, md: 6 }}
        py={4}
        position="relative"
        minWidth={0}
      >
        <div>
          {search.answer === undefined && <chakra.h1 srOnly>Find</chakra.h1>}
          <Sentence
            duty={state.duty}
            policies={policies.data ?? []}
            errors={shownRead.errors}
            onChange={changeDuty}
            onGoTo={() => setPanelOpen(true)}
          />
          <Button
            display={{ md: 'none' }}
            mt={2}
            aria-controls="duty-panel"
            onClick={() => setPanelOpen(true)}
          >
            Change the duty
          </Button>
          {search.error !== null && !search.waiting && (
            <SearchFailed error={search.error} onRetry={search.retry} />
          )}
          {request === undefined && search.answer === undefined && (
            <Empty title="Nothing is searched yet">
              An entry cannot be read: it is marked, with what to do about it. Once it can be, the parts stand
              here.
            </Empty>
          )}
          {request !== undefined && search.answer === undefined && search.error === null && (
            <Loading label="Searching the catalogue" lines={12} />
          )}
          {search.answer !== undefined && (
            <chakra.div
              opacity={search.waiting || request === undefined ? 0.6 : 1}
              aria-busy={search.waiting}
              transition="opacity 120ms"
            >
              <Results
                search={search}
                request={request}
                show={state.show}
                grouped={state.grouped}
                sort={state.sort}
                narrow={(width ?? 1000) < narrowBelow}
                openPart={state.part}
                scrollRef={scrollRef}
                onSort={(sort) => change((before) => ({ ...before, sort }))}
                onShow={(show) => change((before) => ({ ...before, show }))}
                onGrouped={(grouped) => change((before) => ({ ...before, grouped }))}
                onOpen={open}
                address={() =>
                  `${window.location.origin}/find?${writeFind({ ...state, part: undefined }).toString()}`
                }
                nothing={
                  <NothingMeets
                    answer={search.answer}
                    duty={state.duty}
                    narrowed={isNarrowed(state)}
                    onChange={changeDuty}
                    onShowUnrated={() => change((before) => ({ ...before, show: 'met-and-unrated' }))}
                  />
                }
                ledger={
                  <>
                    <Ledger answer={search.answer} duty={state.duty} onChange={changeDuty} />
                    <FilterChips state={state} onChange={change} />
                  </>
                }
              />
            </chakra.div>
          )}
        </div>
      </chakra.div>
      {state.part !== undefined && (
        <Suspense fallback={null}>
          <PartSheet
            key={state.part}
            id={state.part}
            duty={request?.duty}
            policy={request?.policy}
            policyName={policyName}
            address={`?${writeFind(state).toString()}`}
            onClose={close}
          />
        </Suspense>
      )}
    </Desk>
  );
}
