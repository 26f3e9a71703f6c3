import { endOfStamp, fixedChoice, type TimeKeeping } from './interval-end';
import { happensTwice, type CivilChoice } from './logger-clock';
import { readStamp, type Stamp } from './stamp';
import type { TimeRefusal } from './time-refusal';

/**
 * Reads the stamps of one file in its order. Where the order of the rows is to tell the two passings of a civil hour
 * that happens twice, the first is left when the stamps go back (or, where each row has its own stamp, stand still).
 */
export class TimeReader {
  private readonly fixed: CivilChoice;
  private lastText?: string;
  private lastEnd!: number | TimeRefusal;
  /** The last stamp within an hour that happens twice. */
  private lastTwiceS?: number;
  private isSecond = false;

  /** `ownStamps`: each row has a stamp of its own, so that the same stamp again is the second passing. */
  constructor(
    private readonly time: TimeKeeping,
    private readonly nowS: number,
    private readonly ownStamps: boolean,
  ) {
    this.fixed = fixedChoice(time);
  }

  /** The END of the interval that a stamp marks, UTC epoch seconds; or why not. */
  read(text: string): number | TimeRefusal {
    if (text === this.lastText && !this.goesByOrder) return this.lastEnd;
    const stamp = readStamp(text, this.time.form);
    this.lastText = text;
    this.lastEnd =
      'code' in stamp ? stamp : endOfStamp(stamp, text, this.time, this.nowS, this.choiceFor(stamp));
    return this.lastEnd;
  }

  private get goesByOrder(): boolean {
    return this.time.repeatedHour === 'in-order' && 'zone' in this.time.clock;
  }

  private choiceFor({ shownS, offsetS }: Stamp): CivilChoice {
    const { clock } = this.time;
    if (!this.goesByOrder || !('zone' in clock) || offsetS !== undefined) return this.fixed;
    if (!happensTwice(shownS, clock.zone)) {
      this.lastTwiceS = undefined;
      this.isSecond = false;
      return this.fixed;
    }
    const last = this.lastTwiceS;
    if (last !== undefined && (shownS < last || (this.ownStamps && shownS === last))) this.isSecond = true;
    this.lastTwiceS = shownS;
    return { ...this.fixed, repeated: this.isSecond ? 'second' : 'first' };
  }
}
