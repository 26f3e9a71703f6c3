import { useLayoutEffect } from 'react';
import { useSearchParams } from 'react-router-dom';
import { languageOf, type Language } from './language';

/** The page's language by `?lang=`; the document says so too, for screen readers and hyphenation. */
export function useLanguage(): Language {
  const [search] = useSearchParams();
  const lang = languageOf(search);
  useLayoutEffect(() => {
    document.documentElement.lang = lang;
  }, [lang]);
  return lang;
}
