import { OutboxTopic } from '../outbox/outbox-topic';

/** Somebody has been invited and is to get the letter. */
export const INVITED = new OutboxTopic<{ invitationId: string }>('invited');
