import type { Transaction } from 'sequelize';
import type { Writer } from '../database/writer';
import type { IdSequences } from './id-sequences';
import { insertRows } from './insert-rows';
import { momentOf } from './moments';
import type { SeedPolicy } from './reading/read-policy';
import type { Roster } from './roster';

/** Writes the company's derating policy and puts its last published version in force. */
export async function insertPolicy(
  writer: Writer,
  transaction: Transaction,
  policy: SeedPolicy,
  { roster, ids }: { roster: Roster; ids: IdSequences },
): Promise<void> {
  const policyId = ids.next('derating_policies');
  await insertRows(writer, transaction, 'derating_policies', [
    { id: policyId, name: policy.name, origin: 'company', source: policy.source },
  ]);
  const rows = policy.versions.map((version) => ({
    id: ids.next('derating_policy_versions'),
    policy_id: policyId,
    number: version.number,
    state: version.published ? 'published' : 'draft',
    entries: JSON.stringify(version.entries),
    note: version.note,
    entered_by: roster.didAs('component-engineer', version.entered),
    entered_at: momentOf(version.entered.on),
    published_by: version.published ? roster.didAs('component-engineer', version.published) : null,
    published_at: version.published ? momentOf(version.published.on, 16) : null,
  }));
  await insertRows(writer, transaction, 'derating_policy_versions', rows);
  const current = rows.findLast((row) => row.state === 'published');
  if (current) {
    await insertRows(writer, transaction, 'company_policy', [{ only: 1, version_id: current.id }]);
  }
}
