import type { AddressInfo } from 'node:net';
import { buffer } from 'node:stream/consumers';
import { Injectable, type OnModuleDestroy, type OnModuleInit } from '@nestjs/common';
import { PinoLogger } from 'nestjs-pino';
import { SMTPServer } from 'smtp-server';
import { Environment } from '../config/environment';
import { MailBox } from './mail-box';

const LARGEST_LETTER_BYTES = 1_000_000;

/** A mail server of our own for where none is configured: takes letters on the loopback and keeps them as files. */
@Injectable()
export class MailCatcher implements OnModuleInit, OnModuleDestroy {
  private server: SMTPServer | undefined;

  constructor(
    private readonly environment: Environment,
    private readonly box: MailBox,
    private readonly logger: PinoLogger,
  ) {}

  /** True where no mail server is configured and letters stay here. */
  get inUse(): boolean {
    return this.environment.mailUrl === undefined;
  }

  /** The port that it listens on. @throws Error when it does not */
  get port(): number {
    const address = this.server?.server.address();
    if (!isTcp(address)) throw new Error('The local mail catcher is not running.');
    return address.port;
  }

  async onModuleInit(): Promise<void> {
    if (!this.inUse) return;
    const server = new SMTPServer({
      disabledCommands: ['STARTTLS', 'AUTH'],
      authOptional: true,
      size: LARGEST_LETTER_BYTES,
      onData: (stream, _session, done) => {
        buffer(stream)
          .then((source) => this.box.keep(source))
          .then(
            () => done(),
            (error: unknown) => done(error instanceof Error ? error : new Error(String(error))),
          );
      },
    });
    server.on('error', (error) => this.logger.error({ err: error }, 'the local mail catcher failed'));
    await new Promise<void>((resolve) => server.listen(0, '127.0.0.1', resolve));
    this.server = server;
  }

  async onModuleDestroy(): Promise<void> {
    const { server } = this;
    if (server) await new Promise<void>((resolve) => server.close(resolve));
  }
}

function isTcp(address: AddressInfo | string | null | undefined): address is AddressInfo {
  return typeof address === 'object' && address !== null;
}
