import { ApiProperty } from '@nestjs/swagger';
import { ArrayMaxSize, ArrayMinSize, ArrayUnique, IsArray, IsIn, IsInt, Min } from 'class-validator';
import { Prose } from '../../common/validation/prose';
import { type Role, ROLES } from '../../permissions/roles';

export class UserDetails {
  @ApiProperty()
  id: number;

  @ApiProperty()
  email: string;

  @ApiProperty()
  name: string;

  @ApiProperty({ enum: ROLES, enumName: 'Role', isArray: true })
  roles: Role[];

  @ApiProperty({ enum: ['active', 'deactivated'] })
  state: 'active' | 'deactivated';

  @ApiProperty({ description: 'Send it back with a change; an older one is refused as stale' })
  version: number;

  @ApiProperty({ description: 'ISO 8601' })
  createdAt: string;

  @ApiProperty({ required: false, description: 'ISO 8601; absent where the person has never signed in' })
  lastSeenAt?: string;
}

export class UserList {
  @ApiProperty({ type: [UserDetails] })
  items: UserDetails[];
}

export class ReasonedChange {
  @Prose()
  reason: string;

  @ApiProperty()
  @IsInt()
  @Min(1)
  version: number;
}

export class NewRoles extends ReasonedChange {
  @ApiProperty({ enum: ROLES, enumName: 'Role', isArray: true })
  @IsArray()
  @ArrayMinSize(1)
  @ArrayMaxSize(ROLES.length)
  @ArrayUnique()
  @IsIn(ROLES, { each: true, message: `roles must each be one of ${ROLES.join(', ')}` })
  roles: Role[];
}
