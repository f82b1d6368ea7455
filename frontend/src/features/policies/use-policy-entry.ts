import { type PolicyEntry, entryFor } from '@resistry/engineering/derating/policy-entry';
import type { Ratings } from '@resistry/engineering/ratings/ratings';
import type { AnsweredAssessment } from '../../components/assessment/answered-assessment';
import { usePolicy } from './requests/get-policy';

/** The entry that was in force for a part in an assessment; undefined while it is read, and where there is none. */
export function usePolicyEntry(
  policy: AnsweredAssessment['policy'],
  ratings: Ratings | undefined,
): PolicyEntry | undefined {
  const version = usePolicy(typeof policy === 'object' ? policy.id : undefined);
  return ratings && version.data && entryFor(version.data.entries, ratings);
}
