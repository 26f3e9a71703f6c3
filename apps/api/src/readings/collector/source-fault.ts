/** Why a source could not be collected; the message says what to look at. */
export class SourceFault extends Error {
  /** Where the other end asked for a pause, its length, s. */
  readonly retryAfterS: number | undefined;
  /** Whether the place is only not there yet. */
  readonly notThereYet: boolean;

  constructor(
    message: string,
    { retryAfterS, notThereYet = false }: { retryAfterS?: number; notThereYet?: boolean } = {},
  ) {
    super(message);
    this.name = 'SourceFault';
    this.retryAfterS = retryAfterS;
    this.notThereYet = notThereYet;
  }
}
