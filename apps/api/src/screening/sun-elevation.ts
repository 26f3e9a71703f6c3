import { getPosition } from 'suncalc';

/**
 * Elevation of the sun's centre above the horizon, degrees, without refraction, at an instant (UTC epoch seconds) and a
 * place (degrees north and east). Valid: any instant of these centuries, to some hundredths of a degree. Source: the
 * package suncalc.
 */
export function sunElevationDeg(t: number, latitude: number, longitude: number): number {
  return (getPosition(new Date(t * 1000), latitude, longitude).altitude * 180) / Math.PI;
}
