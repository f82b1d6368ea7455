import { Controller, Get, Param, Query } from '@nestjs/common';
import { ApiNotFoundResponse, ApiOkResponse, ApiOperation, ApiTags } from '@nestjs/swagger';
import { ProblemDocument } from '../common/problems/problem-document';
import { NotFoundProblem } from '../common/problems/problems';
import { May } from '../permissions/may.decorator';
import { MailLetter, MailList, MailQuery } from './dto/mail.dto';
import { MailBox } from './mail-box';
import { MailCatcher } from './mail-catcher';
import { presentLetter, presentSummary } from './present-mail';

@ApiTags('mail')
@Controller('mail')
export class MailController {
  constructor(
    private readonly box: MailBox,
    private readonly catcher: MailCatcher,
  ) {}

  @Get()
  @May('read', 'Mail')
  @ApiOperation({
    operationId: 'listMail',
    summary: 'The letters that the local catcher keeps, newest first',
  })
  @ApiOkResponse({ type: MailList })
  async list(@Query() query: MailQuery): Promise<MailList> {
    const { total, letters } = await this.box.list(query.offset ?? 0, query.limit ?? 50);
    return { kept: this.catcher.inUse, total, items: letters.map(presentSummary) };
  }

  @Get(':id')
  @May('read', 'Mail')
  @ApiOperation({ operationId: 'readMail', summary: 'One letter with its text and links' })
  @ApiOkResponse({ type: MailLetter })
  @ApiNotFoundResponse({ type: ProblemDocument })
  async read(@Param('id') id: string): Promise<MailLetter> {
    const letter = await this.box.find(id);
    if (!letter) throw new NotFoundProblem('There is no such letter.');
    return presentLetter(letter);
  }
}
