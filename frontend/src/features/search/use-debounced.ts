import { useEffect, useState } from 'react';

/** The value as it was once it had stood still for a while. The first one counts at once. */
export function useDebounced<Value>(value: Value, milliseconds: number): Value {
  const [settled, setSettled] = useState(value);
  useEffect(() => {
    const timer = setTimeout(() => setSettled(value), milliseconds);
    return () => clearTimeout(timer);
  }, [value, milliseconds]);
  return settled;
}
