import { useMutation, useQueryClient } from '@tanstack/react-query';
import { client } from '../../../api/client';
import { problemOf } from '../../../api/problem';
import type { Schema } from '../../../api/schema';
import { type PartDetails, partDetails } from './get-part';

export type ApprovalChange = { door: 'approval'; form: Schema<'ApprovalChangeForm'> };
export type SupplyChange = { door: 'supply'; form: Schema<'SupplyChangeForm'> };
export type StandingChange = ApprovalChange | SupplyChange;

export async function changeStanding(id: number, { door, form }: StandingChange): Promise<PartDetails> {
  const { data } = await client.post<PartDetails>(`/parts/${id}/${door}`, form);
  return data;
}

/** Changes how a part stands. Its page shows the new histories at once; a stale change has the part read again. */
export function useChangeStanding(id: number) {
  const queries = useQueryClient();
  const readAgain = (): void => {
    void queries.invalidateQueries({ queryKey: ['parts'] });
  };
  return useMutation({
    mutationFn: (change: StandingChange) => changeStanding(id, change),
    onSuccess: (part) => {
      queries.setQueryData(partDetails(id).queryKey, part);
      readAgain();
    },
    onError: (error) => {
      if (problemOf(error).status === 409) readAgain();
    },
  });
}
