import type { ProposalDetail } from '../../../lib/api/types';
import { clockTime } from '../../../lib/format/time';

const DONE: Record<string, string> = {
  confirmed: 'Confirmed',
  declined: 'Declined',
  returned: 'Returned to the analyst',
  issued: 'Issued',
  lapsed: 'Lapsed: the condition no longer holds',
};

/** What was last done with a proposal: "Already confirmed by R. Hale at 13:31"; empty while it is open. */
export function stateSentence(
  { state, history }: Pick<ProposalDetail, 'state' | 'history'>,
  zone: string,
): string {
  const done = DONE[state];
  const last = history.at(-1);
  if (!done) return '';
  return last ? `${done} by ${last.by} at ${clockTime(last.at, zone)}.` : `${done}.`;
}
