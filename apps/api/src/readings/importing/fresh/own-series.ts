import type { LayoutSensor } from '../../../towers/tower-layout';
import type { ParsedReading } from '../../parse/parsed-readings';
import { firstAfter, type Series } from '../../../screening/series';

/** Readings of one sensor that an import brought, the recent ones, in order of time; their flags are not set yet. */
export class OwnSeries implements Series {
  readonly sensorId: number;
  tEnd: number[] = [];
  value: number[] = [];
  rowNo: number[] = [];
  /** None of them carries a flag in the store that this import did not write itself. */
  quality: number[] = [];
  checks: number[] = [];
  /** How many are in the store. */
  written = 0;

  constructor({ id }: LayoutSensor) {
    this.sensorId = id;
  }

  /** Adds a later reading; the last one once more is passed over, any other is out of order and not added. */
  add({ tEnd, value, rowNo }: ParsedReading): 'added' | 'repeated' | 'out of order' {
    const last = this.tEnd.length - 1;
    if (last >= 0 && tEnd <= this.tEnd[last]!)
      return tEnd === this.tEnd[last] && value === this.value[last] ? 'repeated' : 'out of order';
    this.tEnd.push(tEnd);
    this.value.push(value);
    this.rowNo.push(rowNo);
    this.quality.push(0);
    this.checks.push(0);
    return 'added';
  }

  /** How many readings in the store end in (afterT, …]. */
  writtenAfter(afterT: number): number {
    return Math.max(0, this.written - firstAfter(this.tEnd, afterT));
  }

  /** Lets readings until an instant go. */
  dropUntil(t: number): void {
    const drop = firstAfter(this.tEnd, t);
    if (drop === 0) return;
    for (const list of [this.tEnd, this.value, this.rowNo, this.quality, this.checks]) list.splice(0, drop);
    this.written = Math.max(0, this.written - drop);
  }
}
