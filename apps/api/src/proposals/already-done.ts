import type { ProposalAct, ProposalState } from '@lidwatch/contracts';
import { toIso } from '../common/instants';
import { Problem } from '../common/problem';
import type { Proposal } from './models/proposal.model';
import type { RecordedDeed } from './proposal-record';

const DONE: Readonly<Record<ProposalState, string>> = {
  open: 'Still open',
  confirmed: 'Already confirmed',
  declined: 'Already declined',
  returned: 'Sent back to the analysts',
  issued: 'Already issued',
  lapsed: 'Lapsed',
};
const WAITS_FOR: Readonly<Partial<Record<ProposalAct, string>>> = {
  issue: 'An analyst has to confirm it first.',
  return: 'Only a confirmed proposal can be sent back.',
};

/** What the second of two people is told: who did what, and when. */
export function alreadyDone({ state }: Proposal, act: ProposalAct, last: RecordedDeed | undefined): Problem {
  if (state === 'open' || (state === 'returned' && WAITS_FOR[act])) {
    return new Problem('not-possible-now', `${DONE[state]}. ${WAITS_FOR[act] ?? ''}`.trim());
  }
  if (!last) return new Problem('already-done', `${DONE[state]}.`);
  const by = last.actor === 'service' ? '' : ` by ${last.actor}`;
  return new Problem('already-done', `${DONE[state]}${by} at ${toIso(last.at)}.`, {
    state,
    ...(last.actor !== 'service' && { by: last.actor }),
    at: toIso(last.at),
  });
}
