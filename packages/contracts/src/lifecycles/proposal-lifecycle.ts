import type { Lifecycle } from './lifecycle';

/** Where a proposal stands. `returned`: an officer sent a confirmed one back to the analyst. */
export type ProposalState = 'open' | 'confirmed' | 'declined' | 'returned' | 'issued' | 'lapsed';

/** What can be done with a proposal; `lapse` is the service's own act when the condition turned false. */
export type ProposalAct = 'confirm' | 'decline' | 'return' | 'issue' | 'lapse';

/** A proposal's lifecycle: the service opens it, an analyst confirms or declines, an officer issues or returns. */
export const proposalLifecycle = {
  first: 'open',
  transitions: [
    { from: 'open', act: 'confirm', to: 'confirmed' },
    { from: 'open', act: 'decline', to: 'declined' },
    { from: 'open', act: 'lapse', to: 'lapsed' },
    { from: 'returned', act: 'confirm', to: 'confirmed' },
    { from: 'returned', act: 'decline', to: 'declined' },
    { from: 'returned', act: 'lapse', to: 'lapsed' },
    { from: 'confirmed', act: 'issue', to: 'issued' },
    { from: 'confirmed', act: 'return', to: 'returned' },
    { from: 'confirmed', act: 'lapse', to: 'lapsed' },
  ],
} as const satisfies Lifecycle<ProposalState, ProposalAct>;

/** The states that still wait for somebody. */
export const openProposalStates = [
  'open',
  'confirmed',
  'returned',
] as const satisfies readonly ProposalState[];
