import { burningKinds, type PublicText } from '../dto/notice-text.dto';
import type { Language, NoticeFacts } from './notice-facts';
import { BURNING_NAMES, CAUTIONS } from './public-words';

const ENDED = {
  burnBan: {
    en: (place: string) => `The burn ban in ${place} has ended`,
    es: (place: string) => `Terminó la prohibición de quemar en ${place}`,
  },
  advisory: {
    en: (place: string) => `The advisory in ${place} has ended`,
    es: (place: string) => `Terminó el aviso en ${place}`,
  },
} as const;

const NO_RESTRICTION = {
  en: 'This notice restricts burning no longer. Your district’s page says what holds now. Thank you for waiting.',
  es: 'Este aviso ya no limita las quemas. La página de su distrito dice qué rige ahora. Gracias por esperar.',
};
const TO_DO = {
  en: [
    'Burn dry wood with plenty of air: it makes less smoke.',
    'An outdoor fire may need a permit; ask first.',
  ],
  es: [
    'Queme leña seca con mucho aire: hace menos humo.',
    'Un fuego al aire libre puede necesitar permiso; pregunte antes.',
  ],
};
const MAY_USE = { en: 'This notice does not restrict it any more.', es: 'Este aviso ya no lo limita.' };

/** What residents are told when a notice has ended before or at its time. It promises nothing about the air. */
export function writeEnded({ kind, district }: NoticeFacts, lang: Language): PublicText {
  return {
    headline: ENDED[kind][lang](district.name),
    untilText: NO_RESTRICTION[lang],
    whatToDo: [...TO_DO[lang]],
    stoves: burningKinds.map((burning) => ({
      kind: burning,
      name: BURNING_NAMES[lang][burning],
      text: MAY_USE[lang],
    })),
    why: '',
    exemptions: '',
    cautions: CAUTIONS[lang](district.ordinanceRef, district.phone),
  };
}
