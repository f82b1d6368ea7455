import { Module } from '@nestjs/common';
import { Environment } from '../config/environment';
import { refuseInterruptedRestore } from './interrupted-restore';
import { DataDirectoryLock } from './data-directory-lock';

/** Takes the data directory for this process before anything in it is opened. */
@Module({
  providers: [
    {
      provide: DataDirectoryLock,
      inject: [Environment],
      useFactory: async (environment: Environment) => {
        const lock = await DataDirectoryLock.take(environment.dataDirectory);
        refuseInterruptedRestore(environment);
        return lock;
      },
    },
  ],
  exports: [DataDirectoryLock],
})
export class DataDirectoryModule {}
