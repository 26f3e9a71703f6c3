import type { NoticeKind } from '@lidwatch/contracts';
import type { BurningKind } from '../dto/notice-text.dto';
import type { Language } from './notice-facts';

type PerBurning = Readonly<Record<BurningKind, string>>;

/** What each kind of burning is called. */
export const BURNING_NAMES: Readonly<Record<Language, PerBurning>> = {
  en: {
    uncertified: 'uncertified stove',
    certified: 'certified stove',
    pellet: 'pellet stove',
    fireplace: 'fireplace',
    'open burning': 'open burning',
  },
  es: {
    uncertified: 'estufa sin certificar',
    certified: 'estufa certificada',
    pellet: 'estufa de pellets',
    fireplace: 'chimenea',
    'open burning': 'quema al aire libre',
  },
};

const BAN_EN = 'Do not light it. Let a fire that is already lit burn out; add no more wood.';
const BAN_ES = 'No la encienda. Deje que se apague el fuego que ya arde; no añada más leña.';

/** What may go on, by what is in force. */
export const BURNING_TEXTS: Readonly<Record<NoticeKind, Readonly<Record<Language, PerBurning>>>> = {
  burnBan: {
    en: {
      uncertified: BAN_EN,
      certified: `${BAN_EN} The ban covers certified stoves too.`,
      pellet: 'Do not use it. Turn it off and let it burn out.',
      fireplace: BAN_EN,
      'open burning': 'Do not burn leaves, brush or rubbish outdoors.',
    },
    es: {
      uncertified: BAN_ES,
      certified: `${BAN_ES} La prohibición incluye las estufas certificadas.`,
      pellet: 'No la use. Apáguela y deje que termine de arder.',
      fireplace: BAN_ES,
      'open burning': 'No queme hojas, ramas ni basura al aire libre.',
    },
  },
  advisory: {
    en: {
      uncertified: 'Please do not light it. It makes the most smoke.',
      certified: 'Please use it only if you have no other heat. Burn dry wood with plenty of air.',
      pellet: 'Please use it only if you have no other heat.',
      fireplace: 'Please do not light it. It gives little heat and much smoke.',
      'open burning': "Please wait. The city's rules may forbid it on days like this.",
    },
    es: {
      uncertified: 'Por favor, no la encienda. Es la que más humo hace.',
      certified: 'Por favor, úsela solo si no tiene otra calefacción. Queme leña seca y con mucho aire.',
      pellet: 'Por favor, úsela solo si no tiene otra calefacción.',
      fireplace: 'Por favor, no la encienda. Da poco calor y mucho humo.',
      'open burning': 'Por favor, espere. Las normas de la ciudad pueden prohibirlo en días así.',
    },
  },
};

/** Cautions that stand in every notice and on every public page. General advice; the local ordinance goes before it. */
export const CAUTIONS: Readonly<Record<Language, (ordinanceRef: string, phone: string) => string[]>> = {
  en: (ordinanceRef, phone) => [
    'Never heat with a grill, a camp stove or a generator indoors. Carbon monoxide kills.',
    'Smoke is hard on people with heart or lung disease, on children and on older people: stay in, close windows, keep medicine near, and call a doctor if breathing gets hard.',
    `${ordinanceRef ? `The city's ordinance ${ordinanceRef} is what counts.` : "The city's ordinance is what counts."}${phone ? ` Questions: ${phone}.` : ''} In an emergency call the emergency number.`,
  ],
  es: (ordinanceRef, phone) => [
    'Nunca caliente la casa con una parrilla, un hornillo de camping o un generador. El monóxido de carbono mata.',
    'El humo daña más a personas con enfermedades del corazón o del pulmón, a niños y a mayores: quédese dentro, cierre las ventanas, tenga a mano sus medicinas y llame al médico si le cuesta respirar.',
    `${ordinanceRef ? `Vale lo que dice la ordenanza ${ordinanceRef} de la ciudad.` : 'Vale lo que dice la ordenanza de la ciudad.'}${phone ? ` Preguntas: ${phone}.` : ''} En una emergencia, llame al número de emergencias.`,
  ],
};

/** Who may burn all the same, and what suspends a notice. */
export const EXEMPTIONS: Readonly<Record<Language, string>> = {
  en: 'If wood is your only source of heat you are exempt: keep warm. In severe cold, a power cut or a gas outage, ask whether the ordinance suspends this notice.',
  es: 'Si la leña es su única calefacción, está exento: manténgase caliente. Con frío extremo o un corte de luz o de gas, pregunte si la ordenanza suspende este aviso.',
};
