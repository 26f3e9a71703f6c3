/**
 * Figure `analysis`: profiles of five levels analysed a second on one core (layers, textbook classes, surface
 * inversion, heat deficit), beside a bare loop that computes the same four lapse rates from the same typed arrays.
 */
import { createRequire } from 'node:module';
import { performance } from 'node:perf_hooks';

const require = createRequire(import.meta.url);

const HEIGHTS_M = [2, 10, 30, 60, 100];
const PROFILES = { small: 200_000, full: 1_000_000 };
const ROUNDS = { small: 9, full: 15 };
/** Seed of the generator: every run sees the same air. */
const SEED = 20261201;

/** A small, well-known generator (mulberry32), so that figures can be compared between machines and days. */
const generator = (seed) => () => {
  seed = (seed + 0x6d2b79f5) | 0;
  let t = Math.imul(seed ^ (seed >>> 15), 1 | seed);
  t = (t + Math.imul(t ^ (t >>> 7), 61 | t)) ^ t;
  return ((t ^ (t >>> 14)) >>> 0) / 4294967296;
};

/** Winter air: nights with an inversion, days that are mixed, and one level in two hundred missing. */
const winterAir = (profiles) => {
  const random = generator(SEED);
  const levels = HEIGHTS_M.length;
  const temperatureC = new Float64Array(profiles * levels);
  const pressureHPa = new Float64Array(profiles);
  for (let i = 0; i < profiles; i += 1) {
    const gradientPerM = (random() - 0.45) * 0.15;
    const groundC = -25 + 30 * random();
    for (let j = 0; j < levels; j += 1) {
      const rise = gradientPerM * HEIGHTS_M[j] * Math.exp(-HEIGHTS_M[j] / 80);
      temperatureC[i * levels + j] = random() < 0.005 ? NaN : groundC + rise + 0.1 * (random() - 0.5);
    }
    pressureHPa[i] = 880 + 40 * random();
  }
  return { temperatureC, pressureHPa };
};

const bareLoop = (temperatureC, lapseRateKPerKm) => {
  const levels = HEIGHTS_M.length;
  const perMetre = HEIGHTS_M.slice(1).map((h, j) => -1000 / (h - HEIGHTS_M[j]));
  for (let i = 0, at = 0; at < lapseRateKPerKm.length; i += levels) {
    for (let j = 0; j < levels - 1; j += 1, at += 1) {
      lapseRateKPerKm[at] = (temperatureC[i + j + 1] - temperatureC[i + j]) * perMetre[j];
    }
  }
};

const seconds = (work) => {
  const start = performance.now();
  work();
  return (performance.now() - start) / 1000;
};

const spread = (values) => {
  const sorted = [...values].sort((a, b) => a - b);
  return { median: sorted[sorted.length >> 1], low: sorted[0], high: sorted.at(-1) };
};

/**
 * Runs both in turn (A B A B …) and gives medians with their spread.
 *
 * @param {{ size?: 'small' | 'full' }} [options]
 * @returns {Promise<Record<string, { median: number, low: number, high: number }>>} the figures by name
 */
export async function run({ size = 'small' } = {}) {
  const { analyseBatch, batchResult } = require('@lidwatch/atmosphere');
  const profiles = PROFILES[size] ?? PROFILES.small;
  const { temperatureC, pressureHPa } = winterAir(profiles);
  const batch = {
    heightsM: HEIGHTS_M,
    temperatureC,
    pressureHPa,
    assumedPressureHPa: 900,
    isothermalHalfWidthKPerKm: 1,
  };
  const result = batchResult(profiles, HEIGHTS_M.length);
  const bare = new Float64Array(profiles * (HEIGHTS_M.length - 1));
  analyseBatch(batch, result);
  bareLoop(temperatureC, bare);
  const analysed = [];
  const looped = [];
  for (let round = 0; round < (ROUNDS[size] ?? ROUNDS.small); round += 1) {
    analysed.push(seconds(() => analyseBatch(batch, result)));
    looped.push(seconds(() => bareLoop(temperatureC, bare)));
  }
  const perSecond = analysed.map((s) => Math.round(profiles / s));
  const ratios = analysed.map((s, round) => s / looped[round]);
  return { profilesPerSecond: spread(perSecond), ratioToBareLoop: spread(ratios) };
}
