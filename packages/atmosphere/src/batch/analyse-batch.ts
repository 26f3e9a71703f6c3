import { batchLayers } from './layers';
import { batchResult, type BatchResult, type ProfileBatch } from './profiles';
import { batchSurface } from './surface';

const FEWEST_LEVELS = 2;

/** Checks what the loops rely on, once for the whole batch. */
const refuseUnusable = (batch: ProfileBatch, result: BatchResult): void => {
  const levels = batch.heightsM.length;
  const ascending = batch.heightsM.every(
    (h, j) => Number.isFinite(h) && (j === 0 || h > batch.heightsM[j - 1]!),
  );
  if (levels < FEWEST_LEVELS || !ascending)
    throw new RangeError('A batch needs 2 heights or more, ascending.');
  const profiles = batch.pressureHPa.length;
  if (batch.temperatureC.length !== profiles * levels) {
    throw new RangeError(`${profiles} profiles of ${levels} levels need ${profiles * levels} temperatures.`);
  }
  if (result.surface.length < profiles || result.lapseRateKPerKm.length < profiles * (levels - 1)) {
    throw new RangeError('The result has too little room: make it with batchResult(profiles, levels).');
  }
};

/**
 * Layers, textbook classes, surface inversion (plain form, embed depth 0) and heat deficit of many profiles of one
 * tower. It gives what `layersOf`, `findInversions` and `heatDeficitJPerM2` give for each alone; layers read across a
 * missing level are left out.
 *
 * Units: °C, m, hPa in; K/km, m, °C, J/m² out. Valid: any temperatures: NaN and values beyond
 * `ACCEPTED_TEMPERATURE_C` are missing levels. Heights that do not ascend, and arrays of unfitting length, throw a
 * `RangeError`. Source: [Kahl1990]; [AMSGlossary] lapse rate, static stability; [Whiteman2014] heat deficit.
 */
export function analyseBatch(
  batch: ProfileBatch,
  result: BatchResult = batchResult(batch.pressureHPa.length, batch.heightsM.length),
): BatchResult {
  refuseUnusable(batch, result);
  const { heightsM } = batch;
  const thicknessM = Float64Array.from(
    { length: heightsM.length - 1 },
    (_, j) => heightsM[j + 1]! - heightsM[j]!,
  );
  batchLayers(batch, thicknessM, result);
  batchSurface(batch, thicknessM, result);
  return result;
}
