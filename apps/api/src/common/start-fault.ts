/**
 * Why the service cannot start, as one sentence that names the cure. The entry point prints it without a stack and
 * ends with exit code 1.
 */
export class StartFault extends Error {
  override readonly name = 'StartFault';
}
