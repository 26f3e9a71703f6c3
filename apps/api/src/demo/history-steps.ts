const HOUR_S = 3600;
const DAY_S = 24 * HOUR_S;

/** Hours of UTC at which the desk's day turns in the basin: evening, night, before dawn, late morning, noon, afternoon. */
const TURNS = [3, 8, 14, 18, 19, 22].map((hour) => hour * HOUR_S);
/** While nothing waits and nothing is in force, nobody looks at night or in the late morning. */
const QUIET_TURNS = [3, 14, 19, 22].map((hour) => hour * HOUR_S);

/** The last days before the first start are lived through hour by hour, s. */
const HOURLY_S = 3 * DAY_S;

/**
 * The instant up to which the demo's history is lived through in one go from another: six steps a day, four while all
 * is quiet, hour by hour towards the end. What is worked out does not depend on it, only when it is looked at.
 *
 * Units: UTC epoch s. Valid: any instants. Source: the demo's own story (the basin keeps UTC − 7 h).
 */
export function nextStep(t: number, now: number, quiet: boolean): number {
  if (t >= now - HOURLY_S) return (Math.floor(t / HOUR_S) + 1) * HOUR_S;
  const turns = quiet ? QUIET_TURNS : TURNS;
  const day = Math.floor(t / DAY_S) * DAY_S;
  const turn = turns.find((each) => day + each > t);
  return turn === undefined ? day + DAY_S + (turns[0] ?? 0) : day + turn;
}
