import { randomBytes } from 'node:crypto';

const FORM = /^\d{4}-\d{2}-\d{2}T\d{2}-\d{2}-\d{2}Z-[0-9a-f]{4}$/;

/** `2026-12-01T02-30-00Z-4f1c`: sorts by time, is safe as a folder's name, and never comes twice. */
export function backupName(moment: Date): string {
  const time = moment.toISOString().slice(0, 19).replaceAll(':', '-');
  return `${time}Z-${randomBytes(2).toString('hex')}`;
}

/** Whether a text is the name of a backup and nothing that reaches elsewhere. */
export function isBackupName(text: string): boolean {
  return FORM.test(text);
}
