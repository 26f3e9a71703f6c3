import { mjPerM2FromJPerM2, type Inversion, type Layer, type Profile } from '@lidwatch/atmosphere';
import { qualityName } from '@lidwatch/contracts';
import { toIso } from '../common/instants';
import type { TowerLayout } from '../towers/tower-layout';
import type { BlockFacts, StoredLevel } from './block-facts';
import type {
  ElevatedInversionDto,
  ProfileDto,
  ProfileLayerDto,
  SurfaceInversionDto,
} from './dto/profile.dto';
import { showRange } from './dto/range-value.dto';
import { findingsOf, layersIn } from './findings';

const unknownLayer = {
  ...{ lapseRateKPerKm: null, sigmaKPerKm: null, textbookClass: null, probabilityTRises: null },
  ...{ moistLapseRateKPerKm: null, superadiabatic: null, autoconvective: null },
};

const knownLayer = (layer: Layer): Omit<ProfileLayerDto, 'lowerM' | 'upperM'> => ({
  lapseRateKPerKm: layer.lapseRateKPerKm,
  sigmaKPerKm: layer.sigmaKPerKm,
  textbookClass: layer.stabilityClass,
  probabilityTRises: layer.probabilities?.rises ?? null,
  moistLapseRateKPerKm: layer.moistLapseRateKPerKm,
  superadiabatic: layer.superadiabatic,
  autoconvective: layer.autoconvective,
});

/** Between two measured levels whose layer was not worked out, the lapse rate is still plain arithmetic. */
const bareRate = (lowerC: number, upperC: number, thicknessM: number): number | null => {
  const rate = 0 - (1000 * (upperC - lowerC)) / thicknessM;
  return Number.isFinite(rate) ? rate : null;
};

function showLayers(profile: Profile, layers: readonly Layer[]): ProfileLayerDto[] {
  return profile.levels.slice(1).map((upper, i) => {
    const lower = profile.levels[i]!;
    const heights = { lowerM: lower.heightM, upperM: upper.heightM };
    const layer = layers.find((each) => each.baseM === heights.lowerM && each.topM === heights.upperM);
    if (layer) return { ...heights, ...knownLayer(layer) };
    if (lower.temperatureC === null || upper.temperatureC === null) return { ...heights, ...unknownLayer };
    const thicknessM = upper.heightM - lower.heightM;
    const lapseRateKPerKm = bareRate(lower.temperatureC, upper.temperatureC, thicknessM);
    return { ...heights, ...unknownLayer, lapseRateKPerKm };
  });
}

const showInversion = (inversion: Inversion, form: string): SurfaceInversionDto => ({
  baseM: inversion.baseM,
  topM: inversion.topM,
  depthM: showRange(inversion.depthM),
  strengthC: showRange(inversion.strengthC),
  strengthWithinTowerC: inversion.strengthWithinTowerC,
  sigmaC: inversion.sigmaC,
  probability: inversion.probability,
  gradientCPer100m: inversion.gradientCPer100M,
  open: inversion.open,
  baseAtOrBelow: inversion.baseAtOrBelow,
  sure: inversion.sure === 'true',
  form,
});

const showElevated = (inversions: readonly Inversion[]): ElevatedInversionDto[] =>
  inversions
    .filter(({ kind }) => kind === 'elevated')
    .map(({ baseM, topM, strengthC, sure }) => ({
      ...{ baseM, topM },
      strengthC: showRange(strengthC),
      sure: sure === 'true',
    }));

const showLevel = ([heightM, temperatureC, sigmaC, n, quality]: StoredLevel) => ({
  ...{ heightM, temperatureC, sigmaC, n },
  quality: qualityName(quality),
});

/** A kept block in the API's shape; what follows from it is worked out on reading. */
export function showProfile(facts: BlockFacts, rev: number, tower: TowerLayout): ProfileDto {
  const findings = findingsOf(facts, tower);
  const { surface, inversions } = findings.inversions;
  const { lo, hi, reason } = findings.heatDeficitJPerM2;
  const { humidity: _, suspect: __, ...other } = facts.other;
  return {
    towerId: facts.towerId,
    tEnd: toIso(facts.tEnd),
    blockMinutes: tower.blockS / 60,
    rev,
    levels: facts.levels.map(showLevel),
    layers: showLayers(findings.profile, layersIn(findings)),
    surface: surface.finding,
    reason: surface.reason,
    inversion: surface.inversion ? showInversion(surface.inversion, tower.inversionForm) : null,
    elevated: showElevated(inversions),
    stableDepthM: showRange(findings.stableDepthM),
    heatDeficitMJPerM2: showRange({ lo: mjPerM2FromJPerM2(lo), hi: mjPerM2FromJPerM2(hi), reason }),
    breakUpTemperatureC: showRange(findings.breakUpTemperatureC),
    pressureHpa: findings.profile.pressureHPa,
    pressureAssumed: findings.profile.pressureAssumed,
    ...other,
  };
}
