import type { Language } from '../../components/public/language';
import type { Channel, Kind } from '../../lib/api/types';

/** Which notices somebody wants, for which districts, in which language. */
export interface Wishes {
  lang: Language;
  districtSlugs: string[];
  kinds: Kind[];
}

/** What a resident gives to be told next time: an e-mail address, a telephone number, or both. */
export interface SubscriptionRequest extends Wishes {
  email?: string;
  phone?: string;
}

/** A subscriber's own view of their subscription; addresses are masked. */
export interface SubscriptionView extends Wishes {
  contacts: { channel: Channel; address: string; confirmed: boolean }[];
}
