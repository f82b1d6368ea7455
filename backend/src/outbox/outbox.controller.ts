import { Controller, Get, HttpCode, Param, Post } from '@nestjs/common';
import {
  ApiAcceptedResponse,
  ApiNotFoundResponse,
  ApiOkResponse,
  ApiOperation,
  ApiTags,
} from '@nestjs/swagger';
import { ProblemDocument } from '../common/problems/problem-document';
import { UuidPipe } from '../common/validation/uuid.pipe';
import { CurrentPerson } from '../permissions/current-person.decorator';
import { May } from '../permissions/may.decorator';
import { Person } from '../permissions/person';
import { UndeliveredMessages } from './dto/outbox.dto';
import { Undelivered } from './undelivered';

@ApiTags('outbox')
@Controller('outbox')
export class OutboxController {
  constructor(private readonly undelivered: Undelivered) {}

  @Get()
  @May('manage', 'OutboxMessage')
  @ApiOperation({ operationId: 'listUndelivered', summary: 'What has failed to be delivered' })
  @ApiOkResponse({ type: UndeliveredMessages })
  async list(): Promise<UndeliveredMessages> {
    return { items: await this.undelivered.list() };
  }

  @Post(':id/retry')
  @May('manage', 'OutboxMessage')
  @HttpCode(202)
  @ApiOperation({ operationId: 'retryDelivery', summary: 'Try a message again that has been given up' })
  @ApiAcceptedResponse()
  @ApiNotFoundResponse({ type: ProblemDocument })
  async retry(@Param('id', UuidPipe) id: string, @CurrentPerson() person: Person): Promise<void> {
    await this.undelivered.retry(person, id);
  }
}
