import { OutboxTopic } from '../outbox/outbox-topic';

/** A plain-text mail to one person. */
export interface Letter {
  to: string;
  subject: string;
  text: string;
}

/** Add a letter to the outbox under this topic and it leaves after the commit. For letters without secrets. */
export const MAIL = new OutboxTopic<Letter>('mail');
