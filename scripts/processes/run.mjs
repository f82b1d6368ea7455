import { spawn } from 'node:child_process';
import { constants } from 'node:os';
import { ROOT } from '../repository.mjs';

const GRACE_MILLISECONDS = 10_000;

/** Process groups that were started here and still run: the only ones that may be ended from here. */
const running = new Set();

/**
 * Runs a command to its end, in a process group of its own so that it can be ended with everything it started.
 *
 * @param {string} command
 * @param {string[]} words its arguments
 * @param {{ cwd?: string, variables?: Record<string, string>, limitMinutes?: number, stdio?: import('node:child_process').StdioOptions }} [options]
 * @returns {Promise<{ code: number, timedOut: boolean, output: string }>} `output` is what a piped stdout gave. A command that
 *   cannot be started has code 127, one ended by a signal 128 and the signal's number, as a shell says it.
 */
export function run(command, words, options = {}) {
  const { cwd = ROOT, variables = {}, limitMinutes, stdio = ['ignore', 'inherit', 'inherit'] } = options;
  return new Promise((resolve) => {
    const child = spawn(command, words, {
      cwd,
      env: { ...process.env, ...variables },
      stdio,
      detached: true,
    });
    running.add(child);
    let output = '';
    child.stdout?.on('data', (piece) => (output += piece));
    let timedOut = false;
    const limit =
      limitMinutes !== undefined && setTimeout(() => (timedOut = end(child)), limitMinutes * 60_000);
    const finish = (code) => {
      clearTimeout(limit);
      running.delete(child);
      resolve({ code, timedOut, output });
    };
    child.once('error', (error) => {
      console.error(`${command}: ${error.message}`);
      finish(127);
    });
    child.once('close', (code, signal) => finish(code ?? 128 + constants.signals[signal]));
  });
}

/** Runs one of the tools of this repository with this very Node. */
export const runNode = (words, options) => run(process.execPath, words, options);

/** Ends everything that still runs. */
export function endAll() {
  for (const child of running) end(child);
}

/** Asks a group to end, and makes it after a while. @returns {true} */
export function end(child) {
  signalGroup(child, 'SIGTERM');
  setTimeout(() => signalGroup(child, 'SIGKILL'), GRACE_MILLISECONDS).unref();
  return true;
}

function signalGroup(child, signal) {
  if (child.pid === undefined) return;
  try {
    process.kill(-child.pid, signal);
  } catch (error) {
    // The whole group is gone already.
    if (error.code !== 'ESRCH') throw error;
  }
}
