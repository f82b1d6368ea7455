import { Controller, Get, Query } from '@nestjs/common';
import { ApiOkResponse, ApiOperation, ApiTags } from '@nestjs/swagger';
import { May } from '../permissions/may.decorator';
import { TextSearchQuery, TextSearchResult } from './text-search.dto';
import { TextSearchService } from './text-search.service';

@ApiTags('text-search')
@Controller('text-search')
export class TextSearchController {
  constructor(private readonly searches: TextSearchService) {}

  @Get()
  @May('read', 'Search')
  @ApiOperation({
    operationId: 'searchText',
    summary: 'Parts, families and manufacturers by what they are called',
  })
  @ApiOkResponse({ type: TextSearchResult })
  async search(@Query() query: TextSearchQuery): Promise<TextSearchResult> {
    return this.searches.search(query);
  }
}
