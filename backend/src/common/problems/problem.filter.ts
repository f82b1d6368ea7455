import { type ArgumentsHost, Catch, type ExceptionFilter } from '@nestjs/common';
import type { Request, Response } from 'express';
import { PinoLogger } from 'nestjs-pino';
import { requestIdOf } from '../http/request-id';
import { asProblem } from './as-problem';
import { ProblemDocument } from './problem-document';

/** The one exit for every failure. */
@Catch()
export class ProblemFilter implements ExceptionFilter {
  constructor(private readonly logger: PinoLogger) {}

  catch(error: unknown, host: ArgumentsHost): void {
    const request = host.switchToHttp().getRequest<Request>();
    const response = host.switchToHttp().getResponse<Response>();
    const problem = asProblem(error);
    if (problem.status >= 500) this.logger.error({ err: error }, 'unexpected failure');
    if (response.headersSent) {
      response.destroy();
      return;
    }
    if (problem.members.retryAfter !== undefined)
      response.setHeader('Retry-After', problem.members.retryAfter);
    if (problem.status === 401) response.setHeader('WWW-Authenticate', 'Bearer');
    response
      .status(problem.status)
      .setHeader('Content-Type', 'application/problem+json; charset=utf-8')
      .end(JSON.stringify(ProblemDocument.of(problem, requestIdOf(request))));
  }
}
