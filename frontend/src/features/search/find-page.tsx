import { Suspense, lazy, useCallback, useEffect, useMemo, useRef, useState } from 'react';
import { Button } from '../../components/button';
import { useSingleKey } from '../../components/single-key';
import { type PolicySummary, usePolicies } from '../policies/requests/list-policies';
import { readDuty } from './duty/read-duty';
import { FilterPanel } from './filters/filter-panel';
import { Desk, Panel, Pane, Steady } from './find-layout';
import { writeFind } from './find-address';
import type { ChangeDuty } from './panel/change-duty';
import { DutyPanel } from './panel/duty-panel';
import { entryPlace, goToPlace } from './panel/panel-places';
import { policyNameOf } from './policy-name';
import { questionOf } from './question';
import { useSearch } from './requests/use-search';
import { ResultsPane } from './results/results-pane';
import { Sentence } from './sentence/sentence';
import { withServerErrors } from './server-errors';
import { useDebounced } from './use-debounced';
import { useFindState } from './use-find-state';
import { useIsNarrow } from './use-is-narrow';

// With its charts and motion it is worth loading only once a row is opened.
const PartSheet = lazy(() => import('./sheet/part-sheet'));

/** Below this the table's columns no longer fit, and a row becomes one cell; px of the pane. */
const narrowBelow = 620;
/** A refusal is said once the typing has stopped for this long: half a number often contradicts the other entries. */
const refusalPauseMilliseconds = 600;
const noPolicies: readonly PolicySummary[] = [];

/** Find: a duty on one side, the parts that meet it on the other, with why and why not. */
export function Component() {
  const [state, change, asked] = useFindState();
  const [panelOpen, setPanelOpen] = useState(false);
  const paneRef = useRef<HTMLDivElement>(null);
  const narrow = useIsNarrow(paneRef, narrowBelow);
  const policies = usePolicies().data ?? noPolicies;

  const question = useMemo(() => questionOf(asked), [asked]);
  const search = useSearch(question);
  const settled = useDebounced(asked, refusalPauseMilliseconds) === asked;
  const failure = settled && !search.waiting ? search.error : null;
  const read = useMemo(() => readDuty(state.duty), [state.duty]);
  const shownRead = useMemo(() => withServerErrors(read, failure), [read, failure]);

  const changeDuty = useCallback<ChangeDuty>(
    (update) => change((before) => ({ ...before, duty: update(before.duty) })),
    [change],
  );
  const close = useCallback(() => change((before) => ({ ...before, part: undefined })), [change]);
  const openPanel = useCallback(() => setPanelOpen(true), []);
  const toDuty = useCallback(() => {
    setPanelOpen(true);
    requestAnimationFrame(() => goToPlace(entryPlace('lower')));
    return true;
  }, []);
  const toParts = useCallback(() => {
    setPanelOpen(false);
    requestAnimationFrame(() =>
      // The first rows are in sight; the browser would put the whole table there, and the sentence out of it.
      paneRef.current?.querySelector<HTMLElement>('[role=grid]')?.focus({ preventScroll: true }),
    );
    return true;
  }, []);
  useSingleKey('d', toDuty);
  useSingleKey('p', toParts);
  const latest = useRef(state);
  useEffect(() => {
    latest.current = state;
  }, [state]);
  const address = useCallback(
    () => `${window.location.origin}/find?${writeFind({ ...latest.current, part: undefined }).toString()}`,
    [],
  );

  return (
    <Desk data-sheet={state.part === undefined ? 'closed' : 'open'}>
      <title>Find · Resistry</title>
      <Panel data-open={panelOpen} id="duty-panel">
        <Button display={{ md: 'none' }} variant="solid" mb={4} onClick={toParts}>
          Show the parts
        </Button>
        <DutyPanel
          duty={state.duty}
          read={shownRead}
          onChange={changeDuty}
          policies={policies}
          onEnter={toParts}
        />
        <FilterPanel filters={state.filters} flags={state.flags} onChange={change} />
      </Panel>
      <Pane ref={paneRef}>
        <div>
          <Steady>
            <Sentence
              duty={state.duty}
              policies={policies}
              errors={shownRead.errors}
              onChange={changeDuty}
              onGoTo={openPanel}
            />
            <Button display={{ md: 'none' }} mt={2} aria-controls="duty-panel" onClick={openPanel}>
              Change the duty
            </Button>
          </Steady>
          <ResultsPane
            question={question}
            search={search}
            failure={failure}
            read={read}
            onGoTo={openPanel}
            text={state.text}
            filters={state.filters}
            flags={state.flags}
            show={state.show}
            grouped={state.grouped}
            sort={state.sort}
            narrow={narrow}
            openPart={state.part}
            scrollRef={paneRef}
            onChange={change}
            onChangeDuty={changeDuty}
            address={address}
          />
        </div>
      </Pane>
      {state.part !== undefined && (
        <Suspense fallback={null}>
          <PartSheet
            key={state.part}
            id={state.part}
            duty={question.request?.duty}
            policy={question.request?.policy}
            policyName={policyNameOf(state.duty.policy, policies)}
            address={`?${writeFind(state).toString()}`}
            onClose={close}
          />
        </Suspense>
      )}
    </Desk>
  );
}
