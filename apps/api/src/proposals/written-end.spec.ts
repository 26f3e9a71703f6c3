import { eveningRule } from '../testing/evening';
import type { Proposal } from './models/proposal.model';
import { suggestedEnd, writtenEnd } from './written-end';

const OPENED = Date.UTC(2026, 0, 15, 20, 7) / 1000;
const proposal = { kind: 'advisory', openedAt: OPENED } as Proposal;

test('the suggested end is the longest validity from the opening, on the quarter hour, however long it waits', () => {
  expect(suggestedEnd(proposal, eveningRule)).toBe(Date.UTC(2026, 0, 16, 20) / 1000);
  expect(writtenEnd(proposal, eveningRule, undefined, OPENED + 7200)).toBe(Date.UTC(2026, 0, 16, 20) / 1000);
});

test('a person may choose an earlier one', () => {
  expect(writtenEnd(proposal, eveningRule, '2026-01-16T05:00:00-07:00', OPENED)).toBe(
    Date.UTC(2026, 0, 16, 12) / 1000,
  );
});

test.each([
  ['that is no instant', '2026-01-16', 'Write the end'],
  ['that is past', '2026-01-15T20:00:00Z', 'is past'],
  ['beyond what the rule allows', '2026-01-17T20:00:00Z', 'at the latest'],
])('an end %s is refused', (_, chosen, text) => {
  expect(() => writtenEnd(proposal, eveningRule, chosen, OPENED)).toThrow(text);
});
