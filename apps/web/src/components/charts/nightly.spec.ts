import { nightly } from './nightly';
import type { StrengthPoint } from './strength-series';

const ZONE = 'America/Denver';
const at = (instant: string, y: number | null): StrengthPoint => ({
  x: new Date(instant).getTime(),
  at: new Date(instant).getTime(),
  y,
  from: { t: instant, strength: {}, within: y, sure: 'true', speakerId: 1 },
});

describe('nightly', () => {
  it('takes the strongest from noon to noon, over midnight', () => {
    const nights = nightly(
      [at('2026-01-14T18:00-07:00', 2), at('2026-01-15T02:00-07:00', 5), at('2026-01-15T13:00-07:00', 0)],
      ZONE,
    );
    expect(nights.map(({ strongest }) => strongest?.y)).toEqual([5, 0]);
  });

  it('knows that the night of the change to summer time has 23 hours (8 March 2026)', () => {
    const [night] = nightly([at('2026-03-08T00:30-07:00', 1)], ZONE);
    expect(((night?.to ?? 0) - (night?.from ?? 0)) / 3_600_000).toBe(23);
  });

  it('does not take a night without data for one without inversion', () => {
    expect(nightly([at('2026-01-14T18:00-07:00', null)], ZONE)[0]?.strongest).toBeNull();
  });
});
