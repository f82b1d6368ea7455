import { chakra } from '@chakra-ui/react';
import type { ReactNode } from 'react';
import { BrandMark } from '../../components/brand-mark';

export interface AuthFrameProps {
  title: string;
  lead?: ReactNode;
  children: ReactNode;
}

/** The page before one is inside: the mark, one narrow form, nothing else. */
export function AuthFrame({ title, lead, children }: AuthFrameProps) {
  return (
    <chakra.main minHeight="100dvh" display="grid" alignContent="center" justifyItems="center" px={4} py={10}>
      <title>{`${title} · Resistry`}</title>
      <chakra.div width="full" maxWidth="form">
        <chakra.p display="flex" alignItems="center" gap={2.5} fontSize="lg" fontWeight="semibold" mb={8}>
          <BrandMark />
          Resistry
        </chakra.p>
        <chakra.h1 fontSize="xl">{title}</chakra.h1>
        {lead !== undefined && (
          <chakra.p color="fg.muted" mt={1}>
            {lead}
          </chakra.p>
        )}
        <chakra.div mt={6}>{children}</chakra.div>
      </chakra.div>
    </chakra.main>
  );
}
