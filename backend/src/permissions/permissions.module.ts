import { Module } from '@nestjs/common';
import { APP_GUARD } from '@nestjs/core';
import { PermissionGuard } from './permission.guard';
import { PermissionsController } from './permissions.controller';

/** Imported after AuthModule: the guards run in the order of the modules, and this one needs to know who asks. */
@Module({
  controllers: [PermissionsController],
  providers: [{ provide: APP_GUARD, useClass: PermissionGuard }],
})
export class PermissionsModule {}
