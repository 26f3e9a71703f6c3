/** The true minus sign, as wide as a figure. */
export const MINUS = '−';

/**
 * A number with fixed decimals and a true minus; never "−0.0".
 *
 * Units: the number's, not written. Valid: finite numbers; others are written as an en dash.
 */
export function decimal(value: number, decimals = 1): string {
  if (!Number.isFinite(value)) return '–';
  const text = Math.abs(value).toLocaleString('en-US', {
    minimumFractionDigits: decimals,
    maximumFractionDigits: decimals,
  });
  return value < 0 && Number(text.replaceAll(',', '')) !== 0 ? MINUS + text : text;
}

/** A difference with its sign written out: "+6.2", "−0.4", "0.0". */
export function signed(value: number, decimals = 1): string {
  const text = decimal(value, decimals);
  return value > 0 && Number(text.replaceAll(',', '')) !== 0 ? `+${text}` : text;
}

/** A count of things: "1,912". */
export const count = (value: number): string => value.toLocaleString('en-US');

/** "1 text", "2 texts": a count with its noun. */
export const counted = (value: number, one: string, many = `${one}s`): string =>
  `${count(value)} ${value === 1 ? one : many}`;
