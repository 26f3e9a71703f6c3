import { StartFault } from '../common/start-fault';

/** A long catch-up of all loggers takes some seconds; beyond this something is wrong, ms. */
const PATIENCE_MS = 120_000;

/** Tells the local services' loggers and stand-ins what to do. */
export class LoggerClient {
  /** @param url the local services' page, LOCAL_SERVICES_URL */
  constructor(private readonly url: string) {}

  /** Begins the loggers' story around a first start; all instants are UTC epoch seconds. */
  async begin(now: number): Promise<void> {
    await this.order('loggers/begin', { now, anew: true });
  }

  /** Has every row written that is due up to an instant. */
  async write(until: number): Promise<void> {
    await this.order('loggers/write', { until });
  }

  /** Passes over the time up to an instant. */
  async skip(until: number): Promise<void> {
    await this.order('loggers/skip', { until });
  }

  /** Lets the loggers write by themselves from now on. */
  async live(): Promise<void> {
    await this.order('loggers/live', { on: true });
  }

  /** How long the text service waits between two signed call-backs, ms. */
  async statusDelay(statusDelayMs: number): Promise<void> {
    await this.order('sms', { statusDelayMs });
  }

  /** Addresses at which the mail server refuses mail, as mailboxes that are no more do. */
  async bouncing(addresses: readonly string[]): Promise<void> {
    await this.order('mail', { recipients: Object.fromEntries(addresses.map((address) => [address, 550])) });
  }

  private async order(what: string, body: object): Promise<void> {
    let response: Response;
    try {
      response = await fetch(`${this.url}/control/${what}`, {
        method: 'POST',
        headers: { 'content-type': 'application/json' },
        body: JSON.stringify(body),
        signal: AbortSignal.timeout(PATIENCE_MS),
      });
    } catch (error) {
      throw new StartFault(
        `The demo needs the local services, and nothing answers at ${this.url} (${(error as Error).message}): start with npm start, or set DEMO=off.`,
      );
    }
    if (!response.ok) throw new Error(`The local services refused ${what}: ${await response.text()}`);
  }
}
