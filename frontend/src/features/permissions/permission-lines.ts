import type { Schema } from '../../api/schema';

type Row = Schema<'PermissionRow'>;

/** One thing that can be done, with what each role may of it. */
export interface PermissionLine {
  action: Row['action'];
  subject: Row['subject'];
  /** Roles without an entry may not. */
  roles: Partial<Record<Row['role'], 'always' | 'conditional'>>;
  /** The rules in words, each once. */
  sentences: string[];
}

/** Rules by subject and action, in the order in which they came. */
export function permissionLines(rows: readonly Row[]): PermissionLine[] {
  const lines = new Map<string, PermissionLine>();
  for (const { role, action, subject, conditional, sentence } of rows) {
    const key = `${subject} ${action}`;
    const line = lines.get(key) ?? { action, subject, roles: {}, sentences: [] };
    lines.set(key, line);
    // A rule without a condition outweighs one with it.
    if (line.roles[role] !== 'always') line.roles[role] = conditional ? 'conditional' : 'always';
    if (!line.sentences.includes(sentence)) line.sentences.push(sentence);
  }
  return [...lines.values()];
}
