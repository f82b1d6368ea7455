import type { SequelizeModuleOptions } from '@nestjs/sequelize';
import { dialectModule } from './dialect-module';
import { WRITER_PRAGMAS } from './pragmas';

/** The writer's connection: models register by themselves, the schema is the migrations' business alone. */
export function writerOptions(file: string): SequelizeModuleOptions {
  return {
    dialect: 'sqlite',
    storage: file,
    dialectModule: dialectModule(WRITER_PRAGMAS),
    logging: false,
    define: { timestamps: false, freezeTableName: true, underscored: true },
    autoLoadModels: true,
    synchronize: false,
    retryAttempts: 0,
    // DatabaseShutdown closes it, in its turn.
    autoCloseConnection: false,
  };
}
