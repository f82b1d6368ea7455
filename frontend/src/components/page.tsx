import { chakra } from '@chakra-ui/react';
import type { ReactNode } from 'react';

const Frame = chakra('div', { base: { maxWidth: 'page', mx: 'auto', px: { base: 4, md: 6 }, py: 6 } });

export interface PageProps {
  title: string;
  /** One line under the title that says what the page is for. */
  lead?: string;
  /** What can be done with the page as a whole, beside the title. */
  actions?: ReactNode;
  children: ReactNode;
}

/** A page of one column with its heading; its title is also the browser's. */
export function Page({ title, lead, actions, children }: PageProps) {
  return (
    <Frame>
      <title>{`${title} · Resistry`}</title>
      <chakra.div display="flex" flexWrap="wrap" alignItems="baseline" gap={4} mb={5}>
        <chakra.div flex={1} minWidth="12rem">
          <chakra.h1 fontSize="2xl">{title}</chakra.h1>
          {lead !== undefined && (
            <chakra.p color="fg.muted" mt={1} maxWidth="prose">
              {lead}
            </chakra.p>
          )}
        </chakra.div>
        {actions}
      </chakra.div>
      {children}
    </Frame>
  );
}
