import type { Lifecycle } from './lifecycle';

/** Where somebody's account stands: invited (no password yet), active, retired. */
export type UserState = 'invited' | 'active' | 'retired';

/** What happens to an account. */
export type UserAct = 'accept' | 'retire';

/** An account's lifecycle. A retired account is kept, because the record names it, and never comes back. */
export const userLifecycle = {
  first: 'invited',
  transitions: [
    { from: 'invited', act: 'accept', to: 'active' },
    { from: 'invited', act: 'retire', to: 'retired' },
    { from: 'active', act: 'retire', to: 'retired' },
  ],
} as const satisfies Lifecycle<UserState, UserAct>;
