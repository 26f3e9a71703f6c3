import type { Question } from '../parse/propose/questions';
import type { RefusedRow } from '../refusal';

const EXAMPLES = 3;

const examplesOf = (rows: readonly RefusedRow[]): string[] =>
  rows.slice(0, EXAMPLES).map(({ raw }) => raw.slice(0, 80));

/** What a person has to say of rows that lie in the hours of a change of the clocks. */
export function civilQuestions(refused: readonly RefusedRow[]): Question[] {
  const twice = refused.filter(({ code }) => code === 'time-happens-twice');
  const missing = refused.filter(({ code }) => code === 'time-does-not-exist');
  const questions: Question[] = [];
  if (twice.length > 0) {
    questions.push({
      id: 'repeated-hour',
      text: `The clocks were put back: ${twice.length} rows lie in an hour that happens twice. Which one is meant?`,
      choices: [
        { value: 'refuse', text: 'I do not know: leave these rows out' },
        {
          value: 'in-order',
          text: 'Both, in the order of the rows: first the summer hour, then the standard hour',
        },
        { value: 'first', text: 'The first passing (summer time)' },
        { value: 'second', text: 'The second passing (standard time)' },
      ],
      examples: examplesOf(twice),
    });
  }
  if (missing.length > 0) {
    questions.push({
      id: 'missing-hour',
      text: `The clocks were put forward: ${missing.length} rows lie in an hour that does not exist. What is meant?`,
      choices: [
        { value: 'refuse', text: 'I do not know: leave these rows out' },
        { value: 'later', text: 'The logger was put forward later: these rows are in standard time' },
      ],
      examples: examplesOf(missing),
    });
  }
  return questions;
}
