import type { Schema } from '../api/schema';

/** Roles as the interface names them, by the server's name. */
export const roleWords: Record<Schema<'Role'>, string> = {
  administrator: 'administrator',
  librarian: 'librarian',
  'component-engineer': 'component engineer',
  designer: 'designer',
  purchasing: 'purchasing',
};
