import fc from 'fast-check';
import { readClock } from '../../towers/time-keeping/logger-clock';
import { decodeText, NotTextError } from './decode-text';
import { DEFAULT_MAPPING, type Mapping } from './mapping';
import { HeaderError } from './parsed-readings';
import { readCsv, type ReadingContext } from './read-csv';

const T = Date.UTC(2026, 0, 10, 5) / 1000;
const context = (mapping: Partial<Mapping> = {}): ReadingContext => ({
  mapping: { ...DEFAULT_MAPPING, ...mapping },
  sensorIds: new Map([
    ['t2', 1],
    ['t10', 2],
  ]),
  time: { clock: readClock('UTC')!, stamp: 'end', form: 'iso', intervalS: 600 },
  nowS: T + 86_400,
});
const row = (sensorId: number, value: number, rowNo: number, tEnd = T) => ({ sensorId, tEnd, value, rowNo });

describe('a CSV text of readings', () => {
  it('in the wide form has a column per sensor', async () => {
    const text = 'time,t2,t10,battery\n2026-01-10 05:00,-9.5,-7.7,12\n';
    const { rows, refused, ignoredColumns } = await readCsv(text, context());
    expect({ rows, refused, ignoredColumns }).toEqual({
      rows: [row(1, -9.5, 2), row(2, -7.7, 2)],
      refused: [],
      ignoredColumns: ['battery'],
    });
  });

  it('in the long form has a row per reading', async () => {
    const text = 'when;what;worth\n2026-01-10 05:00;low;-9,5\n2026-01-10 05:00;elsewhere;1\n';
    const mapping: Partial<Mapping> = {
      ...({ format: 'long', separator: ';', decimal: ',', columns: { low: 't2' } } as const),
      ...{ timeColumn: 'when', sensorColumn: 'what', valueColumn: 'worth' },
    };
    const { rows, refused } = await readCsv(text, context(mapping));
    expect(rows).toEqual([row(1, -9.5, 2)]);
    expect(refused).toMatchObject([{ rowNo: 3, column: 'what', code: 'sensor-not-known' }]);
  });

  it('takes declared marks for no reading, and refuses others with row, column and cure', async () => {
    const text = 'time,t2,t10\n2026-01-10 05:00,-999,n/a\n';
    const { rows, refused } = await readCsv(text, context({ missing: ['-999'] }));
    expect(rows).toEqual([]);
    expect(refused).toEqual([
      {
        rowNo: 2,
        column: 't10',
        code: 'value-not-a-number',
        text:
          'Row 2, column "t10": "n/a" is not a number; correct it, or declare it as one of this source\'s marks ' +
          'for "no reading".',
        raw: '2026-01-10 05:00,-999,n/a',
      },
    ]);
  });

  it('loses only its own line to a stray quotation mark', async () => {
    const text = 'time,t2,t10\n2026-01-10 05:00,"-9.5,-7.7\n2026-01-10 05:10,-9.6,-7.8\n';
    const { rows, refused } = await readCsv(text, context());
    expect(rows).toEqual([row(1, -9.6, 3, T + 600), row(2, -7.8, 3, T + 600)]);
    expect(refused).toMatchObject([{ rowNo: 2, code: 'quotes-do-not-match' }]);
  });

  it('is read on from a later row with its header before it', async () => {
    const { rows } = await readCsv('time,t2,t10\n2026-01-10 05:00,-9.5,-7.7\n', context(), 41);
    expect(rows.map(({ rowNo }) => rowNo)).toEqual([42, 42]);
  });

  it('of blanks has as many between columns as it likes', async () => {
    const mapping = { separator: 'blank', timeForm: 'epoch-seconds' } as const;
    const given = context(mapping);
    const time = { ...given.time, form: 'epoch-seconds' } as const;
    const { rows } = await readCsv(`  time   t2  t10\n${T}  -9.5\t-7.7\n`, { ...given, time });
    expect(rows).toEqual([row(1, -9.5, 2), row(2, -7.7, 2)]);
  });

  it('whatever its bytes are, gives finite readings and reasons, or says why it cannot be read', async () => {
    const cell = fc.oneof(
      fc.string(),
      fc.double().map(String),
      fc.constantFrom('', '"', '2026-01-10 05:00', 't2'),
    );
    const line = fc.array(cell, { maxLength: 5 }).map((cells) => cells.join(','));
    const file = fc.array(line, { maxLength: 6 }).map((lines) => ['time,t2,t10', ...lines].join('\n'));
    const bytes = fc.oneof(
      file.map((text) => Buffer.from(text)),
      fc.uint8Array().map((all) => Buffer.from(all)),
    );
    await fc.assert(
      fc.asyncProperty(bytes, async (all) => {
        try {
          const { rows, refused } = await readCsv(decodeText(all), context());
          expect(rows.every(({ value, tEnd }) => Number.isFinite(value) && Number.isInteger(tEnd))).toBe(
            true,
          );
          expect(refused.every(({ text }) => /^Row \d+.*: .+;.+\.$/su.test(text))).toBe(true);
        } catch (error) {
          expect(error instanceof HeaderError || error instanceof NotTextError).toBe(true);
        }
      }),
      { numRuns: 500 },
    );
  });
});
