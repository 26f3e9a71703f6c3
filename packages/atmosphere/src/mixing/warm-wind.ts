import { and, compare, or, truthOf, type Quantity, type Truth } from '../bounds';

/** A sector of wind directions, degrees the wind comes from, clockwise from `fromDeg` to `toDeg`, ends included. */
export interface WindSector {
  readonly fromDeg: number;
  readonly toDeg: number;
}

/** Limits of the warm-wind criterion. */
export interface WarmWindSettings {
  readonly warmingCPerHour: number;
  readonly humidityFallPercentPerHour: number;
  readonly windMPerS: number;
}

/** Warming of 1 °C/h, humidity falling 5 %/h, wind above 5 m/s. Source: [Speirs2010], from memory. */
export const DEFAULT_WARM_WIND_SETTINGS: WarmWindSettings = {
  warmingCPerHour: 1,
  humidityFallPercentPerHour: 5,
  windMPerS: 5,
};

/** What was seen over the last hour at a tower. */
export interface WarmWindSigns {
  readonly warmingCPerHour: Quantity;
  /** Fall of relative humidity, positive when it dries, %/h. */
  readonly humidityFallPercentPerHour: Quantity;
  readonly windMPerS: Quantity;
  readonly windFromDeg: number | null;
  readonly sector: WindSector | null;
  /** Whether the upper level warmed before the lowest. */
  readonly upperWarmedFirst: Truth;
}

const turn = (degrees: number): number => ((degrees % 360) + 360) % 360;

/**
 * Whether a wind comes from within a sector.
 *
 * Units: degrees, where the wind comes from. Valid: any angles; the sector runs clockwise and may pass north; one
 * whose ends coincide (or are a full turn apart) holds only that direction (or all). NaN is never within.
 * Source: none (definition).
 */
export function isInSector(windFromDeg: number, sector: WindSector): boolean {
  if (sector.toDeg - sector.fromDeg >= 360) return Number.isFinite(windFromDeg);
  return turn(windFromDeg - sector.fromDeg) <= turn(sector.toDeg - sector.fromDeg);
}

/**
 * Whether a warm wind (foehn, chinook) is breaking up the cold air: the ground warms and dries quickly, and either the
 * wind blows strongly in the tower's declared sector or the upper level warmed first. Without a declared sector the
 * direction is not asked.
 *
 * Units: °C/h, %/h, m/s. Valid: any of the signs may be not known. Source: [Speirs2010] onset, from memory; defer to
 * a forecaster.
 */
export function warmWindBreakUp(
  signs: WarmWindSigns,
  settings: WarmWindSettings = DEFAULT_WARM_WIND_SETTINGS,
): Truth {
  const { windFromDeg, sector } = signs;
  const fromThere =
    sector === null ? 'true' : truthOf(windFromDeg === null ? null : isInSector(windFromDeg, sector));
  const strongWind = and(compare(signs.windMPerS, '>', settings.windMPerS), fromThere);
  return and(
    compare(signs.warmingCPerHour, '>=', settings.warmingCPerHour),
    compare(signs.humidityFallPercentPerHour, '>=', settings.humidityFallPercentPerHour),
    or(strongWind, signs.upperWarmedFirst),
  );
}
