const DAY_S = 86_400;
const two = (n: number): string => (n < 10 ? `0${n}` : String(n));
/** The date written last: series run within days, and a date takes ten times as long to write as a time of day. */
let written = { day: NaN, date: '' };

/** An instant in UTC epoch seconds as ISO 8601 text with the offset Z, whole seconds. */
export function toIso(epochS: number): string {
  const day = Math.floor(epochS / DAY_S);
  if (day !== written.day) {
    written = { day, date: new Date(day * DAY_S * 1000).toISOString().replace(/T.*/, '') };
  }
  const s = Math.floor(epochS) - day * DAY_S;
  return `${written.date}T${two(Math.floor(s / 3600))}:${two(Math.floor(s / 60) % 60)}:${two(s % 60)}Z`;
}

/** The UTC epoch seconds of ISO 8601 text that carries its offset; undefined when it does not or is no instant. */
export function fromIso(text: string): number | undefined {
  if (!/^\d{4}-\d{2}-\d{2}T\d{2}:\d{2}(:\d{2}(\.\d+)?)?(Z|[+-]\d{2}:?\d{2})$/.test(text)) return undefined;
  const ms = Date.parse(text);
  return Number.isNaN(ms) ? undefined : Math.floor(ms / 1000);
}
