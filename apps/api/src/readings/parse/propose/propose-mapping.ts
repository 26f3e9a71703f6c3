import { DEFAULT_MAPPING, type Mapping } from '../mapping';
import { HeaderError } from '../parsed-readings';
import { findColumns, findLong, type FoundColumn, type LongColumns } from './find-columns';
import { findHeader, type FoundHeader } from './find-header';
import { findMarks } from './find-marks';
import { findSeparator, type Cut } from './find-separator';
import { findTime, type FoundTime } from './find-time';
import { guessSensor, unitIn, type KnownSensor } from './guess-sensor';
import type { Question } from './questions';
import type { FileSample } from './sample';

/** What is known of the tower that a file is for. */
export interface ForTower {
  readonly sensors: readonly KnownSensor[];
  readonly intervalS: number;
  readonly clock: string;
}

/** How a file seems to be laid out, and what a person should look at or has to say. */
export interface FoundLayout {
  readonly mapping: Mapping;
  readonly columnNames: readonly string[];
  readonly columns: readonly FoundColumn[];
  /** Long tables: the sensors as the file writes them. */
  readonly written: readonly string[];
  readonly notes: readonly string[];
  readonly questions: readonly Question[];
}

const COMMA = /^[+-]?\d*,\d+$/;
const POINT = /^[+-]?\d*\.\d+$/;

const decimalOf = ({ separator }: Cut, { data }: FoundHeader): '.' | ',' => {
  if (separator === ',') return '.';
  const cells = data.flatMap((row) => row.cells);
  return cells.filter((cell) => COMMA.test(cell)).length > cells.filter((cell) => POINT.test(cell)).length
    ? ','
    : '.';
};

const minutes = (seconds: number): string => (seconds % 60 === 0 ? `${seconds / 60} min` : `${seconds} s`);

const timeNotes = (time: FoundTime, tower: ForTower, names: readonly string[]): string[] => {
  const notes: string[] = [];
  if (time.hasOffset) notes.push('The stamps carry their offset from UTC; the clock is not needed.');
  else if (time.timeForm.startsWith('epoch'))
    notes.push('The time counts from 1970 in UTC; the clock is not needed.');
  else notes.push(`The stamps carry no offset: they are read by the tower's clock, ${tower.clock}.`);
  const zone = /\b(?:[ACEMP][SD]T|AKST|AKDT|HST|CET|CEST|local)\b/.exec(names.join(' '))?.[0];
  if (zone !== undefined && !time.hasOffset) notes.push(`The header says "${zone}": check the clock.`);
  if (time.stepS !== undefined && time.stepS !== tower.intervalS) {
    notes.push(
      `The rows step by ${minutes(time.stepS)}; the tower's interval is ${minutes(tower.intervalS)}. ` +
        `Blocks that miss readings are not worked out: change the interval if the logger's has changed.`,
    );
  }
  return notes;
};

const dayQuestion = (time: FoundTime, example: string): Question[] => {
  if (!time.other) return [];
  const choice = ({ timeForm, timeColumns }: FoundTime) => ({
    value: JSON.stringify(timeColumns ? { timeColumns } : { timeForm }),
    text: timeColumns
      ? timeColumns.map(({ part }) => part).join(', ')
      : timeForm === 'day/month/year'
        ? 'Day first'
        : 'Month first',
  });
  return [
    {
      id: 'day-or-month-first',
      text: 'Day and month can be exchanged in this file. Which comes first?',
      choices: [choice(time), choice(time.other)],
      examples: [example],
    },
  ];
};

const unitQuestion = (columns: readonly FoundColumn[]): Question[] => {
  const open = columns.filter(({ unitOpen }) => unitOpen);
  if (open.length === 0) return [];
  return [
    {
      id: 'unit',
      text: `Are the temperatures in ${open.map(({ name }) => `"${name}"`).join(', ')} °C or °F?`,
      choices: [
        { value: '°C', text: '°C' },
        { value: '°F', text: '°F, convert them' },
      ],
      examples: open.flatMap(({ samples }) => samples).slice(0, 3),
    },
  ];
};

/** The long table's columns, or those of a wide one, as part of the mapping. */
const layoutOf = (
  long: LongColumns | undefined,
  columns: readonly FoundColumn[],
  sensors: readonly KnownSensor[],
): Pick<Mapping, 'format' | 'columns' | 'units' | 'sensorColumn' | 'valueColumn'> => {
  const { sensorColumn, valueColumn } = DEFAULT_MAPPING;
  if (long) {
    const guesses = long.written.map((name) => [name, guessSensor(name, sensors)?.name] as const);
    const units = long.written.map((name) => [name, unitIn(name)] as const);
    return {
      format: 'long',
      ...{ sensorColumn: long.sensorColumn, valueColumn: long.valueColumn },
      columns: Object.fromEntries(guesses.filter(([, sensor]) => sensor !== undefined)) as Record<
        string,
        string
      >,
      units: Object.fromEntries(units.filter(([, unit]) => unit !== undefined)) as Mapping['units'],
    };
  }
  return {
    format: 'wide',
    ...{ sensorColumn, valueColumn },
    columns: Object.fromEntries(
      columns.flatMap(({ name, sensor }) => (sensor === null ? [] : [[name, sensor]])),
    ),
    units: Object.fromEntries(
      columns.flatMap(({ name, sensor, unit }) => (sensor === null || unit === null ? [] : [[name, unit]])),
    ),
  };
};

/**
 * Looks at a file's sample and proposes how to read it. Nothing is decided that the file does not show: what stays open
 * comes as a note or a question.
 *
 * @throws HeaderError where the file is no table, or says no time.
 */
export function proposeMapping(sample: FileSample, tower: ForTower): FoundLayout {
  const cut = findSeparator(sample);
  if (!cut) {
    throw new HeaderError(
      'The file is no table: most of its lines cannot be cut into the same number of cells. ' +
        'Save it as CSV, with a column for the time and one for each sensor.',
    );
  }
  const header = findHeader(cut);
  const decimal = decimalOf(cut, header);
  const time = findTime(header);
  if (!time) {
    throw new HeaderError(
      'No column of the file holds times that can be read. Write them as 2026-01-31 05:10:00, or as day, month and year apart.',
    );
  }
  const places = header.names.map((_, place) => place).filter((place) => !time.used.includes(place));
  const marks = findMarks(
    places.map((place) => header.data.map((row) => row.cells[place] ?? '')),
    decimal,
  );
  const markTexts = new Set(marks.map(({ text }) => text));
  const columns = findColumns(header, time.used, tower.sensors, decimal, markTexts);
  const long = findLong(header, time.used, decimal);
  const layout = layoutOf(long, columns, tower.sensors);
  const notes = [
    ...(header.headerRow === 0 ? ['The file has no header: its columns are called by their numbers.'] : []),
    ...(header.headerRow > 1
      ? [`The header stands in row ${header.headerRow}; the lines above it are passed over.`]
      : []),
    ...timeNotes(time, tower, [...header.names, ...header.between.flatMap((row) => row.cells)]),
    ...marks.map(
      ({ text, times }) => `"${text}" seems to stand for "no reading": ${times} times in the sample.`,
    ),
  ];
  const firstTime = time.used.map((place) => header.data[0]?.cells[place] ?? '').join(' ');
  return {
    mapping: {
      ...layout,
      ...{
        separator: cut.separator,
        decimal,
        headerRow: header.headerRow,
        firstDataRow: header.firstDataRow,
      },
      ...{ timeColumn: time.timeColumn ?? DEFAULT_MAPPING.timeColumn, timeForm: time.timeForm },
      ...(time.timeColumns ? { timeColumns: time.timeColumns } : {}),
      missing: marks.map(({ text }) => text),
    },
    ...{ columnNames: header.names, columns, written: long?.written ?? [] },
    notes,
    questions: [...dayQuestion(time, firstTime), ...unitQuestion(columns)],
  };
}
