import type { Quality } from '../profile';

/** What a sensor measures. */
export type MeasuredQuantity =
  | 'air temperature'
  | 'relative humidity'
  | 'dew point'
  | 'wet bulb'
  | 'wind speed'
  | 'wind direction'
  | 'pressure'
  | 'pm25';

/** A reading before screening. */
export interface RawReading {
  /** UTC epoch seconds of the END of the reading's interval. */
  readonly tEnd: number;
  /** In °C, % over water, m/s, degrees, hPa or µg/m³, after the dated corrections; null where missing. */
  readonly value: number | null;
}

/** The checks, in the order in which they are made and said. */
export const CHECKS = [
  'clock',
  'range',
  'spike',
  'step',
  'stuck',
  'persistence',
  'internal',
  'vertical',
  'neighbours',
] as const;
/** The name of a check. */
export type Check = (typeof CHECKS)[number];

/** What a check says of one reading. */
export interface Flag {
  readonly check: Check;
  readonly verdict: 'suspect' | 'failed';
  /** Plain words, with the limit and where it comes from. */
  readonly reason: string;
  /** Why it does not count: a neighbour moved the same way. Kept, so that the reader sees it was looked at. */
  readonly withdrawn?: string;
}

/** A person's word over a span of a sensor, both ends included; it wins over every check. */
export interface Override {
  readonly sensorId: string;
  readonly from: number;
  readonly to: number;
  readonly quality: 'valid' | 'failed';
  readonly reason: string;
  /** When it was made, UTC epoch seconds: the newest of several holds. */
  readonly at: number;
}

/** A reading after screening. */
export interface ScreenedReading extends RawReading {
  readonly quality: Quality;
  readonly flags: readonly Flag[];
  /** The person's word that decided, if one did. */
  readonly override: Override | null;
}
