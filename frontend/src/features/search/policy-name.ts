import type { PolicySummary } from '../policies/requests/list-policies';

/** How the policy of a duty is called in the sentence. */
export function policyNameOf(chosen: string | undefined, policies: readonly PolicySummary[]): string {
  if (chosen === 'none') return 'the manufacturer’s ratings as they are';
  const policy = policies.find((each) => (chosen === undefined ? each.inForce : String(each.id) === chosen));
  if (policy !== undefined) return `${policy.name} ${policy.version}`;
  return chosen === undefined ? 'the company’s policy' : `policy ${chosen}`;
}

/** Versions by name, the one in force first and chosen where nothing is. */
export function policyOptions(policies: readonly PolicySummary[]): { value: string; words: string }[] {
  const inForce = policies.find((policy) => policy.inForce);
  const words = (policy: PolicySummary): string => `${policy.name} ${policy.version}`;
  return [
    { value: '', words: inForce === undefined ? 'the company’s' : words(inForce) },
    ...policies
      .filter((policy) => policy !== inForce)
      .map((policy) => ({ value: String(policy.id), words: words(policy) })),
    { value: 'none', words: 'none: the manufacturer’s ratings as they are' },
  ];
}
