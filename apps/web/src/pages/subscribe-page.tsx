import { useState } from 'react';
import { useSearchParams } from 'react-router-dom';
import { PublicFrame } from '../components/public/public-frame';
import { PublicMessage } from '../components/public/public-message';
import { useLanguage } from '../components/public/use-language';
import { LookForTheLink } from '../features/subscriptions/components/look-for-the-link';
import { SubscribeForm, type SubscribeEntries } from '../features/subscriptions/components/subscribe-form';
import { SUBSCRIPTION_WORDS } from '../features/subscriptions/words';
import { usePublicDistricts, usePublicOffice } from '../lib/api/use-public-districts';

/** Where residents ask to be told next time; the district they came from is ticked already. */
export function SubscribePage() {
  const lang = useLanguage();
  const office = usePublicOffice();
  const words = SUBSCRIPTION_WORDS[lang];
  const { data: districts, error } = usePublicDistricts();
  const [search] = useSearchParams();
  const [sent, setSent] = useState(false);
  const [entries, setEntries] = useState<SubscribeEntries>(() => ({
    email: '',
    phone: '',
    lang,
    districtSlugs: search.getAll('district'),
    kinds: ['burnBan', 'advisory'],
  }));
  const onSent = (typed: SubscribeEntries) => {
    setEntries(typed);
    setSent(true);
  };
  return (
    <PublicFrame title={sent ? words.sentTitle : words.title} office={office}>
      <div className="public-body">
        {sent ? (
          <LookForTheLink
            lang={lang}
            byMail={entries.email.trim() !== ''}
            byText={entries.phone.trim() !== ''}
            onBack={() => setSent(false)}
          />
        ) : (
          <>
            <div>
              <h1>{words.title}</h1>
              <p>{words.lead}</p>
            </div>
            {error && !districts && <PublicMessage wrong>{error.message}</PublicMessage>}
            {!districts && !error && <p>{words.loading}</p>}
            {districts && (
              <SubscribeForm districts={districts} lang={lang} entries={entries} onSent={onSent} />
            )}
          </>
        )}
      </div>
    </PublicFrame>
  );
}
