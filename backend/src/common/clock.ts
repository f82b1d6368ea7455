/** The time of day, replaceable in tests. */
export class Clock {
  now(): Date {
    return new Date();
  }

  /** The present as ISO 8601 text in UTC, as the database keeps it. */
  timestamp(): string {
    return this.now().toISOString();
  }

  /** Today as ISO 8601 text, in UTC. */
  today(): string {
    return this.timestamp().slice(0, 10);
  }

  /** The moment that many seconds from now (negative: ago), as ISO 8601 text in UTC. */
  timestampIn(seconds: number): string {
    return new Date(this.now().getTime() + seconds * 1000).toISOString();
  }
}
