import { signIn, type Client } from './client';
import { dutyOf, loads, nominals, windowKinds } from './duties';
import { quantile } from './quantiles';

const designers = 50;
const seconds = 20;
const startsPerSecond = 10;

/**
 * Fifty designers, each a search a second, narrow windows as a designer types them, for twenty seconds; beside them one
 * person signs in and opens part pages. Prints p95 and the errors.
 */
export async function fiftyDesigners(url: string): Promise<void> {
  const clients: Client[] = [];
  for (let count = 0; count < designers; count += 1) {
    clients.push(await signIn(url));
    await pause(1000 / startsPerSecond);
  }
  const searches: number[] = [];
  const pages: number[] = [];
  const signIns: number[] = [];
  let errors = 0;
  const attempt = async (work: () => Promise<void>): Promise<void> => {
    try {
      await work();
    } catch {
      errors += 1;
    }
  };
  const until = performance.now() + seconds * 1000;
  const designing = clients.map(async (client, number) => {
    await pause((number * 1000) / designers);
    for (let time = number; performance.now() < until; time += 1) {
      const begun = performance.now();
      await attempt(async () => {
        const kind = windowKinds[time % 2];
        const load = loads[time % loads.length];
        if (kind === undefined || load === undefined) return;
        const { milliseconds } = await client.search({
          duty: dutyOf(kind, nominals[(time * 7) % nominals.length] ?? 1000, load.load),
        });
        searches.push(milliseconds);
      });
      await pause(Math.max(0, 1000 - (performance.now() - begun)));
    }
  });
  const visiting = (async () => {
    const [client] = clients;
    for (let time = 0; performance.now() < until && client !== undefined; time += 1) {
      await attempt(async () => {
        const { status, milliseconds } = await client.get(
          `/api/parts/${String(1 + ((time * 997) % 50_000))}`,
        );
        if (status !== 200) throw new Error(String(status));
        pages.push(milliseconds);
      });
      if (time % 4 === 0)
        await attempt(async () => void signIns.push((await signIn(url, 'librarian')).milliseconds));
      await pause(250);
    }
  })();
  await Promise.all([...designing, visiting]);
  const p95 = (values: readonly number[]): string => quantile(values, 0.95).toFixed(0);
  process.stdout.write(
    `\n${String(designers)} designers, a search a second each, for ${String(seconds)} s: ${String(searches.length)} searches, p95 ${p95(searches)} ms (goal 300), ` +
      `part page p95 ${p95(pages)} ms, sign-in p95 ${p95(signIns)} ms (goal 100), errors ${String(errors)} (goal 0)\n`,
  );
}

function pause(milliseconds: number): Promise<void> {
  return new Promise((resolve) => setTimeout(resolve, milliseconds));
}
