import { HEIGHTS_M, INTERVAL_S } from './districts.mjs';

const DAY_S = 86_400;
const DAYS = 14;
/** A fortnight, s. */
export const FORTNIGHT_S = DAYS * DAY_S;
const DAYS_A_PUSH = 2;

/** Every other night is calm and clear, with an inversion that grows till morning; the jitter is the sensors'. */
function temperatureC(t, heightM) {
  const hour = (t / 3600 - 7) % 24;
  const calm = Math.floor(t / DAY_S) % 2;
  const night = Math.max(0, Math.cos(((hour - 6) / 24) * 2 * Math.PI));
  const jitter = (((t * 7919 + heightM * 104_729) % 997) / 997 - 0.5) * 0.2;
  const inverted = calm * night * 1.3 * Math.log(heightM / 2);
  return -4 + 5 * Math.sin(((hour - 9) / 24) * 2 * Math.PI) - 0.0098 * heightM + inverted + jitter;
}

/** The fortnight that ends now, as CSV bodies to be pushed one after the other. */
export function* fortnight(nowMs) {
  const last = Math.floor(nowMs / 1000 / INTERVAL_S) * INTERVAL_S;
  const header = ['time', ...HEIGHTS_M.map((heightM) => `T ${heightM} m`)].join(',');
  for (let from = last - FORTNIGHT_S; from < last; from += DAYS_A_PUSH * DAY_S) {
    const lines = [header];
    for (let t = from + INTERVAL_S; t <= Math.min(last, from + DAYS_A_PUSH * DAY_S); t += INTERVAL_S) {
      const values = HEIGHTS_M.map((heightM) => temperatureC(t, heightM).toFixed(2));
      lines.push([new Date(t * 1000).toISOString(), ...values].join(','));
    }
    yield lines.join('\n');
  }
}
