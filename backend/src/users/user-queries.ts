import { Injectable } from '@nestjs/common';
import { NotFoundProblem } from '../common/problems/problems';
import { Readers } from '../database/readers';
import { readRoles } from '../permissions/read-roles';
import type { UserDetails } from './dto/user.dto';

interface UserRow {
  id: number;
  email: string;
  name: string;
  roles: string;
  state: 'active' | 'deactivated';
  version: number;
  created_at: string;
  last_seen_at: string | null;
}

const USERS = `
  SELECT users.id, users.email, users.name, users.state, users.version, users.created_at,
    (SELECT json_group_array(role) FROM user_roles WHERE user_id = users.id) AS roles,
    (SELECT max(last_used_at) FROM sessions WHERE user_id = users.id) AS last_seen_at
  FROM users`;

/** Reading accounts. */
@Injectable()
export class UserQueries {
  constructor(private readonly readers: Readers) {}

  async list(): Promise<UserDetails[]> {
    return (await this.readers.select<UserRow>(`${USERS} ORDER BY users.name, users.id`)).map(present);
  }

  /** @throws NotFoundProblem */
  async find(id: number): Promise<UserDetails> {
    const row = await this.readers.lookUp<UserRow>(`${USERS} WHERE users.id = $id`, { id });
    if (!row) throw new NotFoundProblem('There is no such account.');
    return present(row);
  }
}

function present(row: UserRow): UserDetails {
  return {
    id: row.id,
    email: row.email,
    name: row.name,
    roles: readRoles(row.roles),
    state: row.state,
    version: row.version,
    createdAt: row.created_at,
    ...(row.last_seen_at !== null && { lastSeenAt: row.last_seen_at }),
  };
}
