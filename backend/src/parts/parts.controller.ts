import { Controller, Get, Param } from '@nestjs/common';
import { ApiNotFoundResponse, ApiOkResponse, ApiOperation, ApiTags } from '@nestjs/swagger';
import { ProblemDocument } from '../common/problems/problem-document';
import { IdentifierPipe } from '../common/validation/identifier.pipe';
import { May } from '../permissions/may.decorator';
import { AlternatesDto } from './alternates/alternates.dto';
import { Alternates } from './alternates/alternates.service';
import { PartDetails } from './details/part-details';
import { PartDetailsDto } from './details/part-details.dto';

@ApiTags('parts')
@Controller('parts')
export class PartsController {
  constructor(
    private readonly details: PartDetails,
    private readonly equals: Alternates,
  ) {}

  @Get(':id')
  @May('read', 'Part')
  @ApiOperation({ operationId: 'readPart', summary: 'Everything that the catalogue knows of a part' })
  @ApiOkResponse({ type: PartDetailsDto })
  @ApiNotFoundResponse({ type: ProblemDocument })
  async read(@Param('id', IdentifierPipe) id: number): Promise<PartDetailsDto> {
    return this.details.find(id);
  }

  @Get(':id/alternates')
  @May('read', 'Part')
  @ApiOperation({
    operationId: 'listAlternates',
    summary: 'Parts of equal form, fit and function, with every difference',
  })
  @ApiOkResponse({ type: AlternatesDto })
  @ApiNotFoundResponse({ type: ProblemDocument })
  async alternates(@Param('id', IdentifierPipe) id: number): Promise<AlternatesDto> {
    return this.equals.of(id);
  }
}
