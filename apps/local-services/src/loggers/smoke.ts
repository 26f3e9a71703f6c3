import { basinAir } from './basin-air';
import { instantOf, localTime } from './basin-time';
import { dayWeather, weatherNow } from './day-weather';
import { between, chance, ramp, smoothNoise } from './noise';
import { nightOf } from './night-inversion';
import type { Story } from './story';
import { warmWindAt } from './warm-wind';

/** Smoke of an ordinary clear night in Mill Flats above the day's base, µg/m³, by hour from noon to noon. */
const CLEAR_NIGHT = [
  1, 0, 0, 0, 2, 7, 17, 33, 50, 62, 60, 48, 38, 33, 29, 25, 22, 21, 23, 29, 32, 22, 11, 5, 1,
];

/** A warm wind thins smoke to a third in this time, s. */
const THINNING_S = 50 * 60;

/** Where each monitor stands: its share of Mill Flats' smoke. */
export const MONITORS: Readonly<Record<string, number>> = { 'mill-flats-pm25': 1, 'northgate-pm25': 0.65 };

/** What the fires of the night add at an instant, without wind. */
function fires(story: Story, t: number): number {
  const { day, hour } = localTime(t);
  const sinceNoon = hour + (day - nightOf(t)) * 24 - 12;
  const i = Math.floor(sinceNoon);
  const shape = between(CLEAR_NIGHT[i] ?? 0, CLEAR_NIGHT[i + 1] ?? 0, sinceNoon - i);
  return shape * dayWeather(story, nightOf(t)).fires * (1 + 0.15 * smoothNoise(story.seed, 80, t, 5000));
}

/** What the pool has gathered: from middle to middle of each day, nine in the evening. */
function gathered(story: Story, t: number): number {
  const { day, hour } = localTime(t);
  const begun = hour < 21 ? day - 1 : day;
  const warm = warmWindAt(story, day);
  if (warm !== undefined && hour < 21) {
    const held = dayWeather(story, day - 1).poolSmoke;
    return t < warm ? held : held * Math.exp(-(t - warm) / THINNING_S);
  }
  const share = (t - instantOf(begun, 21)) / 86_400;
  const next = dayWeather(story, begun + 1).poolSmoke;
  const ends = story.weather(begun + 1) === 'E';
  return between(dayWeather(story, begun).poolSmoke, ends ? dayWeather(story, begun).poolSmoke : next, share);
}

/**
 * PM2.5 in Mill Flats at an instant, µg/m³, before the monitor's own noise.
 *
 * Units: µg/m³. Valid: any instant. Source: the demo's own table of a clear night, a cold pool and a warm wind.
 */
function smokeNow(story: Story, t: number): number {
  const blown = ramp(basinAir(story, t).windMPerS, 2.6, 5.5);
  return weatherNow(story, t, 'smokeBase') + fires(story, t) * (1 - 0.85 * blown) + gathered(story, t);
}

/**
 * The hourly mean a monitor records for the hour that ends at an instant, negatives and all.
 *
 * Units: µg/m³. Valid: a full hour's end. Source: mean of six instants and noise of ±2.
 */
export function hourlySmoke(story: Story, share: number, tEnd: number): number {
  let sum = 0;
  for (let i = 0; i < 6; i += 1) sum += smokeNow(story, tEnd - 300 - 600 * i);
  const noise = [0, 1, 2].reduce(
    (total, i) => total + chance(story.seed, 90 + i, tEnd, share * 100) - 0.5,
    0,
  );
  return (sum / 6) * share + 1.8 * noise;
}
