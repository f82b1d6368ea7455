import type { Transaction } from 'sequelize';
import type { Writer } from '../database/writer';
import { pricesSql } from '../offers/offer-record';

/** What was entered, with the state it then had. */
const ENTERED = `SELECT entered_at AS at, entered_by AS actor, 'create' AS action, 'Manufacturer' AS kind, id,
    NULL AS before, json_object('code', code, 'name', name) AS after, note AS reason FROM manufacturers
  UNION ALL
  SELECT f.entered_at, f.entered_by, 'create', 'Family', f.id, NULL,
    json_object('code', f.code, 'name', f.name, 'parts', (SELECT count(*) FROM parts WHERE family_id = f.id)), NULL
    FROM families AS f
  UNION ALL
  SELECT r.entered_at, r.entered_by, 'update', 'Family', r.family_id, NULL,
    json_object('revision', r.number, 'state', 'draft'), r.description FROM family_revisions AS r
  UNION ALL
  SELECT r.published_at, r.published_by, 'publish', 'Family', r.family_id,
    json_object('revision', r.number, 'state', 'draft'), json_object('revision', r.number, 'state', 'published'),
    r.description FROM family_revisions AS r
  UNION ALL
  SELECT c.entered_at, c.entered_by, 'create', 'CompanyPartNumber', c.id, NULL,
    json_object('number', c.number, 'description', c.description), NULL FROM company_part_numbers AS c
  UNION ALL
  SELECT o.entered_at, o.entered_by, 'create', 'Offer', o.id, NULL,
    json_object('part', p.manufacturer_part_number, 'supplier', s.name, 'packaging', o.packaging_code,
      'minimumOrder', o.minimum_order, 'orderMultiple', o.order_multiple, 'leadTimeDays', o.lead_time_days,
      'validFrom', o.valid_from, 'validUntil', o.valid_until, 'prices', json(${pricesSql})), 'Entered from the supplier’s quotation.'
    FROM offers AS o JOIN parts AS p ON p.id = o.part_id JOIN suppliers AS s ON s.id = o.supplier_id
  UNION ALL
  SELECT v.entered_at, v.entered_by, 'create', 'Policy', v.policy_id, NULL,
    json_object('version', v.number, 'state', 'draft'), v.note
    FROM derating_policy_versions AS v JOIN derating_policies AS p ON p.id = v.policy_id AND p.origin = 'company'
  UNION ALL
  SELECT v.published_at, v.published_by, 'publish', 'Policy', v.policy_id,
    json_object('version', v.number, 'state', 'draft'), json_object('version', v.number, 'state', 'published'), v.note
    FROM derating_policy_versions AS v JOIN derating_policies AS p ON p.id = v.policy_id AND p.origin = 'company'
    WHERE v.state = 'published'`;

/** What was decided about parts, in the words of the permissions. */
const DECIDED = `SELECT h.changed_at, h.changed_by,
    CASE h.to_approval WHEN 'in-review' THEN 'submit' WHEN 'approved' THEN 'approve' WHEN 'preferred' THEN 'promote'
      WHEN 'restricted' THEN 'restrict' ELSE 'withdraw' END,
    'Part', h.part_id, json_object('approval', h.from_approval),
    json_object('approval', h.to_approval, 'words', h.words, 'scope', h.scope, 'exception', h.exception), h.reason
    FROM approval_history AS h
  UNION ALL
  SELECT h.changed_at, h.changed_by, 'set-supply-status', 'Part', h.part_id, json_object('supply', h.from_supply),
    json_object('supply', h.to_supply, 'lastOrderOn', h.last_order_on), h.reason FROM supply_history AS h`;

/** Writes the audit trail of all that the seed entered, in the order of time. Call it when everything else is there. */
export async function insertAudit(writer: Writer, transaction: Transaction): Promise<void> {
  await writer.run(
    transaction,
    `INSERT INTO audit_entries (recorded_at, actor_id, actor_name, action, subject_type, subject_id, before, after, reason)
     SELECT e.at, e.actor, u.name, e.action, e.kind, CAST(e.id AS TEXT), e.before, e.after, e.reason
     FROM (${ENTERED} UNION ALL ${DECIDED}) AS e JOIN users AS u ON u.id = e.actor ORDER BY e.at, e.kind, e.id`,
  );
}
