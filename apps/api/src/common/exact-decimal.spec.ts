import fc from 'fast-check';
import { Database } from 'sqlite3';
import { atBillionth, billionths, exactSql, millionths } from './exact-decimal';

/** What SQLite makes of rows of whole parts and values. */
const through = (parts: 1e6 | 1e9, rows: readonly unknown[]): Promise<number[]> =>
  new Promise((resolve, reject) => {
    const store = new Database(':memory:');
    store.all(
      `SELECT ${exactSql(parts, 0, 1)} v FROM json_each($1)`,
      [JSON.stringify(rows)],
      (error: Error | null, found: { v: number }[]) => {
        store.close();
        if (error) reject(error);
        else resolve(found.map(({ v }) => v));
      },
    );
  });

describe('numbers on their way through the store', () => {
  const decimals = Array.from({ length: 50_000 }, (_, i) => Math.round(Math.sin(i) * 5e8) / 1e6);
  const means = Array.from({ length: 50_000 }, (_, i) => atBillionth((Math.sin(i) * 60 + Math.cos(i)) / 3));

  it('keep every bit as whole millionths and billionths', async () => {
    expect(decimals.every((value) => millionths(value) !== null)).toBe(true);
    expect(
      await through(
        1e6,
        decimals.map((value) => [millionths(value)]),
      ),
    ).toEqual(decimals);
    expect(means.every((value) => billionths(value) !== null)).toBe(true);
    expect(
      await through(
        1e9,
        means.map((value) => [billionths(value)]),
      ),
    ).toEqual(means);
  });

  it('go as they are where they are neither', async () => {
    const rows = [1e300, -1e22, 9.1e9 + 1e-6];
    expect(rows.map(millionths)).toEqual([null, null, null]);
    expect(
      await through(
        1e6,
        rows.map((value) => [null, value]),
      ),
    ).toEqual(rows);
  });

  it('move by half a billionth at most', () => {
    fc.assert(
      fc.property(fc.double({ min: -8e6, max: 8e6, noNaN: true }), (value) => {
        expect(Math.abs(atBillionth(value) - value)).toBeLessThanOrEqual(1.5e-9);
        expect(billionths(atBillionth(value))).not.toBeNull();
      }),
    );
  });
});
