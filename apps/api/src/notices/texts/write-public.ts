import type { Quantity } from '@lidwatch/atmosphere';
import { burningKinds, type PublicText } from '../dto/notice-text.dto';
import { localTime } from './local-time';
import type { Language, NoticeFacts } from './notice-facts';
import { BURNING_NAMES, BURNING_TEXTS, CAUTIONS, EXEMPTIONS } from './public-words';

const HEADLINE = {
  burnBan: {
    en: (place: string) => `Burn ban in ${place}`,
    es: (place: string) => `Prohibido quemar en ${place}`,
  },
  advisory: {
    en: (place: string) => `Advisory in ${place}: please do not burn`,
    es: (place: string) => `Aviso en ${place}: por favor, no queme`,
  },
} as const;

const UNTIL = {
  burnBan: {
    en: (until: string) => `Do not light stoves, fireplaces or outdoor fires until ${until}.`,
    es: (until: string) => `No encienda estufas, chimeneas ni fuegos al aire libre hasta el ${until}.`,
  },
  advisory: {
    en: (until: string) => `Please do not burn wood until ${until}, if you have other heat.`,
    es: (until: string) => `Por favor, no queme leña hasta el ${until} si tiene otra calefacción.`,
  },
} as const;

const TO_DO = {
  burnBan: {
    en: [
      'Let a fire that is already lit burn out and add no wood.',
      'Use your other heat.',
      'Look in on neighbours who may need help keeping warm.',
    ],
    es: [
      'Deje que se apague el fuego que ya arde y no añada leña.',
      'Use su otra calefacción.',
      'Pregunte a sus vecinos si necesitan ayuda para estar calientes.',
    ],
  },
  advisory: {
    en: [
      'Use your other heat if you have it.',
      'If you must burn: dry wood, a small hot fire, plenty of air.',
      'Leave outdoor fires for another day.',
    ],
    es: [
      'Use su otra calefacción si la tiene.',
      'Si tiene que quemar: leña seca, fuego pequeño y vivo, mucho aire.',
      'Deje los fuegos al aire libre para otro día.',
    ],
  },
} as const;

const degrees = (c: number): string => String(Math.max(1, Math.round(c)));

/** Why, in plain words; a tower that ends inside the warm air gives "at least". */
export function whyText(strengthC: Quantity | undefined, lang: Language): string {
  const lid =
    lang === 'en'
      ? 'Cold air is trapped under warmer air, like a lid. Smoke stays at the ground.'
      : 'El aire frío queda atrapado bajo aire más cálido, como bajo una tapa. El humo se queda junto al suelo.';
  if (!strengthC || !Number.isFinite(strengthC.lo) || strengthC.lo < 0.5) return lid;
  const open = strengthC.hi > strengthC.lo;
  return lang === 'en'
    ? `${lid} It is ${open ? 'at least ' : ''}${degrees(strengthC.lo)} °C warmer up on our mast than at the street.`
    : `${lid} Arriba, en nuestra torre, hace ${open ? 'al menos ' : ''}${degrees(strengthC.lo)} °C más que en la calle.`;
}

/** What the public page says of a notice in force. */
export function writePublic(facts: NoticeFacts, lang: Language): PublicText {
  const { kind, district } = facts;
  const until = localTime(facts.expiresAt, district.timeZone, lang);
  return {
    headline: HEADLINE[kind][lang](district.name),
    untilText: UNTIL[kind][lang](until),
    whatToDo: [...TO_DO[kind][lang]],
    stoves: burningKinds.map((burning) => ({
      kind: burning,
      name: BURNING_NAMES[lang][burning],
      text: BURNING_TEXTS[kind][lang][burning],
    })),
    why: whyText(facts.strengthC, lang),
    exemptions: EXEMPTIONS[lang],
    cautions: CAUTIONS[lang](district.ordinanceRef, district.phone),
  };
}
