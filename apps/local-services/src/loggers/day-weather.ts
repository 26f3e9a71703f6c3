import { localTime } from './basin-time';
import { between, chance, ramp } from './noise';
import type { Story, Weather } from './story';

/** What one day's weather means in numbers. */
export interface DayWeather {
  /** Warming from 2 m to 60 m that a whole night would reach, °C. */
  readonly strengthC: number;
  /** Wind at 10 m on the valley floor by night, m/s; by day a little more. */
  readonly windMPerS: number;
  /** Share of the sky under low cloud, 0 to 1: 1 is stratus, which keeps the mast mixed. */
  readonly cloud: number;
  /** How much warmer than the top of the mast the air above the lid stays by day and night, °C. */
  readonly lidC: number;
  /** How much this day is warmer than the season's normal, °C. */
  readonly warmerC: number;
  /** PM2.5 without anyone heating, and what a whole pool holds besides, µg/m³. */
  readonly smokeBase: number;
  readonly poolSmoke: number;
  /** How much the evening's fires show, 1 being an ordinary clear night. */
  readonly fires: number;
  /** Inversion that the tarn's relay shows by day and night, °C. */
  readonly tarnLidC: number;
  /** 1 on a day whose temperature the story tells outright, else 0, and that temperature, °C (0 on other days). */
  readonly told: number;
  readonly toldMeanC: number;
}

/** For each letter: [usual value, how far a day may lie from it] of each number. */
type Spread = readonly [middle: number, reach: number];
type Spreads = Readonly<Record<keyof DayWeather, Spread>>;

const CALM: Spreads = {
  strengthC: [4.95, 1.5],
  windMPerS: [0.8, 0.2],
  cloud: [0.03, 0.03],
  lidC: [0, 0],
  warmerC: [-1.5, 1],
  smokeBase: [4.6, 0.8],
  poolSmoke: [0, 0],
  fires: [0.75, 0.15],
  tarnLidC: [0, 0],
  told: [0, 0],
  toldMeanC: [0, 0],
};

const STRATUS: Spreads = {
  ...CALM,
  strengthC: [0, 0],
  windMPerS: [0.8, 0.2],
  cloud: [1, 0],
  lidC: [7, 0.7],
  warmerC: [-3, 0.4],
  smokeBase: [0, 0],
  fires: [0.16, 0.03],
};

const SPREADS: Readonly<Record<Weather, Spreads>> = {
  W: {
    ...CALM,
    strengthC: [0.2, 0.2],
    windMPerS: [6.3, 1.2],
    cloud: [0.6, 0.2],
    warmerC: [2, 1],
    smokeBase: [3.5, 0.7],
    fires: [0.03, 0.02],
  },
  K: {
    ...CALM,
    strengthC: [0.7, 0.4],
    windMPerS: [3, 0.5],
    cloud: [0.85, 0.1],
    warmerC: [1, 0.8],
    smokeBase: [4.5, 1],
    fires: [0.12, 0.05],
  },
  P: {
    ...CALM,
    strengthC: [2, 0.6],
    windMPerS: [1.8, 0.3],
    cloud: [0.35, 0.1],
    warmerC: [0, 0.8],
    fires: [0.22, 0.08],
  },
  C: CALM,
  X: { ...CALM, strengthC: [9.2, 0.3], windMPerS: [0.55, 0.1], warmerC: [-5, 0.5], fires: [1.3, 0.05] },
  1: { ...CALM, lidC: [1.5, 0.3], poolSmoke: [7, 1], fires: [0.42, 0.05], smokeBase: [0, 0] },
  2: {
    ...CALM,
    strengthC: [4.4, 0.8],
    lidC: [4, 0.5],
    poolSmoke: [15, 1],
    fires: [0.42, 0.05],
    smokeBase: [0, 0],
  },
  3: { ...STRATUS, lidC: [6.3, 0.5], poolSmoke: [28.5, 1.5] },
  4: { ...STRATUS, poolSmoke: [35.5, 1.5] },
  5: { ...STRATUS, poolSmoke: [41, 1.5] },
  6: { ...STRATUS, poolSmoke: [44, 1.5] },
  H: { ...STRATUS, lidC: [8, 0.4], poolSmoke: [45, 1.5], tarnLidC: [4.5, 0.5] },
  E: {
    ...CALM,
    strengthC: [0.2, 0.2],
    windMPerS: [7.5, 1],
    cloud: [0.4, 0.1],
    warmerC: [5, 0.7],
    smokeBase: [4, 0.5],
    fires: [0.04, 0.02],
  },
};

const known = new WeakMap<Story, Map<number, DayWeather>>();

/**
 * The numbers of the weather that begins at nine in the morning of a local day.
 *
 * Units: in the names. Valid: any day; the same story and day always give the same. Source: the demo's own story.
 */
export function dayWeather(story: Story, day: number): DayWeather {
  const days = known.get(story) ?? new Map<number, DayWeather>();
  known.set(story, days);
  const before = days.get(day);
  if (before) return before;
  const spreads = Object.entries(SPREADS[story.weather(day)]) as [keyof DayWeather, Spread][];
  const drawn = Object.fromEntries(
    spreads.map(([name, [middle, reach]], i) => [
      name,
      middle + reach * (2 * chance(story.seed, 10 + i, day) - 1),
    ]),
  ) as unknown as DayWeather;
  const season = story.season(day);
  const night = story.isAroundTheStart(day)
    ? undefined
    : season?.winter.nights.find((n) => n.day === season.day);
  const weather = night ? { ...drawn, strengthC: night.strengthC, told: 1, toldMeanC: night.meanC } : drawn;
  days.set(day, weather);
  return weather;
}

/** Hour at which one day's weather gives way to the next, and how long that takes, hours. */
const CHANGE_AT_HOUR = 9;
const CHANGE_TAKES_HOURS = 2;

/**
 * The number of a given kind at an instant, passing smoothly from day to day around nine in the morning.
 *
 * Units: the number's. Valid: takesHours up to 18. Source: none.
 */
export function weatherNow(
  story: Story,
  t: number,
  name: keyof DayWeather,
  takesHours = CHANGE_TAKES_HOURS,
): number {
  const { day, hour } = localTime(t);
  const share = ramp(hour, CHANGE_AT_HOUR - takesHours / 2, CHANGE_AT_HOUR + takesHours / 2);
  return between(dayWeather(story, day - 1)[name], dayWeather(story, day)[name], share);
}
