import { Controller, Get, Query } from '@nestjs/common';
import { ApiOkResponse, ApiOperation, ApiTags } from '@nestjs/swagger';
import { May } from '../permissions/may.decorator';
import { AuditReading } from './audit-reading';
import { AuditPage, AuditQuery } from './dto/audit.dto';

@ApiTags('audit')
@Controller('audit')
export class AuditController {
  constructor(private readonly reading: AuditReading) {}

  @Get()
  @May('read', 'AuditEntry')
  @ApiOperation({ operationId: 'listAuditEntries', summary: 'Who changed what, newest first' })
  @ApiOkResponse({ type: AuditPage })
  async list(@Query() query: AuditQuery): Promise<AuditPage> {
    return this.reading.page(query);
  }
}
