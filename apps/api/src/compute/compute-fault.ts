/** The compute thread ended in the middle of its work. Nothing is lost: what waits stays marked. */
export class ComputeFault extends Error {
  constructor(task: string, cause: unknown) {
    const why = cause instanceof Error ? cause.message : String(cause);
    super(
      `The compute thread ended while it worked on "${task}" (${why}). What waits stays marked and is worked out ` +
        `again; import a file that broke off again.`,
      { cause },
    );
    this.name = 'ComputeFault';
  }
}
