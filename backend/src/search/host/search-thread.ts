import { parentPort } from 'node:worker_threads';
import { InlineSearchHost } from './inline-search-host';
import type { FromSearchThread, ToSearchThread } from './search-messages';

/** The searching thread: one search after another, over the index it was last given. */
const host = new InlineSearchHost();
const port = parentPort;
if (port === null) throw new Error('The searching thread was started as a program of its own.');

port.on('message', (message: ToSearchThread) => {
  if (message.kind === 'index') {
    host.take(message.index);
    return;
  }
  answer(() => host.search(message.plan)).then(
    (reply) => port.postMessage(reply),
    (error: unknown) => {
      throw error;
    },
  );
});

async function answer(search: () => ReturnType<InlineSearchHost['search']>): Promise<FromSearchThread> {
  try {
    return { ok: true, result: await search() };
  } catch (error) {
    if (!(error instanceof Error)) throw error;
    return { ok: false, message: error.message, stack: error.stack };
  }
}
