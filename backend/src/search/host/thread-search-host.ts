import { join } from 'node:path';
import { Worker } from 'node:worker_threads';
import type { SearchPlan, SearchResult } from '../engine/search-plan';
import type { CatalogueIndex } from '../index/catalogue-index';
import type { FromSearchThread, ToSearchThread } from './search-messages';
import type { SearchHost } from './search-host';

interface Waiting {
  resolve: (result: SearchResult) => void;
  reject: (error: Error) => void;
}

/**
 * Computes in a thread of its own, so that a search over a large catalogue never keeps other requests waiting. A thread
 * that dies fails the searches it held and is replaced, with the same index.
 */
export class ThreadSearchHost implements SearchHost {
  private worker: Worker;
  private index?: CatalogueIndex;
  private nextId = 1;
  private closing = false;
  private readonly waiting = new Map<number, Waiting>();

  constructor() {
    this.worker = this.start();
  }

  take(index: CatalogueIndex): void {
    this.index = index;
    this.send({ kind: 'index', index });
  }

  search(plan: SearchPlan): Promise<SearchResult> {
    const id = this.nextId;
    this.nextId += 1;
    return new Promise((resolve, reject) => {
      this.waiting.set(id, { resolve, reject });
      this.send({ kind: 'search', id, plan });
    });
  }

  async close(): Promise<void> {
    this.closing = true;
    await this.worker.terminate();
  }

  private send(message: ToSearchThread): void {
    this.worker.postMessage(message);
  }

  private start(): Worker {
    const worker = new Worker(join(__dirname, 'search-thread.js'));
    worker.on('message', (reply: FromSearchThread) => {
      const waiting = this.waiting.get(reply.id);
      this.waiting.delete(reply.id);
      if (reply.ok) waiting?.resolve(reply.result);
      else waiting?.reject(Object.assign(new Error(reply.message), { stack: reply.stack }));
    });
    worker.on('error', (error: Error) => this.replace(error));
    return worker;
  }

  private replace(error: Error): void {
    const lost = [...this.waiting.values()];
    this.waiting.clear();
    for (const { reject } of lost) reject(error);
    if (this.closing) return;
    this.worker = this.start();
    if (this.index !== undefined) this.send({ kind: 'index', index: this.index });
  }
}
