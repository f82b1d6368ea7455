import { Injectable } from '@nestjs/common';
import { Cron } from '@nestjs/schedule';
import { PinoLogger } from 'nestjs-pino';
import { SYSTEM } from '../audit/actor';
import { BackupsService } from './backups.service';

/** Takes a backup each night and lets the oldest go. */
@Injectable()
export class NightlyBackup {
  constructor(
    private readonly backups: BackupsService,
    private readonly logger: PinoLogger,
  ) {}

  @Cron('0 30 2 * * *', { name: 'nightly-backup' })
  async run(): Promise<void> {
    try {
      await this.backups.take(SYSTEM, 'nightly');
      await this.backups.removeOld(SYSTEM);
    } catch (error) {
      this.logger.error({ err: error }, 'the nightly backup failed');
    }
  }
}
