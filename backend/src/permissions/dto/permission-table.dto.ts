import { ApiProperty } from '@nestjs/swagger';
import { ACTIONS, type Action, type Subject, SUBJECTS } from '../actions-and-subjects';
import { type Role, ROLES } from '../roles';

export class PermissionRow {
  @ApiProperty({ enum: ROLES, enumName: 'Role' })
  role: Role;

  @ApiProperty({ enum: ACTIONS, enumName: 'Action' })
  action: Action;

  @ApiProperty({ enum: SUBJECTS, enumName: 'Subject' })
  subject: Subject;

  @ApiProperty({ description: 'True where it also depends on the thing itself; the sentence says how' })
  conditional: boolean;

  @ApiProperty()
  sentence: string;
}

export class PermissionTable {
  @ApiProperty({ enum: ROLES, enumName: 'Role', isArray: true })
  roles: Role[];

  @ApiProperty({ enum: ACTIONS, enumName: 'Action', isArray: true })
  actions: Action[];

  @ApiProperty({ enum: SUBJECTS, enumName: 'Subject', isArray: true })
  subjects: Subject[];

  @ApiProperty({ type: [PermissionRow] })
  rows: PermissionRow[];
}
