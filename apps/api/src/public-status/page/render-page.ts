import { escapeHtml as e } from '../../common/escape-html';
import type { Language } from '../../notices/texts/notice-facts';
import type { PublicStatusDto } from '../dto/public-status.dto';
import { FRAME_WORDS } from '../words/page-frame';
import { inLanguage, renderAnswer, renderList } from './render-answer';

const OTHER = { en: { lang: 'es', name: 'Español' }, es: { lang: 'en', name: 'English' } } as const;

/** A page before it has its answer: the built application's index.html, or a plain one where nothing was built. */
export const PLAIN_PAGE =
  '<!doctype html><html lang="en"><head><meta charset="utf-8"><meta name="viewport" content="width=device-width, initial-scale=1"><title>Lidwatch</title></head><body><div id="root"></div></body></html>';

/** One district's whole page. */
export function renderDistrictPage(template: string, status: PublicStatusDto, lang: Language): string {
  const title = `${status.texts[lang].headline} · ${status.officeName}`;
  const body = frame(renderAnswer(status, lang), status.officeName, `/d/${status.slug}`, lang);
  return fill(template, { title, lang, body, data: status });
}

/** The whole page that lists the districts. */
export function renderListPage(
  template: string,
  statuses: readonly PublicStatusDto[],
  lang: Language,
): string {
  const office = statuses[0]?.officeName ?? 'Lidwatch';
  const title = `${FRAME_WORDS[lang].listTitle} · ${office}`;
  return fill(template, {
    title,
    lang,
    body: frame(renderList(statuses, lang), office, '/', lang),
    data: statuses,
  });
}

function frame(main: string, office: string, path: string, lang: Language): string {
  const words = FRAME_WORDS[lang];
  const other = OTHER[lang];
  const link = (to: string, text: string) => `<a href="${e(inLanguage(to, lang))}">${e(text)}</a>`;
  return [
    `<div class="public"><header class="public-bar"><a class="public-home" href="${e(inLanguage('/', lang))}">${e(office)}</a>`,
    `<nav aria-label="${e(words.language)}"><a lang="${other.lang}" hreflang="${other.lang}" href="${e(inLanguage(path, other.lang))}">${other.name}</a></nav></header>`,
    `<main>${main}</main><footer class="public-foot">${link('/', words.districts)}${link('/subscribe', words.subscribe)}<a href="/sign-in">${e(words.staff)}</a></footer></div>`,
  ].join('');
}

interface Filling {
  title: string;
  lang: Language;
  body: string;
  /** What the application begins with instead of asking again. */
  data: unknown;
}

/** Puts the answer into the page. Functions as replacements, for `$` in a text must not mean anything. */
function fill(template: string, { title, lang, body, data }: Filling): string {
  const json = JSON.stringify(data).replaceAll('<', '\\u003c');
  const embedded = `<script type="application/json" id="public-status">${json}</script>`;
  return template
    .replace(/<html lang="[^"]*"/, () => `<html lang="${lang}"`)
    .replace(/<title>[^<]*<\/title>/, () => `<title>${e(title)}</title>`)
    .replace('<div id="root"></div>', () => `<div id="root">${body}</div>${embedded}`);
}
