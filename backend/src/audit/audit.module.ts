import { Global, Module } from '@nestjs/common';
import { SequelizeModule } from '@nestjs/sequelize';
import { AuditReading } from './audit-reading';
import { AuditTrail } from './audit-trail';
import { AuditController } from './audit.controller';
import { AuditEntryModel } from './models/audit-entry.model';

@Global()
@Module({
  imports: [SequelizeModule.forFeature([AuditEntryModel])],
  controllers: [AuditController],
  providers: [AuditTrail, AuditReading],
  exports: [AuditTrail],
})
export class AuditModule {}
