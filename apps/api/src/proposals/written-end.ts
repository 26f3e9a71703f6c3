import type { RuleDefinition } from '@lidwatch/rules';
import { invalid } from '../common/validation';
import { fromIso, toIso } from '../common/instants';
import type { Proposal } from './models/proposal.model';

const QUARTER_S = 900;

/** When the rule says a notice of this kind must end at the latest, counted from an instant, s. */
const longestS = (kind: Proposal['kind'], rule: RuleDefinition): number =>
  3600 * (rule[kind]?.longestValidityHours ?? 24);

/**
 * The written end that is proposed for a notice: the rule's longest validity from when the proposal was opened, on the
 * quarter hour before. It stays the same while the proposal waits, so that a preview and what is issued agree.
 */
export function suggestedEnd(proposal: Proposal, rule: RuleDefinition): number {
  return Math.floor((proposal.openedAt + longestS(proposal.kind, rule)) / QUARTER_S) * QUARTER_S;
}

/** The written end a person chose, or the suggested one; 422 when it is no instant, past, or beyond what the rule allows. */
export function writtenEnd(
  proposal: Proposal,
  rule: RuleDefinition,
  chosen: string | undefined,
  now: number,
): number {
  const end = chosen === undefined ? suggestedEnd(proposal, rule) : fromIso(chosen);
  const fault = (text: string) => invalid([{ field: 'expiresAt', text }]);
  if (end === undefined)
    throw fault('Write the end as an instant with its offset, such as 2026-01-16T18:00:00Z.');
  if (end <= now) throw fault(`The end ${toIso(end)} is past. Choose a later one.`);
  const latest = now + longestS(proposal.kind, rule);
  if (end > latest) throw fault(`The rule lets such a notice hold until ${toIso(latest)} at the latest.`);
  return end;
}
