import { and, not, or, type Truth } from '@lidwatch/atmosphere';
import { partsOf, toleranceMinutesOf, type Condition, type Purpose } from '../definition/rule-definition';
import type { BlockSeries } from './block-series';
import { clauseTruth } from './clause-truth';
import type { EvaluatedNode, HeldFacts } from './evaluated-node';
import { heldTruth, type HeldSeconds } from './held-for';
import { measuredIn } from './measured-block';

/** Truths by condition and block end. */
class Remembered {
  private readonly truths = new Map<Condition, Map<number, Truth>>();

  /** What was worked out before, else what `workOut` says. */
  of(condition: Condition, t: number, workOut: () => Truth): Truth {
    let known = this.truths.get(condition);
    if (known === undefined) this.truths.set(condition, (known = new Map()));
    let truth = known.get(t);
    if (truth === undefined) known.set(t, (truth = workOut()));
    return truth;
  }
}

/** Evaluations of one series for one purpose, and the truths already worked out, so that held-for stays cheap. */
class Evaluation {
  private readonly truths = new Remembered();
  private readonly nows = new Remembered();

  constructor(
    private readonly series: BlockSeries,
    private readonly purpose: Purpose,
  ) {}

  /** The whole tree at one block end, with what was measured. */
  node(condition: Condition, t: number): EvaluatedNode {
    const now = this.now(condition, t);
    const seconds = this.heldSeconds(condition, t);
    const verdict = seconds
      ? {
          truth: heldTruth(seconds),
          now,
          held: { ...this.facts(seconds, t), ...this.unbroken(condition, seconds, t) },
        }
      : { truth: now, now };
    if ('measure' in condition) {
      const { measure, op, value } = condition;
      return {
        kind: 'clause',
        measure,
        op,
        value,
        measured: measuredIn(this.series.at(t), measure),
        ...verdict,
      };
    }
    const kind = 'all' in condition ? 'all' : 'any' in condition ? 'any' : 'not';
    return { kind, parts: partsOf(condition).map((part) => this.node(part, t)), ...verdict };
  }

  private truth(condition: Condition, t: number): Truth {
    return this.truths.of(condition, t, () => {
      const seconds = this.heldSeconds(condition, t);
      return seconds ? heldTruth(seconds) : this.now(condition, t);
    });
  }

  private now(condition: Condition, t: number): Truth {
    return this.nows.of(condition, t, () => this.workOut(condition, t));
  }

  private workOut(condition: Condition, t: number): Truth {
    if ('measure' in condition)
      return clauseTruth(condition, measuredIn(this.series.at(t), condition.measure));
    const truths = partsOf(condition).map((part) => this.truth(part, t));
    if ('all' in condition) return and(...truths);
    return 'any' in condition ? or(...truths) : not(truths[0]!);
  }

  private heldSeconds(condition: Condition, t: number): HeldSeconds | undefined {
    if (!condition.heldMinutes) return undefined;
    const neededSeconds = condition.heldMinutes * 60;
    const recordFrom = Math.max(t - neededSeconds, this.series.runAt(t)?.from ?? t);
    const seconds = { true: 0, false: 0, 'not known': 0 };
    for (const block of this.series.within(recordFrom, t)) {
      seconds[this.now(condition, block.tEnd)] += block.tEnd - Math.max(block.coversFrom, recordFrom);
    }
    return {
      neededSeconds,
      toleratedSeconds: toleranceMinutesOf(condition, this.purpose) * 60,
      recordSeconds: t - recordFrom,
      trueSeconds: seconds.true,
      falseSeconds: seconds.false,
    };
  }

  /** How long the condition has been true up to t without a break, where it held and that is longer than asked. */
  private unbroken(condition: Condition, { neededSeconds, trueSeconds }: HeldSeconds, t: number) {
    if (trueSeconds < neededSeconds) return {};
    const run = this.series.runAt(t)?.from ?? t;
    const blocks = this.series.within(run, t);
    let i = blocks.length - 1;
    let from = t;
    for (; i >= 0 && blocks[i]!.tEnd === from && this.now(condition, blocks[i]!.tEnd) === 'true'; i -= 1)
      from = blocks[i]!.coversFrom;
    if (t - from <= neededSeconds) return {};
    return { unbrokenMinutes: (t - from) / 60, ...(i < 0 && { unbrokenOrMore: true as const }) };
  }

  private facts(held: HeldSeconds, t: number): HeldFacts {
    const short = held.recordSeconds < held.neededSeconds;
    return {
      neededMinutes: held.neededSeconds / 60,
      toleratedMinutes: held.toleratedSeconds / 60,
      recordMinutes: held.recordSeconds / 60,
      trueMinutes: held.trueSeconds / 60,
      falseMinutes: held.falseSeconds / 60,
      notKnownMinutes: (held.recordSeconds - held.trueSeconds - held.falseSeconds) / 60,
      ...(short && { recordStartsAfter: this.series.runAt(t)?.after ?? ('nothing on record' as const) }),
    };
  }
}

/**
 * Evaluates a condition at a block end by Kleene's strong three-valued logic, and gives the whole tree with what was
 * measured: the same function for live work and for the past.
 *
 * Held for N minutes: over the blocks tiling (tEnd − N, tEnd], since the answering tower last changed, any false gives
 * false; else a record shorter than N, or more not known than is tolerated, gives not known; else true. Time that no
 * block covers is not known. A tolerance is the one place where a short silence may count as if nothing had changed;
 * the evidence says how many minutes of it there were.
 *
 * Units: tEnd in UTC epoch seconds. Valid: a condition that passed `validateRule`, any series.
 * Source: [Kleene1952] §64 for the trees; held-for is the project's own rule language.
 */
export function evaluate(
  condition: Condition,
  series: BlockSeries,
  tEnd: number,
  purpose: Purpose,
): EvaluatedNode {
  return evaluator(series, purpose)(condition, tEnd);
}

/**
 * `evaluate` for many block ends of one series: what was worked out for one is remembered for the next.
 *
 * Units: tEnd in UTC epoch seconds. Valid: as `evaluate`. Source: as `evaluate`.
 */
export function evaluator(
  series: BlockSeries,
  purpose: Purpose,
): (condition: Condition, tEnd: number) => EvaluatedNode {
  const evaluation = new Evaluation(series, purpose);
  return (condition, tEnd) => evaluation.node(condition, tEnd);
}
