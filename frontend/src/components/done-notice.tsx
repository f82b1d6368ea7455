import { chakra } from '@chakra-ui/react';
import type { ReactNode } from 'react';

/** Says that something has been done; read out where it appears. */
export function DoneNotice({ children }: { children: ReactNode }) {
  return (
    <chakra.p role="status" fontSize="sm" color="met" borderInlineStart="3px solid" borderColor="met" ps={3}>
      {children}
    </chakra.p>
  );
}
