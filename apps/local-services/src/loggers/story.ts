import { readFileSync } from 'node:fs';
import path from 'node:path';
import { calendar, dayOfDate, localTime } from './basin-time';
import { chance } from './noise';

/** A letter of `winters.json`: one day's weather. */
export type Weather = 'W' | 'K' | 'P' | 'C' | 'X' | '1' | '2' | '3' | '4' | '5' | '6' | 'H' | 'E';

/** Something that befalls a logger, told by day of the season (0 is 1 November) and hour of local standard time. */
export interface Mishap {
  readonly tower: string;
  readonly day: number;
  readonly hour: number;
  readonly hours: number;
  readonly sensor?: string;
  readonly minutes?: number;
}

/** One winter as told in `winters.json`. */
export interface Winter {
  readonly november: string;
  readonly december: string;
  readonly january: string;
  readonly february: string;
  readonly outages: readonly Mishap[];
  readonly stuck: readonly Mishap[];
  readonly clocks: readonly Mishap[];
  readonly nights: readonly { readonly day: number; readonly strengthC: number; readonly meanC: number }[];
}

/** A day within a winter: 0 is 1 November. */
export interface SeasonDay {
  readonly winter: Winter;
  readonly day: number;
}

interface Winters {
  readonly winters: readonly Winter[];
  readonly offSeason: string;
}

/** Where the demo's data lies, seen from the built code as from the source. */
export const DEMO_FOLDER = path.resolve(__dirname, '../../../../fixtures/demo');

/**
 * Days before and after the first start, as they always are: a cold pool of four days whose last night
 * was clear again, and its end.
 */
const AROUND_THE_START: Readonly<Record<number, Weather>> = {
  [-7]: 'W',
  [-6]: 'K',
  [-5]: 'P',
  [-4]: '1',
  [-3]: '2',
  [-2]: '3',
  [-1]: '2',
  0: '3',
  1: '4',
  2: '5',
  3: '6',
  4: 'E',
  5: 'W',
};

/** The story of the basin's weather around the day on which the demo was first started. */
export class Story {
  private readonly told: Winters;
  private readonly startDay: number;
  private readonly known = new Map<number, Weather>();
  private readonly seasons = new Map<number, SeasonDay | undefined>();

  /**
   * @param seed makes one basin differ from another
   * @param firstStart instant of the first start, UTC epoch s; the pool of the last days is told around it
   */
  constructor(
    readonly seed: number,
    readonly firstStart: number,
  ) {
    this.told = JSON.parse(readFileSync(path.join(DEMO_FOLDER, 'winters.json'), 'utf8')) as Winters;
    this.startDay = localTime(firstStart).day;
  }

  /** The weather that begins at nine in the morning of a local day. */
  weather(day: number): Weather {
    const before = this.known.get(day);
    if (before) return before;
    const weather = this.lookUp(day);
    this.known.set(day, weather);
    return weather;
  }

  private lookUp(day: number): Weather {
    const around = AROUND_THE_START[day - this.startDay];
    if (around !== undefined) return around;
    const season = this.season(day);
    const letters =
      season &&
      season.winter.november + season.winter.december + season.winter.january + season.winter.february;
    const letter = letters?.[season?.day ?? 0];
    const other = this.told.offSeason;
    return (letter ?? other[Math.floor(chance(this.seed, 1, day) * other.length)]) as Weather;
  }

  /** The winter that a local day belongs to and its number in it (0 is 1 November), or undefined out of season. */
  season(day: number): SeasonDay | undefined {
    if (!this.seasons.has(day)) this.seasons.set(day, this.lookUpSeason(day));
    return this.seasons.get(day);
  }

  private lookUpSeason(day: number): SeasonDay | undefined {
    const { year } = calendar(day);
    const begun = day >= dayOfDate(year, 11, 1) ? year : year - 1;
    const of = day - dayOfDate(begun, 11, 1);
    const winter = this.told.winters[(begun + 1) % this.told.winters.length];
    return winter && of < 121 ? { winter, day: of } : undefined;
  }

  /** Whether a local day is one of those around the first start, when no logger fails for long. */
  isAroundTheStart(day: number): boolean {
    return day - this.startDay in AROUND_THE_START;
  }
}
