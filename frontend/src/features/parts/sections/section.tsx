import { chakra } from '@chakra-ui/react';
import { type ReactNode, useId } from 'react';

const Frame = chakra('section', { base: { minWidth: 0, '& > h2 + *': { mt: 2 } } });

/** A part of the page under its heading. */
export function Section({ title, note, children }: { title: string; note?: string; children: ReactNode }) {
  const id = useId();
  return (
    <Frame aria-labelledby={id}>
      <chakra.h2 id={id} fontSize="lg">
        {title}
      </chakra.h2>
      {note !== undefined && (
        <chakra.p color="fg.muted" fontSize="sm" maxWidth="prose">
          {note}
        </chakra.p>
      )}
      {children}
    </Frame>
  );
}

export const Quiet = chakra('p', { base: { color: 'fg.muted', fontSize: 'sm' } });
