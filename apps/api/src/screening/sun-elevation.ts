import { getPosition } from 'suncalc';

/** Elevation of the sun's centre above the horizon, degrees, without refraction. Source: the package suncalc. */
export function sunElevationDeg(t: number, latitude: number, longitude: number): number {
  return (getPosition(new Date(t * 1000), latitude, longitude).altitude * 180) / Math.PI;
}
