import { ApiProperty, ApiPropertyOptional } from '@nestjs/swagger';
import { SizeRefDto } from '../../parts/summary/part-summary.dto';

/** What names a datasheet. */
export class DatasheetRefDto {
  @ApiProperty()
  id: number;

  @ApiProperty()
  documentNumber: string;

  @ApiProperty({ description: 'As the manufacturer numbers it' })
  revision: string;
}

export class DatasheetDto extends DatasheetRefDto {
  @ApiProperty()
  title: string;

  @ApiProperty({ description: 'Day, ISO 8601' })
  issuedOn: string;

  @ApiProperty()
  pageCount: number;
}

/** Where a rating stands in a datasheet. */
export class CitationDto {
  @ApiProperty({ description: 'Field of the ratings' })
  field: string;

  @ApiPropertyOptional({ type: SizeRefDto, description: 'Absent where it stands for every size' })
  size?: SizeRefDto;

  @ApiProperty({ type: DatasheetRefDto })
  datasheet: DatasheetRefDto;

  @ApiProperty()
  page: number;

  @ApiPropertyOptional()
  note?: string;
}

export class DeclarationDto {
  @ApiProperty({ enum: ['RoHS', 'REACH'] })
  kind: 'RoHS' | 'REACH';

  @ApiProperty({ description: 'Day, ISO 8601' })
  datedOn: string;

  @ApiPropertyOptional()
  exemption?: string;

  @ApiProperty()
  statement: string;
}

export class CertificateDto {
  @ApiProperty({ enum: ['safety', 'automotive'] })
  kind: 'safety' | 'automotive';

  @ApiProperty()
  standard: string;

  @ApiProperty()
  number: string;

  @ApiPropertyOptional({ type: SizeRefDto, description: 'Absent where it covers every size' })
  size?: SizeRefDto;

  @ApiProperty({ description: 'Day, ISO 8601' })
  issuedOn: string;

  @ApiPropertyOptional({ description: 'Last day on which it is valid; absent where it does not expire' })
  expiresOn?: string;

  @ApiProperty({ description: 'Its last day has passed' })
  expired: boolean;
}
