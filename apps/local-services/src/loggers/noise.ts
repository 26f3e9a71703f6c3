const UINT32 = 4294967296;

/** Mixes whole numbers into one of 32 bits (murmur3's finishing steps); the same numbers give the same result. */
function mixed(...parts: readonly number[]): number {
  let hash = 0x9747b28c;
  for (const part of parts) {
    hash = Math.imul(hash ^ (part | 0), 0x85ebca6b);
    hash ^= hash >>> 13;
    hash = Math.imul(hash ^ Math.floor(part / UINT32), 0xc2b2ae35);
    hash ^= hash >>> 16;
  }
  return hash >>> 0;
}

/**
 * A number in [0, 1) that looks random and depends on nothing but the numbers given: the demo's weather has no state,
 * so that any span of it can be written in pieces of any size.
 *
 * Units: none. Valid: whole numbers. Source: none (integer hash).
 */
export function chance(seed: number, ...parts: readonly number[]): number {
  return mixed(seed, ...parts) / UINT32;
}

/**
 * A whole number for a name, to tell the noise of one sensor from that of another.
 *
 * Units: none. Valid: any text. Source: FNV-1a, 32 bits.
 */
export function numberOf(name: string): number {
  let hash = 0x811c9dc5;
  for (let i = 0; i < name.length; i += 1) hash = Math.imul(hash ^ name.charCodeAt(i), 0x01000193);
  return hash >>> 0;
}

/**
 * Smooth noise in [-1, 1]: random values every `periodS`, joined without corners.
 *
 * Units: s. Valid: any instant, periodS > 0. Source: value noise with the cubic 3u² − 2u³.
 */
export function smoothNoise(seed: number, channel: number, t: number, periodS: number): number {
  const step = Math.floor(t / periodS);
  const u = t / periodS - step;
  const a = chance(seed, channel, step);
  const b = chance(seed, channel, step + 1);
  return 2 * (a + (b - a) * u * u * (3 - 2 * u)) - 1;
}

/**
 * From 0 at `from` to 1 at `to`, smoothly; also downwards when `to` is below `from`.
 *
 * Units: those of x. Valid: from ≠ to. Source: the cubic 3u² − 2u³.
 */
export function ramp(x: number, from: number, to: number): number {
  const u = Math.min(1, Math.max(0, (x - from) / (to - from)));
  return u * u * (3 - 2 * u);
}

/**
 * A value between two others.
 *
 * Units: theirs. Valid: share 0 to 1. Source: none.
 */
export function between(a: number, b: number, share: number): number {
  return a + (b - a) * share;
}
