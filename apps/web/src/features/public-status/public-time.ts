import type { Language } from '../../components/public/language';

/** "Thursday, 11:00 MST" ("jueves, 11:00 MST"): day and time in the district's zone, with the zone named. */
export function publicTime(instant: string, timeZone: string, lang: Language): string {
  return new Intl.DateTimeFormat(lang === 'en' ? 'en-US' : 'es-US', {
    timeZone,
    weekday: 'long',
    hour: '2-digit',
    minute: '2-digit',
    hourCycle: 'h23',
    timeZoneName: 'short',
  }).format(new Date(instant));
}
