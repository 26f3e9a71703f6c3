import { checkBits, qualityCodes } from '@lidwatch/contracts';
import type { Flags, Series, SetSpan } from './series';

/** Puts what people have set over what the checks said; of overlapping spans the one set last wins. */
export function applySetSpans(series: Series, flags: Flags, spans: readonly SetSpan[]): void {
  for (const span of spans) {
    if (span.sensorId !== series.sensorId) continue;
    series.tEnd.forEach((t, i) => {
      if (t < span.t0 || t > span.t1) return;
      flags.quality[i] = qualityCodes[span.quality];
      flags.checks[i]! |= checkBits.override;
    });
  }
}

/**
 * The flags by which means are made. A tower whose screening only reports leaves out what a person has set failed and
 * nothing else: what the checks call failed is used as suspect.
 */
export function flagsForMeans(flags: Flags, reportOnly: boolean): Flags {
  if (!reportOnly) return flags;
  const quality = flags.quality.map((code, i) =>
    (flags.checks[i]! & checkBits.override) !== 0 ? code : Math.min(code, qualityCodes.suspect),
  );
  return { quality, checks: flags.checks };
}
