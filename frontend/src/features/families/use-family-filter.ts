import { useCallback } from 'react';
import { useSearchParams } from 'react-router-dom';
import type { FamilyFilter } from './requests/list-families';

/** The filter as the address holds it, so that a list can be mailed. */
export function useFamilyFilter(): [FamilyFilter, (change: Partial<FamilyFilter>) => void] {
  const [address, setAddress] = useSearchParams();
  const filter: FamilyFilter = {
    text: address.get('text') ?? '',
    technology: address.get('technology') ?? '',
    manufacturer: address.get('manufacturer') ?? '',
  };
  const change = useCallback(
    (changed: Partial<FamilyFilter>): void =>
      setAddress(
        (before) => {
          const after = new URLSearchParams(before);
          for (const [name, value] of Object.entries(changed)) {
            if (value === '') after.delete(name);
            else after.set(name, value);
          }
          return after;
        },
        { replace: true },
      ),
    [setAddress],
  );
  return [filter, change];
}
