import { ApiProperty, ApiPropertyOptional } from '@nestjs/swagger';
import { technologies, type Approval, type Technology } from '@resistry/engineering/ratings/technology';
import { PersonRefDto } from '../../common/reading/person-ref.dto';
import { NamedDto } from '../../parts/summary/part-summary.dto';
import { FamilyRevisionDto, RevisionRefDto } from './family-revision.dto';
import { CertificateDto, DatasheetDto, DeclarationDto } from './papers.dto';

/** A family with its current ratings and its papers. */
export class FamilyDetailsDto {
  @ApiProperty()
  id: number;

  @ApiProperty()
  code: string;

  @ApiProperty()
  name: string;

  @ApiProperty({ type: NamedDto })
  manufacturer: NamedDto;

  @ApiProperty({ enum: technologies })
  technology: Technology;

  @ApiProperty({ type: PersonRefDto })
  enteredBy: PersonRefDto;

  @ApiProperty({ description: 'ISO 8601' })
  enteredAt: string;

  @ApiProperty({ description: 'Number of parts' })
  parts: number;

  @ApiProperty({
    type: 'object',
    additionalProperties: { type: 'number' },
    description: 'Number of parts by approval, every approval named',
  })
  approvals: Record<Approval, number>;

  @ApiPropertyOptional({ type: FamilyRevisionDto, description: 'Absent before the first publication' })
  revision?: FamilyRevisionDto;

  @ApiProperty({ type: [RevisionRefDto], description: 'The newest first' })
  revisions: RevisionRefDto[];

  @ApiProperty({ type: [DeclarationDto] })
  declarations: DeclarationDto[];

  @ApiProperty({ type: [CertificateDto] })
  certificates: CertificateDto[];

  @ApiProperty({ type: [DatasheetDto] })
  datasheets: DatasheetDto[];
}
