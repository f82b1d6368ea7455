import { chakra } from '@chakra-ui/react';
import { type ReactNode, useId } from 'react';

export interface SectionProps {
  title: string;
  /** One line beneath the title. */
  lead?: ReactNode;
  children: ReactNode;
}

const Region = chakra('section', {
  base: { borderTop: '1px solid', borderColor: 'border', pt: 4, mt: 7, '&:first-child': { mt: 0 } },
});

/** A part of a page under its own heading, set off by a hairline. */
export function Section({ title, lead, children }: SectionProps) {
  const id = useId();
  return (
    <Region aria-labelledby={id}>
      <chakra.h2 id={id} fontSize="lg">
        {title}
      </chakra.h2>
      {lead !== undefined && (
        <chakra.p color="fg.muted" fontSize="sm" mt={1} maxWidth="prose">
          {lead}
        </chakra.p>
      )}
      <chakra.div mt={3}>{children}</chakra.div>
    </Region>
  );
}
