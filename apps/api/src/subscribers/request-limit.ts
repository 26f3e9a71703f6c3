import { Injectable } from '@nestjs/common';
import { Clock } from '../common/clock';
import { Problem } from '../common/problem';

const WINDOW_S = 600;
const MOST_IN_WINDOW = 12;
const MOST_REMEMBERED = 10_000;

/**
 * How many subscription requests one client may make in ten minutes. Kept in memory: after a restart everybody begins
 * anew, which costs nothing, for each address has a limit of its own that is kept in the store.
 */
@Injectable()
export class RequestLimit {
  private readonly requests = new Map<string, number[]>();

  constructor(private readonly clock: Clock) {}

  /** Counts a request; 429 when the client has made too many. */
  count(client: string): void {
    const now = this.clock.now();
    const recent = (this.requests.get(client) ?? []).filter((at) => at > now - WINDOW_S);
    if (recent.length >= MOST_IN_WINDOW)
      throw new Problem('too-many-attempts', 'That were many requests at once. Try again in ten minutes.');
    this.requests.delete(client);
    this.requests.set(client, [...recent, now]);
    const oldest = this.requests.keys().next().value;
    if (this.requests.size > MOST_REMEMBERED && oldest !== undefined) this.requests.delete(oldest);
  }
}
