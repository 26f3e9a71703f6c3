import { Link } from 'react-router-dom';
import { inLanguage, type Language } from '../../../components/public/language';
import { StateShape } from '../../../components/ui/state-shape';
import type { PublicStatus } from '../public-status';
import { STATE_CLASS, STATE_SHAPE } from '../state-class';
import { PAGE_WORDS } from '../words/page-words';

/** Every district with what holds there, one line each, the whole line a link. */
export function DistrictList({ statuses, lang }: { statuses: PublicStatus[]; lang: Language }) {
  const words = PAGE_WORDS[lang];
  if (statuses.length === 0) return <p>{words.noDistricts}</p>;
  return (
    <ul className="district-list">
      {statuses.map(({ slug, name, state, texts }) => (
        <li key={slug}>
          <Link to={inLanguage(`/d/${slug}`, lang)}>
            <strong>{name}</strong>
            <span className={`state-word state-${STATE_CLASS[state]}`}>
              <StateShape state={STATE_SHAPE[state]} />
              {words.states[state]}
            </span>
            <span className="until">{texts[lang].untilText}</span>
          </Link>
        </li>
      ))}
    </ul>
  );
}
