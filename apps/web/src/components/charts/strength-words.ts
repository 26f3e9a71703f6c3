import type { DistrictHistory } from '../../lib/api/types';
import { counted, decimal } from '../../lib/format/number';
import { rangeText } from '../../lib/format/range';
import { dayAndTime, duration } from '../../lib/format/time';
import { limitLines } from './limit-lines';
import { gapsOf, isInSteps, strengthPoints } from './strength-series';

/** The history in a few sentences: the strongest, how long above each limit, the notices, what is not known. */
export function strengthWords(history: DistrictHistory, name: string, now: number): string {
  const points = strengthPoints(history);
  const known = points.filter((point): point is typeof point & { y: number } => point.y !== null);
  if (known.length === 0) return `${name}: nothing is known of this time.`;
  const strongest = known.reduce((best, point) => (point.y > best.y ? point : best));
  const unknownMinutes = gapsOf(history, now).reduce((sum, { from, to }) => sum + (to - from) / 60_000, 0);
  const above = limitLines(history.limits).map(({ y, label }) => {
    const reached = known.filter((point) => point.y >= y).length;
    const minutes = reached * history.stepMinutes;
    if (isInSteps(history))
      return `Reached ${decimal(y)} °C (${label}) in ${reached} of ${points.length} steps of ${duration(history.stepMinutes)}.`;
    return `At or above ${decimal(y)} °C (${label}) for ${duration(minutes)} in all.`;
  });
  return [
    strongest.y > 0
      ? `Strongest ${rangeText(strongest.from.strength, { unit: '°C', style: 'words' })}, ${dayAndTime(strongest.at, history.timeZone)}.`
      : 'No surface inversion was found.',
    ...above,
    history.notices.length > 0
      ? `${counted(history.notices.length, 'notice')} in this time.`
      : 'No notice in this time.',
    unknownMinutes > 0 ? `Not known for ${duration(unknownMinutes)}.` : 'Known throughout.',
  ].join(' ');
}
