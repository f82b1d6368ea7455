import { ApiProperty, ApiPropertyOptional } from '@nestjs/swagger';

export class ManufacturerDto {
  @ApiProperty()
  id: number;

  @ApiProperty()
  code: string;

  @ApiProperty()
  name: string;

  @ApiPropertyOptional()
  country?: string;

  @ApiPropertyOptional()
  note?: string;

  @ApiProperty({ description: 'Number of families' })
  families: number;

  @ApiProperty({ description: 'Number of parts' })
  parts: number;
}

export class ManufacturerList {
  @ApiProperty({ type: [ManufacturerDto] })
  items: ManufacturerDto[];
}
