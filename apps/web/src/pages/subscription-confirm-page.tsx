import { useParams } from 'react-router-dom';
import { PublicFrame } from '../components/public/public-frame';
import { useLanguage } from '../components/public/use-language';
import { ConfirmAddress } from '../features/subscriptions/components/confirm-address';
import { SUBSCRIPTION_WORDS } from '../features/subscriptions/words';
import { usePublicOffice } from '../lib/api/use-public-districts';

/** Where the link in the first message leads. */
export function SubscriptionConfirmPage() {
  const { token = '' } = useParams();
  const lang = useLanguage();
  const office = usePublicOffice();
  return (
    <PublicFrame title={SUBSCRIPTION_WORDS[lang].confirmTitle} office={office}>
      <div className="public-body">
        <ConfirmAddress token={token} lang={lang} />
      </div>
    </PublicFrame>
  );
}
