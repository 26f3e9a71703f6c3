import { keepMapping } from './keep-mapping';
import { proposeMapping, type ForTower } from './propose-mapping';

const air = (heightM: number) => ({ name: `t${heightM}`, quantity: 'air temperature' as const, heightM });
const mast: ForTower = {
  sensors: [
    ...[2, 10, 60].map(air),
    { name: 'rh', quantity: 'relative humidity', heightM: 2 },
    { name: 'wind', quantity: 'wind speed', heightM: 10 },
    { name: 'pressure', quantity: 'station pressure', heightM: 2 },
  ],
  intervalS: 600,
  clock: '-07:00',
};
const two = (n: number): string => String(n).padStart(2, '0');
const steps = (count: number, stepMin: number, row: (t: Date, i: number) => string): string[] =>
  Array.from({ length: count }, (_, i) =>
    row(new Date(Date.UTC(2026, 0, 9, 22, 0) + i * stepMin * 60_000), i),
  );
const iso = (t: Date): string => t.toISOString().slice(0, 16).replace('T', ' ');
const propose = (lines: string[]) => proposeMapping({ head: lines, further: [] }, mast);

describe('what a file seems to be', () => {
  it('finds heights in names, units in brackets, marks, and leaves deviations out', () => {
    const { mapping, notes, questions } = propose([
      'Date,Air Temperature (2 m),Air Temperature (60 m) [deg F],Temp StdDev 2 m,Humidity 2m,Speed 10 m (mph),Pressure [kPa]',
      ...steps(
        200,
        10,
        (t, i) => `${iso(t)}-07:00,${i % 7 ? -9.5 : -999},14.0,0.1,63,4.2,${i % 9 ? 86.1 : 'NaN'}`,
      ),
    ]);
    expect(mapping).toMatchObject({
      ...{ separator: ',', decimal: '.', headerRow: 1, firstDataRow: 2, timeColumn: 'Date', timeForm: 'iso' },
      missing: ['NaN', 'NAN', '-999'],
      columns: {
        'Air Temperature (2 m)': 't2',
        'Air Temperature (60 m) [deg F]': 't60',
        'Humidity 2m': 'rh',
        'Speed 10 m (mph)': 'wind',
        'Pressure [kPa]': 'pressure',
      },
      units: { 'Air Temperature (60 m) [deg F]': '°F', 'Speed 10 m (mph)': 'mph', 'Pressure [kPa]': 'kPa' },
    });
    expect(questions).toEqual([]);
    expect(notes[0]).toMatch(/carry their offset/);
  });

  it('says the unit of a column that it could not name', () => {
    const { mapping, columns } = propose([
      'Date,Low arm [°F]',
      ...steps(50, 10, (t) => `${iso(t)}-07:00,20.5`),
    ]);
    expect(columns).toEqual([expect.objectContaining({ name: 'Low arm [°F]', sensor: null, unit: '°F' })]);
    expect([mapping.columns, mapping.units]).toEqual([{}, {}]);
  });

  it('finds the header below a title and a line of units, semicolons and decimal commas', () => {
    const { mapping } = propose([
      'Mast of the lower valley; logger 3',
      'Zeit;T_2m;T_10m',
      ';°C;K',
      ...steps(
        100,
        10,
        (t) => `${two(t.getUTCDate())}.${two(t.getUTCMonth() + 1)}.2026 ${iso(t).slice(11)};-9,5;263,65`,
      ),
    ]);
    expect(mapping).toMatchObject({
      ...{ separator: ';', decimal: ',', headerRow: 2, firstDataRow: 4, timeForm: 'day/month/year' },
      ...{ columns: { T_2m: 't2', T_10m: 't10' }, units: { T_10m: 'K' } },
    });
  });

  it('tells day and month by the steps where it can, and asks where it cannot', () => {
    const rows = (count: number): string[] =>
      steps(
        count,
        10,
        (t) => `${two(t.getUTCDate())}/${two(t.getUTCMonth() + 1)}/2026 ${iso(t).slice(11)},-9.5`,
      );
    const clear = propose(['time,t2', ...rows(400)]);
    expect(clear.mapping.timeForm).toBe('day/month/year');
    expect(clear.questions).toEqual([]);
    const open = propose(['time,t2', ...rows(10)]);
    expect(open.questions.map(({ id }) => id)).toEqual(['day-or-month-first']);
  });

  it('reads a table of blanks without a header, its time in four columns', () => {
    const { mapping, columns, notes } = propose(
      steps(48, 60, (t) => {
        const date = `  ${t.getUTCDate()}  ${t.getUTCMonth() + 1} 26 ${two(t.getUTCHours())}30`;
        return `${date} E    28.6     1.9    17.1    -5.0`;
      }),
    );
    expect(mapping).toMatchObject({ separator: 'blank', headerRow: 0, firstDataRow: 1, columns: {} });
    expect(mapping.timeColumns?.map(({ part }) => part)).toEqual(['day', 'month', 'two-digit year', 'hhmm']);
    expect(columns.map(({ name }) => name)).toEqual(['5', '6', '7', '8', '9']);
    expect(notes.join(' ')).toMatch(/no header.*step by 60 min; the tower's interval is 10 min/s);
  });

  it('finds a date and a clock in two columns, and a long table', () => {
    const { mapping } = propose([
      'Date,Time,Sensor,Value',
      ...steps(90, 10, (t) => t.toISOString()).flatMap((t) =>
        ['t2', 'T 60 m'].map((name) => `${t.slice(0, 10)},${t.slice(11, 16)},${name},-3.25`),
      ),
    ]);
    expect(mapping).toMatchObject({
      ...{
        format: 'long',
        sensorColumn: 'Sensor',
        valueColumn: 'Value',
        columns: { t2: 't2', 'T 60 m': 't60' },
      },
      timeColumns: [
        { column: 'Date', part: 'date' },
        { column: 'Time', part: 'time' },
      ],
    });
  });

  it('asks whether temperatures are °F where their size says so', () => {
    const { questions, mapping } = propose([
      'time,t2,t60',
      ...steps(90, 10, (t, i) => `${iso(t)},${30 + i / 2},${i % 5}`),
    ]);
    expect(questions).toEqual([
      expect.objectContaining({ id: 'unit', text: 'Are the temperatures in "t2" °C or °F?' }),
    ]);
    expect(mapping.units).toEqual({});
  });

  it('asks whether rows that a word marks and that lie off the step are readings', () => {
    const { questions } = propose(
      steps(48, 60, (t, i) =>
        i % 24 === 23 ? `${iso(t).slice(0, 10)} 23:59,X,-1` : `${iso(t)},${'DEF'[i % 3]},-9.5`,
      ),
    );
    expect(questions).toEqual([
      expect.objectContaining({
        id: 'rows-off-the-step',
        choices: [
          expect.objectContaining({ value: '{"leaveOut":[{"column":"2","values":["X"]}]}' }),
          expect.objectContaining({ value: '{"leaveOut":[]}' }),
        ],
      }),
    ]);
  });

  it('keeps the last mapping where nothing in the file speaks against it', () => {
    const dated = (day: number) =>
      steps(10, 10, (t) => `${two(day)}/01/2026 ${iso(t).slice(11)},-9.5`.replace(/23:|00:/, '22:'));
    const sample = (day: number) => ({ head: ['when,t2', ...dated(day)], further: [] });
    const open = proposeMapping(sample(9), mast);
    const kept = {
      ...open.mapping,
      timeForm: 'day/month/year',
      repeatedHour: 'in-order',
      missing: ['x'],
    } as const;
    const names = mast.sensors.map(({ name }) => name);
    expect(keepMapping(kept, open, sample(9), names)).toMatchObject({
      timeForm: 'day/month/year',
      missing: ['x', 'NaN', 'NAN'],
    });
    expect(keepMapping(kept, open, sample(9), names)).not.toHaveProperty('repeatedHour');
    expect(keepMapping(kept, open, sample(9), ['t10'])).toMatchObject({ columns: {} });
    const wrong = { ...kept, timeForm: 'month/day/year' } as const;
    expect(keepMapping(wrong, proposeMapping(sample(31), mast), sample(31), names)).toBeUndefined();
  });

  it('refuses what is no table, and a table without times', () => {
    expect(() => propose(['one word', 'and', 'another line of text, here', 'x'])).toThrow(/no table/);
    expect(() => propose(['a,b', '1,2', '3,4'])).toThrow(/No column of the file holds times/);
  });
});
