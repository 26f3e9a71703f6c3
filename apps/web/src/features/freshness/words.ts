import type { Trouble } from './api';

/** The kinds of trouble in words. */
export const KIND_WORDS: Record<Trouble['kind'], string> = {
  late: 'Late',
  silent: 'Silent',
  'clock ahead': 'Clock ahead',
  'clock shifted': 'Clock an hour off',
  'source failing': 'Source fails',
};

/** Who was told of a trouble, as far as the mail server says. */
export function toldWords({ toldAt, mailsAccepted, mailsNotAccepted }: Trouble): string {
  if (toldAt === null) return 'Nobody is told yet';
  const all = mailsAccepted + mailsNotAccepted;
  if (all === 0) return 'No analyst to tell';
  if (mailsNotAccepted === 0) return `${all} ${all === 1 ? 'analyst' : 'analysts'} told by mail`;
  return `${mailsAccepted} of ${all} mails accepted`;
}
