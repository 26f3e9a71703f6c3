import { Injectable } from '@nestjs/common';
import { ActivityService } from '../activity/activity.service';
import type { SignedIn } from '../auth/signed-in';
import { Clock } from '../common/clock';
import { toIso } from '../common/instants';
import { invalid } from '../common/validation';
import { UnitOfWork } from '../database/unit-of-work';
import { DistrictsService } from '../districts/districts.service';
import { TowersService } from '../towers/towers.service';
import type {
  ForecastDto,
  ForecastInput,
  ForecastSkillDto,
  ForecastsQuery,
  ForecastTableResultDto,
  OutcomeDto,
} from './dto/forecast.dto';
import { ForecastRows, type ForecastSays, type StoredForecast, type StoredOutcome } from './forecast-rows';
import { isDay, readForecastTable } from './forecast-table';
import { addDays, localDay, localInstant } from './local-days';
import { LEAST_PAIRS, skillOf, type Pair, type Skill } from './skill';

/** Nothing sound is said of nights further ahead than this, days. */
const MOST_AHEAD_DAYS = 10;
/** So many days are given at a time, at most. */
const MOST_DAYS = 400;
const SKILL_DAYS = 30;
/** An entry made by this local hour of its day was a forecast of the night. */
const IN_TIME_HOUR = 18;

const SAYS: readonly (keyof ForecastSays)[] = ['highC', 'lowC', 'cloudPercent', 'windMPerS', 'mixingHeightM'];

const saysOf = (given: Partial<ForecastSays>): ForecastSays => ({
  ...{ highC: given.highC ?? null, lowC: given.lowC ?? null, cloudPercent: given.cloudPercent ?? null },
  ...{ windMPerS: given.windMPerS ?? null, mixingHeightM: given.mixingHeightM ?? null },
});

/** Days' forecasts: entered, read from tables, and held beside what they turned out to be. */
@Injectable()
export class ForecastsService {
  constructor(
    private readonly rows: ForecastRows,
    private readonly districts: DistrictsService,
    private readonly towers: TowersService,
    private readonly work: UnitOfWork,
    private readonly clock: Clock,
    private readonly activity: ActivityService,
  ) {}

  /** The forecasts of a district for some days, the newest day first, each with its newest entry. */
  async list({ districtId, from, to }: ForecastsQuery): Promise<ForecastDto[]> {
    await this.districts.get(districtId);
    this.checkSpan(from, to);
    const entries = await this.rows.between([districtId], from, to);
    const outcomes = await this.shownOutcomes(districtId, from, to);
    const days = new Map<string, StoredForecast[]>();
    for (const entry of entries) days.set(entry.forDay, [...(days.get(entry.forDay) ?? []), entry]);
    return [...days]
      .sort(([a], [b]) => (a < b ? 1 : -1))
      .map(([day, all]) => show(all.at(-1)!, all.length, outcomes.get(day) ?? null));
  }

  /** Enters a forecast; an earlier one for the same day stays on the record, and this one counts from now on. */
  async enter(
    input: ForecastInput,
    by: SignedIn | null,
    origin: StoredForecast['origin'] = 'entered',
  ): Promise<ForecastDto> {
    const district = await this.districts.get(input.districtId);
    const says = saysOf(input);
    if (SAYS.every((key) => says[key] === null)) {
      throw invalid([
        { field: 'lowC', text: 'Say at least one of low, wind, cloud, high or mixing height.' },
      ]);
    }
    if (says.lowC !== null && says.highC !== null && says.lowC > says.highC + 20) {
      throw invalid([{ field: 'lowC', text: 'The low is far above the high: have the two been exchanged?' }]);
    }
    this.checkDay(input.day, district.timeZone);
    const id = await this.work.run(async () => {
      const entry = { districtId: district.id, forDay: input.day, note: input.note ?? '', origin, ...says };
      const made = await this.rows.add({ ...entry, enteredAt: this.clock.now() }, by?.id ?? null);
      await this.record('forecast entered', district.id, by, { day: input.day, ...says });
      return made;
    });
    return show(await this.rows.find(id), 1, null);
  }

  /** Enters a table of forecasts; what says the same as what counts already is not entered again. */
  async enterTable(text: string, by: SignedIn): Promise<ForecastTableResultDto> {
    const districts = await this.districts.list();
    const { rows, refused } = readForecastTable(text, districts);
    const zones = new Map(districts.map(({ id, timeZone }) => [id, timeZone]));
    const [taken, late]: [typeof rows, typeof refused] = [[], []];
    for (const row of rows) {
      const fault = this.dayFault(row.forDay, zones.get(row.districtId)!);
      if (fault === undefined) taken.push(row);
      else late.push({ row: row.row, text: `Row ${row.row}, column "day": ${fault}` });
    }
    const repeated = await this.work.run(async () => {
      let known = 0;
      for (const { row: _, ...row } of taken) {
        const before = (await this.rows.between([row.districtId], row.forDay, row.forDay)).at(-1);
        if (before && SAYS.every((key) => before[key] === row[key]) && before.note === row.note) known += 1;
        else await this.rows.add({ ...row, origin: 'uploaded', enteredAt: this.clock.now() }, by.id);
      }
      if (taken.length > known)
        await this.record('forecasts uploaded', null, by, { rows: taken.length - known });
      return known;
    });
    const all = [...refused, ...late].sort((a, b) => a.row - b.row);
    return { taken: taken.length - repeated, repeated, refused: all };
  }

  /** How the forecasts of the last 30 days did that were entered by the evening of their day. */
  async skill(districtId: number): Promise<ForecastSkillDto> {
    const { timeZone } = await this.districts.get(districtId);
    const today = localDay(timeZone, this.clock.now());
    const span = [addDays(today, -SKILL_DAYS), today] as const;
    const entries = await this.rows.between([districtId], ...span);
    const inTime = entries.filter(
      ({ forDay, enteredAt }) => enteredAt <= localInstant(timeZone, forDay, IN_TIME_HOUR),
    );
    const newest = new Map(inTime.map((entry) => [entry.forDay, entry]));
    const outcomes = await this.rows.outcomes(districtId, ...span);
    const of = (key: 'lowC' | 'highC' | 'windMPerS'): Skill =>
      skillOf(
        outcomes.flatMap((outcome): Pair[] => {
          const [said, came] = [newest.get(outcome.forDay)?.[key] ?? null, outcome[key]];
          return said === null || came === null ? [] : [[said, came]];
        }),
      );
    return { lowC: of('lowC'), highC: of('highC'), windMPerS: of('windMPerS'), least: LEAST_PAIRS };
  }

  private async shownOutcomes(
    districtId: number,
    from: string,
    to: string,
  ): Promise<Map<string, OutcomeDto>> {
    const names = new Map((await this.towers.list()).map(({ id, name }) => [id, name]));
    const outcomes = await this.rows.outcomes(districtId, from, to);
    return new Map(
      outcomes.map((outcome) => [outcome.forDay, showOutcome(outcome, names.get(outcome.towerId) ?? '')]),
    );
  }

  private checkSpan(from: string, to: string): void {
    for (const [field, day] of [
      ['from', from],
      ['to', to],
    ] as const) {
      if (!isDay(day)) throw invalid([{ field, text: `"${day}" is no day; write it as 2026-01-31.` }]);
    }
    if (to < from || addDays(from, MOST_DAYS) < to) {
      throw invalid([{ field: 'to', text: `Ask for ${MOST_DAYS} days at most, the first one first.` }]);
    }
  }

  private checkDay(day: string, timeZone: string): void {
    const fault = isDay(day) ? this.dayFault(day, timeZone) : `"${day}" is no day; write it as 2026-01-31.`;
    if (fault !== undefined) throw invalid([{ field: 'day', text: fault }]);
  }

  private dayFault(day: string, timeZone: string): string | undefined {
    const today = localDay(timeZone, this.clock.now());
    if (day > addDays(today, MOST_AHEAD_DAYS))
      return `${day} is more than ${MOST_AHEAD_DAYS} days ahead; look at the year.`;
    return day < '1990-01-01' ? `${day} lies before 1990; look at the year.` : undefined;
  }

  private record(act: string, districtId: number | null, by: SignedIn | null, body: object): Promise<void> {
    const subject = districtId === null ? 'forecasts' : `district ${districtId}`;
    return this.activity.record({
      actor: by ?? 'service',
      act,
      subject,
      ...(districtId === null ? {} : { districtId }),
      body,
    });
  }
}

const showOutcome = (
  { lowC, highC, windMPerS, mixingLo, mixingHi, hours }: StoredOutcome,
  towerName: string,
): OutcomeDto => ({
  lowC,
  highC,
  windMPerS,
  mixingAtLeastM: mixingLo,
  mixingAtMostM: mixingHi,
  towerName,
  hours,
});

const show = (
  { forDay, enteredAt, ...entry }: StoredForecast,
  entries: number,
  outcome: OutcomeDto | null,
): ForecastDto => ({ ...entry, day: forDay, enteredAt: toIso(enteredAt), entries, outcome });
