import {
  fromMeasured,
  isNotKnown,
  makeProfile,
  mixingHeightM,
  notKnown,
  ventilationIndexM2PerS,
} from '@lidwatch/atmosphere';
import type { MeasuredValues } from '@lidwatch/rules';
import type { ForecastBook } from '../../forecasts/known-forecasts';
import { dayForHigh, dayForNight } from '../../forecasts/local-days';
import type { StoredLevel } from '../../profiles/block-facts';
import { WITHOUT_FORECAST } from './measures-json';

const SAYS_NOTHING = 'the forecast does not say';

/**
 * What the forecasts said of the night and the day to come, as they were known at t: low and wind of the night at hand
 * (until noon still last night), high and mixing height of the coming day (until 18:00 still today). The parcel's mixing
 * height rises from the forecast high through the answering tower's profile; the ventilation index is that times the
 * forecast wind.
 */
export function forecastValues(
  book: ForecastBook,
  { districtId, timeZone }: { districtId: number; timeZone: string },
  t: number,
  levels: readonly StoredLevel[],
): MeasuredValues {
  const night = book.at(districtId, dayForNight(timeZone, t), t);
  const day = book.at(districtId, dayForHigh(timeZone, t), t);
  if (!night && !day) return WITHOUT_FORECAST;
  const values: MeasuredValues = {
    ...WITHOUT_FORECAST,
    ...(night && {
      forecastLowC: fromMeasured(night.lowC, SAYS_NOTHING),
      forecastWindMPerS: fromMeasured(night.windMPerS, SAYS_NOTHING),
    }),
    ...(day && {
      forecastHighC: fromMeasured(day.highC, SAYS_NOTHING),
      forecastMixingHeightM: fromMeasured(day.mixingHeightM, SAYS_NOTHING),
    }),
  };
  if (day?.highC == null) return values;
  const profile = makeProfile(
    levels.map(([heightM, temperatureC, sigmaC]) => ({ heightM, temperatureC, sigmaC })),
  );
  const mixing =
    levels.length === 0
      ? notKnown('the tower gave nothing for this block')
      : mixingHeightM(profile, day.highC);
  const wind = values.forecastWindMPerS!;
  const ventilation =
    isNotKnown(mixing) || isNotKnown(wind)
      ? notKnown('it needs a profile, a forecast high and a forecast wind')
      : ventilationIndexM2PerS(mixing, wind);
  return { ...values, mixingHeightM: mixing, ventilationIndexM2PerS: ventilation };
}
