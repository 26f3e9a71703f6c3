/**
 * A reading's quality as it is stored. Only *failed* is left out of means; *suspect* is used, makes a finding not
 * sure, and is shown. Higher is worse, so the worst of several is their maximum.
 */
export const qualityCodes = { valid: 0, suspect: 1, failed: 2, missing: 3 } as const;

/** A quality by name. */
export type Quality = keyof typeof qualityCodes;

/** A quality as it is stored. */
export type QualityCode = (typeof qualityCodes)[Quality];

/** By their codes, which count from 0 in this order. */
const names = Object.keys(qualityCodes) as Quality[];

/** The name of a stored quality. Throws a RangeError for a number that is no quality. */
export function qualityName(code: number): Quality {
  const name = names[code];
  if (!name) throw new RangeError(`${code} is no quality code; the codes are 0 to ${names.length - 1}.`);
  return name;
}

/** The screening checks, each a bit of `reading.checks`, so that one number says which checks spoke. */
export const checkBits = {
  range: 1,
  spike: 2,
  step: 4,
  persistence: 8,
  'internal consistency': 16,
  'vertical consistency': 32,
  neighbours: 64,
  override: 128,
  stuck: 256,
  clock: 512,
} as const;

/** A screening check by name. */
export type Check = keyof typeof checkBits;

/** The names of the checks in a stored number, in the order of the table. */
export function checkNames(bits: number): Check[] {
  return (Object.keys(checkBits) as Check[]).filter((check) => (bits & checkBits[check]) !== 0);
}
