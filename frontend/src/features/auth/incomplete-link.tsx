import { chakra } from '@chakra-ui/react';
import type { ReactNode } from 'react';
import { Link } from 'react-router-dom';
import { AuthFrame } from './auth-frame';

/** A link from a letter that lost its end on the way, as mail programs do by breaking lines. */
export function IncompleteLink({ title, children }: { title: string; children?: ReactNode }) {
  return (
    <AuthFrame
      title={title}
      lead="Its address is not whole: what proves it to be yours stands at the end of it. Copy all of it from the letter into the address bar."
    >
      <chakra.p display="flex" gap={4} fontSize="sm">
        {children}
        <Link to="/sign-in">To sign-in</Link>
      </chakra.p>
    </AuthFrame>
  );
}
