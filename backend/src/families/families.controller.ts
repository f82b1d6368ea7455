import { Controller, Get, Param, Query } from '@nestjs/common';
import { ApiNotFoundResponse, ApiOkResponse, ApiOperation, ApiTags } from '@nestjs/swagger';
import { ProblemDocument } from '../common/problems/problem-document';
import { IdentifierPipe } from '../common/validation/identifier.pipe';
import { May } from '../permissions/may.decorator';
import { FamilyDetailsDto } from './dto/family-details.dto';
import { FamilyListDto, FamilyQuery } from './dto/family-list.dto';
import { FamilyRevisionDto } from './dto/family-revision.dto';
import { FamilyList } from './family-list';
import { FamilyPage } from './family-page';
import { FamilyRevisions } from './family-revisions';

@ApiTags('families')
@Controller('families')
export class FamiliesController {
  constructor(
    private readonly families: FamilyList,
    private readonly page: FamilyPage,
    private readonly revisions: FamilyRevisions,
  ) {}

  @Get()
  @May('read', 'Family')
  @ApiOperation({ operationId: 'listFamilies', summary: 'Families with their numbers of parts by approval' })
  @ApiOkResponse({ type: FamilyListDto })
  async list(@Query() query: FamilyQuery): Promise<FamilyListDto> {
    return { items: await this.families.find(query) };
  }

  @Get(':id')
  @May('read', 'Family')
  @ApiOperation({ operationId: 'readFamily', summary: 'A family with its current ratings and its papers' })
  @ApiOkResponse({ type: FamilyDetailsDto })
  @ApiNotFoundResponse({ type: ProblemDocument })
  async read(@Param('id', IdentifierPipe) id: number): Promise<FamilyDetailsDto> {
    return this.page.find(id);
  }

  @Get(':id/revisions/:number')
  @May('read', 'Family')
  @ApiOperation({ operationId: 'readFamilyRevision', summary: 'One revision of a family' })
  @ApiOkResponse({ type: FamilyRevisionDto })
  @ApiNotFoundResponse({ type: ProblemDocument })
  async readRevision(
    @Param('id', IdentifierPipe) id: number,
    @Param('number', IdentifierPipe) number: number,
  ): Promise<FamilyRevisionDto> {
    return this.revisions.find(id, number);
  }
}
