import { ApiProperty } from '@nestjs/swagger';
import { IsInt, IsOptional, Max, Min } from 'class-validator';
import { NumberFromText } from '../../common/validation/query-values';

export class MailQuery {
  @ApiProperty({ required: false, minimum: 0, default: 0 })
  @IsOptional()
  @NumberFromText()
  @IsInt()
  @Min(0)
  @Max(1_000_000)
  offset?: number;

  @ApiProperty({ required: false, minimum: 1, maximum: 100, default: 50 })
  @IsOptional()
  @NumberFromText()
  @IsInt()
  @Min(1)
  @Max(100)
  limit?: number;
}

export class MailSummary {
  @ApiProperty()
  id: string;

  @ApiProperty()
  from: string;

  @ApiProperty()
  to: string;

  @ApiProperty()
  subject: string;

  @ApiProperty({ description: 'ISO 8601; empty when the letter says none' })
  date: string;
}

export class MailLetter extends MailSummary {
  @ApiProperty()
  text: string;

  @ApiProperty({ type: [String], description: 'Addresses found in the text' })
  links: string[];
}

export class MailList {
  @ApiProperty({ description: 'False where a mail server is configured, so that no letter stays here' })
  kept: boolean;

  @ApiProperty()
  total: number;

  @ApiProperty({ type: [MailSummary] })
  items: MailSummary[];
}
