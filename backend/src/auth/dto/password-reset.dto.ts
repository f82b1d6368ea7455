import { ApiProperty } from '@nestjs/swagger';
import { IsEmail, IsNotEmpty, IsString, MaxLength } from 'class-validator';

export class PasswordResetRequest {
  @ApiProperty()
  @IsEmail({}, { message: 'email must be an e-mail address' })
  @MaxLength(254)
  email: string;
}

export class PasswordResetTaken {
  @ApiProperty({ description: 'The same words whether or not the address has an account' })
  message: string;
}

export class NewPassword {
  @ApiProperty({ description: 'From the link in the letter' })
  @IsString()
  @IsNotEmpty()
  @MaxLength(100)
  token: string;

  @ApiProperty({ minLength: 10 })
  @IsString()
  @MaxLength(200)
  password: string;
}
