import { truncatedToTenth } from './truncate';

/** A category of the Air Quality Index for PM2.5 with its official colour. */
export interface AqiBand {
  readonly category: AqiCategory;
  readonly fromUgM3: number;
  readonly toUgM3: number;
  readonly fromIndex: number;
  readonly toIndex: number;
  /** Official colour: for the index only. It needs an outline and words: yellow on white has a contrast of 1.07. */
  readonly colour: string;
  /** Text on that colour that can be read. */
  readonly textColour: 'black' | 'white';
}

/** Official names of the categories. */
export type AqiCategory =
  'Good' | 'Moderate' | 'Unhealthy for Sensitive Groups' | 'Unhealthy' | 'Very Unhealthy' | 'Hazardous';

const band = (
  category: AqiCategory,
  [fromUgM3, toUgM3]: readonly [number, number],
  [fromIndex, toIndex]: readonly [number, number],
  colour: string,
  textColour: 'black' | 'white',
): AqiBand => ({ category, fromUgM3, toUgM3, fromIndex, toIndex, colour, textColour });

/** The 24-h PM2.5 breakpoints of 2024. Source: [40CFR58G] table 2 (89 FR 16202); colours [EPA454B24]. */
export const PM25_AQI_BANDS: readonly AqiBand[] = [
  band('Good', [0, 9], [0, 50], '#00E400', 'black'),
  band('Moderate', [9.1, 35.4], [51, 100], '#FFFF00', 'black'),
  band('Unhealthy for Sensitive Groups', [35.5, 55.4], [101, 150], '#FF7E00', 'black'),
  band('Unhealthy', [55.5, 125.4], [151, 200], '#FF0000', 'black'),
  band('Very Unhealthy', [125.5, 225.4], [201, 300], '#8F3F97', 'white'),
  band('Hazardous', [225.5, 325.4], [301, 500], '#7E0023', 'white'),
];

/** An index with its category; `index` is null beyond 500. */
export interface Aqi {
  readonly index: number | null;
  readonly category: AqiCategory;
  readonly colour: string;
  readonly textColour: 'black' | 'white';
  /** True above the highest breakpoint: said as "beyond the index", never capped in silence. */
  readonly beyondTheIndex: boolean;
  readonly truncatedUgM3: number;
}

/**
 * Air Quality Index of a PM2.5 concentration (24-h mean, or NowCast for the current hour): truncated to 0.1 µg/m³,
 * interpolated, rounded to the nearest integer.
 *
 * Units: µg/m³ in. Valid: 0 and above (a negative mean counts as 0); null for NaN or infinity.
 * Source: [40CFR58G] table 2 and equation 1 (breakpoints of 2024).
 */
export function pm25Aqi(concentrationUgM3: number): Aqi | null {
  if (!Number.isFinite(concentrationUgM3)) return null;
  const truncatedUgM3 = Math.max(0, truncatedToTenth(concentrationUgM3));
  const found = PM25_AQI_BANDS.find((b) => truncatedUgM3 <= b.toUgM3);
  const { category, colour, textColour, ...bounds } = found ?? PM25_AQI_BANDS.at(-1)!;
  const named = { category, colour, textColour, truncatedUgM3 };
  if (found === undefined) return { index: null, ...named, beyondTheIndex: true };
  const slope = (bounds.toIndex - bounds.fromIndex) / (bounds.toUgM3 - bounds.fromUgM3);
  const index = Math.round(slope * (truncatedUgM3 - bounds.fromUgM3) + bounds.fromIndex);
  return { index, ...named, beyondTheIndex: false };
}
