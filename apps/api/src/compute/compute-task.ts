/**
 * A function that may run in the compute thread. It is found there again by its file and name, so it must be exported
 * from that file under that name, take one value and give one, both of plain data.
 */
export interface ComputeTask<Given, Result> {
  readonly file: string;
  readonly name: string;
  readonly work: (given: Given) => Result;
}

/** Describes an exported function of a file (`__filename`) as a task. */
export function computeTask<Given, Result>(
  file: string,
  work: (given: Given) => Result,
): ComputeTask<Given, Result> {
  return { file, name: work.name, work };
}

/** What the thread is handed for one run. */
export interface ThreadCall {
  readonly file: string;
  readonly name: string;
  readonly given: unknown;
}
