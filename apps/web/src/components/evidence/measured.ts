import { MEASURES, isMeasureName } from '@lidwatch/rules';
import type { EvaluatedClause, EvaluatedNode, RangeValue } from '../../lib/api/types';
import { rangeText, type BoundStyle } from '../../lib/format/range';
import { decimal } from '../../lib/format/number';
import { duration } from '../../lib/format/time';

/** What was measured for a clause, in its measure's own unit and decimals: "at least 5.1 °C", "yes", "9 h". */
export function measuredText(measure: string, value: RangeValue, style: BoundStyle = 'words'): string {
  if (!isMeasureName(measure)) return rangeText(value, { style });
  const { kind, unit, decimals } = MEASURES[measure];
  if (kind === 'yes-no')
    return value.exactly === undefined ? 'not known' : value.exactly === 1 ? 'yes' : 'no';
  if (unit === 'min') return rangeText(value, { style, write: duration });
  return rangeText(value, { style, unit, write: (v) => decimal(v, decimals) });
}

/** Every clause of a tree, in order. */
export function clausesOf(node: EvaluatedNode): EvaluatedClause[] {
  return node.kind === 'clause' ? [node] : node.parts.flatMap(clausesOf);
}
