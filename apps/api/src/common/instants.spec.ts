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
});
