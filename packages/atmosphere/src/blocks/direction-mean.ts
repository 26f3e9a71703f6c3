import { exactly, notKnown, type Quantity } from '../bounds';

const RADIANS_PER_DEGREE = Math.PI / 180;
/** Shorter than this the resultant of unit vectors has no direction. */
const NO_DIRECTION = 1e-9;

/**
 * Unit-vector mean of wind directions: 350° and 10° give 360° (written 0°).
 *
 * Units: degrees the wind comes from. Valid: any finite directions in any order, others passed over; not known when
 * there is none or they cancel. Source: [EPA454] §6.2 unit-vector mean.
 */
export function meanDirectionDeg(directionsDeg: readonly (number | null)[]): Quantity {
  const given = directionsDeg.filter((d): d is number => Number.isFinite(d)).sort((a, b) => a - b);
  if (given.length === 0) return notKnown('no wind direction was given');
  const east = given.reduce((sum, d) => sum + Math.sin(d * RADIANS_PER_DEGREE), 0) / given.length;
  const north = given.reduce((sum, d) => sum + Math.cos(d * RADIANS_PER_DEGREE), 0) / given.length;
  if (Math.hypot(east, north) < NO_DIRECTION) return notKnown('the wind directions cancel');
  const degrees = Math.atan2(east, north) / RADIANS_PER_DEGREE;
  return exactly(((degrees % 360) + 360) % 360);
}
