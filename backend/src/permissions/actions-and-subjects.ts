/** What the rules speak of; a new deed or kind of thing gets its word here first. `manage` means every deed. */
export const ACTIONS = [
  'read',
  'compute',
  'create',
  'update',
  'submit',
  'return',
  'approve',
  'promote',
  'restrict',
  'withdraw',
  'publish',
  'set-supply-status',
  'set-last-order-date',
  'end',
  'invite',
  'change-roles',
  'deactivate',
  'reactivate',
  'manage',
] as const;
export type Action = (typeof ACTIONS)[number];

export const SUBJECTS = [
  'Account',
  'Search',
  'Part',
  'Family',
  'Manufacturer',
  'CompanyPartNumber',
  'Offer',
  'Review',
  'Policy',
  'User',
  'Permission',
  'AuditEntry',
  'Mail',
  'OutboxMessage',
  'Backup',
] as const;
export type Subject = (typeof SUBJECTS)[number];
