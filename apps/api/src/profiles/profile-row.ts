import { mjPerM2FromJPerM2, type Quantity, type Truth } from '@lidwatch/atmosphere';
import type { BlockFacts } from './block-facts';
import type { Findings } from './findings';

/** Columns of a profile as it is written, in order. */
export const PROFILE_COLUMNS = [
  'tower_id',
  't_end',
  'levels',
  'surface',
  'reason',
  'base_m',
  'top_m',
  'depth_lo',
  'depth_hi',
  'strength_lo',
  'strength_hi',
  'within_c',
  'sigma_c',
  'prob',
  'gradient',
  'open',
  'sure',
  'stable_lo',
  'stable_hi',
  'elevated_base_m',
  'elevated_strength_lo',
  'elevated_strength_hi',
  'heat_lo',
  'heat_hi',
  'breakup_lo',
  'breakup_hi',
  'pressure_hpa',
  'pressure_assumed',
  'other',
] as const;

/** Those of the columns that hold real numbers. */
export const REAL_COLUMNS: ReadonlySet<string> = new Set(
  PROFILE_COLUMNS.filter((column) => /_(m|c|lo|hi|hpa)$|^(prob|gradient)$/.test(column)),
);

type Stored = number | string | null;

const finite = (value: number | null): number | null =>
  value !== null && Number.isFinite(value) ? value : null;
const number = (quantity: Quantity): Stored => (quantity.lo === quantity.hi ? finite(quantity.lo) : null);
const truth = (value: Truth): Stored => (value === 'not known' ? null : Number(value === 'true'));

/** A block's facts and findings as the row that keeps them. */
export function profileRow(facts: BlockFacts, findings: Findings): Stored[] {
  const { surface, lid } = findings.inversions;
  const { inversion } = surface;
  const { depthM: depth, strengthC: strength } = surface;
  const { stableDepthM: stable, heatDeficitJPerM2: heat, breakUpTemperatureC: breakUp } = findings;
  return [
    facts.towerId,
    facts.tEnd,
    JSON.stringify(facts.levels),
    surface.finding,
    surface.reason ?? null,
    inversion?.baseM ?? null,
    inversion?.topM ?? null,
    finite(depth.lo),
    finite(depth.hi),
    finite(strength.lo),
    finite(strength.hi),
    number(surface.strengthWithinTowerC),
    finite(inversion?.sigmaC ?? null),
    finite(surface.probability),
    number(surface.gradientCPer100M),
    inversion?.open ?? 'no',
    truth(surface.sure),
    finite(stable.lo),
    finite(stable.hi),
    number(lid.baseM),
    finite(lid.strengthC.lo),
    finite(lid.strengthC.hi),
    finite(mjPerM2FromJPerM2(heat.lo)),
    finite(mjPerM2FromJPerM2(heat.hi)),
    finite(breakUp.lo),
    finite(breakUp.hi),
    findings.profile.pressureHPa,
    Number(findings.profile.pressureAssumed),
    JSON.stringify(facts.other),
  ];
}
