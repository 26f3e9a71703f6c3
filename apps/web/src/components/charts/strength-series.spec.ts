import type { DistrictHistory } from '../../lib/api/types';
import { gapsOf } from './strength-series';

const at = (clock: string): number => Date.parse(`2026-01-15T${clock}:00Z`);
const now = at('12:00');

/** A history of hourly points from 06:00 to 12:00; null is a point of which nothing is known. */
function history(points: readonly [clock: string, within: number | null][]): DistrictHistory {
  return {
    ...{ districtId: 1, timeZone: 'UTC', stepMinutes: 60, limits: [], notices: [], nights: [] },
    ...{ from: '2026-01-15T06:00:00Z', to: '2026-01-15T14:00:00Z' },
    points: points.map(([clock, within]) => ({
      ...{ t: `2026-01-15T${clock}:00Z`, within, sure: 'true' as const, speakerId: 1 },
      strength: within === null ? { notKnown: 'silent' } : { exactly: within },
    })),
  };
}

const full: [string, number][] = ['07:00', '08:00', '09:00', '10:00', '11:00', '12:00'].map((clock) => [
  clock,
  1,
]);
const shown = (points: readonly [string, number | null][]) =>
  gapsOf(history(points), now).map(({ from, to }) =>
    [from, to].map((ms) => new Date(ms).toISOString().slice(11, 16)).join(' to '),
  );

describe('stretches of a history that are not known', () => {
  it.each<[string, [string, number | null][], string[]]>([
    ['none where every step is there, and none ahead of now', full, []],
    ['everything without a point', [], ['06:00 to 12:00']],
    ['what lies before the first reading', full.slice(3), ['06:00 to 09:00']],
    ['what lies after the last', full.slice(0, 3), ['09:00 to 12:00']],
    ['steps that are missing', [...full.slice(0, 2), ...full.slice(4)], ['08:00 to 10:00']],
    [
      'points that are not known',
      [...full.slice(0, 2), ['09:00', null], ...full.slice(3)],
      ['08:00 to 10:00'],
    ],
    ['an unknown end', [...full.slice(0, 5), ['12:00', null]], ['11:00 to 12:00']],
  ])('are %s', (_, points, expected) => expect(shown(points)).toEqual(expected));
});
