import { ApiProperty, ApiPropertyOptional } from '@nestjs/swagger';
import type { ImpliedQuantities } from '@resistry/engineering/duty/requirement';

class ImpliedWindowDto {
  @ApiProperty({ description: 'Ω' })
  lower: number;

  @ApiPropertyOptional({ description: 'Ω; absent where nothing bounds it' })
  upper?: number;

  @ApiPropertyOptional({ description: 'Ω' })
  nominal?: number;
}

class ImpliedIntervalDto {
  @ApiProperty()
  min: number;

  @ApiPropertyOptional({ description: 'Absent where nothing bounds it' })
  max?: number;
}

/** What follows from a duty, SI; a field is absent where nothing bounds it. */
export class RequirementDto implements ImpliedQuantities {
  @ApiPropertyOptional({ type: ImpliedWindowDto })
  window?: ImpliedWindowDto;

  @ApiPropertyOptional({ type: ImpliedIntervalDto, description: 'V' })
  voltage?: ImpliedIntervalDto;

  @ApiPropertyOptional({ type: ImpliedIntervalDto, description: 'A' })
  current?: ImpliedIntervalDto;

  @ApiPropertyOptional({ description: 'Largest dissipation over the window, W' })
  dissipation?: number;
}
