import { Controller, Get, Module } from '@nestjs/common';
import { Test } from '@nestjs/testing';
import { APP_FILTER, APP_GUARD } from '@nestjs/core';
import type { NestExpressApplication } from '@nestjs/platform-express';
import { LoggerModule } from 'nestjs-pino';
import request from 'supertest';
import { ProblemFilter } from '../src/common/problems/problem.filter';
import { May } from '../src/permissions/may.decorator';
import { PermissionGuard } from '../src/permissions/permission.guard';
import { Public } from '../src/permissions/public.decorator';

@Controller('forgotten')
class ForgottenController {
  @Get('naked')
  naked(): string {
    return 'open';
  }

  @Get('both')
  @Public()
  @May('read', 'Part')
  both(): string {
    return 'open';
  }

  @Get('public')
  @Public()
  public(): string {
    return 'open';
  }
}

@Module({
  imports: [LoggerModule.forRoot({ pinoHttp: { level: 'silent' } })],
  controllers: [ForgottenController],
  providers: [
    { provide: APP_GUARD, useClass: PermissionGuard },
    { provide: APP_FILTER, useClass: ProblemFilter },
  ],
})
class ForgottenModule {}

describe('a route without a rule', () => {
  let application: NestExpressApplication;
  beforeAll(async () => {
    const module = await Test.createTestingModule({ imports: [ForgottenModule] }).compile();
    application = module.createNestApplication<NestExpressApplication>();
    await application.init();
  });
  afterAll(() => application.close());

  it.each(['naked', 'both'])('is closed, and so is one with two (%s)', async (path) => {
    const answer = await request(application.getHttpServer()).get(`/forgotten/${path}`).expect(403);
    expect(answer.body).toMatchObject({ rule: `closed ForgottenController.${path}` });
  });

  it('is not the same as a public one', async () => {
    await request(application.getHttpServer()).get('/forgotten/public').expect(200, 'open');
  });
});
