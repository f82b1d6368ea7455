import { useCallback, useEffect, useRef, useState } from 'react';

/** After so long without a change the next one counts at once. */
const restMilliseconds = 120;
/** Within a run of changes only the last before a pause of this length counts. */
const pauseMilliseconds = 40;

/**
 * The value to act on while somebody types: the first change after a rest at once, the later ones of a run as soon as
 * there is the shortest of pauses. So what follows the typing does not wait for it, and a burst is not followed key by key.
 * @param same tells values that need no new action
 * @returns the value, and what is to be told of each change
 */
export function useSettled<Value>(
  initial: Value,
  same: (first: Value, second: Value) => boolean,
): [Value, (value: Value) => void] {
  const [settled, setSettled] = useState(initial);
  const latest = useRef({ value: initial, at: -Infinity });
  const timer = useRef<ReturnType<typeof setTimeout>>(undefined);
  useEffect(() => () => clearTimeout(timer.current), []);
  const settle = useCallback(
    (value: Value) => {
      const before = latest.current;
      if (same(before.value, value)) return;
      const at = performance.now();
      latest.current = { value, at };
      clearTimeout(timer.current);
      const rested = at - before.at > restMilliseconds;
      if (rested) setSettled(value);
      else timer.current = setTimeout(() => setSettled(value), pauseMilliseconds);
    },
    [same],
  );
  return [settled, settle];
}
