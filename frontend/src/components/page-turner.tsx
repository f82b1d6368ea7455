import { chakra } from '@chakra-ui/react';
import { Button } from './button';

export interface PageTurnerProps {
  /** From 1. */
  page: number;
  pageSize: number;
  total: number;
  onPage: (page: number) => void;
}

/** Turns the pages of a list; nothing where one page holds it all. */
export function PageTurner({ page, pageSize, total, onPage }: PageTurnerProps) {
  const last = Math.max(1, Math.ceil(total / pageSize));
  if (last === 1) return null;
  return (
    <chakra.nav aria-label="Pages" display="flex" alignItems="center" gap={3} mt={4} fontSize="sm">
      <Button disabled={page <= 1} onClick={() => onPage(page - 1)}>
        Page before
      </Button>
      <span role="status">
        {page} of {last}
      </span>
      <Button disabled={page >= last} onClick={() => onPage(page + 1)}>
        Next page
      </Button>
    </chakra.nav>
  );
}
