import { EventEmitter } from 'node:events';
import type { Worker } from 'node:worker_threads';
import type { SearchPlan, SearchResult } from '../engine/search-plan';
import type { CatalogueIndex } from '../index/catalogue-index';
import type { FromSearchThread, ToSearchThread } from './search-messages';
import { ThreadSearchHost } from './thread-search-host';

/** Stands for the thread: notes what it is sent, answers when told to. */
class Thread extends EventEmitter {
  readonly sent: ToSearchThread[] = [];

  postMessage(message: ToSearchThread): void {
    this.sent.push(message);
  }

  terminate(): Promise<number> {
    return Promise.resolve(0);
  }

  reply(message: FromSearchThread): void {
    this.emit('message', message);
  }
}

const planAt = (offset: number): SearchPlan => ({
  duty: {},
  policy: 'none',
  filters: {},
  showUnrated: false,
  byCompanyNumber: false,
  sort: { by: 'preference', descending: false },
  offset,
  limit: 10,
  relaxations: false,
});
const resultOf = (total: number): SearchResult => ({
  total,
  unrated: 0,
  items: [],
  knockouts: [],
  relaxations: [],
  byApproval: {},
  exact: 0,
});

let threads: Thread[];
let host: ThreadSearchHost;
const thread = (): Thread => threads.at(-1)!;
const offsetsSent = (): number[] =>
  thread().sent.flatMap((message) => (message.kind === 'search' ? [message.plan.offset] : []));

beforeEach(() => {
  threads = [];
  host = new ThreadSearchHost(() => {
    threads.push(new Thread());
    return thread() as unknown as Worker;
  });
});

it('gives the thread one search at a time, in their order', async () => {
  const first = host.search(planAt(1));
  const second = host.search(planAt(2));
  expect(offsetsSent()).toEqual([1]);
  thread().reply({ ok: true, result: resultOf(11) });
  expect(offsetsSent()).toEqual([1, 2]);
  thread().reply({ ok: true, result: resultOf(22) });
  expect([(await first).total, (await second).total]).toEqual([11, 22]);
});

it('never begins a search that was given up while it waited', async () => {
  const first = host.search(planAt(1));
  const typing = new AbortController();
  const second = host.search(planAt(2), typing.signal);
  const third = host.search(planAt(3));
  typing.abort();
  thread().reply({ ok: true, result: resultOf(11) });
  await expect(second).rejects.toMatchObject({ kind: 'abandoned' });
  expect(offsetsSent()).toEqual([1, 3]);
  thread().reply({ ok: true, result: resultOf(33) });
  expect([(await first).total, (await third).total]).toEqual([11, 33]);
});

it('a thread that dies fails the search it held; the next ones go to a new thread with the same index', async () => {
  const index = { rows: [] } as unknown as CatalogueIndex;
  host.take(index);
  const first = host.search(planAt(1));
  const second = host.search(planAt(2));
  thread().emit('error', new Error('out of memory'));
  await expect(first).rejects.toThrow('out of memory');
  expect(threads).toHaveLength(2);
  expect(thread().sent[0]).toEqual({ kind: 'index', index });
  expect(offsetsSent()).toEqual([2]);
  thread().reply({ ok: true, result: resultOf(22) });
  expect((await second).total).toBe(22);
});
