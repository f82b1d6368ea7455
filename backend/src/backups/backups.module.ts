import { Module } from '@nestjs/common';
import { BackupsController } from './backups.controller';
import { BackupsService } from './backups.service';
import { NightlyBackup } from './nightly-backup';

@Module({
  controllers: [BackupsController],
  providers: [BackupsService, NightlyBackup],
})
export class BackupsModule {}
