import { Global, Module, type OnModuleInit } from '@nestjs/common';
import { SequelizeModule } from '@nestjs/sequelize';
import { Sequelize } from 'sequelize-typescript';
import { Environment } from '../config/environment';
import { DataDirectoryLock } from './data-directory-lock';
import { DataDirectoryModule } from './data-directory.module';
import { DatabaseShutdown } from './database-shutdown';
import { migrate } from './migrate';
import { migrations } from './migrations';
import { Readers } from './readers';
import { requireTransactions } from './transaction-required';
import { Writer } from './writer';
import { writerOptions } from './writer-options';

@Global()
@Module({
  imports: [
    DataDirectoryModule,
    SequelizeModule.forRootAsync({
      imports: [DataDirectoryModule],
      // The lock stands here so that the directory is taken before the schema is touched.
      inject: [Environment, DataDirectoryLock],
      useFactory: async (environment: Environment) => {
        await migrate(environment.databaseFile, migrations);
        return writerOptions(environment.databaseFile);
      },
    }),
  ],
  providers: [Writer, Readers, DatabaseShutdown],
  exports: [Writer, Readers],
})
export class DatabaseModule implements OnModuleInit {
  constructor(private readonly sequelize: Sequelize) {}

  onModuleInit(): void {
    requireTransactions(this.sequelize);
  }
}
