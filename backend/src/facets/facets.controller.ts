import { Controller, Get } from '@nestjs/common';
import { ApiOkResponse, ApiOperation, ApiTags } from '@nestjs/swagger';
import { May } from '../permissions/may.decorator';
import { FacetsDto } from './facets.dto';
import { FacetsService } from './facets.service';

@ApiTags('facets')
@Controller('facets')
export class FacetsController {
  constructor(private readonly facets: FacetsService) {}

  @Get()
  @May('read', 'Search')
  @ApiOperation({
    operationId: 'readFacets',
    summary: 'What a search can be narrowed to, with numbers of parts',
  })
  @ApiOkResponse({ type: FacetsDto })
  async read(): Promise<FacetsDto> {
    return this.facets.count();
  }
}
