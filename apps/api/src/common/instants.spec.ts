import fc from 'fast-check';
import { fromIso, toIso } from './instants';

describe('instants', () => {
  it.each([
    ['2026-01-16T01:00:00Z', 1_768_525_200],
    ['2026-01-15T18:00:00-07:00', 1_768_525_200],
    ['2026-01-15T18:00-0700', 1_768_525_200],
    ['1970-01-01T00:00:00.900Z', 0],
  ])('%s is %d s', (text, epochS) => expect(fromIso(text)).toBe(epochS));

  it.each(['2026-01-16T01:00:00', '2026-01-16', 'yesterday', '2026-13-01T00:00:00Z', ''])(
    '%j is none',
    (text) => expect(fromIso(text)).toBeUndefined(),
  );

  it('go out in UTC with whole seconds, and come back', () => {
    expect(toIso(1_768_525_200)).toBe('2026-01-16T01:00:00Z');
    expect(fromIso(toIso(1_768_525_201))).toBe(1_768_525_201);
  });

  it('go out as the language itself writes them, whatever went out before', () => {
    const plain = (t: number): string => new Date(t * 1000).toISOString().replace('.000Z', 'Z');
    fc.assert(
      fc.property(fc.integer({ min: -62_000_000_000, max: 250_000_000_000 }), (t) => toIso(t) === plain(t)),
      { numRuns: 2_000 },
    );
    for (const t of [0, -1, 86_399, 86_400, 1_709_164_800]) expect(toIso(t)).toBe(plain(t));
  });

  it.each([NaN, 9e12])('%d does not go out', (t) => expect(() => toIso(t)).toThrow(RangeError));
});
