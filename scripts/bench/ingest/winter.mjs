/** Levels of the generated mast, m. */
export const HEIGHTS_M = [2, 10, 30, 60, 100];
const INTERVAL_S = 300;
const BEGIN_S = Date.UTC(2015, 10, 1) / 1000;

/** Generated temperature, °C: nights with an inversion, days without, with jitter that needs no randomness. */
const temperatureC = (t, heightM) => {
  const night = Math.cos((((t / 3600) % 24) / 24) * 2 * Math.PI);
  const jitter = Math.sin(t * 0.0137 * heightM) * 0.25;
  return Math.round((-4 + night * (Math.sqrt(heightM) * 0.5 - 3) + jitter) * 100) / 100;
};

/** A mast's readings as a CSV file, so many readings altogether, a line every five minutes. */
export function winterFile(readings) {
  const lines = [['time', ...HEIGHTS_M.map((heightM) => `t${heightM}`)].join(',')];
  for (let i = 1; i <= Math.ceil(readings / HEIGHTS_M.length); i += 1) {
    const t = BEGIN_S + i * INTERVAL_S;
    const cells = HEIGHTS_M.map((heightM) => temperatureC(t, heightM));
    lines.push(`${new Date(t * 1000).toISOString()},${cells.join(',')}`);
  }
  return lines.join('\n');
}

/** The same readings as rows of the reading table, for the yardstick. */
export function* winterRows(readings) {
  const lines = Math.ceil(readings / HEIGHTS_M.length);
  for (let i = 0; i < lines; i += 1) {
    const t = BEGIN_S + (i + 1) * INTERVAL_S;
    const rows = HEIGHTS_M.map(
      (heightM, level) => `${level + 1},${t},${temperatureC(t, heightM)},0,0,1,${i + 2}`,
    );
    yield `${rows.join('\n')}\n`;
  }
}
