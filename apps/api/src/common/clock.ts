/** What time it is. Injected everywhere, so that tests and the demo's history run under a clock that is set. */
export abstract class Clock {
  /** Now, in milliseconds since 1970-01-01 UTC. */
  abstract nowMs(): number;

  /** Now, in whole UTC epoch seconds. */
  now(): number {
    return Math.floor(this.nowMs() / 1000);
  }
}

/** The computer's clock. */
export class SystemClock extends Clock {
  override nowMs(): number {
    return Date.now();
  }
}

/** A clock that stands still until it is set. */
export class SetClock extends Clock {
  constructor(private epochS: number) {
    super();
  }

  override nowMs(): number {
    return this.epochS * 1000;
  }

  /** Sets the clock to an instant in UTC epoch seconds. */
  set(epochS: number): void {
    this.epochS = epochS;
  }

  /** Moves the clock on by some seconds. */
  advance(seconds: number): void {
    this.epochS += seconds;
  }
}
