import {
  breakUpTemperatureC,
  findInversions,
  heatDeficitJPerM2,
  layersOf,
  makeProfile,
  notKnown,
  stableDepth,
  type InversionFinding,
  type Layer,
  type Level,
  type MatchedPair,
  type Profile,
  type Quantity,
} from '@lidwatch/atmosphere';
import { qualityName } from '@lidwatch/contracts';
import { versionAt, type TowerLayout } from '../towers/tower-layout';
import type { BlockFacts, StoredLevel } from './block-facts';

/** All that follows from one block of a tower. */
export interface Findings {
  readonly profile: Profile;
  /** Whether every level gave what can be a temperature of air: else nothing but the plain differences is said. */
  readonly isAir: boolean;
  readonly inversions: InversionFinding;
  readonly stableDepthM: Quantity;
  readonly heatDeficitJPerM2: Quantity;
  readonly breakUpTemperatureC: Quantity;
}

const levelOf = ([heightM, temperatureC, sigmaC, n, quality]: StoredLevel): Level => ({
  heightM,
  temperatureC,
  sigmaC,
  n,
  quality: qualityName(quality),
});

const NO_PAIRS: MatchedPair[] = [];

/** Each two sensors that have a standard deviation as a matched pair; the larger of the two holds for them. */
function matchedPairs(tower: TowerLayout, tEnd: number): MatchedPair[] {
  if (!tower.sensors.some(({ versions }) => versions.some(({ pairSigma }) => pairSigma !== null)))
    return NO_PAIRS;
  const matched = tower.sensors
    .filter(({ quantity }) => quantity === 'air temperature')
    .flatMap((sensor) => versionAt(sensor, tEnd) ?? [])
    .flatMap(({ heightM, pairSigma }) => (pairSigma === null ? [] : [{ heightM, pairSigma }]))
    .sort((a, b) => a.heightM - b.heightM);
  return matched.flatMap((lower, i) =>
    matched.slice(i + 1).map((upper) => ({
      lowerM: lower.heightM,
      upperM: upper.heightM,
      sigmaC: Math.max(lower.pairSigma, upper.pairSigma),
    })),
  );
}

/** The layers of a profile with all that is derived from each. */
export const layersIn = ({ profile, isAir }: Findings): readonly Layer[] => (isAir ? layersOf(profile) : []);

/**
 * A tower whose screening only reports shows what its sensors said, even where that is no temperature of air:
 * lapse rates and inversions are then plain arithmetic, and nothing else can be said.
 */
function withImpossibleLevels(profile: Profile, levels: readonly StoredLevel[]): Profile | undefined {
  const put = profile.levels.map((level) => {
    const said = levels.find(([heightM, temperatureC]) => heightM === level.heightM && temperatureC !== null);
    if (level.temperatureC !== null || !said) return level;
    return { heightM: level.heightM, temperatureC: said[1], sigmaC: said[2], suspect: true };
  });
  return put.some((level, i) => level !== profile.levels[i]) ? { ...profile, levels: put } : undefined;
}

/** Works out all that follows from one block of a tower, by the tower's settings. */
export function findingsOf(facts: BlockFacts, tower: TowerLayout): Findings {
  const { inversionForm: form, embedDepthM } = tower;
  const profile = makeProfile(facts.levels.map(levelOf), {
    pressureHPa: facts.pressureHpa,
    elevationM: tower.elevationM,
    matchedPairs: matchedPairs(tower, facts.tEnd),
    humidity: (facts.other.humidity ?? []).map(([heightM, relativeHumidityPercent, sigmaPercent]) => ({
      ...{ heightM, relativeHumidityPercent, sigmaPercent },
    })),
  });
  const impossible = tower.reportOnly ? withImpossibleLevels(profile, facts.levels) : undefined;
  const inversions = findInversions(impossible ?? profile, { form, embedDepthM });
  if (impossible) return nothingElse(impossible, inversions);
  return {
    profile,
    isAir: true,
    inversions,
    stableDepthM: stableDepth(profile).moistM,
    heatDeficitJPerM2: heatDeficitJPerM2(profile, undefined, inversions),
    breakUpTemperatureC: breakUpTemperatureC(inversions.surface),
  };
}

const nothingElse = (profile: Profile, inversions: InversionFinding): Findings => {
  const unknown = notKnown('a level gave what is no temperature of air');
  return {
    ...{ profile, inversions, isAir: false },
    ...{ stableDepthM: unknown, heatDeficitJPerM2: unknown, breakUpTemperatureC: unknown },
  };
};
