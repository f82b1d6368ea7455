import { NestFactory } from '@nestjs/core';
import type { NestExpressApplication } from '@nestjs/platform-express';
import cookieParser from 'cookie-parser';
import { Logger } from 'nestjs-pino';
import { AppModule } from './app.module';
import { apiHeaders } from './common/http/api-headers';
import { compressAnswers } from './common/http/compress-answers';
import { giveRequestId } from './common/http/request-id';
import { securityHeaders } from './common/http/security-headers';
import { servePages } from './common/http/serve-pages';
import { ApplicationOptions } from './config/application-options';
import type { Environment } from './config/environment';

/** A duty with a sampled waveform is the largest JSON that anybody sends. */
const LARGEST_JSON = '1mb';

/**
 * Builds the whole application, ready to listen: what `main.ts` starts and what the tests call.
 *
 * @throws Error when the data directory is in use or its schema unknown
 */
export async function createApplication(
  environment: Environment,
  options: ApplicationOptions = new ApplicationOptions(),
): Promise<NestExpressApplication> {
  const application = await NestFactory.create<NestExpressApplication>(AppModule.with(environment, options), {
    bufferLogs: true,
    bodyParser: false,
    abortOnError: false,
  });
  application.useLogger(application.get(Logger));
  // From here on the log tells at once what a start is busy with; seeding takes seconds.
  application.flushLogs();
  application.disable('x-powered-by');
  application.disable('etag');
  // Only where a proxy speaks TLS for us is there one whose word on the client's address counts.
  application.set('trust proxy', environment.servedOverTls ? 1 : false);
  application.setGlobalPrefix('api');
  application.use(giveRequestId);
  application.use(securityHeaders(options.pagesDirectory, environment.servedOverTls));
  application.use('/api', apiHeaders, compressAnswers);
  servePages(application, options.pagesDirectory);
  application.useBodyParser('json', { limit: LARGEST_JSON, strict: true });
  application.use(cookieParser());
  return application;
}
