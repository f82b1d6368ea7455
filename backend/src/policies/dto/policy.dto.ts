import { ApiProperty, ApiPropertyOptional } from '@nestjs/swagger';
import type { PolicyEntry } from '@resistry/engineering/derating/policy-entry';
import { PolicyEntryDto } from './policy-entry.dto';

/** A published version of a derating policy. */
export class PolicyDto {
  @ApiProperty({ description: 'Id of the version' })
  id: number;

  @ApiProperty()
  name: string;

  @ApiProperty({ description: 'Number of the version within its policy' })
  version: number;

  @ApiProperty({ enum: ['company', 'agency'] })
  origin: 'company' | 'agency';

  @ApiProperty({ description: 'Where its figures come from' })
  source: string;

  @ApiProperty({ description: "Whether it is the company's policy in force" })
  inForce: boolean;

  @ApiProperty()
  note: string;

  @ApiPropertyOptional()
  publishedAt?: string;

  @ApiPropertyOptional({ description: "Absent for an agency's table, which comes with the program" })
  publishedBy?: string;
}

/** A published version with its entries; the first that matches a part is in force for it. */
export class PolicyVersionDto extends PolicyDto {
  @ApiProperty({ type: [PolicyEntryDto] })
  entries: PolicyEntry[];
}

export class PolicyList {
  @ApiProperty({ type: [PolicyDto] })
  items: PolicyDto[];
}
