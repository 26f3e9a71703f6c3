import { compare, exactly, notKnown, truthOf, type Quantity, type Truth } from '../bounds';
import { ZERO_CELSIUS_K } from '../constants';
import { probabilityBelow, SURE_FROM_PROBABILITY } from '../profile';
import { potentialTemperatureK, pressureAboveHPa, standardPressureHPa } from '../temperature';
import { sigmaOfDifference } from '../uncertainty';

/** A temperature sensor of one of two towers at different elevations. */
export interface TowerTemperature {
  /** Elevation of the ground, m above sea level. */
  readonly elevationM: number;
  /** Height of the sensor above ground, m: use sensors of the same height. */
  readonly heightM: number;
  readonly temperatureC: number | null;
  readonly sigmaC?: number | null;
  readonly pressureHPa?: number | null;
}

/** How much warmer the bench is than the valley floor: the witness for a lid above the mast. */
export interface FloorToBench {
  readonly riseM: number | null;
  /** T(bench) − T(floor), °C. */
  readonly differenceC: Quantity;
  readonly gradientCPer100M: Quantity;
  /** θ(bench) − θ(floor) per 100 m, K: about 0.98 K more than the temperature's. */
  readonly potentialCPer100M: Quantity;
  readonly sigmaC: number | null;
  /** Whether the bench is warmer, as an estimate, and whether that (either way) is sure. */
  readonly benchWarmer: Truth;
  readonly sure: Truth;
}

const nothing = (reason: string, riseM: number | null): FloorToBench => ({
  riseM,
  differenceC: notKnown(reason),
  gradientCPer100M: notKnown(reason),
  potentialCPer100M: notKnown(reason),
  sigmaC: null,
  benchWarmer: 'not known',
  sure: 'not known',
});

/** θ difference with the bench's pressure taken hydrostatically from the floor's, so that no barometer's error enters. */
const potentialDifferenceK = (
  floor: TowerTemperature,
  floorC: number,
  benchC: number,
  riseM: number,
): number => {
  const floorHPa = floor.pressureHPa ?? standardPressureHPa(floor.elevationM) ?? standardPressureHPa(0)!;
  const benchHPa = pressureAboveHPa(floorHPa, riseM, (floorC + benchC) / 2 + ZERO_CELSIUS_K);
  const theta = (temperatureC: number, hPa: number) =>
    potentialTemperatureK(temperatureC + ZERO_CELSIUS_K, hPa);
  return theta(benchC, benchHPa) - theta(floorC, floorHPa);
};

/**
 * Temperature and potential-temperature difference per 100 m between a low and a high tower.
 *
 * Units: m, °C, hPa in; °C and °C/100 m out. Valid: the bench's sensor higher above sea level than the floor's and
 * both temperatures known; else not known with the reason. Rises of up to about 1 km. The air between the towers is
 * not seen: the difference bounds the mean only. Source: [Whiteman2014] (slope stations as a pseudo-sounding);
 * [GUM] for σ.
 */
export function floorToBench(
  floor: TowerTemperature,
  bench: TowerTemperature,
  sureFromProbability: number = SURE_FROM_PROBABILITY,
): FloorToBench {
  const riseM = bench.elevationM + bench.heightM - (floor.elevationM + floor.heightM);
  if (!(riseM > 0)) return nothing('the bench tower does not stand higher than the floor tower', null);
  const [floorC, benchC] = [floor.temperatureC, bench.temperatureC];
  if (floorC === null || !Number.isFinite(floorC)) return nothing('the floor tower gave nothing', riseM);
  if (benchC === null || !Number.isFinite(benchC)) return nothing('the bench tower gave nothing', riseM);
  const difference = benchC - floorC;
  const sigmaC = sigmaOfDifference(floor.sigmaC, bench.sigmaC);
  const warmer = sigmaC === null ? null : 1 - probabilityBelow(difference, sigmaC, 0, true);
  return {
    riseM,
    differenceC: exactly(difference),
    gradientCPer100M: exactly((100 * difference) / riseM),
    potentialCPer100M: exactly((100 * potentialDifferenceK(floor, floorC, benchC, riseM)) / riseM),
    sigmaC,
    benchWarmer: compare(exactly(difference), '>', 0),
    sure: truthOf(
      warmer === null ? null : warmer >= sureFromProbability || warmer <= 1 - sureFromProbability,
    ),
  };
}
