import { Body, Controller, HttpCode, Post } from '@nestjs/common';
import {
  ApiExtraModels,
  ApiOkResponse,
  ApiOperation,
  ApiTags,
  ApiUnprocessableEntityResponse,
} from '@nestjs/swagger';
import { assess } from '@resistry/engineering/assessment/assess';
import { impliedQuantities } from '@resistry/engineering/duty/requirement';
import { ProblemDocument } from '../common/problems/problem-document';
import { May } from '../permissions/may.decorator';
import { PoliciesService } from '../policies/policies.service';
import { AssessmentDto, PolicyVersionRefDto } from './dto/assessment.dto';
import { AssessRatingsRequest, RequirementRequest } from './dto/assess-request.dto';
import { RequirementDto } from './dto/requirement.dto';
import { presentAssessment } from './present-assessment';
import { refuseRatings } from './refuse-ratings';
import { requirementOfDuty } from './requirement-of-duty';

@ApiTags('assessments')
@ApiExtraModels(PolicyVersionRefDto)
@Controller()
export class AssessmentsController {
  constructor(private readonly policies: PoliciesService) {}

  @Post('requirements')
  @HttpCode(200)
  @May('compute', 'Search')
  @ApiOperation({ operationId: 'deriveRequirement', summary: 'What follows from a duty' })
  @ApiOkResponse({ type: RequirementDto })
  @ApiUnprocessableEntityResponse({ type: ProblemDocument })
  derive(@Body() body: RequirementRequest): RequirementDto {
    return impliedQuantities(requirementOfDuty(body.duty));
  }

  @Post('assessments')
  @HttpCode(200)
  @May('compute', 'Search')
  @ApiOperation({
    operationId: 'assessRatings',
    summary: 'Hold a part known only by its numbers against a duty',
  })
  @ApiOkResponse({ type: AssessmentDto })
  @ApiUnprocessableEntityResponse({ type: ProblemDocument })
  async assess(@Body() body: AssessRatingsRequest): Promise<AssessmentDto> {
    const requirement = requirementOfDuty(body.duty);
    refuseRatings(body.ratings);
    const { policy, used } = await this.policies.resolve(body.policy);
    return presentAssessment(assess({ modes: [{ ratings: body.ratings }] }, requirement, policy), used);
  }
}
