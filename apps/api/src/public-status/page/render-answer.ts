import { escapeHtml as e } from '../../common/escape-html';
import type { PublicText } from '../../notices/dto/notice-text.dto';
import { localTime } from '../../notices/texts/local-time';
import type { Language } from '../../notices/texts/notice-facts';
import { fromIso } from '../../common/instants';
import type { PublicState, PublicStatusDto } from '../dto/public-status.dto';
import { FRAME_WORDS, STATE_WORDS } from '../words/page-frame';

const CLASS: Record<PublicState, string> = {
  'no restriction': 'none',
  advisory: 'advisory',
  'burn ban': 'ban',
  'not known': 'unknown',
};

/** A path that keeps the language. */
export const inLanguage = (path: string, lang: Language): string =>
  lang === 'en' ? path : `${path}${path.includes('?') ? '&' : '?'}lang=${lang}`;

const lines = (items: readonly string[]): string => items.map((item) => `<li>${e(item)}</li>`).join('');

/** The stove question works without a script: radios, and a stylesheet that shows the chosen one's answer. */
function stoves({ stoves: all }: PublicText, legend: string): string {
  const choices = all.map(
    ({ kind, name }, at) =>
      `<label><input type="radio" name="stove" value="${e(kind)}"${at === 0 ? ' checked' : ''}><span>${e(name)}</span></label>`,
  );
  const answers = all.map(
    ({ kind, name, text }) =>
      `<p class="stove-answer" data-stove="${e(kind)}"><strong class="print-only">${e(name)}: </strong>${e(text)}</p>`,
  );
  return `<fieldset class="stove"><legend>${e(legend)}</legend><div class="stove-choices">${choices.join('')}</div><div>${answers.join('')}</div></fieldset>`;
}

/** Smoke at the monitor as a number, or that it is not known; the page's script adds the AQI category. */
function smoke({ smoke: measured }: PublicStatusDto, lang: Language): string {
  if (!measured) return '';
  const words = FRAME_WORDS[lang];
  const { exactly } = measured.pm25;
  const said = exactly === undefined ? words.notKnown : `${Math.round(Math.max(0, exactly))} µg/m³`;
  return `<section><h2>${e(words.smokeNow)}: ${e(said)}</h2></section>`;
}

/** A district's answer as HTML: what holds, until when, what to do, why, cautions. Everything is escaped. */
export function renderAnswer(status: PublicStatusDto, lang: Language): string {
  const words = FRAME_WORDS[lang];
  const text = status.texts[lang];
  const [first = '', ...others] = text.cautions;
  const checked = localTime(fromIso(status.checkedAt) ?? 0, status.timeZone, lang);
  return [
    `<section class="answer answer-${CLASS[status.state]}"><h1><span>${e(text.headline)}</span></h1>`,
    `<p class="until">${e(text.untilText)}</p><p class="checked">${e(words.checked)} ${e(checked)}</p></section>`,
    `<div class="public-body">${stoves(text, words.myStove)}`,
    text.exemptions && `<p class="exemptions">${e(text.exemptions)}</p>`,
    `<section class="to-do"><h2>${e(words.whatToDo)}</h2><ul>${lines(text.whatToDo)}</ul></section>`,
    `<section class="why"><div class="why-card"><div><h2>${e(words.why)}</h2><p>${e(text.why)}</p></div></div></section>`,
    smoke(status, lang),
    `<section class="cautions"><h2>${e(words.staySafe)}</h2><p><strong>${e(first)}</strong></p>${others.map((caution) => `<p>${e(caution)}</p>`).join('')}</section>`,
    `<p><a class="button button-go button-wide" href="${e(inLanguage(`/subscribe?district=${status.slug}`, lang))}">${e(words.tellMe)}</a></p></div>`,
  ].join('');
}

/** The list of districts as HTML, each line a link with what holds there. */
export function renderList(statuses: readonly PublicStatusDto[], lang: Language): string {
  const words = FRAME_WORDS[lang];
  const rows = statuses.map(
    ({ slug, name, state, texts }) =>
      `<li><a href="${e(inLanguage(`/d/${slug}`, lang))}"><strong>${e(name)}</strong><span class="state-word state-${CLASS[state]}">${e(STATE_WORDS[lang][state])}</span><span class="until">${e(texts[lang].untilText)}</span></a></li>`,
  );
  const list =
    rows.length > 0 ? `<ul class="district-list">${rows.join('')}</ul>` : `<p>${e(words.noDistricts)}</p>`;
  return `<div class="public-body"><h1>${e(words.listTitle)}</h1><p>${e(words.listLead)}</p>${list}</div>`;
}
