import { keepPreviousData, queryOptions, useQuery } from '@tanstack/react-query';
import { client } from '../../../api/client';
import type { Schema } from '../../../api/schema';

export const reviewsPerPage = 50;

async function listOpenReviews(page: number, signal: AbortSignal): Promise<Schema<'ReviewList'>> {
  const { data } = await client.get<Schema<'ReviewList'>>('/reviews', {
    params: { state: 'open', page, pageSize: reviewsPerPage },
    signal,
  });
  return data;
}

const openReviews = (page: number) =>
  queryOptions({
    queryKey: ['reviews', 'open', page],
    queryFn: ({ signal }) => listOpenReviews(page, signal),
    placeholderData: keepPreviousData,
  });

export const useOpenReviews = (page: number) => useQuery(openReviews(page));
