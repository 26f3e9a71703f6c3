import { DEFAULT_MAPPING, type Mapping } from '../mapping';
import { HeaderError } from '../parsed-readings';
import { findColumns, type FoundColumn } from './find-columns';
import { findHeader, type FoundHeader } from './find-header';
import { findLong, type LongColumns } from './find-long';
import { findMarks } from './find-marks';
import { findCuts, type Cut } from './find-separator';
import { findSummaries, type FoundSummaries } from './find-summaries';
import { findTime, type FoundTime } from './find-time';
import type { KnownSensor } from './guess-sensor';
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

/** Not a number by its own words. */
const ALWAYS = ['NaN', 'NAN'];
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

const SHOWN = 80;

const summaryQuestion = (found: FoundSummaries | undefined): Question[] => {
  if (!found) return [];
  const { column, values, rows, example } = found;
  return [
    {
      id: 'rows-off-the-step',
      text: `Rows with "${values[0]}" in column "${column}" lie off the step of all the others (${rows} in the sample). Are they readings?`,
      choices: [
        {
          value: JSON.stringify({ leaveOut: [{ column, values }] }),
          text: 'No, such as a summary of the day: leave them out',
        },
        { value: JSON.stringify({ leaveOut: [] }), text: 'Yes, take them' },
      ],
      examples: [example.slice(0, SHOWN)],
    },
  ];
};

/** The long table's columns, or those of a wide one, as part of the mapping. */
const layoutOf = (
  long: LongColumns | undefined,
  columns: readonly FoundColumn[],
): Pick<Mapping, 'format' | 'columns' | 'units' | 'sensorColumn' | 'valueColumn'> => {
  const { sensorColumn, valueColumn } = DEFAULT_MAPPING;
  if (long) {
    return {
      format: 'long',
      ...{ sensorColumn: long.sensorColumn, valueColumn: long.valueColumn },
      columns: Object.fromEntries(
        long.written.flatMap(({ name, sensor }) => (sensor === undefined ? [] : [[name, sensor]])),
      ),
      units: Object.fromEntries(
        long.written.flatMap(({ name, sensor, unit }) =>
          sensor === undefined || unit === undefined ? [] : [[name, unit]],
        ),
      ),
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

/** The file cut in the way in which it says the time. */
function tableOf(sample: FileSample): { cut: Cut; header: FoundHeader; time: FoundTime } {
  const cuts = findCuts(sample);
  if (cuts.length === 0) {
    throw new HeaderError(
      'The file is no table: most of its lines cannot be cut into the same number of cells. ' +
        'Save it as CSV, with a column for the time and one for each sensor.',
    );
  }
  for (const cut of cuts) {
    const header = findHeader(cut);
    const time = findTime(header);
    if (time) return { cut, header, time };
  }
  throw new HeaderError(
    'No column of the file holds times that can be read. Write a date and a time of day in each row, such as ' +
      '2026-01-31 05:10:00, or day, month, year and time in columns of their own.',
  );
}

/**
 * Looks at a file's sample and proposes how to read it. Nothing is decided that the file does not show: what stays open
 * comes as a note or a question.
 *
 * @throws HeaderError where the file is no table, or says no time.
 */
export function proposeMapping(sample: FileSample, tower: ForTower): FoundLayout {
  const { cut, header, time } = tableOf(sample);
  const decimal = decimalOf(cut, header);
  const places = header.names.map((_, place) => place).filter((place) => !time.used.includes(place));
  const marks = findMarks(
    places.map((place) => header.data.map((row) => row.cells[place] ?? '')),
    decimal,
  );
  const markTexts = new Set(marks.map(({ text }) => text));
  const columns = findColumns(header, time.used, tower.sensors, decimal, markTexts);
  const long = findLong(header, time.used, tower.sensors, decimal);
  const layout = layoutOf(long, columns);
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
      ...(time.stamp ? { stamp: time.stamp } : {}),
      onlyNamed: true,
      missing: [...new Set([...ALWAYS, ...marks.map(({ text }) => text)])],
    },
    ...{ columnNames: header.names, columns, written: long?.written.map(({ name }) => name) ?? [] },
    notes,
    questions: [
      ...dayQuestion(time, firstTime),
      ...unitQuestion(columns),
      ...summaryQuestion(findSummaries(header, time)),
    ],
  };
}
