import { calendar, localTime, sunHours } from './basin-time';
import { weatherNow } from './day-weather';
import { nightInversion, type NightInversion } from './night-inversion';
import { between, ramp, smoothNoise } from './noise';
import type { Story } from './story';
import { warmWindShare } from './warm-wind';

/** The air of the basin at one instant: what every tower's levels are worked out from. */
export interface BasinAir {
  /** Temperature at 60 m on the valley floor, °C. */
  readonly topC: number;
  /** Warming from 2 m to 60 m that the night has built, °C. */
  readonly strengthC: number;
  /** Height scale of that warming, m: small in the evening, larger towards morning. */
  readonly scaleM: number;
  /** How much too cold the mixed air below still is to reach the top of the mast, °C; 0 once it has. */
  readonly deficitC: number;
  /** Share of the daytime shape, 0 by night to 1 by day. */
  readonly day: number;
  /** Strength of the sun's heating, 0 to 1. */
  readonly sun: number;
  /** How well the wind or the cloud keeps the mast mixed, 0 to 1. */
  readonly mixed: number;
  /** How much warmer the air above the lid is than the top of the mast, °C. */
  readonly lidC: number;
  /** Inversion that the tarn's relay shows because the pool reaches up to it, °C. */
  readonly tarnLidC: number;
  /** Wind at 10 m on the valley floor, m/s. */
  readonly windMPerS: number;
  readonly cloud: number;
}

/** Swing of the temperature at 60 m from night to afternoon on a clear day, °C. */
const SWING_C = 3.5;

/** Wind at which the warm wind blows through the valley, m/s, and what it brings besides the day's own warmth, °C. */
const WARM_WIND_M_PER_S = 9;
const WARM_WIND_C = 5;

/** Temperature of the season at 60 m, °C: coldest in mid-January. */
function seasonC(day: number): number {
  return 8.4 - 11.9 * Math.cos(((2 * Math.PI) / 365) * (calendar(day).dayOfYear - 15));
}

/** Course of the temperature at 60 m over the day: 0 at its lowest (7 h), 1 at its highest (15:30). */
function courseOfDay(hour: number): number {
  if (hour >= 7 && hour < 15.5) return ((hour - 7) / 8.5) ** 1.8;
  const since = (hour < 7 ? hour + 24 : hour) - 15.5;
  return (1 - since / 15.5) ** 1.6;
}

function sunShare(t: number, cloud: number): number {
  const { day, hour } = localTime(t);
  const { sunrise, sunset } = sunHours(day);
  const u = Math.min(1, Math.max(0, (hour - sunrise) / (sunset - sunrise)));
  return Math.sin(Math.PI * u) * (1 - 0.8 * cloud);
}

function windMPerS(story: Story, t: number, sun: number): number {
  const steady = weatherNow(story, t, 'windMPerS') + 0.7 * sun;
  const gusts = 0.16 * smoothNoise(story.seed, 50, t, 1500) + 0.12 * smoothNoise(story.seed, 51, t, 5400);
  const blowing = warmWindShare(story, t, 10) * (1 - ramp(localTime(t).hour, 15, 21));
  return Math.max(0.1, between(steady, WARM_WIND_M_PER_S, blowing) * (1 + gusts));
}

function topC(story: Story, t: number, windMixes: number, cloud: number): number {
  const { day, hour } = localTime(t);
  const normalC =
    seasonC(day) + 2.2 * smoothNoise(story.seed, 70, t, 4.3 * 86_400) + weatherNow(story, t, 'warmerC', 14);
  const meanC = normalC * (1 - weatherNow(story, t, 'told', 14)) + weatherNow(story, t, 'toldMeanC', 14);
  const swingC = SWING_C * between(1, 0.25, ramp(cloud, 0.3, 1)) * between(1, 0.6, windMixes);
  const warmedC = WARM_WIND_C * warmWindShare(story, t, 60) * (1 - ramp(hour, 14, 23));
  return meanC + swingC * (courseOfDay(hour) - 0.5) + warmedC;
}

function dayShare(t: number, night: NightInversion): number {
  const { hour } = localTime(t);
  return hour < 12 ? ramp(night.mixedAway, 0, 0.05) : 1 - ramp(night.hours, -1, 0);
}

/**
 * The basin's air at an instant, from the story alone.
 *
 * Units: UTC epoch s in; in the names. Valid: any instant. Source: shape of a night from the demo's own table: the
 * evening builds from the ground, the morning sun mixes it away from below, wind and low cloud keep it from forming.
 */
export function basinAir(story: Story, t: number): BasinAir {
  const last = lastAsked.get(story);
  if (last?.t === t) return last.air;
  const air = workedOut(story, t);
  lastAsked.set(story, { t, air });
  return air;
}

/** The levels of the towers all ask for the same instant, one after the other. */
const lastAsked = new WeakMap<Story, { t: number; air: BasinAir }>();

function workedOut(story: Story, t: number): BasinAir {
  const cloud = weatherNow(story, t, 'cloud');
  const sun = sunShare(t, cloud);
  const wind = windMPerS(story, t, sun);
  const night = nightInversion(story, t);
  const windMixes = ramp(wind, 2.4, 4.5);
  const lasting = (1 - windMixes) * (1 - ramp(cloud, 0.7, 1));
  const strengthC = night.unsteadyC * lasting;
  const nightLidC = 0.55 * night.builtC * lasting * (localTime(t).hour < 12 ? 1 - night.mixedAway : 1);
  const stayed = 1 - warmWindShare(story, t, 60);
  return {
    topC: topC(story, t, windMixes, cloud),
    strengthC,
    scaleM: between(9, 23, Math.min(1, Math.max(0, night.hours) / 9)),
    deficitC: (strengthC + 0.6) * (1 - night.mixedAway),
    day: dayShare(t, night),
    sun,
    mixed: Math.max(windMixes, 0.85 * ramp(cloud, 0.5, 1)),
    lidC: (weatherNow(story, t, 'lidC') + nightLidC) * stayed,
    tarnLidC: weatherNow(story, t, 'tarnLidC') * stayed,
    windMPerS: wind,
    cloud,
  };
}
