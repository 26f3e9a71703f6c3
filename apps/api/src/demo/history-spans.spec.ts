import { historySpans } from './history-spans';

const zone = 'America/Boise';
const at = (iso: string): number => Date.parse(iso) / 1000;
const shown = (now: string): string[] =>
  historySpans(at(now), zone).map(({ from, to }) =>
    [from, to].map((t) => new Date(t * 1000).toISOString().slice(0, 10)).join(' to '),
  );

describe('what the demo tells of the past', () => {
  it.each([
    ['2026-12-01T06:00:00Z', ['2025-11-01 to 2026-03-01', '2026-11-19 to 2026-12-01']],
    ['2027-02-20T06:00:00Z', ['2025-11-01 to 2026-03-01', '2027-02-08 to 2027-02-20']],
    ['2027-07-04T12:00:00Z', ['2026-11-01 to 2027-03-01', '2027-06-22 to 2027-07-04']],
    ['2027-03-05T12:00:00Z', ['2026-11-01 to 2027-03-05']],
  ])('at a first start on %s is %j', (now, expected) => expect(shown(now)).toEqual(expected));
});
