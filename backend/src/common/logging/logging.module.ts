import { type DynamicModule, Module } from '@nestjs/common';
import type { Request } from 'express';
import { LoggerModule } from 'nestjs-pino';
import type { LevelWithSilent } from 'pino';
import { requestIdOf } from '../http/request-id';
import { loggedError } from './logged-error';

const SECRET_PATHS = [
  'req.headers.authorization',
  'req.headers.cookie',
  'res.headers["set-cookie"]',
  '*.password',
  '*.currentPassword',
  '*.newPassword',
  '*.token',
  '*.accessToken',
];

/** Structured logging: one line a request with its id; secrets and bodies never reach it. */
@Module({})
export class LoggingModule {
  static at(level: LevelWithSilent): DynamicModule {
    return {
      module: LoggingModule,
      imports: [
        LoggerModule.forRoot({
          pinoHttp: {
            level,
            genReqId: requestIdOf,
            redact: { paths: SECRET_PATHS, censor: '[redacted]' },
            autoLogging: { ignore: (request) => !(request.url ?? '').startsWith('/api/') },
            customLogLevel: (_request, response, error) =>
              error || response.statusCode >= 500 ? 'error' : response.statusCode >= 400 ? 'warn' : 'info',
            serializers: {
              err: loggedError,
              req: (request: Request) => ({ id: request.id, method: request.method, url: request.url }),
              res: (response: { statusCode: number }) => ({ statusCode: response.statusCode }),
            },
          },
        }),
      ],
    };
  }
}
