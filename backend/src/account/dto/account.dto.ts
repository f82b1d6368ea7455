import { ApiProperty } from '@nestjs/swagger';
import { IsNotEmpty, IsString, MaxLength } from 'class-validator';
import { Filled } from '../../common/validation/filled';

export class OwnName {
  @ApiProperty({ maxLength: 100 })
  @IsString()
  @Filled()
  @MaxLength(100)
  name: string;
}

export class OwnPassword {
  @ApiProperty()
  @IsString()
  @IsNotEmpty()
  @MaxLength(200)
  currentPassword: string;

  @ApiProperty({ minLength: 10 })
  @IsString()
  @MaxLength(200)
  newPassword: string;
}

export class OwnSession {
  @ApiProperty()
  id: string;

  @ApiProperty({ description: 'What the browser says of itself' })
  userAgent: string;

  @ApiProperty({ description: 'Network address at sign-in' })
  address: string;

  @ApiProperty({ description: 'ISO 8601' })
  createdAt: string;

  @ApiProperty({ description: 'ISO 8601' })
  lastUsedAt: string;

  @ApiProperty({ description: 'Whether this very request belongs to it' })
  current: boolean;
}

export class OwnSessions {
  @ApiProperty({ type: [OwnSession] })
  items: OwnSession[];
}
