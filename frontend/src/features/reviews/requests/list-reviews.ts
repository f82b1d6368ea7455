import { keepPreviousData, queryOptions, useQuery } from '@tanstack/react-query';
import { client } from '../../../api/client';
import type { Schema } from '../../../api/schema';

export type Review = Schema<'ReviewDto'>;
export type ReviewState = Review['state'];

export const reviewsPerPage = 50;

async function listReviews(
  state: ReviewState,
  page: number,
  signal: AbortSignal,
): Promise<Schema<'ReviewList'>> {
  const { data } = await client.get<Schema<'ReviewList'>>('/reviews', {
    params: { state, page, pageSize: reviewsPerPage },
    signal,
  });
  return data;
}

const reviews = (state: ReviewState, page: number) =>
  queryOptions({
    queryKey: ['reviews', state, page],
    queryFn: ({ signal }) => listReviews(state, page, signal),
    placeholderData: keepPreviousData,
  });

export const useReviews = (state: ReviewState, page: number) => useQuery(reviews(state, page));
