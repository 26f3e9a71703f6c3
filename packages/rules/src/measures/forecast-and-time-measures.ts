import { numberMeasure } from './measure';

/** What the forecast says of the coming night and day, and what the clock says. */
export const FORECAST_AND_TIME_MEASURES = {
  forecastLowC: numberMeasure('°C', -80, 60, {
    label: { en: 'Forecast low', es: 'Mínima pronosticada' },
    docs: "Lowest temperature forecast for the coming night. Not known once the forecast's validity has passed.",
  }),
  forecastHighC: numberMeasure('°C', -80, 60, {
    label: { en: 'Forecast high', es: 'Máxima pronosticada' },
    docs: "Highest temperature forecast for the coming day. Not known once the forecast's validity has passed.",
  }),
  forecastWindMPerS: numberMeasure('m/s', 0, 75, {
    label: { en: 'Forecast wind', es: 'Viento pronosticado' },
    docs: "Wind forecast for the coming night. Not known once the forecast's validity has passed.",
  }),
  forecastMixingHeightM: numberMeasure('m', 0, 10_000, {
    label: { en: 'Forecast mixing height', es: 'Altura de mezcla pronosticada' },
    decimals: 0,
    docs: "Mixing height forecast for the coming day. Not known once the forecast's validity has passed.",
  }),
  hourOfDay: numberMeasure('h', 0, 23, {
    label: { en: 'Hour of the day', es: 'Hora del día' },
    decimals: 0,
    whole: true,
    docs: "Hour in the district's own zone in which the block ends, 0 to 23.",
  }),
  month: numberMeasure('', 1, 12, {
    label: { en: 'Month', es: 'Mes' },
    decimals: 0,
    whole: true,
    docs: "Month in the district's own zone, 1 (January) to 12.",
  }),
} as const;
