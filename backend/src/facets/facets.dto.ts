import { ApiProperty } from '@nestjs/swagger';
import { seriesNames, type SeriesName } from '@resistry/engineering/preferred-values/series';
import {
  mountings,
  technologies,
  type Mounting,
  type Technology,
} from '@resistry/engineering/ratings/technology';
import { NamedDto } from '../parts/summary/part-summary.dto';

class Counted {
  @ApiProperty({ description: 'Number of parts that the filter lets through' })
  parts: number;
}

export class ManufacturerFacet extends NamedDto {
  @ApiProperty({ description: 'Number of parts that the filter lets through' })
  parts: number;
}

export class FamilyFacet extends ManufacturerFacet {
  @ApiProperty()
  manufacturerId: number;
}

export class TechnologyFacet extends Counted {
  @ApiProperty({ enum: technologies })
  value: Technology;
}

export class SizeFacet extends Counted {
  @ApiProperty({ description: 'Inch code of a chip, or the trade’s code of the body' })
  code: string;

  @ApiProperty({
    type: [String],
    description: 'Metric codes of the sizes that bear the code; empty for none',
  })
  metricCodes: string[];
}

export class SeriesFacet extends Counted {
  @ApiProperty({ enum: seriesNames })
  value: SeriesName;
}

export class NumberFacet extends Counted {
  @ApiProperty()
  value: number;
}

export class MountingFacet extends Counted {
  @ApiProperty({ enum: mountings })
  value: Mounting;
}

/** What the filters of a search can be set to, each value with its number of parts in the whole catalogue. */
export class FacetsDto {
  @ApiProperty({ type: [ManufacturerFacet] })
  manufacturers: ManufacturerFacet[];

  @ApiProperty({ type: [FamilyFacet] })
  families: FamilyFacet[];

  @ApiProperty({ type: [TechnologyFacet] })
  technologies: TechnologyFacet[];

  @ApiProperty({ type: [SizeFacet] })
  sizes: SizeFacet[];

  @ApiProperty({ type: [SeriesFacet], description: 'A part can be in several' })
  series: SeriesFacet[];

  @ApiProperty({ type: [NumberFacet], description: 'Fractions' })
  tolerances: NumberFacet[];

  @ApiProperty({ type: [NumberFacet], description: '1/K' })
  tcrs: NumberFacet[];

  @ApiProperty({ type: [MountingFacet] })
  mountings: MountingFacet[];
}
