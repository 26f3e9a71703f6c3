import { CsvReader, type ReadingContext } from './csv-reader';
import { DEFAULT_MAPPING, type Mapping } from './mapping';

const iso = (epochS: number): string => new Date(epochS * 1000).toISOString().slice(0, 16);

const contextOf = (mapping: Partial<Mapping>, zone?: string): ReadingContext => ({
  mapping: { ...DEFAULT_MAPPING, ...mapping },
  sensorIds: new Map([
    ['t10', 1],
    ['t60', 2],
    ['wind', 3],
  ]),
  time: {
    clock: zone ? { zone } : { offsetS: 0 },
    stamp: 'end',
    form: mapping.timeForm ?? 'iso',
    intervalS: 1800,
    repeatedHour: mapping.repeatedHour,
    missingHour: mapping.missingHour,
  },
  nowS: Date.UTC(2026, 0, 1) / 1000,
});

function read(lines: string[], mapping: Partial<Mapping>, zone?: string) {
  const reader = new CsvReader(contextOf(mapping, zone));
  reader.readLines(lines, 1);
  const { rows, refused } = reader.take();
  return { rows: rows.map(({ sensorId, tEnd, value }) => [sensorId, iso(tEnd), value]), refused };
}

describe('tables of other shapes', () => {
  it('are read without a header, their time in day, month, two-digit year and hhmm', () => {
    const { rows, refused } = read(
      [
        '  1  3 19 0030 E   28.6   -5.0   1.4',
        '  1  3 19 0930 E   28.6   -4.5   1.4',
        '  1  3 19 2400 X  999.9   -4.0   1.4',
      ],
      {
        ...{ separator: 'blank', headerRow: 0, missing: ['999.9'], columns: { '6': 't10', '7': 't60' } },
        timeColumns: [
          { column: '1', part: 'day' },
          { column: '2', part: 'month' },
          { column: '3', part: 'two-digit year' },
          { column: '4', part: 'hhmm' },
        ],
      },
    );
    expect(refused).toEqual([]);
    expect(rows).toEqual([
      [1, '2019-03-01T00:30', 28.6],
      [2, '2019-03-01T00:30', -5],
      [1, '2019-03-01T09:30', 28.6],
      [2, '2019-03-01T09:30', -4.5],
      [2, '2019-03-02T00:00', -4],
    ]);
  });

  it('are taken without what a person left out: columns, written names, and rows by a word', () => {
    const leaveOut = [{ column: 'class', values: ['X'] }];
    const wide = read(['time,class,T,t60', '2025-01-01 00:10,D,1,2', '2025-01-02 00:00,X,3,4'], {
      onlyNamed: true,
      columns: { T: 't10' },
      leaveOut,
    });
    expect(wide).toEqual({ rows: [[1, '2025-01-01T00:10', 1]], refused: [] });
    const long = read(
      ['time,sensor,value', '2025-01-01 00:10,T,1', '2025-01-01 00:10,t60,2', '2025-01-01 00:10,new,3'],
      { format: 'long', onlyNamed: true, columns: { T: 't10' } },
    );
    expect(long.rows).toEqual([[1, '2025-01-01T00:10', 1]]);
    expect(long.refused.map(({ code }) => code)).toEqual(['sensor-not-known']);
  });

  it('are read by the day of the year, and a day the year does not have is refused', () => {
    const timeColumns = [
      { column: 'y', part: 'year' },
      { column: 'doy', part: 'day of year' },
      { column: 'hm', part: 'hhmm' },
    ] as const;
    const { rows, refused } = read(['y,doy,hm,t10', '2024,60,1230,1', '2025,366,0,1'], { timeColumns });
    expect(rows).toEqual([[1, '2024-02-29T12:30', 1]]);
    expect(refused.map(({ rowNo, column, code }) => [rowNo, column, code])).toEqual([
      [3, 'y doy hm', 'time-not-readable'],
    ]);
  });

  it('are read below a title, passing the line of units over, date and time apart', () => {
    const { rows, refused } = read(
      ['Mast of the lower valley;;', 'day;clock;t10;t60', ';;deg C;deg C', '24/12/2025;05:30;-9,5;-3,25'],
      {
        ...{ separator: ';', decimal: ',', headerRow: 2, firstDataRow: 4, timeForm: 'day/month/year' },
        timeColumns: [
          { column: 'day', part: 'date' },
          { column: 'clock', part: 'time' },
        ],
      },
    );
    expect(refused).toEqual([]);
    expect(rows).toEqual([
      [1, '2025-12-24T05:30', -9.5],
      [2, '2025-12-24T05:30', -3.25],
    ]);
  });

  it('come in other units: 212 °F and 373.15 K are 100 °C, a knot is 1852 m an hour', () => {
    const units = { t10: '°F', t60: 'K', wind: 'kn' } as const;
    const { rows } = read(['time,t10,t60,wind', '2025-12-24 05:30,212,373.15,36'], { units });
    expect(rows.map(([, , value]) => value)).toEqual([100, 100, 18.52]);
  });

  it('refuse two columns that are set to one sensor', () => {
    expect(() => read(['time,a,b', '2025-12-24 05:30,1,2'], { columns: { a: 't10', b: 't10' } })).toThrow(
      /"a" and "b" are set to the same sensor/,
    );
  });
});

describe('civil time around a change of the clocks', () => {
  // The rows of America/Denver on 2025-11-02, half-hourly: 01:00 and 01:30 are shown twice.
  const autumn = ['00:30', '01:00', '01:30', '01:00', '01:30', '02:00'].map((t, i) => `2025-11-02 ${t},${i}`);

  it('is refused where nobody has said which passing is meant', () => {
    const { rows, refused } = read(['time,t10', ...autumn], {}, 'America/Denver');
    expect(rows.map(([, t]) => t)).toEqual(['2025-11-02T06:30', '2025-11-02T09:00']);
    expect(refused.map(({ code }) => code)).toEqual(Array(4).fill('time-happens-twice'));
  });

  it('is told apart by the order of the rows', () => {
    const { rows, refused } = read(['time,t10', ...autumn], { repeatedHour: 'in-order' }, 'America/Denver');
    expect(refused).toEqual([]);
    expect(rows.map(([, t]) => t)).toEqual(
      ['06:30', '07:00', '07:30', '08:00', '08:30', '09:00'].map((t) => `2025-11-02T${t}`),
    );
  });

  it('is told apart in hourly rows, whose stamp stands still', () => {
    const hourly = ['00:00', '01:00', '01:00', '02:00'].map((t) => `2025-11-02 ${t},1`);
    const { rows } = read(['time,t10', ...hourly], { repeatedHour: 'in-order' }, 'America/Denver');
    expect(rows.map(([, t]) => t)).toEqual(
      ['06:00', '07:00', '08:00', '09:00'].map((t) => `2025-11-02T${t}`),
    );
  });

  it('does not exist in spring unless the clock was put forward later', () => {
    const spring = ['time,t10', '2025-03-09 02:30,1'];
    expect(read(spring, {}, 'America/Denver').refused.map(({ code }) => code)).toEqual([
      'time-does-not-exist',
    ]);
    expect(read(spring, { missingHour: 'later' }, 'America/Denver').rows).toEqual([
      [1, '2025-03-09T09:30', 1],
    ]);
  });
});
