import { chakra } from '@chakra-ui/react';
import { type Approval, approvals } from '@resistry/engineering/ratings/technology';
import type { ReactNode } from 'react';
import { Button } from '../../../components/button';
import { approvalWords } from '../../../wording/standing-words';
import type { Show } from '../requests/search-request';

const count = new Intl.NumberFormat('en');

export interface CountLineProps {
  total: number;
  unrated: number;
  byApproval: Partial<Record<Approval, number>>;
  show: Show;
  grouped: boolean;
  onShow: (show: Show) => void;
  onGrouped: (grouped: boolean) => void;
  /** What can be done with the table. */
  children: ReactNode;
}

/** How many meet the duty; how many cannot be told, and whether those are shown. */
export function CountLine({
  total,
  unrated,
  byApproval,
  show,
  grouped,
  onShow,
  onGrouped,
  children,
}: CountLineProps) {
  const things = grouped
    ? total === 1
      ? 'number meets'
      : 'numbers meet'
    : total === 1
      ? 'part meets'
      : 'parts meet';
  return (
    <chakra.div display="flex" flexWrap="wrap" alignItems="baseline" columnGap={4} rowGap={1} my={3}>
      <chakra.h1 fontSize="xl">
        <span role="status">
          {count.format(total)} {things} it
        </span>
      </chakra.h1>
      <chakra.span fontSize="sm" color="fg.muted">
        {approvals
          .filter((approval) => (byApproval[approval] ?? 0) > 0)
          .reverse()
          .map(
            (approval) =>
              `${count.format(byApproval[approval] ?? 0)} ${approvalWords[approval].toLowerCase()}`,
          )
          .join(', ')}
      </chakra.span>
      {unrated > 0 && (
        <Button
          variant="plain"
          aria-pressed={show === 'met-and-unrated'}
          onClick={() => onShow(show === 'met' ? 'met-and-unrated' : 'met')}
        >
          {show === 'met'
            ? `${count.format(unrated)} more are unrated: show them`
            : `${count.format(unrated)} unrated among them: hide them`}
        </Button>
      )}
      <chakra.div flex={1} />
      <Button variant="plain" aria-pressed={grouped} onClick={() => onGrouped(!grouped)}>
        {grouped ? 'One row a part' : 'One row a number'}
      </Button>
      {children}
    </chakra.div>
  );
}
