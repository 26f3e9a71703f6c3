/** Something the person at the keyboard can put right: printed as one sentence, without a stack. */
export class Fault extends Error {}

/** Runs a script's main function; a Fault becomes one line and exit code 1. */
export async function runMain(main) {
  try {
    await main();
  } catch (error) {
    console.error(error instanceof Fault ? error.message : error);
    process.exit(1);
  }
}
