import { join } from 'node:path';
import { Worker } from 'node:worker_threads';
import { Problem } from '../../common/problems/problem';
import type { SearchPlan, SearchResult } from '../engine/search-plan';
import type { CatalogueIndex } from '../index/catalogue-index';
import type { FromSearchThread, ToSearchThread } from './search-messages';
import type { SearchHost } from './search-host';

/** Searches leave little behind that lives on: a small nursery keeps the thread small. */
const nurseryMegabytes = 16;

function startThread(): Worker {
  return new Worker(join(__dirname, 'search-thread.js'), {
    resourceLimits: { maxYoungGenerationSizeMb: nurseryMegabytes },
  });
}

interface Waiting {
  plan: SearchPlan;
  gone?: AbortSignal;
  resolve: (result: SearchResult) => void;
  reject: (error: Error) => void;
}

/**
 * Computes in a thread of its own, so that a search over a large catalogue never keeps other requests waiting. One search
 * after another; who types on gives the earlier ones up before they are begun. A thread that dies fails the search it held
 * and is replaced, with the same index.
 */
export class ThreadSearchHost implements SearchHost {
  private worker: Worker;
  private index?: CatalogueIndex;
  private closing = false;
  private readonly queue: Waiting[] = [];
  private running?: Waiting;

  /** @param newThread starts the thread that searches */
  constructor(private readonly newThread: () => Worker = startThread) {
    this.worker = this.start();
  }

  take(index: CatalogueIndex): void {
    this.index = index;
    this.send({ kind: 'index', index });
  }

  search(plan: SearchPlan, gone?: AbortSignal): Promise<SearchResult> {
    return new Promise((resolve, reject) => {
      this.queue.push({ plan, gone, resolve, reject });
      this.begin();
    });
  }

  async close(): Promise<void> {
    this.closing = true;
    await this.worker.terminate();
  }

  private begin(): void {
    while (this.running === undefined) {
      const next = this.queue.shift();
      if (next === undefined) return;
      if (next.gone?.aborted === true) {
        next.reject(new Problem('abandoned', 'Nobody waited for this search any more.'));
        continue;
      }
      this.running = next;
      this.send({ kind: 'search', plan: next.plan });
    }
  }

  private send(message: ToSearchThread): void {
    this.worker.postMessage(message);
  }

  private start(): Worker {
    const worker = this.newThread();
    worker.on('message', (reply: FromSearchThread) => {
      const { running } = this;
      this.running = undefined;
      if (reply.ok) running?.resolve(reply.result);
      else running?.reject(Object.assign(new Error(reply.message), { stack: reply.stack }));
      this.begin();
    });
    worker.on('error', (error: Error) => this.replace(error));
    return worker;
  }

  private replace(error: Error): void {
    const { running } = this;
    this.running = undefined;
    running?.reject(error);
    if (this.closing) return;
    this.worker = this.start();
    if (this.index !== undefined) this.send({ kind: 'index', index: this.index });
    this.begin();
  }
}
