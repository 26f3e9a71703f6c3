import type { Cell, CellValue } from 'exceljs';

const HALF_SECOND_MS = 500;
const DAY_MS = 86_400_000;
/** Day 0 of spreadsheets: a time without a day lies on it. */
const DAY_ZERO_MS = Date.UTC(1899, 11, 30);
/** Days of spreadsheets begin at day 25569 where 1970 does. */
const DAYS_TO_1970 = 25_569;
const DATE_LETTERS = /[ymdhs]/i;
/** What a number's format has and a date's has not, apart from parts of a second. */
const DIGITS = /[0#?]/;
/** What is shown as it stands, or says the colour or the language; and parts of a second. */
const ASIDE = /\[[^\]]*]|"[^"]*"|\\.|s[.,]0+/gi;

/** A date as the clock shows it; spreadsheets keep fractions of days, so it is rounded to the second. */
function wallTime(date: Date): string {
  const ms = date.getTime() + HALF_SECOND_MS;
  const text = new Date(ms).toISOString().slice(0, 19).replace('T', ' ');
  return ms >= DAY_ZERO_MS && ms < DAY_ZERO_MS + DAY_MS ? text.slice(11) : text;
}

/** Whether a cell's format shows a date or a time. */
export function isDateFormat(format: string | undefined): boolean {
  if (format === undefined || format === 'General') return false;
  const bare = format.replace(ASIDE, (part) => (/^s/i.test(part) ? 's' : ''));
  return DATE_LETTERS.test(bare) && !DIGITS.test(bare);
}

const fromSerial = (days: number): Date => new Date((days - DAYS_TO_1970) * DAY_MS);
const toSerial = (date: Date): number => date.getTime() / DAY_MS + DAYS_TO_1970;

/**
 * What a cell shows, as text. A date is what the clock shows, a time without a day the time alone; of a formula the
 * result it last had. A formula without a result is left as its formula, which no reading is.
 */
export function cellText(cell: Pick<Cell, 'value' | 'numFmt'>): string {
  return shown(cell.value, isDateFormat(cell.numFmt));
}

function shown(value: CellValue, isDate: boolean): string {
  if (value === null || value === undefined) return '';
  // A unit in a number's format ("0.0 \m") makes the library take the number for a date.
  if (value instanceof Date && !isDate) return Number.isNaN(value.getTime()) ? '' : plain(toSerial(value));
  if (value instanceof Date) return Number.isNaN(value.getTime()) ? '' : wallTime(value);
  if (typeof value === 'number' && isDate && Math.abs(value) < 3e6) return wallTime(fromSerial(value));
  if (typeof value !== 'object') return String(value);
  if ('richText' in value) return value.richText.map(({ text }) => text).join('');
  if ('error' in value) return value.error;
  if ('hyperlink' in value) return String(value.text);
  const { result } = value;
  return result === undefined ? `=${'formula' in value ? value.formula : ''}` : shown(result, isDate);
}

/** Without the last bits that the way through a date costs. */
const plain = (value: number): string => String(Number(value.toPrecision(12)));

/** Whether a cell is worked out from others. */
export const isFormula = (value: CellValue): boolean =>
  typeof value === 'object' && value !== null && ('formula' in value || 'sharedFormula' in value);
