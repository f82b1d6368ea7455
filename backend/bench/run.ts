import assert from 'node:assert/strict';
import { availableParallelism } from 'node:os';
import { join } from 'node:path';
import { signIn, type Client } from './client';
import { exactness } from './exactness';
import { dutyOf, loads, nominals, policies, windowKinds, type WindowKind } from './duties';
import { fiftyDesigners } from './fifty-designers';
import { largeCatalogue } from './large-catalogue';
import { openIndex } from './open-index';
import { quantile } from './quantiles';
import { startServer } from './server';
import { SqlPair } from './sql-pair';
import { Statements } from './statements';

const folder = join(__dirname, '..', '..', '..', 'data', 'bench');
const searchesEach = 30;
const comparedEach = 2;

interface Line {
  kind: WindowKind;
  name: string;
  ours: number[];
  theirs: number[];
}

async function main(): Promise<void> {
  const dataDirectory = await largeCatalogue(folder);
  const server = await startServer(dataDirectory);
  try {
    const client = await signIn(server.url);
    process.stdout.write(
      `${String(availableParallelism())} cores. Times in ms, whole answers over HTTP on the loopback interface.\n\n`,
    );
    const lines = await ourTimes(client);
    const memory = server.memory();
    await compare(client, dataDirectory, lines);
    print(lines);
    process.stdout.write(
      `\nMemory of the server: ${memory.now.toFixed(0)} MB, at its highest ${memory.peak.toFixed(0)} MB (goal 512 MB)\n`,
    );
    await fiftyDesigners(server.url);
  } finally {
    await server.stop();
  }
  await exactness();
}

async function ourTimes(client: Client): Promise<Line[]> {
  const lines: Line[] = [];
  for (const kind of windowKinds) {
    for (const { name: loadName, load } of loads) {
      for (const { name: policyName, policy } of policies) {
        const ours: number[] = [];
        for (let time = 0; time < searchesEach + 3; time += 1) {
          const duty = dutyOf(kind, nominals[(time * 7) % nominals.length] ?? 1000, load);
          const { milliseconds } = await client.search({ duty, policy });
          if (time >= 3) ours.push(milliseconds);
        }
        lines.push({ kind, name: `${loadName}, ${policyName}`, ours, theirs: [] });
      }
    }
  }
  return lines;
}

/** Holds some of the same searches to the SQL pair: identical answers, asserted, and its times. */
async function compare(client: Client, dataDirectory: string, lines: readonly Line[]): Promise<void> {
  const { index, close } = await openIndex(dataDirectory);
  process.stdout.write(
    `${String(index.columns.partId.length)} parts, ${String(index.ratings.size)} sizes, ${String(index.rows.length)} rows.\n`,
  );
  const database = await Statements.open(join(dataDirectory, 'resistry.sqlite'));
  const pair = await SqlPair.prepare(database, index);
  let position = 0;
  for (const kind of windowKinds) {
    for (const { load } of loads) {
      for (const { policy } of policies) {
        const line = lines[position];
        position += 1;
        for (let time = 0; time < comparedEach; time += 1) {
          const duty = dutyOf(kind, nominals[(time * 11 + 5) % nominals.length] ?? 1000, load);
          const evaluation = await pair.give(duty, { entries: [policy] });
          await pair.answer(evaluation);
          const sql = await pair.answer(evaluation);
          const { answer } = await client.search({ duty, policy });
          assert.deepEqual(
            {
              total: answer.total,
              unrated: answer.unrated,
              ids: answer.items.map(({ part }) => part.id),
              knockouts: answer.knockouts,
            },
            {
              total: sql.answer.total,
              unrated: sql.answer.unrated,
              ids: sql.answer.items.map(({ part }) => part.id),
              knockouts: sql.answer.knockouts,
            },
          );
          line?.theirs.push(sql.milliseconds);
        }
      }
    }
  }
  await database.close();
  await close();
}

function print(lines: readonly Line[]): void {
  process.stdout.write(
    '\nwindow            load, policy         p50     p95    goal   SQL pair   ratio (goal 1.5)\n',
  );
  for (const { kind, name, ours, theirs } of lines) {
    const p95 = quantile(ours, 0.95);
    const sql = quantile(theirs, 0.5);
    process.stdout.write(
      `${kind.name.padEnd(17)} ${name.padEnd(18)} ${quantile(ours, 0.5).toFixed(1).padStart(7)} ${p95.toFixed(1).padStart(7)} ${String(kind.goal).padStart(7)} ${sql.toFixed(1).padStart(10)} ${(p95 / sql).toFixed(2).padStart(7)}${p95 <= kind.goal ? '' : '   over the goal'}\n`,
    );
  }
}

main().catch((error: unknown) => {
  process.stderr.write(`${error instanceof Error ? (error.stack ?? error.message) : String(error)}\n`);
  process.exitCode = 1;
});
