import type { DistrictHistory, RangeValue } from '../../lib/api/types';

const bounds = (value: RangeValue): [string, string] => {
  if ('exactly' in value) return [String(value.exactly), String(value.exactly)];
  if ('atLeast' in value) return [String(value.atLeast), ''];
  if ('atMost' in value) return ['', String(value.atMost)];
  if ('between' in value) return [String(value.between[0]), String(value.between[1])];
  return ['', ''];
};

/**
 * What the chart shows as CSV (RFC 4180): the end of each mean in UTC, the bounds of the strength (an open bound is
 * empty, both empty is not known), the part within the tower, and whether it is sure.
 */
export function strengthCsv({ points }: DistrictHistory): string {
  const head = 'time_utc,strength_at_least_c,strength_at_most_c,strength_within_tower_c,sure';
  const rows = points.map(({ t, strength, within, sure }) =>
    [new Date(t).toISOString(), ...bounds(strength), within ?? '', sure].join(','),
  );
  return [head, ...rows, ''].join('\r\n');
}
