import { mkdtempSync, rmSync } from 'node:fs';
import type { AddressInfo, Server } from 'node:net';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import type { NestExpressApplication } from '@nestjs/platform-express';
import { ApplicationOptions } from '../../src/config/application-options';
import { readEnvironment, type Seed } from '../../src/config/environment';
import { createApplication } from '../../src/create-application';
import { OutboxDispatcher } from '../../src/outbox/outbox-dispatcher';
import { MovableClock } from './movable-clock';
import { PeopleBuilder } from './people-builder';

/** bcrypt's lowest work factor: the tests sign in often. */
const LOWEST_COST = 4;

export interface StartOptions {
  seed?: Seed;
  /** Starts on an existing data directory, which is then left in place. */
  dataDirectory?: string;
  environment?: Record<string, string>;
  options?: Partial<ApplicationOptions>;
}

/** The whole application on a data directory of its own, listening on a free port of 127.0.0.1. */
export class StartedApplication {
  readonly people: PeopleBuilder;
  private closing: Promise<void> | undefined;

  constructor(
    readonly nest: NestExpressApplication,
    readonly dataDirectory: string,
    readonly clock: MovableClock,
    private readonly keepsDirectory: boolean,
  ) {
    this.people = new PeopleBuilder(this.server, nest);
  }

  /** What supertest takes: `request(application.server)`. */
  get server(): Server {
    return this.nest.getHttpServer();
  }

  get url(): string {
    const { port } = this.server.address() as AddressInfo;
    return `http://127.0.0.1:${port}`;
  }

  /** Resolves when everything in the outbox that is due has been delivered. */
  async delivered(): Promise<void> {
    await this.nest.get(OutboxDispatcher).drain();
  }

  /** Stops the application and leaves its data in place. Doing it twice does no harm. */
  async close(): Promise<void> {
    this.closing ??= this.nest.close();
    await this.closing;
  }

  /** Stops the application; the data directory goes, unless it was given. */
  async stop(): Promise<void> {
    await this.close();
    if (!this.keepsDirectory) rmSync(this.dataDirectory, { recursive: true, force: true });
  }
}

export async function startApplication(start: StartOptions = {}): Promise<StartedApplication> {
  const dataDirectory = start.dataDirectory ?? mkdtempSync(join(tmpdir(), 'resistry-test-'));
  const clock = new MovableClock();
  const environment = readEnvironment({
    PORT: '0',
    HOST: '127.0.0.1',
    DATA_DIR: dataDirectory,
    SEED: start.seed ?? 'none',
    ...start.environment,
  });
  const options = new ApplicationOptions({
    passwordHashCost: LOWEST_COST,
    logLevel: 'silent',
    pagesDirectory: join(dataDirectory, 'no-pages'),
    clock,
    ...start.options,
  });
  const nest = await createApplication(environment, options);
  await nest.listen(0, '127.0.0.1');
  return new StartedApplication(nest, dataDirectory, clock, start.dataDirectory !== undefined);
}
