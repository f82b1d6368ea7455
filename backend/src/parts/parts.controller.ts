import { Controller, Get, Param } from '@nestjs/common';
import { ApiNotFoundResponse, ApiOkResponse, ApiOperation, ApiTags } from '@nestjs/swagger';
import { ProblemDocument } from '../common/problems/problem-document';
import { IdentifierPipe } from '../common/validation/identifier.pipe';
import { May } from '../permissions/may.decorator';
import { PartDetails } from './details/part-details';
import { PartDetailsDto } from './details/part-details.dto';

@ApiTags('parts')
@Controller('parts')
export class PartsController {
  constructor(private readonly details: PartDetails) {}

  @Get(':id')
  @May('read', 'Part')
  @ApiOperation({ operationId: 'readPart', summary: 'Everything that the catalogue knows of a part' })
  @ApiOkResponse({ type: PartDetailsDto })
  @ApiNotFoundResponse({ type: ProblemDocument })
  async read(@Param('id', IdentifierPipe) id: number): Promise<PartDetailsDto> {
    return this.details.find(id);
  }
}
