import { atLeast, exactly, notKnown, type Quantity } from '../bounds';
import {
  DRY_AIR_GAS_CONSTANT_J_PER_KG_K,
  DRY_AIR_SPECIFIC_HEAT_J_PER_KG_K,
  ZERO_CELSIUS_K,
} from '../constants';
import { findInversions, runsOf, type InversionFinding } from '../inversions';
import { isMeasured, type MeasuredLevel, type Profile } from '../profile';
import { exner, pressureAboveHPa } from '../temperature';

/** Air at one point of the column: density and potential temperature. */
interface Point {
  readonly heightM: number;
  readonly temperatureK: number;
  readonly pressureHPa: number;
}

const densityKgPerM3 = (point: Point): number =>
  (100 * point.pressureHPa) / (DRY_AIR_GAS_CONSTANT_J_PER_KG_K * point.temperatureK);
const thetaK = (point: Point): number => point.temperatureK / exner(point.pressureHPa);

const carriedUp = (from: Point, heightM: number, temperatureK: number): Point => ({
  heightM,
  temperatureK,
  pressureHPa: pressureAboveHPa(
    from.pressureHPa,
    heightM - from.heightM,
    (from.temperatureK + temperatureK) / 2,
  ),
});

/** The levels up to height h, the last one interpolated to h where it lies between two. */
const upTo = (
  levels: readonly MeasuredLevel[],
  toHeightM: number,
): { heightM: number; temperatureC: number }[] => {
  const below = levels.filter((level) => level.heightM <= toHeightM);
  const next = levels[below.length];
  const last = below.at(-1);
  if (last === undefined || next === undefined || last.heightM === toHeightM) return [...below];
  const share = (toHeightM - last.heightM) / (next.heightM - last.heightM);
  const temperatureC = last.temperatureC + share * (next.temperatureC - last.temperatureC);
  return [...below, { heightM: toHeightM, temperatureC }];
};

/** Levels and the middles between them, with the pressure carried up hydrostatically: points for Simpson's rule. */
const columnOf = (
  levels: readonly { heightM: number; temperatureC: number }[],
  pressureHPa: number,
): Point[] => {
  const first = levels[0]!;
  let point: Point = {
    heightM: first.heightM,
    temperatureK: first.temperatureC + ZERO_CELSIUS_K,
    pressureHPa,
  };
  const points = [point];
  for (const level of levels.slice(1)) {
    const topK = level.temperatureC + ZERO_CELSIUS_K;
    const middle = carriedUp(point, (point.heightM + level.heightM) / 2, (point.temperatureK + topK) / 2);
    point = carriedUp(middle, level.heightM, topK);
    points.push(middle, point);
  }
  return points;
};

const integralJPerM2 = (points: readonly Point[]): number => {
  const thetaTop = thetaK(points.at(-1)!);
  const lacking = points.map((point) => densityKgPerM3(point) * (thetaTop - thetaK(point)));
  let sum = 0;
  for (let i = 0; i + 2 < points.length; i += 2) {
    const depthM = points[i + 2]!.heightM - points[i]!.heightM;
    sum += (depthM / 6) * (lacking[i]! + 4 * lacking[i + 1]! + lacking[i + 2]!);
  }
  return DRY_AIR_SPECIFIC_HEAT_J_PER_KG_K * sum;
};

/**
 * Heat deficit H = cp ∫ ρ (θ(h) − θ(z)) dz from the lowest level to a fixed height h: the heat, per area, that would
 * bring the column below h to the potential temperature of its top. Negatives are not clipped: an unstable column
 * has a heat surplus.
 *
 * The temperature is linear between levels; each layer is integrated by Simpson's rule (trapezoids of its two halves,
 * refined), within 1e-5 of the exact integral. A mast's H is not comparable with that of a whole valley.
 *
 * Units: m, °C, hPa in; J/m² out. Valid: two or more levels from the lowest up to h; not known without the lowest.
 * "At least" when the surface inversion of `finding` reaches h open, when h lies above the tower, or when a level is
 * missing below h: this takes the air above to be no less than neutral. Source: [Whiteman2014] heat deficit.
 */
export function heatDeficitJPerM2(
  profile: Profile,
  toHeightM?: number,
  finding: InversionFinding = findInversions(profile),
): Quantity {
  const lowest = profile.levels[0];
  if (lowest === undefined) return notKnown('the tower gave no temperature level');
  if (!isMeasured(lowest)) return notKnown(`the lowest level, at ${lowest.heightM} m, gave nothing`);
  const run = runsOf(profile)[0]!;
  const h = toHeightM ?? profile.levels.at(-1)!.heightM;
  const levels = upTo(run.levels, h);
  if (levels.length < 2) return notKnown(`two levels are needed from ${lowest.heightM} m up to ${h} m`);
  const heat = integralJPerM2(columnOf(levels, profile.pressureHPa));
  const reached = levels.at(-1)!.heightM;
  if (reached < h) return atLeast(heat, `the temperature is known up to ${reached} m, not to ${h} m`);
  const inversion = finding.surface.inversion;
  const open = inversion !== null && inversion.open !== 'no' && inversion.topM <= h;
  return open ? atLeast(heat, 'the surface inversion reaches the highest level') : exactly(heat);
}
