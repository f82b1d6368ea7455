import type { AuditEntry } from './requests/list-audit';

/** A field that a change touched; undefined where there was, or is, nothing. */
export interface ChangedField {
  field: string;
  before?: string;
  after?: string;
}

function words(value: unknown): string | undefined {
  if (value === undefined || value === null || value === '') return undefined;
  if (typeof value === 'string') return value;
  if (Array.isArray(value)) return value.map((each) => words(each) ?? 'nothing').join(', ');
  return JSON.stringify(value);
}

/** `leadTimeDays` as people say it. */
export const fieldWords = (field: string): string =>
  field.replace(/(?<=[a-z])[A-Z]/g, (letter) => ` ${letter.toLowerCase()}`);

/** What differs between before and after, in the order in which the fields were recorded. */
export function changedFields({
  before = {},
  after = {},
}: Pick<AuditEntry, 'before' | 'after'>): ChangedField[] {
  const fields = [...new Set([...Object.keys(before), ...Object.keys(after)])];
  return fields.flatMap((field) => {
    const change = { field, before: words(before[field]), after: words(after[field]) };
    return change.before === change.after ? [] : [change];
  });
}
