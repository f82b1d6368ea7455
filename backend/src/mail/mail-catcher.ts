import type { AddressInfo } from 'node:net';
import { Injectable, type OnModuleDestroy, type OnModuleInit } from '@nestjs/common';
import { PinoLogger } from 'nestjs-pino';
import type { SMTPServer } from 'smtp-server';
import { Environment } from '../config/environment';
import { closeMailServer, listenForMail } from './listen-for-mail';
import { MailBox } from './mail-box';

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
    this.server = await listenForMail(this.box, 0, '127.0.0.1', (error) =>
      this.logger.error({ err: error }, 'the local mail catcher failed'),
    );
  }

  async onModuleDestroy(): Promise<void> {
    if (this.server) await closeMailServer(this.server);
  }
}

function isTcp(address: AddressInfo | string | null | undefined): address is AddressInfo {
  return typeof address === 'object' && address !== null;
}
