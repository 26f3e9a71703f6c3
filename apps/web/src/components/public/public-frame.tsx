import type { ReactNode } from 'react';
import { Link } from 'react-router-dom';
import { inLanguage } from './language';
import { LanguageSwitch } from './language-switch';
import { usePageTitle } from './use-page-title';
import { useLanguage } from './use-language';

const WORDS = {
  en: { districts: 'All districts', subscribe: 'Get notices', staff: 'Staff sign-in', tools: 'Language' },
  es: {
    districts: 'Todos los distritos',
    subscribe: 'Recibir avisos',
    staff: 'Acceso del personal',
    tools: 'Idioma',
  },
} as const;

/** The frame of every residents' page: who speaks, the language, the page's own part, and the few ways on. */
export function PublicFrame({
  title,
  office,
  children,
}: {
  title: string;
  office?: string;
  children: ReactNode;
}) {
  const lang = useLanguage();
  const words = WORDS[lang];
  usePageTitle(title, office);
  return (
    <div className="public">
      <header className="public-bar">
        <Link className="public-home" to={inLanguage('/', lang)}>
          {office ?? words.districts}
        </Link>
        <nav aria-label={words.tools}>
          <LanguageSwitch lang={lang} />
        </nav>
      </header>
      <main>{children}</main>
      <footer className="public-foot">
        <Link to={inLanguage('/', lang)}>{words.districts}</Link>
        <Link to={inLanguage('/subscribe', lang)}>{words.subscribe}</Link>
        <Link to="/sign-in">{words.staff}</Link>
      </footer>
    </div>
  );
}
