const SIGNALS = ['SIGINT', 'SIGTERM', 'SIGHUP'];

/**
 * Calls `stop` at the first signal and `stopAtOnce` at one that comes when somebody has lost patience. A terminal's
 * Ctrl-C arrives twice, from the terminal and through npm, which is no impatience.
 */
export function onSignals(stop, stopAtOnce = () => undefined) {
  let first;
  for (const signal of SIGNALS) {
    process.on(signal, () => {
      if (first === undefined) {
        first = performance.now();
        stop();
      } else if (performance.now() - first > 1000) {
        stopAtOnce();
      }
    });
  }
}
