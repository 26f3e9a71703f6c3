import type { DistrictHistory, RangeValue } from '../../lib/api/types';

const written = (bound: number | undefined): string => (bound === undefined ? '' : String(bound));

const bounds = ({ exactly, atLeast, atMost, between }: RangeValue): [string, string] => [
  written(exactly ?? atLeast ?? between?.[0]),
  written(exactly ?? atMost ?? between?.[1]),
];

/**
 * What the chart shows as CSV (RFC 4180): the end of each mean in UTC, the bounds of the strength (an open bound is
 * empty, both empty is not known), the part within the tower, and whether it is sure. Of a step of several blocks it is
 * the strongest, at its own time.
 */
export function strengthCsv({ points }: DistrictHistory): string {
  const head = 'time_utc,strength_at_least_c,strength_at_most_c,strength_within_tower_c,sure';
  const rows = points.map(({ t, strongestAt, strength, within, sure }) =>
    [new Date(strongestAt ?? t).toISOString(), ...bounds(strength), within ?? '', sure].join(','),
  );
  return [head, ...rows, ''].join('\r\n');
}
