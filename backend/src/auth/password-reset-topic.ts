import { OutboxTopic } from '../outbox/outbox-topic';

/** Somebody asked for a new password for this address, which may have no account. */
export const PASSWORD_RESET_REQUESTED = new OutboxTopic<{ email: string; silent: boolean }>(
  'password-reset-requested',
);
