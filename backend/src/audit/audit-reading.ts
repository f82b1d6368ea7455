import { Injectable } from '@nestjs/common';
import type { BindValues } from '../database/bind-values';
import { Readers } from '../database/readers';
import type { AuditEntry, AuditPage, AuditQuery } from './dto/audit.dto';

const PAGE = 50;

interface AuditRow {
  id: number;
  recorded_at: string;
  actor_id: number | null;
  actor_name: string;
  action: string;
  subject_type: string;
  subject_id: string;
  before: string | null;
  after: string | null;
  reason: string | null;
}

/** One way to narrow the trail: its condition in SQL and the one value that it binds. */
interface Filter {
  condition: string;
  bind: BindValues;
}

/** Reading the audit trail, newest entry first. */
@Injectable()
export class AuditReading {
  constructor(private readonly readers: Readers) {}

  async page(query: AuditQuery): Promise<AuditPage> {
    const limit = query.limit ?? PAGE;
    const filters = filtersOf(query);
    const where = filters.map(({ condition }) => condition).join(' AND ') || 'TRUE';
    const bind = Object.assign({ rows: limit + 1 }, ...filters.map((filter) => filter.bind)) as BindValues;
    const rows = await this.readers.select<AuditRow>(
      `SELECT * FROM audit_entries WHERE ${where} ORDER BY id DESC LIMIT $rows`,
      bind,
    );
    const items = rows.slice(0, limit).map(present);
    const last = items.at(-1);
    return rows.length > limit && last ? { items, next: last.id } : { items };
  }
}

function filtersOf(query: AuditQuery): Filter[] {
  const { subjectType, subjectId, actor, action, text, from, to, before } = query;
  return [
    ...(subjectType === undefined
      ? []
      : [{ condition: 'subject_type = $subjectType', bind: { subjectType } }]),
    ...(subjectId === undefined ? [] : [{ condition: 'subject_id = $subjectId', bind: { subjectId } }]),
    ...(actor === undefined ? [] : [{ condition: 'actor_id = $actor', bind: { actor } }]),
    ...(action === undefined ? [] : [{ condition: 'action = $action', bind: { action } }]),
    ...(from === undefined ? [] : [{ condition: 'recorded_at >= $from', bind: { from: utc(from) } }]),
    ...(to === undefined ? [] : [{ condition: 'recorded_at < $to', bind: { to: utc(to) } }]),
    ...(before === undefined ? [] : [{ condition: 'id < $before', bind: { before } }]),
    ...(text === undefined ? [] : [containing(text)]),
  ];
}

/** Plain containment: `%` and `_` in what people type mean themselves. */
function containing(text: string): Filter {
  return {
    condition: `instr(lower(actor_name || char(10) || coalesce(reason, '') || char(10) || coalesce(before, '')
      || char(10) || coalesce(after, '')), lower($text)) > 0`,
    bind: { text },
  };
}

/** Moments are compared as text, so they all take the one form that the table has. */
function utc(moment: string): string {
  return new Date(moment).toISOString();
}

function present(row: AuditRow): AuditEntry {
  return {
    id: row.id,
    recordedAt: row.recorded_at,
    ...(row.actor_id !== null && { actorId: row.actor_id }),
    actorName: row.actor_name,
    action: row.action,
    subjectType: row.subject_type,
    subjectId: row.subject_id,
    ...(row.before !== null && { before: fields(row.before) }),
    ...(row.after !== null && { after: fields(row.after) }),
    ...(row.reason !== null && { reason: row.reason }),
  };
}

/** AuditTrail writes objects only. */
function fields(json: string): Record<string, unknown> {
  return JSON.parse(json) as Record<string, unknown>;
}
