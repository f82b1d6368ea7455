import { readDuty } from './duty/read-duty';
import type { FindState } from './find-address';
import { requestOf } from './request-of';
import type { SearchRequest } from './requests/search-request';

/** What Find asks: as it is typed, and as the server takes it. */
export interface Question {
  state: FindState;
  /** Undefined while something typed cannot be read. */
  request: SearchRequest | undefined;
}

export const questionOf = (state: FindState): Question => ({
  state,
  request: requestOf(state, readDuty(state.duty).duty),
});

const asked = ['duty', 'text', 'filters', 'flags', 'show', 'grouped', 'sort'] as const;

/** Whether two states ask the same; the part whose sheet is open makes no difference. */
export const sameQuestion = (first: FindState, second: FindState): boolean =>
  asked.every((name) => first[name] === second[name]);
