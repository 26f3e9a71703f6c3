const STAMP =
  /^(\d{4})[-/](\d{1,2})[-/](\d{1,2})[T ]\s*(\d{1,2}):(\d{2})(?::(\d{2})(?:[.,](\d+))?)?\s*(Z|UTC|[+-]\d{2}(?::?\d{2})?)?$/i;
const COMPACT =
  /^(\d{4})(\d{2})(\d{2})[T ]?(\d{2})(\d{2})(?:(\d{2})(?:[.,](\d+))?)?\s*(Z|UTC|[+-]\d{2}(?::?\d{2})?)?$/i;

/** Seconds of an offset such as `Z`, `-07:00`, `+0530` or `+02`. */
export function offsetS(text) {
  if (!text || /^(Z|UTC)$/i.test(text)) return 0;
  const [, sign, hours, minutes] = /^([+-])(\d{2}):?(\d{2})?$/.exec(text) ?? [];
  return (sign === '-' ? -1 : 1) * (Number(hours) * 3600 + Number(minutes ?? 0) * 60);
}

/**
 * The instant of a stamp, UTC epoch seconds; undefined where it is none. An offset in the stamp wins; without one the
 * clock is `offset` from UTC. Worked out here anew and not with the service's own reader: this is a check on it.
 */
export function instantOf(text, offset) {
  const parts = STAMP.exec(text.trim()) ?? COMPACT.exec(text.trim());
  if (!parts) return undefined;
  const [year, month, day, hour, minute, second] = parts.slice(1, 7).map((part) => Number(part ?? 0));
  const date = new Date(Date.UTC(year, month - 1, day));
  const fraction = parts[7] ? Number(`0.${parts[7]}`) : 0;
  if (date.getUTCMonth() !== month - 1 || date.getUTCDate() !== day) return undefined;
  if (hour > 24 || minute > 59 || second > 59) return undefined;
  const shown = date.getTime() / 1000 + hour * 3600 + minute * 60 + second + fraction;
  return Math.round(shown - offsetS(parts[8] ?? offset));
}

/** End of the block that holds the interval which a stamp marks, UTC epoch seconds. Blocks are (start, end]. */
export function blockEndOf(instant, { stamp, blockS }) {
  const shift = { instant: 0, end: 0, start: blockS, middle: blockS / 2 }[stamp];
  return Math.ceil((instant + shift) / blockS) * blockS;
}
