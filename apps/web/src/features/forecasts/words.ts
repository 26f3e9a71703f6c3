import type { Forecast, ForecastSkill } from './types';

const minus = (text: string): string => text.replace('-', '−');

/** "−14.5", one decimal at most; "–" for nothing. */
export const number = (value: number | null, digits = 1): string =>
  value === null ? '–' : minus(String(Number(value.toFixed(digits))));

/** "+1.2": a difference with its sign. */
export const difference = (said: number | null, came: number | null): string => {
  if (said === null || came === null) return '';
  const value = Number((said - came).toFixed(1));
  return value > 0 ? `+${value}` : minus(String(value));
};

/** The mixing height a day turned out to have, by the parcel method: "at least 60", "40". */
export function mixingInWords(outcome: NonNullable<Forecast['outcome']>): string {
  const { mixingAtLeastM: lo, mixingAtMostM: hi } = outcome;
  if (lo === null && hi === null) return '–';
  return hi === null
    ? `at least ${number(lo, 0)}`
    : lo === hi
      ? number(lo, 0)
      : `${number(lo, 0)} to ${number(hi, 0)}`;
}

const QUANTITIES: readonly { key: 'lowC' | 'highC' | 'windMPerS'; name: string; unit: string }[] = [
  { key: 'lowC', name: 'Lows', unit: '°C' },
  { key: 'highC', name: 'Highs', unit: '°C' },
  { key: 'windMPerS', name: 'Wind', unit: 'm/s' },
];

/** How forecasts did, a sentence for each quantity. */
export function skillInWords(skill: ForecastSkill): string[] {
  return QUANTITIES.map(({ key, name, unit }) => {
    const { n, meanError, meanAbsoluteError } = skill[key];
    if (meanError === null || meanAbsoluteError === null) {
      return `${name}: ${n} of the last 30 days can be compared; ${skill.least} are needed to say anything.`;
    }
    const side =
      Math.abs(meanError) < 0.05 ? 'neither too high nor too low' : meanError > 0 ? 'too high' : 'too low';
    const by = side.startsWith('neither') ? '' : ` by ${number(Math.abs(meanError))} ${unit}`;
    return `${name}: off by ${number(meanAbsoluteError)} ${unit} on average, on the whole ${side}${by} (${n} days).`;
  });
}
