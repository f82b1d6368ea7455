import { chakra } from '@chakra-ui/react';
import { Link } from 'react-router-dom';
import { RuledTable } from '../../components/ruled-table';
import { StatusWord } from '../../components/status-word';
import { dayWords } from '../../wording/date-words';
import { approvalWords, reviewWords } from '../../wording/standing-words';
import type { Review, ReviewState } from './requests/list-reviews';

function Row({ review }: { review: Review }) {
  const { part, cause, words, openedAt, openedBy, closedAt, closedBy, outcome } = review;
  return (
    <tr>
      <chakra.th scope="row" minWidth={{ md: '12rem' }}>
        <Link to={`/parts/${part.id}`}>{part.companyPartNumber?.number ?? part.manufacturerPartNumber}</Link>
        <chakra.span display="block" fontWeight="normal" color="fg.muted">
          {part.manufacturer.name}
          {part.companyPartNumber !== undefined && ` ${part.manufacturerPartNumber}`}
        </chakra.span>
      </chakra.th>
      <chakra.td minWidth="16rem" whiteSpace="pre-line">
        <b>{reviewWords[cause]}.</b> {words}
      </chakra.td>
      <td>
        <StatusWord kind="approval" status={part.approval} />
      </td>
      <td>
        <StatusWord kind="supply" status={part.supply} />
      </td>
      <chakra.td minWidth="7rem">
        {dayWords(openedAt)}
        <chakra.span display="block" color="fg.muted">
          {openedBy.name}
        </chakra.span>
      </chakra.td>
      {closedAt !== undefined && (
        <chakra.td minWidth="7rem">
          {outcome === undefined ? 'closed' : approvalWords[outcome].toLowerCase()}, {dayWords(closedAt)}
          <chakra.span display="block" color="fg.muted">
            {closedBy?.name}
          </chakra.span>
        </chakra.td>
      )}
    </tr>
  );
}

export interface ReviewTableProps {
  state: ReviewState;
  reviews: readonly Review[];
}

/** Parts that wait for a decision, or got one. */
export function ReviewTable({ state, reviews }: ReviewTableProps) {
  return (
    <RuledTable label={state === 'open' ? 'Open reviews' : 'Decided reviews'}>
      <thead>
        <tr>
          <th scope="col">Part</th>
          <th scope="col">Why</th>
          <th scope="col">Approval now</th>
          <th scope="col">Supply now</th>
          <th scope="col">Opened</th>
          {state === 'closed' && <th scope="col">Decided</th>}
        </tr>
      </thead>
      <tbody>
        {reviews.map((review) => (
          <Row key={review.id} review={review} />
        ))}
      </tbody>
    </RuledTable>
  );
}
