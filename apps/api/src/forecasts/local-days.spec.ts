import { addDays, dayAfter, dayForHigh, dayForNight, localDay, localInstant, nightOf } from './local-days';

const ZONE = 'America/Denver';
const utc = (text: string): number => Date.parse(`${text}:00Z`) / 1000;

describe('the night and the day that a forecast is about', () => {
  it('are noon to noon and midnight to midnight in the zone', () => {
    expect(nightOf(ZONE, '2026-01-15')).toEqual({
      from: utc('2026-01-15T19:00'),
      to: utc('2026-01-16T19:00'),
    });
    expect(dayAfter(ZONE, '2026-01-15')).toEqual({
      from: utc('2026-01-16T07:00'),
      to: utc('2026-01-17T07:00'),
    });
  });

  it('have 23 and 25 hours where the clocks change', () => {
    const hours = ({ from, to }: { from: number; to: number }): number => (to - from) / 3600;
    expect(hours(dayAfter(ZONE, '2026-03-07'))).toBe(23);
    expect(hours(dayAfter(ZONE, '2026-10-31'))).toBe(25);
    expect(hours(nightOf(ZONE, '2026-03-07'))).toBe(23);
    expect(hours(nightOf(ZONE, '2026-10-31'))).toBe(25);
  });

  it('turn over at noon for the night, and at six in the evening for the day', () => {
    const at = (hour: string): number => utc(`2026-01-15T${hour}`) + 7 * 3600;
    expect([at('11:59'), at('12:00')].map((t) => dayForNight(ZONE, t))).toEqual(['2026-01-14', '2026-01-15']);
    expect([at('17:59'), at('18:00')].map((t) => dayForHigh(ZONE, t))).toEqual(['2026-01-14', '2026-01-15']);
  });

  it('count days across months and years', () => {
    expect(addDays('2026-12-31', 1)).toBe('2027-01-01');
    expect(localDay(ZONE, utc('2026-01-01T06:59'))).toBe('2025-12-31');
    expect(localInstant(ZONE, '2026-01-01', 0)).toBe(utc('2026-01-01T07:00'));
  });
});
