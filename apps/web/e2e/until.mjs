/**
 * Asks again and again until the answer is one to go on with, and gives it back; throws after the time limit. An ask
 * that throws counts as "not yet".
 *
 * @template T
 * @param {string} what for the message
 * @param {() => T | Promise<T>} ask
 * @param {number} withinMs
 */
export async function until(what, ask, withinMs = 20_000) {
  const end = Date.now() + withinMs;
  for (let last; ;) {
    try {
      const answer = await ask();
      if (answer) return answer;
    } catch (error) {
      last = error;
    }
    if (Date.now() > end)
      throw new Error(`Not within ${withinMs} ms: ${what}${last ? ` (${last.message})` : ''}`);
    await new Promise((resolve) => setTimeout(resolve, 150));
  }
}
