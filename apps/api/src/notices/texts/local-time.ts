import type { Language } from './notice-facts';

const LOCALE: Record<Language, string> = { en: 'en-US', es: 'es-US' };

/**
 * An instant as residents read it, in their zone and with the zone's name: `Thursday 15 January, 11:00 MST`.
 *
 * Units: UTC epoch seconds. Valid: any instant; `timeZone` is an IANA zone.
 */
export function localTime(epochS: number, timeZone: string, lang: Language): string {
  const parts = new Intl.DateTimeFormat(LOCALE[lang], {
    timeZone,
    weekday: 'long',
    day: 'numeric',
    month: 'long',
    hour: '2-digit',
    minute: '2-digit',
    hourCycle: 'h23',
    timeZoneName: 'short',
  }).formatToParts(epochS * 1000);
  const of = (type: Intl.DateTimeFormatPartTypes) => parts.find((part) => part.type === type)?.value ?? '';
  const day = lang === 'en' ? `${of('day')} ${of('month')}` : `${of('day')} de ${of('month')}`;
  return `${of('weekday')} ${day}, ${of('hour')}:${of('minute')} ${of('timeZoneName')}`;
}

/** The same, short enough for a text message: `Thu 11:00`. */
export function shortLocalTime(epochS: number, timeZone: string, lang: Language): string {
  const parts = new Intl.DateTimeFormat(LOCALE[lang], {
    timeZone,
    weekday: 'short',
    day: 'numeric',
    hour: '2-digit',
    minute: '2-digit',
    hourCycle: 'h23',
  }).formatToParts(epochS * 1000);
  const of = (type: Intl.DateTimeFormatPartTypes) => parts.find((part) => part.type === type)?.value ?? '';
  return `${of('weekday')} ${of('day')}, ${of('hour')}:${of('minute')}`;
}
