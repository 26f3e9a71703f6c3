import type { Band } from './raw-backdrop';
import { selectedEnds, type Selection } from './selection';
import type { SeenSensor, SetSpan } from './types';
import { SAID_NAME } from './words';

/** What people have set of some sensors and not undone, and what is chosen, as stretches behind a chart. */
export function bandsOf(
  spans: readonly SetSpan[],
  sensors: readonly SeenSensor[],
  selection: Selection,
  zone: string,
): Band[] {
  const nameOf = (id: number | undefined) => sensors.find(({ sensorId }) => sensorId === id)?.name;
  const set = spans
    .filter(({ sensorId, undoneAt }) => undoneAt === null && nameOf(sensorId) !== undefined)
    .map(({ sensorId, from, to, quality }): Band => ({
      ...{ from: Date.parse(from), to: Date.parse(to), kind: quality === 'failed' ? 'aside' : 'right' },
      label: `${nameOf(sensorId)} ${SAID_NAME[quality].toLowerCase()}`,
    }));
  const ends = selectedEnds(selection, zone);
  const name = nameOf(selection.sensorId) ?? sensors[0]?.name;
  if (!ends || name === undefined) return set;
  const chosen: Band = {
    ...{ from: Date.parse(ends.from), to: Date.parse(ends.to), kind: 'chosen' },
    label: `${name} chosen`,
  };
  return [...set, chosen];
}
