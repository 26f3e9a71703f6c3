/**
 * Messages in hand, fetched a batch at a time by many takers; the next batch is on its way before the last one is
 * used up, so that nobody waits for the store.
 */
export class Supply<T> {
  private waiting: T[] = [];
  private filling: Promise<void> | undefined;
  private dry = false;

  /**
   * @param fetch gives the next batch; an empty one means that there is no more
   * @param reserve the next batch is fetched when no more than this many are in hand
   */
  constructor(
    private readonly fetch: () => Promise<T[]>,
    private readonly reserve: number,
  ) {}

  /** The next one, or undefined when there is no more. Rejects when a batch could not be fetched. */
  async next(): Promise<T | undefined> {
    if (!this.dry && this.waiting.length <= this.reserve) this.filling ??= this.fill();
    while (this.waiting.length === 0 && this.filling) await this.filling;
    return this.waiting.shift();
  }

  /** Fetches no more, and hands over what nobody has taken. */
  async close(): Promise<T[]> {
    this.dry = true;
    await this.filling?.catch(() => undefined);
    const rest = this.waiting;
    this.waiting = [];
    return rest;
  }

  private async fill(): Promise<void> {
    try {
      const batch = await this.fetch();
      this.waiting.push(...batch);
      this.dry ||= batch.length === 0;
    } catch (error) {
      this.dry = true;
      throw error;
    } finally {
      this.filling = undefined;
    }
  }
}
