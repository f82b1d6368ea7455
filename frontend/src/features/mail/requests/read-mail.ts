import { keepPreviousData, queryOptions, useQuery } from '@tanstack/react-query';
import { client } from '../../../api/client';
import type { Schema } from '../../../api/schema';

/** Letters on a page of the list. */
export const lettersPerPage = 50;

async function listMail(offset: number, signal: AbortSignal): Promise<Schema<'MailList'>> {
  const { data } = await client.get<Schema<'MailList'>>('/mail', {
    params: { offset, limit: lettersPerPage },
    signal,
  });
  return data;
}

async function readLetter(id: string, signal: AbortSignal): Promise<Schema<'MailLetter'>> {
  const { data } = await client.get<Schema<'MailLetter'>>(`/mail/${encodeURIComponent(id)}`, { signal });
  return data;
}

const mailList = (offset: number) =>
  queryOptions({
    queryKey: ['mail', 'list', offset],
    queryFn: ({ signal }) => listMail(offset, signal),
    placeholderData: keepPreviousData,
    // Letters arrive while one looks.
    staleTime: 0,
  });

export const useMailList = (offset: number) => useQuery(mailList(offset));

const mailLetter = (id: string) =>
  queryOptions({ queryKey: ['mail', id], queryFn: ({ signal }) => readLetter(id, signal) });

export const useLetter = (id: string) => useQuery(mailLetter(id));
