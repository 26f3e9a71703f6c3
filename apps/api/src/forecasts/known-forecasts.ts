import { Injectable } from '@nestjs/common';
import { addDays } from './local-days';
import { ForecastRows, type StoredForecast } from './forecast-rows';

const utcDay = (t: number): string => new Date(t * 1000).toISOString().slice(0, 10);

/** Forecasts as they were known at any instant: an entry counts from when it was made. */
export class ForecastBook {
  private readonly byDay = new Map<string, StoredForecast[]>();

  /** Takes entries in the order in which they were made. */
  constructor(entries: readonly StoredForecast[]) {
    for (const entry of entries) {
      const key = `${entry.districtId} ${entry.forDay}`;
      const kept = this.byDay.get(key);
      if (kept) kept.push(entry);
      else this.byDay.set(key, [entry]);
    }
  }

  /** The forecast for a day as it was known at t; undefined where none had been entered. */
  at(districtId: number, day: string, t: number): StoredForecast | undefined {
    return this.byDay.get(`${districtId} ${day}`)?.findLast(({ enteredAt }) => enteredAt <= t);
  }
}

/** Reads the forecasts that may speak of a stretch of time. */
@Injectable()
export class KnownForecasts {
  constructor(private readonly rows: ForecastRows) {}

  /** The forecasts of some districts that may speak of instants from `from` to `to`, UTC epoch seconds. */
  async book(districtIds: readonly number[], from: number, to: number): Promise<ForecastBook> {
    const days = [addDays(utcDay(from), -2), addDays(utcDay(to), 1)] as const;
    return new ForecastBook(await this.rows.between(districtIds, ...days));
  }
}
