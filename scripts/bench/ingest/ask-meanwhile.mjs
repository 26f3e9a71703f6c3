const ASK_EVERY_MS = 40;
const pause = (ms) => new Promise((resolve) => setTimeout(resolve, ms));

/** Asks for the list of towers every so often, as a screen would; the answer stops it and gives the p95, ms. */
export function askMeanwhile(client) {
  const times = [];
  let going = true;
  const asking = (async () => {
    while (going) {
      const begun = performance.now();
      await client.get('/api/towers');
      times.push(performance.now() - begun);
      await pause(ASK_EVERY_MS);
    }
  })();
  return async () => {
    going = false;
    await asking;
    return times.sort((a, b) => a - b)[Math.floor(times.length * 0.95)];
  };
}
