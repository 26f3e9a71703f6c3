import { basinAir, type BasinAir } from './basin-air';
import { localTime } from './basin-time';
import { ramp, smoothNoise } from './noise';
import type { Story } from './story';
import { warmWindShare } from './warm-wind';

/** Where a tower stands in the basin, as far as its air depends on it. */
export interface Site {
  /** Highest temperature level, m: the shapes below hang from it. */
  readonly topM: number;
  /** Metres above the valley floor. */
  readonly aboveFloorM: number;
  /** Share of the basin's night inversion that this tower sees. */
  readonly inversionShare: number;
  /** Share of the warmth above the lid that reaches this tower. */
  readonly lidShare: number;
  /** Wind compared with the valley floor. */
  readonly windFactor: number;
  /** Height scale of its inversion compared with the valley floor's. */
  readonly scaleFactor: number;
  /** Whether a filled-up pool shows here as an inversion by day and night. */
  readonly feelsFullPool: boolean;
}

/** The three masts by their slugs. */
export const SITES: Readonly<Record<string, Site>> = {
  'mill-mast': {
    topM: 60,
    aboveFloorM: 0,
    inversionShare: 1,
    lidShare: 0,
    windFactor: 1,
    scaleFactor: 1,
    feelsFullPool: false,
  },
  'bench-mast': {
    topM: 40,
    aboveFloorM: 140,
    inversionShare: 0.5,
    lidShare: 0.72,
    windFactor: 1.2,
    scaleFactor: 0.7,
    feelsFullPool: false,
  },
  'tarn-relay': {
    topM: 100,
    aboveFloorM: 330,
    inversionShare: 0.22,
    lidShare: 1,
    windFactor: 1.7,
    scaleFactor: 1.1,
    feelsFullPool: true,
  },
};

/** Dry-adiabatic cooling, °C/m, and the cooling of the free air where no lid warms it. */
const DRY_C_PER_M = 0.0098;
const FREE_AIR_C_PER_M = 0.0065;

/** Cooling with height that a well mixed mast shows above its lowest ten metres, °C/m. */
const MIXED_C_PER_M = 0.0093;

/** Share of an inversion's warming that is reached at a height, 0 at 2 m to 1 at the top. */
function risen(heightM: number, topM: number, scaleM: number): number {
  return (1 - Math.exp(-(heightM - 2) / scaleM)) / (1 - Math.exp(-(topM - 2) / scaleM));
}

/** The larger of two, rounded off over some tenths of a degree. */
function softMax(a: number, b: number): number {
  return (a + b + Math.hypot(a - b, 0.15)) / 2;
}

/** Difference from the top of the tower at a height, °C. */
function shapeC(site: Site, air: BasinAir, heightM: number): number {
  const belowTopM = site.topM - heightM;
  const strengthC = site.inversionShare * air.strengthC + (site.feelsFullPool ? air.tarnLidC : 0);
  const share = risen(heightM, site.topM, air.scaleM * site.scaleFactor);
  const mixedC = MIXED_C_PER_M * Math.min(belowTopM, site.topM - 10) * air.mixed;
  const nightC = mixedC - strengthC * (1 - share);
  const groundC = 0.2 * air.sun * Math.exp(-(heightM - 2) / 4);
  const lidC = site.feelsFullPool ? air.tarnLidC * (1 - share) : 0;
  const dayC =
    DRY_C_PER_M * belowTopM * (1 - 0.3 * air.cloud) + groundC - site.inversionShare * air.deficitC - lidC;
  return nightC + air.day * (softMax(nightC, dayC) - nightC);
}

/** Temperature at the top level of a tower, °C. */
function siteTopC(site: Site, air: BasinAir): number {
  const aboveMastM = site.aboveFloorM + site.topM - 60;
  if (aboveMastM <= 0) return air.topC;
  const underLid = Math.min(1, air.lidC / 3);
  return air.topC + site.lidShare * air.lidC - FREE_AIR_C_PER_M * aboveMastM * (1 - underLid);
}

/**
 * True air temperature at a level of a tower, before the sensor's own error.
 *
 * Units: °C; UTC epoch s, m. Valid: heights from 2 m to the site's top. Source: the demo's own model.
 */
export function towerTemperatureC(story: Story, site: Site, t: number, heightM: number): number {
  const air = basinAir(story, t);
  const behind = warmWindShare(story, t, 60) - warmWindShare(story, t, heightM);
  const restless =
    0.09 * smoothNoise(story.seed, 100 + site.aboveFloorM + heightM, t, 1500) +
    0.05 * smoothNoise(story.seed, 600 + site.aboveFloorM + heightM, t, 420);
  return (
    siteTopC(site, air) +
    shapeC(site, air, heightM) -
    5 * Math.max(0, behind) +
    restless * (0.6 + 0.08 * air.strengthC)
  );
}

/** Wind at a tower, m/s. */
export function towerWindMPerS(story: Story, site: Site, t: number): number {
  return Math.max(
    0.1,
    basinAir(story, t).windMPerS * site.windFactor +
      0.15 * smoothNoise(story.seed, 900 + site.aboveFloorM, t, 900),
  );
}

/**
 * Relative humidity at 2 m on the valley floor, %: near saturation in a cold pool's stratus, 45 in a warm wind.
 *
 * Units: %. Valid: any instant. Source: the demo's own story.
 */
export function floorHumidityPct(story: Story, t: number): number {
  const air = basinAir(story, t);
  const warm = warmWindShare(story, t, 2) * (1 - ramp(localTime(t).hour, 16, 24));
  const calm = 66 + 18 * (1 - air.day) + 3 * Math.min(3, air.strengthC) - 10 * air.sun;
  const pct =
    Math.max(calm, 92 * ramp(air.cloud, 0.7, 1)) * (1 - 0.12 * air.mixed * (1 - ramp(air.cloud, 0.8, 1)));
  return Math.min(99.5, pct + (45 - pct) * warm + 1.5 * smoothNoise(story.seed, 950, t, 2700));
}

/** Station pressure at the valley floor, hPa: the standard atmosphere's 882 at 1,150 m, and the passing weather. */
export function floorPressureHpa(story: Story, t: number): number {
  return (
    882.5 + 7 * smoothNoise(story.seed, 960, t, 5 * 86_400) + 0.8 * smoothNoise(story.seed, 961, t, 40_000)
  );
}
