/** A reading as a second, deliberately simple reader finds it. */
export interface StrictCell {
  readonly tEnd: number | undefined;
  readonly value: number | undefined;
}

/** The cells of one line by RFC 4180, a letter at a time. */
export function strictCells(line: string): string[] {
  const cells = [''];
  let isQuoted = false;
  for (let i = 0; i < line.length; i++) {
    const letter = line[i]!;
    const last = cells.length - 1;
    if (isQuoted && letter === '"' && line[i + 1] === '"') cells[last] += line[++i]!;
    else if (letter === '"') isQuoted = !isQuoted;
    else if (letter === ',' && !isQuoted) cells.push('');
    else cells[last] += letter;
  }
  return cells;
}

/** Days since 1970 of a date of the Gregorian calendar, by counting leap days; undefined for a date that is none. */
function days(year: number, month: number, day: number): number | undefined {
  const isLeap = (year % 4 === 0 && year % 100 !== 0) || year % 400 === 0;
  const lengths = [31, isLeap ? 29 : 28, 31, 30, 31, 30, 31, 31, 30, 31, 30, 31];
  if (month < 1 || month > 12 || day < 1 || day > lengths[month - 1]!) return undefined;
  const before = year - 1;
  const all = before * 365 + Math.floor(before / 4) - Math.floor(before / 100) + Math.floor(before / 400);
  return all - 719_162 + lengths.slice(0, month - 1).reduce((sum, each) => sum + each, 0) + day - 1;
}

const TIME =
  /^([0-9]{4})[-/.]?([0-9]{1,2})[-/.]?([0-9]{1,2})[T ]?\s*([0-9]{1,2})(?::?([0-9]{2}))?(?::?([0-9]{2})(?:[.,]([0-9]+))?)?\s*(Z|UTC|GMT|[+-][0-9:]{2,5})?$/i;

/** UTC epoch seconds of a stamp with the year first; without an offset it is UTC. */
export function strictTime(text: string): number | undefined {
  const parts = TIME.exec(text.trim());
  if (!parts) return undefined;
  const [y, mo, d, h, mi, s] = parts.slice(1, 7).map((part) => Number(part ?? 0)) as [
    number,
    number,
    number,
    number,
    number,
    number,
  ];
  const day = days(y, mo, d);
  if (day === undefined || mi > 59 || s > 59 || h * 3600 + mi * 60 + s > 86_400) return undefined;
  const part = Number(`0.${parts[7] ?? '0'}`) >= 0.5 ? 1 : 0;
  const zone = /^([+-])([0-9]{2}):?([0-9]{2})?$/.exec(parts[8] ?? '');
  const offset = zone ? (zone[1] === '-' ? -60 : 60) * (Number(zone[2]) * 60 + Number(zone[3] ?? 0)) : 0;
  return day * 86_400 + h * 3600 + mi * 60 + s + part - offset;
}

/** A number in plain notation of ASCII digits with a decimal point; anything else is none. */
export const strictNumber = (text: string): number | undefined =>
  /^[+-]?([0-9]+(\.[0-9]*)?|\.[0-9]+)([eE][+-]?[0-9]+)?$/.test(text.trim())
    ? parseFloat(text.trim())
    : undefined;

/** What the strict reader finds in a row of a wide file for the column of this name. */
export function strictCell(lines: readonly string[], rowNo: number, column: string): StrictCell {
  const clean = (cell: string) => cell.trim();
  const header = strictCells(lines.find((line) => line.trim() !== '') ?? '').map(clean);
  const cells = strictCells(lines[rowNo - 1] ?? '');
  const places = header.flatMap((name, i) => (name === column ? [i] : []));
  const times = header.flatMap((name, i) => (name === 'time' ? [i] : []));
  if (places.length !== 1 || times.length !== 1 || cells.length !== header.length)
    return { tEnd: undefined, value: undefined };
  return { tEnd: strictTime(cells[times[0]!]!), value: strictNumber(cells[places[0]!]!) };
}
