import { Injectable } from '@nestjs/common';
import type { OutboxTopic } from './outbox-topic';

/**
 * Handles one message. It may be called twice for the same one (a kill between the work and its mark), so doing it
 * again must do no harm. To fail is to throw.
 */
export type OutboxHandler<Payload extends object> = (payload: Payload, messageId: string) => Promise<void>;

/** Who handles which topic; features register when they start. */
@Injectable()
export class OutboxHandlers {
  private readonly handlers = new Map<string, (payload: string, messageId: string) => Promise<void>>();

  register<Payload extends object>(topic: OutboxTopic<Payload>, handler: OutboxHandler<Payload>): void {
    if (this.handlers.has(topic.name)) throw new Error(`The outbox topic ${topic.name} has two handlers.`);
    this.handlers.set(topic.name, (payload, messageId) => handler(topic.read(payload), messageId));
  }

  /** @throws Error when no feature handles the topic, or the handler fails */
  async handle(message: { id: string; kind: string; payload: string }): Promise<void> {
    const handler = this.handlers.get(message.kind);
    if (!handler) throw new Error(`Nothing handles the topic ${message.kind}.`);
    await handler(message.payload, message.id);
  }
}
