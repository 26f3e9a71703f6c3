import type { NoticeText, NoticeTexts } from '../dto/notice-text.dto';
import { mailHtml } from './mail-html';
import { shortLocalTime } from './local-time';
import type { Language, NoticeFacts } from './notice-facts';
import { toGsm7 } from './sms-segments';
import { writeEnded } from './write-ended';
import { writePublic } from './write-public';

/** Where delivery puts the link to a recipient's own page. */
export const MANAGE_URL = '{manageUrl}';

const LEAVE = {
  en: (url: string) => `Change what you get, or leave: ${url}`,
  es: (url: string) => `Cambiar lo que recibe o darse de baja: ${url}`,
};
const MORE = { en: 'More, and whether it still holds', es: 'Más información y si sigue vigente' };
const REFERENCE = { en: 'Reference', es: 'Referencia' };

/** The notice's page. */
export const pageOf = ({ publicUrl, district }: NoticeFacts, lang: Language): string =>
  `${publicUrl}/d/${district.slug}${lang === 'en' ? '' : `?lang=${lang}`}`;

/** A notice's words in both languages, for mail, text message and public page. */
export function writeNotice(facts: NoticeFacts): NoticeTexts {
  return { en: writeIn(facts, 'en'), es: writeIn(facts, 'es') };
}

function writeIn(facts: NoticeFacts, lang: Language): NoticeText {
  const shown = facts.act === 'begin' ? writePublic(facts, lang) : writeEnded(facts, lang);
  const page = pageOf(facts, lang);
  const paragraphs = [
    shown.untilText,
    shown.whatToDo.map((line) => `- ${line}`).join('\n'),
    facts.act === 'begin' ? shown.stoves.map(({ name, text }) => `${capital(name)}: ${text}`).join('\n') : '',
    shown.why,
    shown.exemptions,
    ...shown.cautions,
    `${MORE[lang]}: ${page}`,
    `${facts.officeName} · ${REFERENCE[lang]} ${facts.ref}`,
    LEAVE[lang](MANAGE_URL),
  ].filter((paragraph) => paragraph !== '');
  return {
    subject: `${shown.headline} (${facts.ref})`,
    mailText: `${shown.headline}\n\n${paragraphs.join('\n\n')}\n`,
    mailHtml: mailHtml(shown.headline, paragraphs, facts.kind, facts.act),
    sms: smsOf(facts, lang, page),
    public: shown,
  };
}

/** The text message: who, what, where, until when, the one exception, where to read on, how to leave. */
function smsOf(facts: NoticeFacts, lang: Language, page: string): string {
  const { kind, act, officeName, ref, district } = facts;
  const until = shortLocalTime(facts.expiresAt, district.timeZone, lang);
  const words =
    act === 'end'
      ? {
          en: `${kind === 'burnBan' ? 'burn ban' : 'advisory'} in ${district.name} has ended.`,
          es: `${kind === 'burnBan' ? 'la prohibición de quemar' : 'el aviso'} en ${district.name} terminó.`,
        }
      : {
          burnBan: {
            en: `burn ban in ${district.name} until ${until}. Do not light stoves or fires. Only source of heat is exempt.`,
            es: `prohibido quemar en ${district.name} hasta ${until}. No encienda estufas ni fuegos. Exento si es su única calefacción.`,
          },
          advisory: {
            en: `advisory for ${district.name} until ${until}. Please do not burn wood if you have other heat.`,
            es: `aviso para ${district.name} hasta ${until}. Por favor no queme leña si tiene otra calefacción.`,
          },
        }[kind];
  const leave = lang === 'en' ? 'STOP to leave' : 'ALTO para salir';
  return toGsm7(`${officeName}: ${words[lang]} ${page} ${ref} ${leave}`);
}

const capital = (text: string): string => text.charAt(0).toUpperCase() + text.slice(1);
