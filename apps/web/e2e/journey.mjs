import { arrival } from './chapters/arrival.mjs';
import { decision } from './chapters/decision.mjs';
import { effects } from './chapters/effects.mjs';
import { ending } from './chapters/ending.mjs';
import { finding } from './chapters/finding.mjs';
import { resident } from './chapters/resident.mjs';
import { screening } from './chapters/screening.mjs';
import { upload } from './chapters/upload.mjs';

/**
 * The whole journey, chapter by chapter; each step builds on the ones before. `trip` carries the counter of steps, the
 * product, everybody's window, and what one chapter found for the next (`valley`, `noticePath`).
 */
export async function journey(trip) {
  for (const chapter of [arrival, resident, finding, decision, effects, ending, screening, upload])
    await chapter(trip);
}
