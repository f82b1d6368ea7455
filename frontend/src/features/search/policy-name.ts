import type { PolicySummary } from '../policies/requests/list-policies';

/** How the policy of a duty is called in the sentence. */
export function policyNameOf(chosen: string | undefined, policies: readonly PolicySummary[]): string {
  if (chosen === 'none') return 'no policy, as rated';
  const policy = policies.find((each) => (chosen === undefined ? each.inForce : String(each.id) === chosen));
  if (policy !== undefined) return `${policy.name} ${policy.version}`;
  return chosen === undefined ? 'the company’s policy' : `policy ${chosen}`;
}
