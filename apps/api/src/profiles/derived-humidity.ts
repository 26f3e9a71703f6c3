import { humidityOf, isKnown, standardPressureHPa, type MeasuredHumidity } from '@lidwatch/atmosphere';

/** A measured dew point or wet bulb with the air temperature beside it, °C; σ as one standard deviation. */
export interface HumidityByTemperature {
  readonly kind: 'dew point' | 'wet bulb';
  readonly heightM: number;
  readonly valueC: number;
  readonly valueSigmaC: number;
  readonly airC: number;
  readonly airSigmaC: number;
}

const SEA_LEVEL_HPA = 1013.25;
/** Small enough that the curve is straight, large enough for the arithmetic, °C. */
const STEP_C = 0.01;

const measured = (kind: HumidityByTemperature['kind'], valueC: number): MeasuredHumidity =>
  kind === 'dew point' ? { kind, dewPointC: valueC } : { kind, wetBulbC: valueC };

/**
 * Relative humidity over water from a dew point (chilled mirror) or a wet bulb (psychrometer), with its standard
 * deviation by the slopes: [height m, %, σ %]. Undefined outside the formulas' range.
 *
 * Source: WMO-No. 8, annex 4.B, by `humidityOf`; error propagation to first order.
 */
export function derivedHumidity(
  { kind, heightM, valueC, valueSigmaC, airC, airSigmaC }: HumidityByTemperature,
  pressureHPa: number,
): readonly [number, number, number] | undefined {
  const percent = (air: number, value: number): number | undefined => {
    const { overWaterPercent } = humidityOf(air, measured(kind, value), pressureHPa);
    return isKnown(overWaterPercent) ? overWaterPercent.lo : undefined;
  };
  const here = percent(airC, valueC);
  const byValue = percent(airC, valueC - STEP_C);
  const byAir = percent(airC + STEP_C, valueC);
  if (here === undefined || byValue === undefined || byAir === undefined) return undefined;
  const sigma = Math.hypot(((here - byValue) / STEP_C) * valueSigmaC, ((byAir - here) / STEP_C) * airSigmaC);
  return [heightM, here, sigma];
}

/** The measured pressure, or the standard atmosphere's at the tower's elevation, hPa. */
export const pressureOr = (measuredHPa: number | null, elevationM: number): number =>
  measuredHPa ?? standardPressureHPa(elevationM) ?? SEA_LEVEL_HPA;
