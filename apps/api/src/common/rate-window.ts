/** What a client may still use. */
export interface Quota {
  readonly left: number;
  /** Until all of it may be used again, s. */
  readonly resetS: number;
}

/** So many clients are remembered; beyond them the one that used something longest ago is forgotten. */
const MOST_REMEMBERED = 10_000;

/**
 * Counts what each client uses within a window of time that begins with its first use. Kept in memory under the given
 * time: after a restart everybody begins anew. (Packages for this go by the computer's clock, not by ours.)
 */
export class RateWindow {
  private readonly used = new Map<string, { readonly sinceS: number; readonly amount: number }>();

  constructor(
    /** How much each client may use within the window. */
    readonly most: number,
    /** Length of the window, s. */
    readonly windowS: number,
  ) {}

  /** What a client may still use. */
  quota(client: string, nowS: number): Quota {
    const known = this.used.get(client);
    const resetS = known ? known.sinceS + this.windowS - nowS : 0;
    if (!known || resetS <= 0) return { left: this.most, resetS: this.windowS };
    return { left: Math.max(0, this.most - known.amount), resetS };
  }

  /** Counts what a client used. */
  use(client: string, nowS: number, amount = 1): void {
    const known = this.used.get(client);
    const goesOn = known !== undefined && nowS < known.sinceS + this.windowS;
    this.used.delete(client);
    this.used.set(client, goesOn ? { ...known, amount: known.amount + amount } : { sinceS: nowS, amount });
    const oldest = this.used.keys().next();
    if (this.used.size > MOST_REMEMBERED && !oldest.done) this.used.delete(oldest.value);
  }
}
