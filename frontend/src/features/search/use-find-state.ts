import { useCallback, useEffect, useRef, useState } from 'react';
import { useSearchParams } from 'react-router-dom';
import { changedNames } from './changed-names';
import { type FindState, readFind, writeFind } from './find-address';
import { sameQuestion } from './question';
import { useSettled } from './use-settled';

export type ChangeFind = (change: (state: FindState) => FindState) => void;

/** Browsers refuse an address that changes with every key; a moment later is soon enough for a link. */
const addressPauseMilliseconds = 300;
/** Changes of the same entry within this time are one step for the back button. */
const oneStepMilliseconds = 2500;

/**
 * What Find shows, held in step with the address: each change becomes a step of the browser's history, those of one
 * entry while it is typed a single one, and an address that changes by itself (a link, back, the text search in the bar)
 * changes what is shown.
 * @returns the state as it is shown, what changes it, and the state that is to be asked for while somebody types
 */
export function useFindState(): [FindState, ChangeFind, FindState] {
  const [address, setAddress] = useSearchParams();
  const [state, setState] = useState(() => readFind(address));
  const [asked, settle] = useSettled(state, sameQuestion);
  const latest = useRef(state);
  const show = useCallback(
    (next: FindState) => {
      latest.current = next;
      setState(next);
      settle(next);
    },
    [settle],
  );
  const written = useRef({ address: address.toString(), names: '', at: 0 });
  // An address that only reads differently from how we would write it is no step of anybody's.
  const changedHere = useRef(false);

  useEffect(() => {
    const now = address.toString();
    if (now === written.current.address) return;
    written.current = { address: now, names: '', at: 0 };
    changedHere.current = false;
    show(readFind(address));
  }, [address, show]);

  useEffect(() => {
    const next = writeFind(state);
    if (next.toString() === written.current.address) return undefined;
    const timer = setTimeout(() => {
      const before = written.current;
      const names = changedNames(new URLSearchParams(before.address), next);
      const at = Date.now();
      const sameStep = names === before.names && at - before.at < oneStepMilliseconds;
      written.current = { address: next.toString(), names, at };
      // At once, because a step back that overtakes it would look as if nothing had changed.
      setAddress(next, { replace: sameStep || !changedHere.current, flushSync: true });
    }, addressPauseMilliseconds);
    return () => clearTimeout(timer);
  }, [state, setAddress]);

  const change = useCallback<ChangeFind>(
    (update) => {
      changedHere.current = true;
      show(update(latest.current));
    },
    [show],
  );
  return [state, change, asked];
}
