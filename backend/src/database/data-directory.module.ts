import { Module } from '@nestjs/common';
import { Environment } from '../config/environment';
import { DataDirectoryLock } from './data-directory-lock';

/** Takes the data directory for this process before anything in it is opened. */
@Module({
  providers: [
    {
      provide: DataDirectoryLock,
      inject: [Environment],
      useFactory: (environment: Environment) => DataDirectoryLock.take(environment.dataDirectory),
    },
  ],
  exports: [DataDirectoryLock],
})
export class DataDirectoryModule {}
