/*
 * `npm test`: every gate and every test, one runner after the other, and at the end one line with what passed and
 * failed. `npm test -- --only backend,e2e` takes some of them.
 */
import { endAll } from './processes/run.mjs';
import { onSignals } from './processes/pass-signals-on.mjs';
import { chooseRunners } from './test/choose-runners.mjs';
import { sum, totalLine } from './test/counts.mjs';
import { RUNNERS } from './test/runners.mjs';
import { say } from './say.mjs';

/** All runners together; what has not begun by then counts as failed. */
const LIMIT_MINUTES = 36;

let interrupted = false;
onSignals(() => {
  interrupted = true;
  endAll();
});

try {
  const results = await runAll(chooseRunners(process.argv.slice(2), RUNNERS));
  for (const result of results) console.log(resultLine(result));
  const total = sum(results);
  if (total.failed > 0) process.exitCode = 1;
  console.log(totalLine(total));
} catch (error) {
  say(error.message);
  process.exitCode = 1;
}

async function runAll(runners) {
  const begin = performance.now();
  const results = [];
  for (const runner of runners) {
    const left = LIMIT_MINUTES - minutesSince(begin);
    const result = interrupted || left <= 0 ? notBegun(runner) : await runOne(runner, left);
    say(resultLine(result));
    results.push(result);
  }
  return results;
}

function notBegun({ name }) {
  return { name, minutes: 0, passed: 0, failed: 1 };
}

async function runOne({ name, run, limitMinutes }, left) {
  const begin = performance.now();
  say(name);
  let counts;
  try {
    counts = await run(Math.min(limitMinutes, left));
  } catch (error) {
    console.error(error);
    counts = { passed: 0, failed: 1 };
  }
  return { name, minutes: minutesSince(begin), ...counts };
}

function minutesSince(begin) {
  return (performance.now() - begin) / 60_000;
}

function resultLine({ name, minutes, passed, failed }) {
  return `${name.padEnd(12)} ${minutes.toFixed(1).padStart(5)} min  ${totalLine({ passed, failed })}`;
}
