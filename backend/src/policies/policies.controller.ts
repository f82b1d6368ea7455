import { Controller, Get, Param } from '@nestjs/common';
import { ApiNotFoundResponse, ApiOkResponse, ApiOperation, ApiTags } from '@nestjs/swagger';
import { ProblemDocument } from '../common/problems/problem-document';
import { IdentifierPipe } from '../common/validation/identifier.pipe';
import { May } from '../permissions/may.decorator';
import { PolicyList, PolicyVersionDto } from './dto/policy.dto';
import { PoliciesService } from './policies.service';

@ApiTags('policies')
@Controller('policies')
export class PoliciesController {
  constructor(private readonly policies: PoliciesService) {}

  @Get()
  @May('read', 'Policy')
  @ApiOperation({ operationId: 'listPolicies', summary: 'Published versions of the derating policies' })
  @ApiOkResponse({ type: PolicyList })
  async list(): Promise<PolicyList> {
    return { items: await this.policies.list() };
  }

  @Get(':id')
  @May('read', 'Policy')
  @ApiOperation({ operationId: 'readPolicy', summary: 'One published version with its entries' })
  @ApiOkResponse({ type: PolicyVersionDto })
  @ApiNotFoundResponse({ type: ProblemDocument })
  async read(@Param('id', IdentifierPipe) id: number): Promise<PolicyVersionDto> {
    return this.policies.find(id);
  }
}
