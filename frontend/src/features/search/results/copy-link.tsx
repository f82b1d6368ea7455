import { useEffect, useState } from 'react';
import { Button } from '../../../components/button';

const saidFor = 2500;

/** Puts the address of the search on the clipboard, as it stands in this moment. */
export function CopyLink({ address }: { address: () => string }) {
  const [said, setSaid] = useState<string>();
  useEffect(() => {
    if (said === undefined) return undefined;
    const timer = setTimeout(() => setSaid(undefined), saidFor);
    return () => clearTimeout(timer);
  }, [said]);
  const copy = (): void => {
    navigator.clipboard.writeText(address()).then(
      () => setSaid('Link copied'),
      () => setSaid('Not copied'),
    );
  };
  return (
    <Button variant="plain" aria-live="polite" onClick={copy}>
      {said ?? 'Copy link'}
    </Button>
  );
}
