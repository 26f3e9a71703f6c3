/** Who goes first at the gate: people who wait for an answer, then bulk loads. */
export type Lane = 'people' | 'bulk';

/** Gives the gate back; calling it twice does nothing. */
export type Release = () => void;

/** How the gate tells that somebody held it for long. */
export type LongHold = (heldMs: number, lane: Lane) => void;

const longHoldMs = 1000;

/**
 * Lets one writer in at a time, first come first served within a lane, the people lane before the bulk lane.
 * The waiting is done in JavaScript, so that no thread is blocked by a lock.
 */
export class Gate {
  private readonly waiting: Record<Lane, ((release: Release) => void)[]> = { people: [], bulk: [] };
  private held = false;
  private closed = false;

  constructor(
    private readonly onLongHold: LongHold = () => undefined,
    private readonly nowMs: () => number = () => performance.now(),
  ) {}

  /** Waits for its turn and resolves with the way to give the gate back. Rejects once the gate is closed. */
  enter(lane: Lane): Promise<Release> {
    if (this.closed) return Promise.reject(new Error('The database is closing; no further write is taken.'));
    if (!this.held) return Promise.resolve(this.admit(lane));
    return new Promise((resolve) => this.waiting[lane].push(resolve));
  }

  /** Takes no newcomer any more and resolves when everybody who waited has been through. */
  async close(): Promise<void> {
    const last = this.enter('bulk');
    this.closed = true;
    (await last)();
  }

  private admit(lane: Lane): Release {
    this.held = true;
    const since = this.nowMs();
    let given = false;
    return () => {
      if (given) return;
      given = true;
      const heldMs = this.nowMs() - since;
      if (heldMs > longHoldMs) this.onLongHold(heldMs, lane);
      this.next();
    };
  }

  private next(): void {
    this.held = false;
    const lane: Lane = this.waiting.people.length > 0 ? 'people' : 'bulk';
    const resolve = this.waiting[lane].shift();
    if (resolve) resolve(this.admit(lane));
  }
}
