import { ApiProperty } from '@nestjs/swagger';
import { type Role, ROLES } from '../../permissions/roles';

export class SignedInUser {
  @ApiProperty()
  id: number;

  @ApiProperty()
  email: string;

  @ApiProperty()
  name: string;

  @ApiProperty({ enum: ROLES, enumName: 'Role', isArray: true })
  roles: Role[];
}

/** Who is signed in and what he or she may do. */
export class Me {
  @ApiProperty({ type: SignedInUser })
  user: SignedInUser;

  @ApiProperty({
    description:
      'The rules of this person, packed by @casl/ability; unpack with unpackRules of @casl/ability/extra',
    type: 'array',
    items: { type: 'array', items: {} },
  })
  rules: unknown[][];
}

export class SignedIn extends Me {
  @ApiProperty({ description: 'Goes into the Authorization header as a bearer token; good for ten minutes' })
  accessToken: string;
}
