import type { MeasuredQuantity } from './reading';

/** A lowest and a highest value, both still accepted. */
export interface Range {
  readonly lowest: number;
  readonly highest: number;
}

/** A change beyond `limit` within `hours`. */
export interface ChangeLimit {
  readonly hours: number;
  readonly limit: number;
  readonly source: string;
}

/** Limits between levels of one tower, temperature rising upward being positive. Source: [EPA454] table 8-4. */
export interface VerticalLimits {
  /** °C/m, by day and by night. */
  readonly risePerMetreByDayC: number;
  readonly fallPerMetreAtNightC: number;
  /** °C between two levels. */
  readonly riseC: number;
  readonly fallC: number;
}

/** Table 8-4 of EPA-454/R-99-005. Real winters break it: it gives *suspect* at most. */
export const DEFAULT_VERTICAL_LIMITS: VerticalLimits = {
  risePerMetreByDayC: 0.1,
  fallPerMetreAtNightC: 0.1,
  riseC: 5,
  fallC: 3,
};

/**
 * From this elevation of the sun on, degrees, air that warms upward is unusual. Table 8-4 says "by day"; but a night's
 * inversion outlasts sunrise until the net radiation of the ground turns, near 9° over grass and 20° over snow under a
 * clear sky (Holtslag and van Ulden 1983, from memory).
 */
export const DAY_FROM_SUN_DEG = 15;

/** Limits of one sensor; each may be set, null switches a check off. */
export interface SensorLimits {
  /** Outside: failed. */
  readonly physical: Range;
  /** Outside, though physical (local records): suspect. */
  readonly plausible: Range | null;
  /** Changes beyond these: suspect, unless a neighbour moves the same way. */
  readonly steps: readonly ChangeLimit[];
  /** Variation of no more than this: suspect, unless a neighbour is as steady. */
  readonly steadiness: readonly ChangeLimit[];
  /** Identical for so many hours while another level moves: failed. */
  readonly stuckHours: number | null;
  /** Another level *moves* when it varies by more than this over that time. */
  readonly movesBy: number;
  /** A single reading that differs by more than this from both its neighbours in time, the same way: failed. */
  readonly spike: number | null;
  /** Differs by more than this from the median of the declared neighbours: suspect. Off unless set. */
  readonly neighbourDifference: number | null;
  /** An unusual difference to the temperature level below: suspect, unless another pair of levels goes the same way. */
  readonly levelDifference: VerticalLimits | null;
}

const EPA = 'EPA-454/R-99-005, table 8-4';
const WMO = 'WMO time consistency, 1993';

const off = {
  plausible: null,
  steps: [],
  steadiness: [],
  stuckHours: null,
  movesBy: 0.5,
  spike: null,
  neighbourDifference: null,
  levelDifference: null,
} as const;

const changes = (source: string, ...pairs: readonly (readonly [number, number])[]): readonly ChangeLimit[] =>
  pairs.map(([hours, limit]) => ({ hours, limit, source }));

/**
 * Default limits of each kind of sensor, in its unit. Sources: ranges [Zahumensky2004] (from memory); changes and
 * steadiness [EPA454] table 8-4 and [WMO1993]; spikes, PM2.5 and the ends of humidity common practice.
 */
export const DEFAULT_LIMITS: Readonly<Record<MeasuredQuantity, SensorLimits>> = {
  'air temperature': {
    ...off,
    physical: { lowest: -80, highest: 60 },
    steps: [...changes(EPA, [1, 5]), ...changes(WMO, [2, 7], [3, 9], [6, 15], [12, 25])],
    steadiness: changes(EPA, [12, 0.5]),
    stuckHours: 3,
    spike: 5,
    levelDifference: DEFAULT_VERTICAL_LIMITS,
  },
  'dew point': {
    ...off,
    physical: { lowest: -80, highest: 35 },
    steps: [...changes(EPA, [1, 5]), ...changes(WMO, [2, 6], [3, 8], [6, 12], [12, 20])],
    steadiness: changes(EPA, [12, 0.5]),
    stuckHours: 3,
    spike: 5,
  },
  'wet bulb': {
    ...off,
    physical: { lowest: -80, highest: 40 },
    steps: changes(EPA, [1, 5]),
    stuckHours: 3,
    spike: 5,
  },
  'relative humidity': {
    ...off,
    physical: { lowest: -5, highest: 110 },
    plausible: { lowest: 0, highest: 105 },
    spike: 30,
  },
  'wind speed': {
    ...off,
    physical: { lowest: 0, highest: 75 },
    plausible: { lowest: 0, highest: 25 },
    steadiness: changes(EPA, [3, 0.1], [12, 0.5]),
  },
  'wind direction': {
    ...off,
    physical: { lowest: 0, highest: 360 },
    steadiness: changes(EPA, [3, 1], [18, 10]),
  },
  pressure: {
    ...off,
    physical: { lowest: 400, highest: 1100 },
    steps: [...changes(EPA, [3, 6]), ...changes(WMO, [1, 3], [6, 18], [12, 36])],
    spike: 5,
  },
  pm25: { ...off, physical: { lowest: -10, highest: 10000 }, plausible: { lowest: -10, highest: 1000 } },
};

/** A neighbour moves the same way when it makes at least this share of the change. Common practice. */
export const SAME_WAY_SHARE = 0.5;
/** Readings further apart than so many intervals are no neighbours in time. */
export const NEIGHBOUR_IN_TIME_INTERVALS = 2.5;
