import { chakra } from '@chakra-ui/react';
import { useSearchParams } from 'react-router-dom';
import { Answered } from '../../components/answered';
import { Page } from '../../components/page';
import { PageTurner } from '../../components/page-turner';
import { SelectField } from '../../components/select-field';
import { Empty } from '../../components/states';
import { type ReviewState, reviewsPerPage, useReviews } from './requests/list-reviews';
import { ReviewTable } from './review-table';

const states = [
  { value: 'open', words: 'those that wait, the oldest first' },
  { value: 'closed', words: 'those decided, the newest first' },
] as const;

const nothing: Record<ReviewState, { title: string; words: string }> = {
  open: {
    title: 'Nothing waits',
    words:
      'Parts that are submitted, that leave active supply, or that are preferred and lose their second source come here.',
  },
  closed: { title: 'Nothing has been decided', words: 'A decision on a part under review is kept here.' },
};

/** Parts that wait for a decision, and those that got one; it is made on the page of the part. */
export function Component() {
  const [address, setAddress] = useSearchParams();
  const state: ReviewState = address.get('state') === 'closed' ? 'closed' : 'open';
  const asked = Number(address.get('page') ?? 1);
  const page = Number.isInteger(asked) && asked > 0 ? asked : 1;
  const reviews = useReviews(state, page);
  const show = (change: { state?: string; page?: number }): void =>
    setAddress({ state: change.state ?? state, page: String(change.page ?? 1) });
  return (
    <Page title="Reviews" lead="Parts that wait for a decision. It is made on the page of the part.">
      <chakra.div maxWidth="form" mb={4}>
        <SelectField
          label="Show"
          stacked
          value={state}
          options={states}
          onValue={(value) => show({ state: value })}
        />
      </chakra.div>
      <Answered query={reviews} label="Reading the reviews">
        {({ total, items }) =>
          items.length === 0 ? (
            <Empty title={nothing[state].title}>{nothing[state].words}</Empty>
          ) : (
            <>
              <ReviewTable state={state} reviews={items} />
              <PageTurner
                page={page}
                pageSize={reviewsPerPage}
                total={total}
                onPage={(turned) => show({ page: turned })}
              />
            </>
          )
        }
      </Answered>
    </Page>
  );
}
