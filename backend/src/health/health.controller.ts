import { Controller, Get } from '@nestjs/common';
import { ApiOkResponse, ApiOperation, ApiTags } from '@nestjs/swagger';
import { Readers } from '../database/readers';
import { Public } from '../permissions/public.decorator';
import { Health } from './dto/health.dto';

@ApiTags('health')
@Controller('health')
export class HealthController {
  constructor(private readonly readers: Readers) {}

  @Get()
  @Public()
  @ApiOperation({
    operationId: 'readHealth',
    summary: 'Whether the application answers and reaches its database',
  })
  @ApiOkResponse({ type: Health })
  async read(): Promise<Health> {
    const newest = await this.readers.lookUp<{ name: string }>(
      'SELECT max(name) AS name FROM schema_migrations',
    );
    return { status: 'ok', schema: newest?.name ?? '' };
  }
}
