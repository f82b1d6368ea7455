import { Global, Module } from '@nestjs/common';
import { SequelizeModule } from '@nestjs/sequelize';
import { AuditTrail } from './audit-trail';
import { AuditEntryModel } from './models/audit-entry.model';

@Global()
@Module({
  imports: [SequelizeModule.forFeature([AuditEntryModel])],
  providers: [AuditTrail],
  exports: [AuditTrail],
})
export class AuditModule {}
