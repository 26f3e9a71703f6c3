import { Link, useLocation } from 'react-router-dom';
import { LANGUAGE_NAMES, inLanguage, type Language } from './language';

/** A link to the same page in the other language, named in that language. */
export function LanguageSwitch({ lang }: { lang: Language }) {
  const { pathname, search, hash } = useLocation();
  const other = lang === 'en' ? 'es' : 'en';
  const here = pathname + search + hash;
  return (
    <Link to={inLanguage(here, other)} replace lang={other} hrefLang={other}>
      {LANGUAGE_NAMES[other]}
    </Link>
  );
}
