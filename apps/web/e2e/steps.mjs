/**
 * Counts named steps; after one that failed the rest, which build on it, are counted as failed too.
 *
 * @param {() => Promise<void>} onFailure called at the first failure, while everything still stands
 */
export function stepCounter(onFailure) {
  const counts = { passed: 0, failed: 0 };
  const step = async (name, work) => {
    if (counts.failed > 0) {
      counts.failed += 1;
      console.log(`not reached  ${name}`);
      return;
    }
    const begun = Date.now();
    try {
      await work();
      counts.passed += 1;
      console.log(`ok  ${name} (${Date.now() - begun} ms)`);
    } catch (error) {
      counts.failed += 1;
      console.error(`FAILED  ${name}\n${error.stack}`);
      await onFailure();
    }
  };
  return { counts, step };
}

/** Throws unless it is so. */
export function sure(isSo, what) {
  if (!isSo) throw new Error(`Not so: ${what}`);
}
