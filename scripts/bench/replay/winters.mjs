const BLOCK_S = 900;
const DAYS_OF_A_WINTER = 120;

/** A small, well-known generator (mulberry32), so that figures can be compared between machines and days. */
const generator = (seed) => () => {
  seed = (seed + 0x6d2b79f5) | 0;
  let t = Math.imul(seed ^ (seed >>> 15), 1 | seed);
  t = (t + Math.imul(t ^ (t >>> 7), 61 | t)) ^ t;
  return ((t ^ (t >>> 14)) >>> 0) / 4294967296;
};

const rounded = (value) => Math.round(value * 100) / 100;
const known = (value) => [rounded(value), rounded(value)];
const SILENT = [null, null, 'the tower gave nothing'];

/** One block: an inversion by night on clear nights, smoke with it, and one block in fifty silent. */
function block(t, clear, random) {
  const night = Math.max(0, Math.cos(((t % 86_400) / 86_400 - 0.5) * 2 * Math.PI));
  const strength = clear * night * 6 + (random() - 0.5) * 0.6;
  const measures =
    random() < 0.02
      ? { inversionStrengthC: SILENT, strengthWithinTowerC: SILENT, inversionSure: SILENT }
      : {
          inversionStrengthC:
            strength > 3 ? [rounded(strength), null, 'it reaches the top'] : known(Math.max(0, strength)),
          strengthWithinTowerC: known(Math.max(0, strength)),
          inversionSure: known(strength > 0.5 ? 1 : 0),
        };
  return {
    tEnd: t,
    measures: {
      ...measures,
      pm25NowCast: known(8 + clear * night * 60 * random()),
      windSpeedMPerS: known((1 - clear) * 6 * random()),
    },
  };
}

/** Winters of 15-min blocks of one tower, from November to February, oldest first. */
export function* blocksOfWinters(winters, seed) {
  const random = generator(seed);
  for (let winter = 0; winter < winters; winter += 1) {
    const begin = Date.UTC(2015 + winter, 10, 1) / 1000;
    for (let day = 0; day < DAYS_OF_A_WINTER; day += 1) {
      const clear = random() < 0.4 ? 1 : random() * 0.4;
      for (let t = BLOCK_S; t <= 86_400; t += BLOCK_S) yield block(begin + day * 86_400 + t, clear, random);
    }
  }
}
