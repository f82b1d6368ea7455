import { ApiProperty } from '@nestjs/swagger';
import { NamedDto } from '../../parts/summary/part-summary.dto';

export class SupplierList {
  @ApiProperty({ type: [NamedDto] })
  items: NamedDto[];
}
