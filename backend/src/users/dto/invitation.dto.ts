import { ApiProperty } from '@nestjs/swagger';
import {
  ArrayMaxSize,
  ArrayMinSize,
  ArrayUnique,
  IsArray,
  IsEmail,
  IsIn,
  IsNotEmpty,
  IsString,
  MaxLength,
} from 'class-validator';
import { Filled } from '../../common/validation/filled';
import { type Role, ROLES } from '../../permissions/roles';

export class NewInvitation {
  @ApiProperty()
  @IsEmail({}, { message: 'email must be an e-mail address' })
  @MaxLength(254)
  email: string;

  @ApiProperty({ enum: ROLES, enumName: 'Role', isArray: true })
  @IsArray()
  @ArrayMinSize(1)
  @ArrayMaxSize(ROLES.length)
  @ArrayUnique()
  @IsIn(ROLES, { each: true, message: `roles must each be one of ${ROLES.join(', ')}` })
  roles: Role[];
}

export class InvitationCreated {
  @ApiProperty()
  id: string;
}

export class InvitationDetails {
  @ApiProperty()
  id: string;

  @ApiProperty()
  email: string;

  @ApiProperty({ enum: ROLES, enumName: 'Role', isArray: true })
  roles: Role[];

  @ApiProperty({ description: 'Name of the administrator who sent it' })
  invitedBy: string;

  @ApiProperty({ description: 'ISO 8601' })
  createdAt: string;

  @ApiProperty({ description: 'ISO 8601' })
  expiresAt: string;

  @ApiProperty({ enum: ['open', 'expired'] })
  state: 'open' | 'expired';
}

export class InvitationList {
  @ApiProperty({ type: [InvitationDetails] })
  items: InvitationDetails[];
}

export class InvitationToken {
  @ApiProperty({ description: 'From the link in the letter' })
  @IsString()
  @IsNotEmpty()
  @MaxLength(100)
  token: string;
}

export class InvitationPreview {
  @ApiProperty()
  email: string;

  @ApiProperty({ enum: ROLES, enumName: 'Role', isArray: true })
  roles: Role[];

  @ApiProperty({ description: 'ISO 8601' })
  expiresAt: string;
}

export class InvitationAcceptanceForm extends InvitationToken {
  @ApiProperty({ minLength: 1, maxLength: 100 })
  @IsString()
  @Filled()
  @MaxLength(100)
  name: string;

  @ApiProperty({ minLength: 10 })
  @IsString()
  @MaxLength(200)
  password: string;
}
