import { DRY_ADIABATIC_LAPSE_RATE_K_PER_KM, moistLapseRateKPerKm } from '@lidwatch/atmosphere';

/** A point of a line in the column. */
export interface ColumnPoint {
  heightM: number;
  temperatureC: number;
}

/** Steps in which the moist line is followed upward: its slope hardly changes over a mast. */
const STEPS = 8;
/** Pressure falls by about this much per metre near the ground (hydrostatic, 0 °C, 900 hPa). */
const HPA_PER_M = 0.11;

/** The dry adiabat that starts at the ground with this temperature, up to a height. */
export function dryAdiabat(groundC: number, toM: number): ColumnPoint[] {
  const topC = groundC - (DRY_ADIABATIC_LAPSE_RATE_K_PER_KM * toM) / 1000;
  return [
    { heightM: 0, temperatureC: groundC },
    { heightM: toM, temperatureC: topC },
  ];
}

/** The moist adiabat that starts at the ground with this temperature and pressure, up to a height. */
export function moistAdiabat(groundC: number, pressureHPa: number, toM: number): ColumnPoint[] {
  const points: ColumnPoint[] = [{ heightM: 0, temperatureC: groundC }];
  const stepM = toM / STEPS;
  let temperatureC = groundC;
  for (let step = 1; step <= STEPS; step++) {
    const heightM = step * stepM;
    const lapseRateKPerKm = moistLapseRateKPerKm(temperatureC, pressureHPa - HPA_PER_M * (heightM - stepM));
    temperatureC -= (lapseRateKPerKm * stepM) / 1000;
    points.push({ heightM, temperatureC });
  }
  return points;
}
