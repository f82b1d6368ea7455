import { Controller, Get } from '@nestjs/common';
import { ApiOkResponse, ApiOperation, ApiTags } from '@nestjs/swagger';
import { PermissionTable } from './dto/permission-table.dto';
import { May } from './may.decorator';
import { permissionTable } from './permission-table';

@ApiTags('permissions')
@Controller('permissions')
export class PermissionsController {
  @Get()
  @May('read', 'Permission')
  @ApiOperation({ operationId: 'readPermissions', summary: 'Who may do what, rule by rule' })
  @ApiOkResponse({ type: PermissionTable })
  read(): PermissionTable {
    return permissionTable();
  }
}
