import { ONESELF, type PermissionRule } from './rule';
import { ROLES } from './roles';

/** The thing must say who entered it, and that must be somebody else: four eyes. */
const ENTERED_BY_SOMEBODY_ELSE = { enteredBy: { $exists: true, $ne: ONESELF } };

/** Every rule of who may do what. The server applies them, the browser receives them, administrators read them. */
export const rules: readonly PermissionRule[] = [
  {
    roles: ROLES,
    actions: ['manage'],
    subjects: ['Account'],
    sentence: 'Everybody keeps his or her own account: name, password and sessions.',
  },
  {
    roles: ROLES,
    actions: ['read'],
    subjects: ['Part', 'Family', 'Manufacturer', 'CompanyPartNumber', 'Offer', 'Policy'],
    sentence:
      'Everybody who is signed in may read the whole catalogue, its offers and the derating policies.',
  },
  {
    roles: ROLES,
    actions: ['compute', 'read'],
    subjects: ['Search'],
    sentence: 'Everybody who is signed in may search, assess and compute.',
  },
  {
    roles: ['librarian'],
    actions: ['create', 'update', 'submit'],
    subjects: ['Manufacturer', 'Part'],
    sentence: 'A librarian enters manufacturers and parts and submits parts for review.',
  },
  {
    roles: ['librarian'],
    actions: ['create'],
    subjects: ['Family'],
    sentence: 'A librarian enters families.',
  },
  {
    roles: ['librarian'],
    actions: ['update', 'submit'],
    subjects: ['Family'],
    conditions: { state: { $eq: 'draft' } },
    sentence: 'A librarian changes a family revision while it is a draft; a published one never changes.',
  },
  {
    roles: ['librarian', 'component-engineer'],
    actions: ['return'],
    subjects: ['Part'],
    sentence:
      'A component engineer sends a part under review back to draft, and a librarian takes a submission back.',
  },
  {
    roles: ['component-engineer'],
    actions: ['approve', 'restrict', 'withdraw'],
    subjects: ['Part'],
    conditions: ENTERED_BY_SOMEBODY_ELSE,
    sentence:
      'A component engineer approves, restricts and withdraws parts, but none that he or she entered.',
  },
  {
    roles: ['component-engineer'],
    actions: ['promote'],
    subjects: ['Part'],
    conditions: ENTERED_BY_SOMEBODY_ELSE,
    sentence: 'Only a component engineer promotes a part to preferred, and none that he or she entered.',
  },
  {
    roles: ['component-engineer'],
    actions: ['create', 'update'],
    subjects: ['CompanyPartNumber', 'Policy'],
    sentence: 'A component engineer keeps the company part numbers and the derating policy.',
  },
  {
    roles: ['component-engineer'],
    actions: ['publish'],
    subjects: ['Family', 'Policy'],
    conditions: { ...ENTERED_BY_SOMEBODY_ELSE, state: { $eq: 'draft' } },
    sentence:
      'A component engineer publishes drafts of family revisions and of the derating policy, but none that he or she entered.',
  },
  {
    roles: ['component-engineer', 'designer', 'purchasing'],
    actions: ['read'],
    subjects: ['Review'],
    sentence: 'Component engineers, designers and purchasing see which parts are under review.',
  },
  {
    roles: ['purchasing'],
    actions: ['set-supply-status', 'set-last-order-date'],
    subjects: ['Part'],
    sentence: 'Purchasing sets the supply status of a part and its last order date.',
  },
  {
    roles: ['purchasing'],
    actions: ['manage'],
    subjects: ['Offer'],
    sentence: 'Purchasing enters, changes and ends offers.',
  },
  {
    roles: ['administrator'],
    actions: ['read', 'invite', 'change-roles', 'reactivate'],
    subjects: ['User'],
    sentence: 'An administrator invites people, gives them roles and lets them back in.',
  },
  {
    roles: ['administrator'],
    actions: ['deactivate'],
    subjects: ['User'],
    conditions: { id: { $exists: true, $ne: ONESELF } },
    sentence: 'An administrator deactivates the accounts of other people, never his or her own.',
  },
  {
    roles: ['administrator'],
    actions: ['read'],
    subjects: ['Permission', 'AuditEntry', 'Mail'],
    sentence:
      'An administrator reads these rules, the audit trail and the mail that this machine has caught.',
  },
  {
    roles: ['administrator'],
    actions: ['manage'],
    subjects: ['OutboxMessage', 'Backup'],
    sentence: 'An administrator makes and checks backups and sees what could not be delivered.',
  },
];
