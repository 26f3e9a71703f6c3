import { useState } from 'react';
import { Link, useParams } from 'react-router-dom';
import { inLanguage } from '../components/public/language';
import { PublicFrame } from '../components/public/public-frame';
import { PublicMessage } from '../components/public/public-message';
import { useLanguage } from '../components/public/use-language';
import { useSubscription } from '../features/subscriptions/api';
import { LeavePart } from '../features/subscriptions/components/leave-part';
import { MyContacts } from '../features/subscriptions/components/my-contacts';
import { MyWishes } from '../features/subscriptions/components/my-wishes';
import { SUBSCRIPTION_WORDS } from '../features/subscriptions/words';
import { usePublicDistricts, usePublicOffice } from '../lib/api/use-public-districts';

/** A subscriber's own page, by the link in each message: see, change, leave. */
export function SubscriptionPage() {
  const { token = '' } = useParams();
  const lang = useLanguage();
  const office = usePublicOffice();
  const words = SUBSCRIPTION_WORDS[lang];
  const { data: view, error } = useSubscription(token);
  const { data: districts } = usePublicDistricts();
  const [left, setLeft] = useState(false);
  const again = <Link to={inLanguage('/subscribe', lang)}>{words.again}</Link>;
  return (
    <PublicFrame title={left ? words.leftTitle : words.mineTitle} office={office}>
      <div className="public-body">
        <h1>{left ? words.leftTitle : words.mineTitle}</h1>
        {left && (
          <PublicMessage>
            {words.left} {again}
          </PublicMessage>
        )}
        {error && !left && (
          <PublicMessage wrong>
            {error.message} {again}
          </PublicMessage>
        )}
        {(!view || !districts) && !error && !left && <p>{words.loading}</p>}
        {view && districts && !left && (
          <>
            <MyContacts contacts={view.contacts} lang={lang} />
            <MyWishes token={token} lang={lang} view={view} districts={districts} />
            <LeavePart token={token} lang={lang} onLeft={() => setLeft(true)} />
          </>
        )}
      </div>
    </PublicFrame>
  );
}
