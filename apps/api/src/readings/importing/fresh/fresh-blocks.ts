import type { ScreeningContext } from '@lidwatch/atmosphere';
import { millionths } from '../../../common/exact-decimal';
import { graceS } from '../../../profiles/grace';
import { contextOf, screenStretch } from '../../../screening/screen-tower';
import { firstAfter, type Flags } from '../../../screening/series';
import { blockEndOf, type TowerLayout } from '../../../towers/tower-layout';
import type { ParsedReading } from '../../parse/parsed-readings';
import { BlocksInOrder } from './blocks-in-order';
import type { Fresh } from './fresh';
import { OwnSeries } from './own-series';

const HOUR_S = 3600;
const NO_FLAGS: Flags = { tEnd: [], quality: [], checks: [] };

/**
 * Works out an import's blocks straight from its rows, as long as they come in order of time. A block is final once
 * everything that can influence it has come; what is not final is carried on to the next rows. After rows that go the
 * usual way it begins anew, out of their reach.
 */
export class FreshBlocks {
  private readonly context: ScreeningContext;
  /** As far as a reading can influence another one's flags or an hour's mean, and a block more on either side, s. */
  private readonly marginS: number;
  private series: OwnSeries[] = [];
  private blocks: BlocksInOrder;
  /** Rows must be later; undefined before the first rows. */
  private laterThan: number | undefined;
  /** Blocks in (firstDone, doneUntil] are final. */
  private firstDone = 0;
  private doneUntil = 0;
  /** Ends of the blocks that are marked and wait, and of the last of them ever. */
  private readonly waiting = new Set<number>();
  private lastEnd = -Infinity;
  private epoch = 1;

  constructor(
    private readonly tower: TowerLayout,
    private readonly nowS: number,
  ) {
    this.context = contextOf(tower);
    this.marginS = this.context.beforeS + this.context.afterS + 2 * tower.blockS + HOUR_S;
    this.series = tower.sensors.map((sensor) => new OwnSeries(sensor));
    this.blocks = new BlocksInOrder(tower);
  }

  /**
   * What further rows come to; undefined where they are out of order or not exact, so that they go the usual way.
   * Begins anew where what came until the epoch `passedUntil` went that way.
   */
  add(rows: readonly ParsedReading[], passedUntil = 0): Fresh | undefined {
    if (rows.length === 0) return undefined;
    if (this.epoch <= passedUntil) this.beginAfter(this.front());
    const first = rows.reduce((t, { tEnd }) => Math.min(t, tEnd), Infinity);
    this.begin(first);
    const repeated = this.isLater(first) ? this.take(rows) : undefined;
    if (repeated === undefined) {
      this.beginAfter(
        Math.max(
          this.front(),
          rows.reduce((t, { tEnd }) => Math.max(t, tEnd), -Infinity),
        ),
      );
      return undefined;
    }
    const [afterT, front] = [this.doneUntil, this.front()];
    const untilT = Math.max(afterT, this.finalUntil(front));
    const near = this.near(first, front);
    const flags =
      untilT > afterT
        ? screenStretch(this.tower, this.series, { t0: afterT, t1: untilT }, [])
        : this.series.map(() => NO_FLAGS);
    const found = this.blocks.between(this.series, flags, { t0: afterT, t1: untilT });
    const rowsOf = newRows(this.series, flags);
    this.lastEnd = Math.max(this.lastEnd, blockEndOf(front, this.tower.blockS));
    const heldAfterT = Math.max(this.heldFrom(), afterT - this.marginS);
    const fresh: Fresh = {
      ...{ epoch: this.epoch, repeated },
      ...{ ...rowsOf, ...found, near, waitingEnds: this.nowWaiting(afterT, untilT) },
      ...{ done: { afterT, untilT }, held: { afterT: heldAfterT, untilT: this.lastEnd } },
    };
    this.goOn(untilT);
    return fresh;
  }

  /** Rows that go the usual way. */
  pass(rows: readonly ParsedReading[]): void {
    this.beginAfter(rows.reduce((t, { tEnd }) => Math.max(t, tEnd), this.front()));
  }

  private begin(first: number): void {
    if (this.laterThan !== undefined) return;
    const { blockS } = this.tower;
    this.firstDone = this.doneUntil = blockEndOf(first, blockS) - blockS;
    this.laterThan = this.firstDone - this.marginS;
  }

  /** Begins anew after an instant: what lies within its reach is left to the usual way, too. */
  private beginAfter(t: number): void {
    this.epoch += 1;
    if (t === -Infinity) return;
    this.laterThan = t;
    this.firstDone = this.doneUntil = blockEndOf(t + this.marginS, this.tower.blockS);
    this.series = this.tower.sensors.map((sensor) => new OwnSeries(sensor));
    this.blocks = new BlocksInOrder(this.tower);
    this.waiting.clear();
    this.lastEnd = -Infinity;
  }

  /** Instant of the last reading taken. */
  private front(): number {
    return this.series.reduce((t, { tEnd }) => Math.max(t, tEnd.at(-1) ?? -Infinity), -Infinity);
  }

  /** Whether rows from here on alter nothing that is final. */
  private isLater(first: number): boolean {
    if (first <= this.laterThan!) return false;
    return this.doneUntil === this.firstDone || first - this.context.afterS > this.doneUntil;
  }

  /** Takes rows; how many were repeated, undefined where one is out of order or cannot be kept exactly. */
  private take(rows: readonly ParsedReading[]): number | undefined {
    const bySensor = new Map(this.series.map((series) => [series.sensorId, series]));
    let repeated = 0;
    for (const row of rows) {
      const added = millionths(row.value) === null ? undefined : bySensor.get(row.sensorId)?.add(row);
      if (added === 'repeated') repeated += 1;
      else if (added !== 'added') return undefined;
    }
    return repeated;
  }

  /** The end of the last block that later rows cannot alter and that counts as closed. */
  private finalUntil(front: number): number {
    const { blockS, intervalS } = this.tower;
    const closed = Math.min(front - this.context.afterS - blockS, this.nowS - graceS(intervalS));
    return Math.floor(closed / blockS) * blockS;
  }

  private heldFrom(): number {
    return blockEndOf(this.laterThan!, this.tower.blockS);
  }

  private near(first: number, front: number): Fresh['near'] {
    const afterT = Math.min(this.doneUntil - this.marginS, first - 1);
    return {
      ...{ afterT, untilT: front + this.marginS },
      count: this.series.reduce((n, series) => n + series.writtenAfter(afterT), 0),
      unmarkedAfterT: Math.max(this.lastEnd, this.heldFrom(), afterT),
    };
  }

  /** Ends of the blocks that hold new readings, are not final and were not waiting before. */
  private nowWaiting(afterT: number, untilT: number): number[] {
    const ends = new Set<number>();
    for (const { tEnd, written } of this.series) {
      for (let i = written; i < tEnd.length; i += 1) ends.add(blockEndOf(tEnd[i]!, this.tower.blockS));
    }
    return [...ends].filter((end) => (end <= afterT || end > untilT) && !this.waiting.has(end));
  }

  private goOn(untilT: number): void {
    const { blockS } = this.tower;
    for (const series of this.series) {
      for (let i = series.written; i < series.tEnd.length; i += 1)
        this.waiting.add(blockEndOf(series.tEnd[i]!, blockS));
    }
    for (const end of this.waiting) if (end <= untilT) this.waiting.delete(end);
    this.doneUntil = untilT;
    for (const series of this.series) {
      series.written = series.tEnd.length;
      series.dropUntil(untilT - this.marginS);
    }
  }
}

/** New readings with their flags, and the flags of earlier ones. */
function newRows(
  series: readonly OwnSeries[],
  flags: readonly Flags[],
): Pick<Fresh, 'readings' | 'earlierFlags'> {
  const readings: string[] = [];
  const earlier: string[] = [];
  series.forEach(({ sensorId, tEnd, value, rowNo, written }, s) => {
    const judged = flags[s]!;
    const shift = judged.tEnd.length === 0 ? 0 : firstAfter(tEnd, judged.tEnd[0]! - 1);
    for (let i = shift; i < Math.min(written, shift + judged.tEnd.length); i += 1) {
      const [quality, checks] = [judged.quality[i - shift]!, judged.checks[i - shift]!];
      if (quality !== 0 || checks !== 0) earlier.push(`[${sensorId},${tEnd[i]},${quality},${checks}]`);
    }
    for (let i = written; i < tEnd.length; i += 1) {
      const [quality, checks] = [judged.quality[i - shift] ?? 0, judged.checks[i - shift] ?? 0];
      readings.push(`[${sensorId},${tEnd[i]},${millionths(value[i]!)},${quality},${checks},${rowNo[i]}]`);
    }
  });
  return {
    readings: `[${readings.join()}]`,
    earlierFlags: earlier.length === 0 ? undefined : `[${earlier.join()}]`,
  };
}
