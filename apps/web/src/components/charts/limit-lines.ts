import type { HistoryLimit } from '../../lib/api/types';
import { decimal } from '../../lib/format/number';
import { duration } from '../../lib/format/time';
import { kindInSentence } from '../../lib/words';

/** A limit of the rule as a line of the chart. */
export interface LimitLine {
  y: number;
  label: string;
}

const STRENGTH = new Set(['inversionStrengthC', 'strengthWithinTowerC']);

/** The limits at which the rule begins something by the inversion's strength; one line each value. */
export function limitLines(limits: readonly HistoryLimit[]): LimitLine[] {
  const lines = limits
    .filter(({ act, measure }) => act === 'begin' && STRENGTH.has(measure))
    .map(({ kind, value, heldMinutes }) => ({
      y: value,
      label: `${kindInSentence(kind)}: ${decimal(value)} °C${heldMinutes > 0 ? ` for ${duration(heldMinutes)}` : ''}`,
    }));
  const values = [...new Set(lines.map(({ y }) => y))];
  return values.map((value) => ({
    y: value,
    label: lines
      .filter(({ y }) => y === value)
      .map(({ label }) => label)
      .join('; '),
  }));
}
