import { CsvReader } from '../csv-reader';
import { proposeMapping, type ForTower } from './propose-mapping';

const air = (heightM: number) => ({ name: `t${heightM}`, quantity: 'air temperature' as const, heightM });
const mast: ForTower = {
  sensors: [
    ...[2, 10, 60].map(air),
    { name: 'speed', quantity: 'wind speed', heightM: 10 },
    { name: 'dir', quantity: 'wind direction', heightM: 10 },
    { name: 'pressure', quantity: 'station pressure', heightM: 2 },
  ],
  intervalS: 3600,
  clock: 'UTC',
};
const ids = new Map(mast.sensors.map(({ name }, i) => [name, i]));
const ROWS = 72;

interface Parts {
  readonly y: string;
  readonly yy: string;
  readonly mo: string;
  readonly d: string;
  readonly h: string;
  readonly doy: string;
  readonly month: string;
  readonly i: number;
}
const two = (n: number): string => String(n).padStart(2, '0');
/** Hourly rows from 9 January 2026, 22:00. */
const hourly = (row: (parts: Parts) => string): string[] =>
  Array.from({ length: ROWS }, (_, i) => {
    const t = new Date(Date.UTC(2026, 0, 9, 22 + i));
    return row({
      ...{ y: '2026', yy: '26', mo: '01', month: 'Jan', i },
      ...{ d: two(t.getUTCDate()), h: two(t.getUTCHours()), doy: String(t.getUTCDate()) },
    });
  });

/** What the first row comes to by the proposal: instant, values by sensor; and what stays open. */
function firstRow(lines: readonly string[], said: Record<string, string>) {
  const { mapping: found, questions } = proposeMapping({ head: lines, further: [] }, mast);
  const mapping = { ...found, columns: { ...found.columns, ...said } };
  const reader = new CsvReader({
    ...{ mapping, sensorIds: ids, nowS: Date.UTC(2026, 11, 1) / 1000 },
    time: { clock: { offsetS: 0 }, stamp: 'end', form: mapping.timeForm, intervalS: 3600 },
  });
  reader.readLines(lines, 1);
  const { rows, refused } = reader.take();
  const first = rows.filter(({ rowNo }) => rowNo === rows[0]?.rowNo || mapping.format === 'long');
  const names = [...ids.keys()];
  return {
    at: new Date((rows[0]?.tEnd ?? 0) * 1000).toISOString().slice(0, 16),
    last: new Date((rows.at(-1)?.tEnd ?? 0) * 1000).toISOString().slice(0, 16),
    values: Object.fromEntries(first.slice(0, 3).map(({ sensorId, value }) => [names[sensorId], value])),
    refused: refused.length,
    questions: questions.map(({ id }) => id),
  };
}

const right = { at: '2026-01-09T22:00', last: '2026-01-12T21:00', refused: 0, questions: [] };

describe('common layouts of loggers and archives', () => {
  it.each<[string, string[], Record<string, number>, Record<string, string>?]>([
    [
      'names, units and kinds of value in lines of their own below a title',
      [
        '"Table","mast","hourly"',
        '"TIMESTAMP","RECORD","AirTC_2m_Avg","WindDir_10m","WS_10m_Avg","PTemp_C"',
        '"TS","RN","Deg C","deg","m/s","Deg C"',
        '"","","Avg","Smp","Avg","Smp"',
        ...hourly(({ y, mo, d, h, i }) => `"${y}-${mo}-${d} ${h}:00:00",${i},-9.5,270,4.2,21.5`),
      ],
      { t2: -9.5, dir: 270, speed: 4.2 },
    ],
    [
      'two times a row: the end counts; digits alone; the usual number for no reading',
      [
        'TIMESTAMP_START,TIMESTAMP_END,TA_2m,Pressure kPa',
        ...hourly(
          ({ y, mo, d, h, i }) =>
            `${y}0101${two(i % 24)}00,${y}${mo}${d}${h}00,${i % 9 === 1 ? -9999 : 1.5},86`,
        ),
      ],
      { t2: 1.5, pressure: 860 },
    ],
    [
      'year, day of year and an hour, which is no hhmm',
      hourly(({ y, doy, h }) => `${y},${doy},${Number(h)},-3.5`),
      { t2: -3.5 },
      { '4': 't2' },
    ],
    [
      'a column between year and month',
      [
        'yr jday mo dy hr mi t2',
        ...hourly(({ y, doy, mo, d, h }) => `${y} ${doy} ${Number(mo)} ${d} ${h} 0 -3.5`),
      ],
      { t2: -3.5 },
    ],
    [
      'a date of digits and a hhmm',
      ['day;clock;t10', ...hourly(({ y, mo, d, h }) => `${y}${mo}${d};${h}00;-3,5`)],
      { t10: -3.5 },
    ],
    [
      'a day with a midnight that says nothing, and a clock',
      ['Date,Time,t10', ...hourly(({ y, mo, d, h }) => `${y}-${mo}-${d} 00:00:00,${h}:00:00,-3.5`)],
      { t10: -3.5 },
    ],
    [
      'a month by its name',
      ['when\tt10', ...hourly(({ y, month, d, h }) => `${d}-${month}-${y} ${h}:00:00\t-3.5`)],
      { t10: -3.5 },
    ],
    [
      'two digits for the year, month first',
      ['when,t10', ...hourly(({ yy, mo, d, h }) => `${Number(mo)}/${Number(d)}/${yy} ${Number(h)}:00,-3.5`)],
      { t10: -3.5 },
    ],
    [
      'date and hour in ten digits',
      ['station;datum;TT_10', ...hourly(({ y, mo, d, h }) => `7;${y}${mo}${d}${h};-3.5`)],
      { t10: -3.5 },
      { TT_10: 't10' },
    ],
    [
      'blanks with decimal commas',
      ['date time t2 t10', ...hourly(({ y, mo, d, h }) => `${d}.${mo}.${y} ${h}:00 -3,5 -2,5`)],
      { t2: -3.5, t10: -2.5 },
    ],
    [
      'heights as the header',
      ['time;2;10;60', ...hourly(({ y, mo, d, h }) => `${y}-${mo}-${d} ${h}:00;-3.5;-2.5;1`)],
      { t2: -3.5, t10: -2.5, t60: 1 },
      { '2': 't2', '10': 't10', '60': 't60' },
    ],
    [
      'a row for each height, its unit beside it',
      [
        'time,height_m,temperature,unit',
        ...hourly(
          ({ y, mo, d, h }) => `${y}-${mo}-${d} ${h}:00,2,14,deg F\n${y}-${mo}-${d} ${h}:00,10,23,deg F`,
        ),
      ].flatMap((line) => line.split('\n')),
      { t2: -10, t10: -5 },
    ],
    [
      'pressures near 999 hPa, which are no marks',
      [
        'time,pressure,t2',
        ...hourly(({ y, mo, d, h, i }) => `${y}-${mo}-${d} ${h}:00,${i % 2 ? 999.0 : 1001.5},-3`),
      ],
      { pressure: 1001.5, t2: -3 },
    ],
  ])('%s', (_, lines, values, said = {}) => {
    expect(firstRow(lines, said)).toEqual({ ...right, values });
  });
});
