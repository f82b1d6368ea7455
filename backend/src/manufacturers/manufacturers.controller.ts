import { Controller, Get } from '@nestjs/common';
import { ApiOkResponse, ApiOperation, ApiTags } from '@nestjs/swagger';
import { May } from '../permissions/may.decorator';
import { ManufacturerList } from './dto/manufacturer.dto';
import { ManufacturersService } from './manufacturers.service';

@ApiTags('manufacturers')
@Controller('manufacturers')
export class ManufacturersController {
  constructor(private readonly manufacturers: ManufacturersService) {}

  @Get()
  @May('read', 'Manufacturer')
  @ApiOperation({
    operationId: 'listManufacturers',
    summary: 'All manufacturers with their numbers of families and parts',
  })
  @ApiOkResponse({ type: ManufacturerList })
  async list(): Promise<ManufacturerList> {
    return { items: await this.manufacturers.list() };
  }
}
