import { Clock } from '../../src/common/clock';

/** A clock that a test sets forward; otherwise it goes with the real one. */
export class MovableClock extends Clock {
  private aheadMilliseconds = 0;

  override now(): Date {
    return new Date(Date.now() + this.aheadMilliseconds);
  }

  forward(seconds: number): void {
    this.aheadMilliseconds += seconds * 1000;
  }
}
