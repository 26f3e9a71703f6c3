/** Something that is done every so often. */
export interface Job {
  name: string;
  everySeconds: number;
  /** Does it once; what it returns is kept as the last result. */
  run: () => Promise<string | void>;
}
