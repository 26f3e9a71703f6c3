import { numberMeasure } from './measure';

/** What decides how far smoke spreads, and how much of it there is. */
export const SMOKE_MEASURES = {
  mixingHeightM: numberMeasure('m', 0, 10_000, {
    label: { en: 'Mixing height', es: 'Altura de mezcla' },
    decimals: 0,
    docs:
      "Height to which a parcel warmed to the day's forecast high rises dry-adiabatically (parcel method). " +
      '"At least" beyond the top of the tower.',
  }),
  ventilationIndexM2PerS: numberMeasure('m²/s', 0, 500_000, {
    label: { en: 'Ventilation index', es: 'Índice de ventilación' },
    decimals: 0,
    docs: 'Mixing height times the forecast wind, which stands for the transport wind: no mast measures that.',
  }),
  surfaceTemperatureC: numberMeasure('°C', -80, 60, {
    label: { en: 'Temperature near the ground', es: 'Temperatura cerca del suelo' },
    docs: 'Block mean at the lowest level of the answering tower.',
  }),
  relativeHumidityPct: numberMeasure('%', 0, 110, {
    label: { en: 'Relative humidity', es: 'Humedad relativa' },
    decimals: 0,
    docs: 'Block mean over water at the lowest level that measures humidity.',
  }),
  windSpeedMPerS: numberMeasure('m/s', 0, 75, {
    label: { en: 'Wind', es: 'Viento' },
    docs: 'Block mean at the lowest level that measures wind.',
  }),
  pm25Hour: numberMeasure('µg/m³', -10, 2000, {
    label: { en: 'PM2.5, last hour', es: 'PM2.5, última hora' },
    docs: "Mean of the newest full hour at the district's monitor.",
  }),
  pm25NowCast: numberMeasure('µg/m³', 0, 2000, {
    label: { en: 'PM2.5 NowCast', es: 'PM2.5 NowCast' },
    docs: 'NowCast of the last twelve hours (US EPA); not known unless two of the newest three hours are there.',
  }),
  pm25Day: numberMeasure('µg/m³', -10, 2000, {
    label: { en: 'PM2.5, calendar day', es: 'PM2.5, día civil' },
    docs:
      'Mean from midnight to midnight local standard time, of at least 18 hours (40 CFR 50 App. N): ' +
      'that of the last finished day.',
  }),
  pm25Running24h: numberMeasure('µg/m³', -10, 2000, {
    label: { en: 'PM2.5, last 24 hours', es: 'PM2.5, últimas 24 horas' },
    docs: 'Mean of the last 24 hourly values, of at least 18. Not the regulatory 24-hour mean.',
  }),
} as const;
