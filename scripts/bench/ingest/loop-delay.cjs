const { writeFileSync } = require('node:fs');
const { monitorEventLoopDelay } = require('node:perf_hooks');
const { isMainThread } = require('node:worker_threads');

const RESOLUTION_MS = 5;
const EVERY_MS = 500;
const WARM_UP_MS = 4_000;

/** Preloaded into the service: keeps how long its event loop was held beyond its turn, ms, since it had started. */
if (isMainThread && process.env.LOOP_DELAY_FILE) {
  const delays = monitorEventLoopDelay({ resolution: RESOLUTION_MS });
  delays.enable();
  setTimeout(() => delays.reset(), WARM_UP_MS).unref();
  setInterval(() => {
    const [p99Ms, maxMs] = [delays.percentile(99), delays.max].map((ns) => ns / 1e6 - RESOLUTION_MS);
    writeFileSync(process.env.LOOP_DELAY_FILE, JSON.stringify({ p99Ms, maxMs }));
  }, EVERY_MS).unref();
}
