/** A kind of message in the outbox, with the shape of what it carries (plain data, no secrets). */
export class OutboxTopic<Payload extends object> {
  constructor(readonly name: string) {}

  write(payload: Payload): string {
    return JSON.stringify(payload);
  }

  /** The text must be what `write` of this topic made. */
  read(text: string): Payload {
    return JSON.parse(text) as Payload;
  }
}
