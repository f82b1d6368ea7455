import { type DynamicModule, Module } from '@nestjs/common';
import { Clock } from '../common/clock';
import { ApplicationOptions } from './application-options';
import { Environment } from './environment';
import { Secrets } from './secrets';

@Module({})
export class ConfigModule {
  static with(environment: Environment, options: ApplicationOptions): DynamicModule {
    return {
      module: ConfigModule,
      global: true,
      providers: [
        { provide: Environment, useValue: environment },
        { provide: ApplicationOptions, useValue: options },
        { provide: Clock, useValue: options.clock },
        { provide: Secrets, useFactory: () => Secrets.openIn(environment.folder('secrets')) },
      ],
      exports: [Environment, ApplicationOptions, Clock, Secrets],
    };
  }
}
