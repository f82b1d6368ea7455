import { ApiPropertyOptional } from '@nestjs/swagger';
import { IsInt, IsOptional, Max, Min } from 'class-validator';
import { NumberFromText } from '../validation/query-values';

const LARGEST_PAGE = 200;
const USUAL_PAGE = 50;

/** Query parameters of a list that comes by pages. */
export class PageQuery {
  @ApiPropertyOptional({ type: 'integer', minimum: 1, maximum: 1_000_000, default: 1 })
  @IsOptional()
  @NumberFromText()
  @IsInt()
  @Min(1)
  @Max(1_000_000)
  page?: number;

  @ApiPropertyOptional({ type: 'integer', minimum: 1, maximum: LARGEST_PAGE, default: USUAL_PAGE })
  @IsOptional()
  @NumberFromText()
  @IsInt()
  @Min(1)
  @Max(LARGEST_PAGE)
  pageSize?: number;
}

/** What a page is in rows. */
export function rowsOfPage({ page = 1, pageSize = USUAL_PAGE }: PageQuery): {
  limit: number;
  offset: number;
} {
  return { limit: pageSize, offset: (page - 1) * pageSize };
}
