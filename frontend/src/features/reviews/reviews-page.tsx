import { chakra } from '@chakra-ui/react';
import { useState } from 'react';
import { Link } from 'react-router-dom';
import type { Schema } from '../../api/schema';
import { Answered } from '../../components/answered';
import { Page } from '../../components/page';
import { PageTurner } from '../../components/page-turner';
import { RuledTable } from '../../components/ruled-table';
import { Empty } from '../../components/states';
import { StatusWord } from '../../components/status-word';
import { dayWords } from '../../wording/date-words';
import { reviewsPerPage, useOpenReviews } from './requests/list-reviews';

function Reviews({ reviews }: { reviews: readonly Schema<'ReviewDto'>[] }) {
  return (
    <RuledTable label="Open reviews">
      <thead>
        <tr>
          <th scope="col">Part</th>
          <th scope="col">Why it waits</th>
          <th scope="col">Approval</th>
          <th scope="col">Opened</th>
        </tr>
      </thead>
      <tbody>
        {reviews.map(({ id, part, words, openedAt, openedBy }) => (
          <tr key={id}>
            <th scope="row">
              <Link to={`/parts/${part.id}`}>
                {part.companyPartNumber?.number ?? part.manufacturerPartNumber}
              </Link>
              <chakra.span display="block" fontWeight="normal" color="fg.muted">
                {part.manufacturer.name} {part.manufacturerPartNumber}
              </chakra.span>
            </th>
            <td>{words}</td>
            <td>
              <StatusWord kind="approval" status={part.approval} />
            </td>
            <td>
              {dayWords(openedAt)} <span className="not-stated">{openedBy.name}</span>
            </td>
          </tr>
        ))}
      </tbody>
    </RuledTable>
  );
}

/** Parts that wait for a decision, the oldest first; it is made on the page of the part. */
export function Component() {
  const [page, setPage] = useState(1);
  const reviews = useOpenReviews(page);
  return (
    <Page title="Reviews" lead="Parts that wait for a decision, the oldest first.">
      <Answered query={reviews} label="Reading the reviews">
        {({ total, items }) =>
          items.length === 0 ? (
            <Empty title="Nothing waits">
              Parts that are submitted, that leave active supply, or that are preferred and lose their second
              source come here.
            </Empty>
          ) : (
            <>
              <Reviews reviews={items} />
              <PageTurner page={page} pageSize={reviewsPerPage} total={total} onPage={setPage} />
            </>
          )
        }
      </Answered>
    </Page>
  );
}
