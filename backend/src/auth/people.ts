import { Injectable } from '@nestjs/common';
import { Clock } from '../common/clock';
import { Readers } from '../database/readers';
import { Person } from '../permissions/person';
import { readRoles } from '../permissions/read-roles';

interface PersonRow {
  id: number;
  name: string;
  email: string;
  roles: string;
}

/** The person behind a session, with the roles that he or she has now. */
@Injectable()
export class People {
  constructor(
    private readonly readers: Readers,
    private readonly clock: Clock,
  ) {}

  /** @returns undefined when the session has ended or run out, or the account is deactivated */
  async ofSession(sessionId: string): Promise<Person | undefined> {
    const row = await this.readers.lookUp<PersonRow>(
      `SELECT users.id, users.name, users.email,
          (SELECT json_group_array(role) FROM user_roles WHERE user_id = users.id) AS roles
        FROM sessions JOIN users ON users.id = sessions.user_id
        WHERE sessions.id = $sessionId AND sessions.ended_at IS NULL AND sessions.expires_at > $now
          AND users.state = 'active'`,
      { sessionId, now: this.clock.timestamp() },
    );
    if (!row) return undefined;
    return new Person(row.id, row.name, row.email, readRoles(row.roles), sessionId);
  }
}
