import type { Mapping, ProposedColumn, Question } from './types';
import { UNITS } from './words';

const without = <T>(record: Readonly<Record<string, T>> | undefined, key: string): Record<string, T> =>
  Object.fromEntries(Object.entries(record ?? {}).filter(([name]) => name !== key));

const units = (mapping: Mapping): Record<string, string> => mapping.units ?? {};
const columns = (mapping: Mapping): Record<string, string> => mapping.columns ?? {};

/** The sensor a column is set to; undefined: left out. */
export const sensorOf = (mapping: Mapping, column: string): string | undefined => columns(mapping)[column];

/** The unit a column comes in; undefined: its sensor's own. */
export const unitOf = (mapping: Mapping, column: string): string | undefined => units(mapping)[column];

/** Sets a column to a sensor, or leaves it out; a unit goes with the sensor it was for. */
export const setSensor = (mapping: Mapping, column: string, sensor: string): Mapping => {
  const rest = without(columns(mapping), column);
  const next = { ...mapping, columns: sensor === '' ? rest : { ...rest, [column]: sensor } };
  return sensor === '' ? { ...next, units: without(units(mapping), column) } : next;
};

/** Sets the unit of a column; empty: its sensor's own. */
export const setUnit = (mapping: Mapping, column: string, unit: string): Mapping => ({
  ...mapping,
  units: { ...without(units(mapping), column), ...(unit === '' ? {} : { [column]: unit }) },
});

/**
 * What a person chose a column to be: it then comes in the unit that stood in the file, where the sensor can come in
 * that, else in the one set before, else in the sensor's own. No sensor: the column is left out.
 */
export function chooseSensor(
  mapping: Mapping,
  column: string,
  sensor: { name: string; quantity: string } | undefined,
  unitFound: string | null,
): Mapping {
  if (!sensor) return setSensor(mapping, column, '');
  const fits = (unit: string | null | undefined) => Boolean(unit && UNITS[sensor.quantity]?.includes(unit));
  const unit = [unitFound, unitOf(mapping, column)].find(fits);
  return setUnit(setSensor(mapping, column, sensor.name), column, unit ?? '');
}

/** Puts an answer into the mapping; `open` are the columns a question about units is about. */
export function answered(
  mapping: Mapping,
  question: Question,
  value: string,
  open: readonly string[],
): Mapping {
  switch (question.id) {
    case 'repeated-hour':
      return { ...mapping, repeatedHour: value as NonNullable<Mapping['repeatedHour']> };
    case 'missing-hour':
      return { ...mapping, missingHour: value as NonNullable<Mapping['missingHour']> };
    case 'day-or-month-first':
    case 'rows-off-the-step':
      return { ...mapping, ...(JSON.parse(value) as Partial<Mapping>) };
    case 'unit':
      return open.reduce((next, column) => setUnit(next, column, value === '°F' ? value : ''), mapping);
  }
}

/** The columns of which the values do not tell °C from °F; the question about units is about them. */
export const columnsOfOpenUnit = (columns: readonly ProposedColumn[]): string[] =>
  columns.filter(({ unit, note }) => unit === null && note?.includes('°F')).map(({ name }) => name);

/** The sensors that more than one column is set to. */
export function setTwice(mapping: Mapping): string[] {
  const sensors = Object.values(columns(mapping));
  return [...new Set(sensors.filter((sensor, i) => sensors.indexOf(sensor) !== i))];
}

/** Marks for "no reading" as they are typed: one after the other, cut by blanks. */
export const marksOf = (typed: string): string[] => typed.split(/\s+/).filter((mark) => mark !== '');
