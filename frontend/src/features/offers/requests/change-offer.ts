import { useMutation, useQueryClient } from '@tanstack/react-query';
import { client } from '../../../api/client';
import { problemOf } from '../../../api/problem';
import type { Schema } from '../../../api/schema';

export type Offer = Schema<'OfferDto'>;

/** What is done to an offer; a change and an end are made on the version that was seen. */
export type OfferDeed =
  | { deed: 'enter'; form: Schema<'NewOfferForm'> }
  | { deed: 'change'; id: number; form: Schema<'OfferChangeForm'> }
  | { deed: 'end'; id: number; form: Schema<'OfferEndForm'> };

async function changeOffer(deed: OfferDeed): Promise<Offer> {
  switch (deed.deed) {
    case 'enter':
      return (await client.post<Offer>('/offers', deed.form)).data;
    case 'change':
      return (await client.put<Offer>(`/offers/${deed.id}`, deed.form)).data;
    case 'end':
      return (await client.post<Offer>(`/offers/${deed.id}/end`, deed.form)).data;
  }
}

/** Enters, changes or ends an offer. What is shown of the part is read again, after a stale edit too. */
export function useChangeOffer() {
  const queries = useQueryClient();
  const readAgain = (): Promise<void> => queries.invalidateQueries({ queryKey: ['parts'] });
  return useMutation({
    mutationFn: changeOffer,
    onSuccess: readAgain,
    onError: (error) => {
      if (problemOf(error).status === 409) void readAgain();
    },
  });
}
