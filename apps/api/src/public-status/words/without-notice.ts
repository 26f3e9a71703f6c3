import { burningKinds, type BurningKind, type PublicText } from '../../notices/dto/notice-text.dto';
import type { Language } from '../../notices/texts/notice-facts';
import { BURNING_NAMES, CAUTIONS } from '../../notices/texts/public-words';

/** What no notice in force looks like: the air is measured, or it is not. Neither promises clean air. */
export type WithoutNotice = 'no restriction' | 'not known';

interface Words {
  headline: (place: string) => string;
  untilText: string;
  whatToDo: string[];
  why: string;
  stove: string;
  open: string;
}

const WORDS: Record<WithoutNotice, Record<Language, Words>> = {
  'no restriction': {
    en: {
      headline: (place) => `No restriction in force in ${place}`,
      untilText:
        'Nothing forbids a stove here now. Look again before you light one; this can change within the hour.',
      whatToDo: [
        'Burn dry wood with plenty of air: a small hot fire makes less smoke.',
        'Never burn rubbish, painted or treated wood.',
      ],
      why: 'No advisory and no burn ban holds now. That does not mean the air is clean: smoke lies unevenly in a valley.',
      stove: 'You may use it. Dry wood and plenty of air make less smoke.',
      open: 'No notice stops it now, but an outdoor fire may need a permit. Ask first.',
    },
    es: {
      headline: (place) => `Sin restricción vigente en ${place}`,
      untilText:
        'Ahora nada prohíbe encender una estufa aquí. Mire de nuevo antes de encenderla; puede cambiar en menos de una hora.',
      whatToDo: [
        'Queme leña seca con mucho aire: un fuego pequeño y vivo hace menos humo.',
        'Nunca queme basura ni madera pintada o tratada.',
      ],
      why: 'No hay aviso ni prohibición vigente. Eso no significa que el aire esté limpio: el humo se reparte de forma desigual en un valle.',
      stove: 'Puede usarla. La leña seca y mucho aire hacen menos humo.',
      open: 'Ningún aviso lo impide ahora, pero un fuego al aire libre puede necesitar permiso. Pregunte antes.',
    },
  },
  'not known': {
    en: {
      headline: (place) => `We cannot see the air in ${place} right now`,
      untilText:
        'No notice is in force, but our measurements are missing. Please wait with burning if you can.',
      whatToDo: [
        'If you have other heat, use it until we can see again.',
        'If you smell smoke or see haze, do not add to it.',
      ],
      why: 'Our tower has sent nothing lately. Not knowing is not the same as all being well.',
      stove: 'We cannot see the air right now. Please wait if you can, or call us.',
      open: 'We cannot see the air right now. Please wait.',
    },
    es: {
      headline: (place) => `Ahora no podemos ver el aire en ${place}`,
      untilText:
        'No hay ningún aviso vigente, pero faltan nuestras mediciones. Por favor, espere para quemar si puede.',
      whatToDo: [
        'Si tiene otra calefacción, úsela hasta que volvamos a ver.',
        'Si huele humo o ve neblina, no la aumente.',
      ],
      why: 'Nuestra torre no ha enviado nada últimamente. No saber no es lo mismo que estar todo bien.',
      stove: 'Ahora no podemos ver el aire. Por favor, espere si puede, o llámenos.',
      open: 'Ahora no podemos ver el aire. Por favor, espere.',
    },
  },
};

const ONLY_HEAT: Record<Language, string> = {
  en: 'If wood is your only source of heat: keep warm.',
  es: 'Si la leña es su única calefacción: manténgase caliente.',
};

/** What a district's page says when no notice is in force. */
export function withoutNotice(
  state: WithoutNotice,
  lang: Language,
  { name, ordinanceRef, phone }: { name: string; ordinanceRef: string; phone: string },
): PublicText {
  const words = WORDS[state][lang];
  const textFor = (burning: BurningKind) => (burning === 'open burning' ? words.open : words.stove);
  return {
    headline: words.headline(name),
    untilText: words.untilText,
    whatToDo: words.whatToDo,
    stoves: burningKinds.map((kind) => ({ kind, name: BURNING_NAMES[lang][kind], text: textFor(kind) })),
    why: words.why,
    exemptions: state === 'not known' ? ONLY_HEAT[lang] : '',
    cautions: CAUTIONS[lang](ordinanceRef, phone),
  };
}
