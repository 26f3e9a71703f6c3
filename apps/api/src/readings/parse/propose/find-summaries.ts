import type { RowsLeftOut } from '../mapping';
import type { FoundHeader } from './find-header';
import { textOf, type FoundTime } from './find-time';
import { readStamp } from '../../../towers/time-keeping/stamp';

/** Rows that a word in a column marks, and that lie off the usual step: likely a day's summary. */
export interface FoundSummaries extends RowsLeftOut {
  readonly rows: number;
  readonly example: string;
}

const LOOKED_AT = 600;
const MOST_SHARE = 0.2;
const WORD = /^[a-z][\w -]{0,30}$/i;

/** Finds a text that only stands in rows whose time lies off the grid of all the others. */
export function findSummaries({ names, data }: FoundHeader, time: FoundTime): FoundSummaries | undefined {
  const rows = data.slice(0, LOOKED_AT);
  const stamps = rows.map((row) => readStamp(textOf(row, { ...time, form: time.timeForm }), time.timeForm));
  if (time.stepS === undefined) return undefined;
  const phases = stamps.map((stamp) => ('code' in stamp ? undefined : stamp.shownS % time.stepS!));
  const usual = phases.find((phase) => phase !== undefined);
  const isOff = phases.map((phase) => phase !== undefined && phase !== usual);
  const off = isOff.filter(Boolean).length;
  if (off === 0 || off > MOST_SHARE * rows.length) return undefined;
  for (const [place, column] of names.entries()) {
    if (time.used.includes(place)) continue;
    const text = rows.find((_, i) => isOff[i])!.cells[place]!;
    const marks = rows.map(({ cells }) => cells[place] === text);
    if (!WORD.test(text) || marks.some((mark, i) => mark !== isOff[i])) continue;
    return { column, values: [text], rows: off, example: rows.find((_, i) => isOff[i])!.cells.join(' ') };
  }
  return undefined;
}
