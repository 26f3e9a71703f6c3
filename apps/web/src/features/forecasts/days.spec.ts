import { addDays, dayAfterInWords, nightAtHand, nightInWords, today } from './days';

const ZONE = 'America/Denver';
const at = (iso: string): number => Date.parse(iso);

describe('the days of a forecast', () => {
  it('turn over at noon in the zone', () => {
    expect(nightAtHand(at('2026-01-15T18:59:00Z'), ZONE)).toBe('2026-01-14');
    expect(nightAtHand(at('2026-01-15T19:00:00Z'), ZONE)).toBe('2026-01-15');
    expect(today(at('2026-01-16T06:59:00Z'), ZONE)).toBe('2026-01-15');
  });

  it('are said in words', () => {
    expect(addDays('2026-02-28', 1)).toBe('2026-03-01');
    expect(nightInWords('2026-01-31')).toBe('Sat 31 Jan to Sun 1 Feb');
    expect(dayAfterInWords('2026-01-31')).toBe('Sun 1 Feb');
  });
});
