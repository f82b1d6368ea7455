import type { AuditQuery } from './requests/list-audit';

/** The filters as they stand in the address; days as `2026-12-01`. */
export const auditFilterNames = ['subject', 'id', 'actor', 'action', 'text', 'from', 'to'] as const;
export type AuditFilterName = (typeof auditFilterNames)[number];
export type AuditFilter = Record<AuditFilterName, string>;

export function readAuditFilter(address: URLSearchParams): AuditFilter {
  const of = (name: AuditFilterName): string => address.get(name) ?? '';
  return {
    subject: of('subject'),
    id: of('id'),
    actor: of('actor'),
    action: of('action'),
    text: of('text'),
    from: of('from'),
    to: of('to'),
  };
}

export function writeAuditFilter(filter: AuditFilter): URLSearchParams {
  const address = new URLSearchParams();
  for (const name of auditFilterNames) {
    const value = filter[name].trim();
    if (value !== '') address.set(name, value);
  }
  return address;
}

/** The start of a day in the reader's time zone, some days later; undefined where it is no day. */
function startOfDay(day: string, later: number): string | undefined {
  const date = new Date(`${day}T00:00:00`);
  if (Number.isNaN(date.getTime())) return undefined;
  date.setDate(date.getDate() + later);
  return date.toISOString();
}

/** Both days count whole, so the trail ends where the day after the last begins. */
export function auditQuery(filter: AuditFilter): AuditQuery {
  return {
    subjectType: filter.subject || undefined,
    subjectId: filter.id || undefined,
    actor: filter.actor || undefined,
    action: filter.action || undefined,
    text: filter.text || undefined,
    from: startOfDay(filter.from, 0),
    to: startOfDay(filter.to, 1),
  };
}
