import { SURE_FROM_PROBABILITY } from '../profile';

/** *plain*: every decrease counts, as in published statistics; *sensor-aware*: a decrease the sensors cannot tell does not. */
export type InversionForm = 'plain' | 'sensor-aware';

/** What may be set about finding inversions. */
export interface InversionSettings {
  readonly form: InversionForm;
  /** A decrease thinner than this is passed over: 0 m for towers, 100 m for soundings ([Kahl1990]). */
  readonly embedDepthM: number;
  /** A decrease smaller than this many σ of its difference is passed over in the sensor-aware form. */
  readonly passOverSigmas: number;
  /** From which probability a finding is called sure. */
  readonly sureFromProbability: number;
  /** An elevated inversion counts as a lid from this strength, °C. Common practice 0.3 to 0.5. */
  readonly lidMinimumC: number;
}

/** Sensor-aware, embed depth 0 m, 1.645 σ, sure from 0.95, a lid from 0.3 °C. */
export const DEFAULT_INVERSION_SETTINGS: InversionSettings = {
  form: 'sensor-aware',
  embedDepthM: 0,
  passOverSigmas: 1.645,
  sureFromProbability: SURE_FROM_PROBABILITY,
  lidMinimumC: 0.3,
};

/** Embed depth for soundings, m. Source: [Kahl1990]. */
export const SOUNDING_EMBED_DEPTH_M = 100;
