/** Something that only a person can say. */
export interface Question {
  readonly id: 'repeated-hour' | 'missing-hour' | 'day-or-month-first' | 'unit' | 'rows-off-the-step';
  readonly text: string;
  readonly choices: readonly { readonly value: string; readonly text: string }[];
  /** Cells or times that the question is about. */
  readonly examples: readonly string[];
}
