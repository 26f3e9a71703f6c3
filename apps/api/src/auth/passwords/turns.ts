/** Lets a few at a time through; the others wait, first come first served, and beyond a limit are refused. */
export class Turns {
  private readonly waiting: (() => void)[] = [];
  private inside = 0;

  constructor(
    private readonly atOnce: number,
    private readonly mostWaiting: number,
  ) {}

  /** Whether no more can wait. */
  get full(): boolean {
    return this.waiting.length >= this.mostWaiting;
  }

  /** Runs work when its turn comes. */
  async take<T>(work: () => Promise<T>): Promise<T> {
    if (this.inside < this.atOnce) this.inside++;
    else await new Promise<void>((resolve) => this.waiting.push(resolve));
    try {
      return await work();
    } finally {
      const next = this.waiting.shift();
      if (next) next();
      else this.inside--;
    }
  }
}
