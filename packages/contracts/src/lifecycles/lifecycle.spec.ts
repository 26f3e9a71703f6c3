import { after, possibleActs, statesBefore } from './lifecycle';
import { noticeLifecycle } from './notice-lifecycle';
import { outboxLifecycle } from './outbox-lifecycle';
import { openProposalStates, proposalLifecycle } from './proposal-lifecycle';
import { userLifecycle } from './user-lifecycle';

const lifecycles = { proposalLifecycle, noticeLifecycle, outboxLifecycle, userLifecycle };

describe('lifecycles', () => {
  it.each(Object.entries(lifecycles))('%s reaches every state and has one answer per act', (_, lifecycle) => {
    const steps: readonly { from: string; act: string; to: string }[] = lifecycle.transitions;
    const reached = new Set<string>([lifecycle.first]);
    for (let round = 0; round < steps.length; round++)
      for (const step of steps) if (reached.has(step.from)) reached.add(step.to);
    expect(new Set(steps.flatMap(({ from, to }) => [from, to]))).toEqual(reached);
    expect(new Set(steps.map(({ from, act }) => `${from} ${act}`)).size).toBe(steps.length);
  });

  it('issues a proposal only after somebody confirmed it', () => {
    expect(statesBefore(proposalLifecycle, 'issue')).toEqual(['confirmed']);
    expect(after(proposalLifecycle, 'open', 'issue')).toBeUndefined();
    expect(after(proposalLifecycle, 'open', 'confirm')).toBe('confirmed');
  });

  it('counts as open exactly the proposal states that have a next step', () => {
    const withNextStep = new Set(proposalLifecycle.transitions.map(({ from }) => from));
    expect(new Set(openProposalStates)).toEqual(withNextStep);
  });

  it('lets an ended notice rest', () => {
    expect(possibleActs(noticeLifecycle, 'ended')).toEqual([]);
  });

  it('never sends a message again that the carrier took', () => {
    expect(after(outboxLifecycle, 'accepted', 'retry')).toBeUndefined();
    expect(after(outboxLifecycle, 'delivered', 'retry')).toBeUndefined();
  });
});
