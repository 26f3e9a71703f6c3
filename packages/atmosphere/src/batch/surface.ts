import {
  isGiven,
  OPEN_CODES,
  pressureOf,
  SURFACE_CODES,
  type BatchResult,
  type ProfileBatch,
} from './profiles';
import { batchHeatDeficit } from './heat-deficit';

/** Codes held in this file: reading an imported one again and again costs more than the arithmetic. */
const { absent: ABSENT, present: PRESENT, 'not known': NOT_KNOWN } = SURFACE_CODES;
const { no: CLOSED, 'at the top': AT_THE_TOP, 'cut by a missing level': CUT } = OPEN_CODES;

/**
 * Surface inversion (plain form, embed depth 0) and heat deficit to the tower's top of all profiles of a batch.
 *
 * Units: °C, m, hPa in; m, °C, J/m² out. Valid: a batch whose arrays fit; what is not known is NaN.
 * Source: [Kahl1990] surface-based inversion; [Whiteman2014] heat deficit.
 */
export function batchSurface(batch: ProfileBatch, thicknessM: Float64Array, result: BatchResult): void {
  const { heightsM, temperatureC: t } = batch;
  const { surface, open, topM, strengthC, heatDeficitJPerM2, heatAtLeast } = result;
  const profiles = batch.pressureHPa.length;
  const levels = heightsM.length;
  const layers = levels - 1;
  for (let row = 0; row < profiles; row += 1) {
    const offset = row * levels;
    let base = 0;
    while (base < levels && !isGiven(t[offset + base]!)) base += 1;
    let runEnd = base;
    while (runEnd < layers && isGiven(t[offset + runEnd + 1]!)) runEnd += 1;
    let top = base;
    while (top < runEnd && t[offset + top + 1]! > t[offset + top]!) top += 1;

    const present = top > base;
    const fromTheGround = base === 0 && runEnd > 0;
    const isOpen = present && top === runEnd;
    surface[row] = present ? PRESENT : fromTheGround ? ABSENT : NOT_KNOWN;
    open[row] = !isOpen ? CLOSED : runEnd < layers ? CUT : AT_THE_TOP;
    topM[row] = present ? heightsM[top]! : NaN;
    strengthC[row] = present ? t[offset + top]! - t[offset + base]! : fromTheGround ? 0 : NaN;
    heatAtLeast[row] = fromTheGround && (isOpen || runEnd < layers) ? 1 : 0;
    heatDeficitJPerM2[row] = fromTheGround
      ? batchHeatDeficit(t, offset, runEnd, thicknessM, pressureOf(batch, row))
      : NaN;
  }
}
