import { createHash } from 'node:crypto';

/**
 * A number in [0, 1) drawn from words and numbers: the same always give the same, so that the demo's people decide
 * alike at every first start.
 *
 * Units: none. Valid: any parts. Source: the first 32 bits of SHA-256.
 */
export function draw(...parts: readonly (string | number)[]): number {
  return createHash('sha256').update(parts.join('|')).digest().readUInt32BE() / 2 ** 32;
}

/** One of a list, drawn. */
export function pick<T>(list: readonly T[], ...parts: readonly (string | number)[]): T {
  const found = list[Math.floor(draw(...parts) * list.length)];
  if (found === undefined) throw new Error('There is nothing to pick from.');
  return found;
}
