import { chakra } from '@chakra-ui/react';
import { useDeferredValue } from 'react';
import { Loading } from '../../../components/states';
import type { ReadDuty } from '../duty/read-duty';
import { Steady } from '../find-layout';
import type { Question } from '../question';
import type { Search } from '../requests/use-search';
import { useKeptPlace } from '../use-kept-place';
import { countWords } from './count-line';
import { NothingAsked } from './nothing-asked';
import { Results, type ResultsProps } from './results';
import { SearchFailed } from './search-failed';

export interface ResultsPaneProps extends Omit<ResultsProps, 'answered'> {
  question: Question;
  search: Search;
  /** What went wrong, once it is worth saying: not while the entry that caused it is being typed. */
  failure: Error | null;
  read: ReadDuty;
  /** Called before leading to a control of the panel, which may be folded away. */
  onGoTo: () => void;
}

/** What the search answers, in each of its states: on its way, answered, waiting for a newer answer, refused, failed. */
export function ResultsPane({ question, search, failure, read, onGoTo, ...results }: ResultsPaneProps) {
  // Drawn after whatever is typed meanwhile, a slice at a time, so that no key waits for a table.
  const answered = useDeferredValue(search.latest);
  const current = answered?.question === question;
  const shown = failure === null ? answered : undefined;
  useKeptPlace(results.scrollRef, shown !== undefined);
  const nothingYet = failure === null && answered === undefined;
  return (
    <>
      <Steady>
        {shown === undefined && <chakra.h1 srOnly>Find</chakra.h1>}
        <chakra.div role="status" srOnly>
          {shown !== undefined && current && countWords(shown.answer.total, results.grouped)}
        </chakra.div>
        {failure !== null && <SearchFailed error={failure} onRetry={search.retry} />}
        {nothingYet && question.request === undefined && <NothingAsked read={read} onGoTo={onGoTo} />}
        {nothingYet && question.request !== undefined && (
          <Loading label="Searching the catalogue" lines={12} />
        )}
      </Steady>
      {shown !== undefined && (
        <chakra.div
          data-stale={current ? undefined : ''}
          aria-busy={!current && question.request !== undefined}
          // An answer that comes at once is not worth a flicker.
          css={{ '&[data-stale]': { opacity: 0.6, transition: 'opacity 120ms 200ms' } }}
        >
          <Results {...results} answered={shown} />
        </chakra.div>
      )}
    </>
  );
}
