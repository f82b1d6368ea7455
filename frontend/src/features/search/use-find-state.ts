import { useCallback, useEffect, useRef, useState } from 'react';
import { useSearchParams } from 'react-router-dom';
import { type FindState, readFind, writeFind } from './find-address';

export type ChangeFind = (change: (state: FindState) => FindState) => void;

/**
 * What Find shows, held in step with the address: typing changes the address in place, and an address that changes by
 * itself (a link, back, the text search in the bar) changes what is shown.
 */
export function useFindState(): [FindState, ChangeFind] {
  const [address, setAddress] = useSearchParams();
  const [state, setState] = useState(() => readFind(address));
  const written = useRef(address.toString());

  useEffect(() => {
    const now = address.toString();
    if (now === written.current) return;
    written.current = now;
    setState(readFind(address));
  }, [address]);

  useEffect(() => {
    const next = writeFind(state);
    if (next.toString() === written.current) return undefined;
    // Browsers refuse an address that changes with every key; a moment later is soon enough for a link.
    const timer = setTimeout(() => {
      written.current = next.toString();
      setAddress(next, { replace: true });
    }, 200);
    return () => clearTimeout(timer);
  }, [state, setAddress]);

  const change = useCallback<ChangeFind>((update) => setState(update), []);
  return [state, change];
}
