/**
 * Numbers that pass through the store's JSON without losing their last bit: SQLite reads decimal text with an error of
 * one bit now and then, but divides whole numbers exactly. A value goes as whole parts of 10⁻⁶ or 10⁻⁹.
 */
const MILLION = 1e6;
const BILLION = 1e9;

/** A value as whole millionths; null where it is none, so that it must go as text. */
export function millionths(value: number): number | null {
  const whole = Math.round(value * MILLION);
  return Number.isSafeInteger(whole) && whole / MILLION === value ? whole : null;
}

/** A value as whole billionths; null where it is none. */
export function billionths(value: number): number | null {
  const whole = Math.round(value * BILLION);
  return Number.isSafeInteger(whole) && whole / BILLION === value ? whole : null;
}

/** The value at the nearest whole billionth; unchanged where it is too large to be counted in them. */
export function atBillionth(value: number): number {
  const whole = Math.round(value * BILLION);
  return Number.isSafeInteger(whole) ? whole / BILLION : value;
}

/** SQL that makes the value of a JSON array `value` again: whole parts at one place, or the value itself at another. */
export const exactSql = (parts: 1e6 | 1e9, wholeAt: number, valueAt: number): string =>
  `coalesce((value->>${wholeAt}) / ${parts.toFixed(1)}, CAST(value->>${valueAt} AS REAL))`;
