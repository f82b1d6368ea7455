import { Injectable, type OnApplicationShutdown } from '@nestjs/common';
import { Sequelize } from 'sequelize-typescript';
import { DataDirectoryLock } from './data-directory-lock';
import { Readers } from './readers';

/** Closes in this order when the last request is answered: the lock goes only when nothing has the file open. */
@Injectable()
export class DatabaseShutdown implements OnApplicationShutdown {
  constructor(
    private readonly readers: Readers,
    private readonly sequelize: Sequelize,
    private readonly lock: DataDirectoryLock,
  ) {}

  async onApplicationShutdown(): Promise<void> {
    await this.readers.close();
    await this.sequelize.close();
    await this.lock.release();
  }
}
