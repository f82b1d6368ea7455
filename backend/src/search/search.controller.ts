import { Body, Controller, HttpCode, Param, Post, Res } from '@nestjs/common';
import {
  ApiNotFoundResponse,
  ApiOkResponse,
  ApiOperation,
  ApiTags,
  ApiUnprocessableEntityResponse,
} from '@nestjs/swagger';
import type { Response } from 'express';
import { closedSignal } from '../common/http/closed-signal';
import { AssessmentDto } from '../assessments/dto/assessment.dto';
import { AssessPartRequest } from '../assessments/dto/assess-request.dto';
import { ProblemDocument } from '../common/problems/problem-document';
import { IdentifierPipe } from '../common/validation/identifier.pipe';
import { May } from '../permissions/may.decorator';
import { SearchRequest } from './dto/search-request.dto';
import { SearchResultDto } from './dto/search-result.dto';
import { PartAssessmentService } from './part-assessment.service';
import { SearchService } from './search.service';

@ApiTags('search')
@Controller('parts')
export class SearchController {
  constructor(
    private readonly searches: SearchService,
    private readonly assessments: PartAssessmentService,
  ) {}

  @Post('search')
  @HttpCode(200)
  @May('compute', 'Search')
  @ApiOperation({
    operationId: 'searchParts',
    summary: 'Parts that meet a duty, with exact counts of what each check removes',
  })
  @ApiOkResponse({ type: SearchResultDto })
  @ApiUnprocessableEntityResponse({ type: ProblemDocument })
  async search(
    @Body() body: SearchRequest,
    @Res({ passthrough: true }) response: Response,
  ): Promise<SearchResultDto> {
    return this.searches.search(body, closedSignal(response));
  }

  @Post(':id/assessment')
  @HttpCode(200)
  @May('compute', 'Search')
  @ApiOperation({ operationId: 'assessPart', summary: 'Hold one catalogue part against a duty' })
  @ApiOkResponse({ type: AssessmentDto })
  @ApiNotFoundResponse({ type: ProblemDocument })
  @ApiUnprocessableEntityResponse({ type: ProblemDocument })
  async assess(
    @Param('id', IdentifierPipe) id: number,
    @Body() body: AssessPartRequest,
  ): Promise<AssessmentDto> {
    return this.assessments.assess(id, body);
  }
}
