import { Injectable } from '@nestjs/common';
import { PinoLogger } from 'nestjs-pino';

export type StandingListener = (partIds: readonly number[]) => Promise<void>;

/**
 * Tells whoever keeps a copy of the parts' standing (approval, supply, price, second source) which parts have changed.
 * Announced after the commit and before the answer, so that whoever made the change sees it at once.
 */
@Injectable()
export class StandingChanges {
  private readonly listeners: StandingListener[] = [];

  constructor(private readonly logger: PinoLogger) {}

  subscribe(listener: StandingListener): void {
    this.listeners.push(listener);
  }

  /** Resolves when every listener has taken the news. The change is committed: a listener that fails does not undo it. */
  async announce(partIds: readonly number[]): Promise<void> {
    if (partIds.length === 0) return;
    const outcomes = await Promise.allSettled(this.listeners.map((listener) => listener(partIds)));
    for (const outcome of outcomes) {
      if (outcome.status === 'rejected') {
        this.logger.error(
          { err: outcome.reason as unknown, partIds },
          'a change of standing was not taken up',
        );
      }
    }
  }
}
