import type { Truth } from '../bounds';
import { truthOf } from '../bounds';

/** Irradiance of the sun at the top of the atmosphere, W/m². Source: [Kopp2011]. */
export const SOLAR_CONSTANT_W_PER_M2 = 1361;
/** Below this noon elevation, degrees, the sun does not break up an inversion over snow. Common practice; a setting. */
export const SUN_MATTERS_FROM_ELEVATION_DEG = 4;

/**
 * Most that the sun can give a horizontal surface at an elevation, without an atmosphere.
 *
 * Units: degrees in; W/m² out. Valid: −90 to 90°; 0 below the horizon. Source: [Kopp2011] times the sine of elevation.
 */
export const extraterrestrialFluxWPerM2 = (sunElevationDeg: number): number =>
  Math.max(0, SOLAR_CONSTANT_W_PER_M2 * Math.sin((sunElevationDeg * Math.PI) / 180));

/**
 * Whether the sun can matter for break-up that day, by its highest elevation.
 *
 * Units: degrees. Valid: the elevation at noon, from an almanac or a library; null gives not known.
 * Source: common practice at high latitudes; the bound is a setting.
 */
export const sunCanMatter = (
  noonElevationDeg: number | null,
  fromElevationDeg: number = SUN_MATTERS_FROM_ELEVATION_DEG,
): Truth => truthOf(noonElevationDeg === null ? null : noonElevationDeg >= fromElevationDeg);
