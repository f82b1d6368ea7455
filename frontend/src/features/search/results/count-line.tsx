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

const Actions = chakra('div', {
  base: {
    display: 'flex',
    flexWrap: 'wrap',
    alignItems: 'baseline',
    columnGap: 4,
    marginInlineStart: 'auto',
    justifyContent: 'flex-end',
  },
});

/** "27 parts meet it": the heading of the results, and what is said aloud when they change. */
export function countWords(total: number, grouped: boolean): string {
  const things = grouped ? ['number meets', 'numbers meet'] : ['part meets', 'parts meet'];
  return `${count.format(total)} ${total === 1 ? things[0] : things[1]} it`;
}

function approvalsWords(byApproval: CountLineProps['byApproval']): string {
  return approvals
    .filter((approval) => (byApproval[approval] ?? 0) > 0)
    .reverse()
    .map((approval) => `${count.format(byApproval[approval] ?? 0)} ${approvalWords[approval].toLowerCase()}`)
    .join(', ');
}

/** How many meet the duty; how many cannot be told, and whether those are shown. */
export function CountLine(props: CountLineProps) {
  const { total, unrated, byApproval, show, grouped, onShow, onGrouped, children } = props;
  return (
    <chakra.div my={3}>
      <chakra.div display="flex" flexWrap="wrap" alignItems="baseline" columnGap={4}>
        <chakra.h1 fontSize="xl">{countWords(total, grouped)}</chakra.h1>
        <chakra.span fontSize="sm" color="fg.muted">
          {approvalsWords(byApproval)}
        </chakra.span>
        <Actions>{children}</Actions>
      </chakra.div>
      <chakra.div display="flex" flexWrap="wrap" columnGap={4} mt={0.5}>
        <Button variant="plain" aria-pressed={grouped} onClick={() => onGrouped(!grouped)}>
          {grouped ? 'By company number: show single parts' : 'Group by company number'}
        </Button>
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
      </chakra.div>
    </chakra.div>
  );
}
