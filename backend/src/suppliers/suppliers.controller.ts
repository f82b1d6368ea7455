import { Controller, Get } from '@nestjs/common';
import { ApiOkResponse, ApiOperation, ApiTags } from '@nestjs/swagger';
import { May } from '../permissions/may.decorator';
import { SupplierList } from './dto/supplier.dto';
import { SuppliersService } from './suppliers.service';

@ApiTags('suppliers')
@Controller('suppliers')
export class SuppliersController {
  constructor(private readonly suppliers: SuppliersService) {}

  @Get()
  @May('read', 'Offer')
  @ApiOperation({ operationId: 'listSuppliers', summary: 'All suppliers, by name' })
  @ApiOkResponse({ type: SupplierList })
  async list(): Promise<SupplierList> {
    return { items: await this.suppliers.list() };
  }
}
