import { PublicFrame } from '../components/public/public-frame';
import { PublicMessage } from '../components/public/public-message';
import { useLanguage } from '../components/public/use-language';
import { usePublicStatus } from '../features/public-status/api';
import { DistrictList } from '../features/public-status/components/district-list';
import { PAGE_WORDS } from '../features/public-status/words/page-words';

/** The residents' first page: every district with what holds there. */
export function PublicListPage() {
  const lang = useLanguage();
  const words = PAGE_WORDS[lang];
  const { data, error } = usePublicStatus();
  return (
    <PublicFrame title={words.listTitle} office={data?.[0]?.officeName}>
      <div className="public-body">
        <div>
          <h1>{words.listTitle}</h1>
          <p>{words.listLead}</p>
        </div>
        {error && <PublicMessage wrong>{data ? words.stale : words.failed}</PublicMessage>}
        {data && <DistrictList statuses={data} lang={lang} />}
        {!data && !error && <p>{words.loading}</p>}
      </div>
    </PublicFrame>
  );
}
