import { localTime, sunHours } from './basin-time';
import { dayWeather } from './day-weather';
import { chance, smoothNoise } from './noise';
import type { Story } from './story';

/** Hours in which a clear night builds about two thirds of its inversion. */
const BUILDING_HOURS = 4.5;

/** Hours before sunset at which the ground begins to cool the air. */
const BEGINS_BEFORE_SUNSET_HOURS = 0.6;

/** A stretch in which at most one surge falls, s. */
const SURGE_SPAN_S = 5400;

/** What the night has built so far, wind and cloud left aside. */
export interface NightInversion {
  /** Warming from 2 m to 60 m without and with its surges, °C. */
  readonly builtC: number;
  readonly unsteadyC: number;
  /** Hours since the ground began to cool the air; negative in the afternoon before. */
  readonly hours: number;
  /** How far the morning sun has mixed it away, 0 to 1. */
  readonly mixedAway: number;
}

/** Local day on whose evening the night of an instant began; from noon on that is today. */
export function nightOf(t: number): number {
  const { day, hour } = localTime(t);
  return hour < 12 ? day - 1 : day;
}

/** Surges of the drainage wind: now and then up to half of the inversion is gone for ten to forty minutes. */
function surge({ seed }: Story, t: number): number {
  const span = Math.floor(t / SURGE_SPAN_S);
  if (chance(seed, 40, span) > 0.4) return 1;
  const lengthS = 600 + 1800 * chance(seed, 41, span);
  const begin = span * SURGE_SPAN_S + chance(seed, 42, span) * (SURGE_SPAN_S - lengthS);
  const into = (t - begin) / lengthS;
  if (into <= 0 || into >= 1) return 1;
  return 1 - (0.15 + 0.3 * chance(seed, 43, span)) * Math.sin(Math.PI * into);
}

/**
 * The inversion a night has built from the ground, and how far the morning has taken it away from below.
 *
 * Units: UTC epoch s in; in the names. Valid: any instant. Source: the demo's own table of a clear January night.
 */
export function nightInversion(story: Story, t: number): NightInversion {
  const { day, hour } = localTime(t);
  const evening = nightOf(t);
  const { strengthC } = dayWeather(story, evening);
  const onset = sunHours(evening).sunset - BEGINS_BEFORE_SUNSET_HOURS;
  const hours = hour + (day - evening) * 24 - onset;
  const builtC = hours > 0 ? strengthC * (1 - Math.exp(-hours / BUILDING_HOURS)) : 0;
  const unsteady = 0.07 * smoothNoise(story.seed, 60, t, 2400) + 0.05 * smoothNoise(story.seed, 61, t, 1080);
  const from = sunHours(day).sunrise + 0.2;
  const to = from + 2.1 + 0.08 * strengthC;
  const morning = Math.min(1, Math.max(0, (hour - from) / (to - from)));
  return {
    builtC,
    unsteadyC: builtC * (1 + unsteady) * surge(story, t),
    hours,
    mixedAway: hour < 12 ? morning ** 1.35 : 1,
  };
}
