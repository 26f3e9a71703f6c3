/** The languages residents are answered in. */
export type Language = 'en' | 'es';

/** Each language by its own name, for the switch between them. */
export const LANGUAGE_NAMES: Readonly<Record<Language, string>> = { en: 'English', es: 'Español' };

/** The language a query string asks for; English when it names none we have. */
export function languageOf(search: URLSearchParams): Language {
  return search.get('lang') === 'es' ? 'es' : 'en';
}

/**
 * A path with the language in its query, so that a link keeps it.
 *
 * Valid: a path of this site, with or without a query. English, the default, is left unsaid.
 */
export function inLanguage(path: string, lang: Language): string {
  const url = new URL(path, 'http://here');
  if (lang === 'en') url.searchParams.delete('lang');
  else url.searchParams.set('lang', lang);
  return url.pathname + url.search + url.hash;
}
