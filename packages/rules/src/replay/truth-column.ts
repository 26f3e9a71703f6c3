import { compare, type Truth } from '@lidwatch/atmosphere';
import { toleranceMinutesOf, type Clause, type Condition, type Purpose } from '../definition/rule-definition';
import { heldTruth, type HeldSeconds } from '../evaluation/held-for';
import type { BlockColumns } from './columns';

/** Truths as they stand in a column: in this order all is the least and any the greatest. */
export const FALSE = 0;
export const NOT_KNOWN = 1;
export const TRUE = 2;

const CODES: Readonly<Record<Truth, number>> = { false: FALSE, 'not known': NOT_KNOWN, true: TRUE };

/**
 * The truth of a condition at every block, in one pass: the same answers as `evaluate` at each block end.
 *
 * Units: none; one of `FALSE`, `NOT_KNOWN`, `TRUE` per block. Valid: a condition that passed `validateRule`, columns
 * that hold its measures (one that is missing throws an `Error`). Source: [Kleene1952] §64 as least and greatest.
 */
export function truthColumn(condition: Condition, columns: BlockColumns, purpose: Purpose): Uint8Array {
  const now = nowColumn(condition, columns, purpose);
  return condition.heldMinutes
    ? heldColumn(now, columns, condition.heldMinutes * 60, 60 * toleranceMinutesOf(condition, purpose))
    : now;
}

function nowColumn(condition: Condition, columns: BlockColumns, purpose: Purpose): Uint8Array {
  if ('measure' in condition) return clauseColumn(condition, columns);
  if ('not' in condition) return truthColumn(condition.not, columns, purpose).map((truth) => TRUE - truth);
  const all = 'all' in condition;
  const [first, ...others] = (all ? condition.all : condition.any).map((part) =>
    truthColumn(part, columns, purpose),
  );
  const result = first!.slice();
  for (const other of others) {
    for (let i = 0; i < result.length; i += 1) {
      const better = all ? other[i]! < result[i]! : other[i]! > result[i]!;
      if (better) result[i] = other[i]!;
    }
  }
  return result;
}

function clauseColumn({ measure, op, value }: Clause, { tEnd, measures }: BlockColumns): Uint8Array {
  const bounds = measures.get(measure);
  if (!bounds) throw new Error(`The columns lack ${measure}. Make them with every measure of the rule.`);
  const truths = new Uint8Array(tEnd.length);
  const limit = Number(value);
  // One object for all: the comparison is the only one in the house, and must not cost a new object per block.
  const quantity = { lo: 0, hi: 0 };
  for (let i = 0; i < truths.length; i += 1) {
    quantity.lo = bounds.lo[i]!;
    quantity.hi = bounds.hi[i]!;
    truths[i] = CODES[compare(quantity, op, limit)];
  }
  return truths;
}

/** Held-for over a window that moves with the blocks: what enters is added, what leaves is taken away. */
function heldColumn(
  now: Uint8Array,
  { tEnd, coversFrom, runFrom }: BlockColumns,
  neededSeconds: number,
  toleratedSeconds: number,
): Uint8Array {
  const truths = new Uint8Array(now.length);
  const seconds = [0, 0, 0];
  const held = { neededSeconds, toleratedSeconds, recordSeconds: 0, trueSeconds: 0, falseSeconds: 0 };
  let oldest = 0;
  for (let i = 0; i < now.length; i += 1) {
    const t = tEnd[i]!;
    const from = Math.max(t - neededSeconds, runFrom[i]!);
    seconds[now[i]!]! += t - coversFrom[i]!;
    while (tEnd[oldest]! <= from) {
      seconds[now[oldest]!]! -= tEnd[oldest]! - coversFrom[oldest]!;
      oldest += 1;
    }
    const before = Math.max(0, from - coversFrom[oldest]!);
    const cut = now[oldest]!;
    held.recordSeconds = t - from;
    held.trueSeconds = seconds[TRUE]! - (cut === TRUE ? before : 0);
    held.falseSeconds = seconds[FALSE]! - (cut === FALSE ? before : 0);
    truths[i] = CODES[heldTruth(held satisfies HeldSeconds)];
  }
  return truths;
}
