/** A stretch of time, UTC epoch seconds: a notice, or an event such as a run of days with much smoke. */
export interface Span {
  readonly from: number;
  readonly to: number;
}

/**
 * How long before each event that was warned of its warning began, in seconds; 0 where it began later than the event.
 * A warning is of an event when the two share time; of several the first counts. Events nobody warned of give nothing.
 *
 * Units: UTC epoch seconds in, s out. Valid: spans in any order. Source: common practice.
 */
export function leadTimesS(warnings: readonly Span[], events: readonly Span[]): number[] {
  return events.flatMap((event) => {
    const begun = warnings
      .filter(({ from, to }) => from < event.to && to > event.from)
      .map(({ from }) => from);
    return begun.length === 0 ? [] : [Math.max(0, event.from - Math.min(...begun))];
  });
}
