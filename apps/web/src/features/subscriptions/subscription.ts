import type { components } from '../../lib/api/schema';

type Shapes = components['schemas'];

/** A subscriber's own view of their subscription; addresses are masked. */
export type SubscriptionView = Shapes['SubscriptionView'];
/** Which notices somebody wants, for which districts, in which language. */
export type Wishes = Pick<SubscriptionView, 'lang' | 'districtSlugs' | 'kinds'>;
/** What a resident gives to be told next time: an e-mail address, a telephone number, or both. */
export type SubscriptionRequest = Shapes['SubscriptionRequest'];
