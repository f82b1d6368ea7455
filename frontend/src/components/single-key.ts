import { useEffect, useSyncExternalStore } from 'react';

/**
 * Keys without a modifier that work anywhere on a page, as long as nobody types. Who speaks to the computer, or rests a
 * hand on the keys, can turn them off (WCAG 2.2, 2.1.4); the choice is kept in this browser.
 */
const storageKey = 'resistry-single-keys';
const listeners = new Set<() => void>();
let switchedOff = readSwitch();

function readSwitch(): boolean {
  try {
    return window.localStorage.getItem(storageKey) === 'off';
  } catch {
    return false;
  }
}

export function switchSingleKeys(on: boolean): void {
  switchedOff = !on;
  try {
    window.localStorage.setItem(storageKey, on ? 'on' : 'off');
  } catch {
    // Storage may be closed to us; then the choice holds until the page is left.
  }
  for (const listener of [...listeners]) listener();
}

function subscribe(listener: () => void): () => void {
  listeners.add(listener);
  return () => listeners.delete(listener);
}

export const useSingleKeysOn = (): boolean => !useSyncExternalStore(subscribe, () => switchedOff);

/** Whether a key belongs to what it is pressed in: a field takes it as text, a dialog keeps the page out of reach. */
const isTaken = (target: EventTarget | null): boolean =>
  target instanceof HTMLElement &&
  target.closest('input, select, textarea, [contenteditable], [role=dialog]') !== null;

/**
 * Does something when a key is pressed anywhere on the page.
 * @param act returns false where it could not; the key then stays with the page
 */
export function useSingleKey(key: string, act: () => boolean): void {
  const on = useSingleKeysOn();
  useEffect(() => {
    if (!on) return undefined;
    const press = (event: KeyboardEvent): void => {
      if (event.key !== key || event.ctrlKey || event.metaKey || event.altKey) return;
      if (event.defaultPrevented || isTaken(event.target)) return;
      if (act()) event.preventDefault();
    };
    document.addEventListener('keydown', press);
    return () => document.removeEventListener('keydown', press);
  }, [key, act, on]);
}
