import { ApiProperty, ApiPropertyOptional } from '@nestjs/swagger';
import {
  approvals,
  supplyStatuses,
  type Approval,
  type SupplyStatus,
} from '@resistry/engineering/ratings/technology';
import { NamedDto } from '../summary/part-summary.dto';

export class OrderingCodeDto {
  @ApiProperty({ description: 'Code of the packaging' })
  packaging: string;

  @ApiProperty()
  description: string;

  @ApiProperty({ description: 'Pieces in one packaging' })
  quantity: number;

  @ApiPropertyOptional({ description: 'Absent where the template of the family cannot write it' })
  code?: string;
}

/** A part under a company part number. */
export class SourceDto {
  @ApiProperty()
  id: number;

  @ApiProperty()
  manufacturerPartNumber: string;

  @ApiProperty({ type: NamedDto })
  manufacturer: NamedDto;

  @ApiProperty({ type: NamedDto })
  family: NamedDto;

  @ApiProperty({ description: 'Place in the approved manufacturer list, from 1' })
  position: number;

  @ApiProperty({ enum: approvals })
  approval: Approval;

  @ApiProperty({ enum: supplyStatuses })
  supply: SupplyStatus;

  @ApiPropertyOptional({ description: 'Lowest unit price at 1000 pieces in force today, EUR' })
  unitPrice?: number;

  @ApiPropertyOptional({ description: 'Day, ISO 8601' })
  lastOrderOn?: string;
}
