import type { Language } from '../../../components/public/language';
import type { SubscriptionView } from '../subscription';
import { SUBSCRIPTION_WORDS } from '../words';

/** Where a subscriber is reached, masked, and which of it still has to be confirmed. */
export function MyContacts({ contacts, lang }: { contacts: SubscriptionView['contacts']; lang: Language }) {
  const words = SUBSCRIPTION_WORDS[lang];
  return (
    <section>
      <h2>{words.reach}</h2>
      <ul className="contact-list">
        {contacts.map(({ channel, address, confirmed }) => (
          <li key={channel + address}>
            {address}
            {!confirmed && <span className="mute"> ({words.notConfirmed})</span>}
          </li>
        ))}
      </ul>
    </section>
  );
}
