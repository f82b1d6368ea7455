import type { MongoAbility } from '@casl/ability';

export interface NavigationItem {
  to: string;
  label: string;
  /** What one must be allowed to see it: the same words as on the server. */
  action: string;
  subject: string;
  /** Administration stands apart from the daily work. */
  group: 'work' | 'administration';
}

const items: readonly NavigationItem[] = [
  { to: '/find', label: 'Find', action: 'read', subject: 'Part', group: 'work' },
  { to: '/families', label: 'Families', action: 'read', subject: 'Family', group: 'work' },
  { to: '/policies', label: 'Policies', action: 'read', subject: 'Policy', group: 'work' },
  { to: '/reviews', label: 'Reviews', action: 'read', subject: 'Review', group: 'work' },
  { to: '/people', label: 'People', action: 'read', subject: 'User', group: 'administration' },
  {
    to: '/permissions',
    label: 'Who may do what',
    action: 'read',
    subject: 'Permission',
    group: 'administration',
  },
  { to: '/audit', label: 'Audit trail', action: 'read', subject: 'AuditEntry', group: 'administration' },
  { to: '/mail', label: 'Mail box', action: 'read', subject: 'Mail', group: 'administration' },
  { to: '/backups', label: 'Backups', action: 'read', subject: 'Backup', group: 'administration' },
];

/** The places a person may go, in order. */
export function navigationFor(ability: MongoAbility, group: NavigationItem['group']): NavigationItem[] {
  return items.filter((item) => item.group === group && ability.can(item.action, item.subject));
}
