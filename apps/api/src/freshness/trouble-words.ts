import type { TroubleKind } from './dto/trouble.dto';

/** An instant as mails and lists write it: UTC, to the minute. */
export const minuteUtc = (epochS: number): string =>
  `${new Date(epochS * 1000).toISOString().slice(0, 16).replace('T', ' ')} UTC`;

/** How long something takes, in words. */
export function span(seconds: number): string {
  const minutes = Math.round(seconds / 60);
  if (minutes < 120) return `${minutes} min`;
  const hours = Math.round(minutes / 60);
  return hours < 48 ? `${hours} h` : `${Math.round(hours / 24)} days`;
}

/** What to look at, by what is wrong. */
export const CURES: Record<TroubleKind, string> = {
  late: 'Look at the logger’s power and its link, and at this tower’s sources.',
  silent:
    'Look at the logger’s power and its link, and at this tower’s sources; retire a tower that is no longer used.',
  'clock ahead':
    'Look at the logger’s clock and at the zone that is set for this tower; the rows are kept as refused and can be sent again.',
  'clock shifted':
    'Look at the logger’s clock and its daylight-saving setting; if it is right now, change this tower’s clock, and withdraw what came in with wrong times.',
  'source failing': 'Look at this tower’s sources: address, folder, sign-in.',
};
