import { type Role, ROLES } from './roles';

/** Roles out of JSON text, as the database keeps and gathers them, in the order of the list of roles. */
export function readRoles(json: string): Role[] {
  const held: unknown = JSON.parse(json);
  return Array.isArray(held) ? ROLES.filter((role) => held.includes(role)) : [];
}
