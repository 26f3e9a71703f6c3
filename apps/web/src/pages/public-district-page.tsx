import { useParams } from 'react-router-dom';
import { PublicFrame } from '../components/public/public-frame';
import { PublicMessage } from '../components/public/public-message';
import { useLanguage } from '../components/public/use-language';
import { usePublicDistrict } from '../features/public-status/api';
import { DistrictAnswer } from '../features/public-status/components/district-answer';
import { PAGE_WORDS } from '../features/public-status/words/page-words';

/** What holds in one district, for the people who live there. */
export function PublicDistrictPage() {
  const { slug = '' } = useParams();
  const lang = useLanguage();
  const words = PAGE_WORDS[lang];
  const { data, error } = usePublicDistrict(slug);
  return (
    <PublicFrame title={data?.texts[lang].headline ?? words.listTitle} office={data?.officeName}>
      {error && (
        <div className="public-body">
          <PublicMessage wrong>
            {data ? words.stale : error.status === 404 ? words.notFound : words.failed}
          </PublicMessage>
        </div>
      )}
      {data && <DistrictAnswer status={data} lang={lang} />}
      {!data && !error && <p className="public-body">{words.loading}</p>}
    </PublicFrame>
  );
}
