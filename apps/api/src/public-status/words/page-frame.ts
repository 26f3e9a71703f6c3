import type { Language } from '../../notices/texts/notice-facts';
import type { PublicState } from '../dto/public-status.dto';

/** The served page's own words, beside those of the notice. */
export const FRAME_WORDS = {
  en: {
    listTitle: 'May I burn today?',
    listLead: 'Choose where you live.',
    noDistricts: 'No district has been set up yet.',
    myStove: 'My stove is…',
    whatToDo: 'What to do',
    why: 'Why',
    staySafe: 'Stay safe',
    tellMe: 'Tell me next time',
    checked: 'Looked at',
    districts: 'All districts',
    subscribe: 'Get notices',
    staff: 'Staff sign-in',
    language: 'Language',
    smokeNow: 'Smoke now',
    notKnown: 'not known',
  },
  es: {
    listTitle: '¿Puedo quemar hoy?',
    listLead: 'Elija dónde vive.',
    noDistricts: 'Todavía no hay ningún distrito.',
    myStove: 'Mi estufa es…',
    whatToDo: 'Qué hacer',
    why: 'Por qué',
    staySafe: 'Cuídese',
    tellMe: 'Avíseme la próxima vez',
    checked: 'Revisado',
    districts: 'Todos los distritos',
    subscribe: 'Recibir avisos',
    staff: 'Acceso del personal',
    language: 'Idioma',
    smokeNow: 'Humo ahora',
    notKnown: 'no se sabe',
  },
} as const satisfies Record<Language, Record<string, string>>;

/** What holds, in a word or two. */
export const STATE_WORDS: Readonly<Record<Language, Record<PublicState, string>>> = {
  en: {
    'no restriction': 'No restriction',
    advisory: 'Advisory',
    'burn ban': 'Burn ban',
    'not known': 'Not known',
  },
  es: {
    'no restriction': 'Sin restricción',
    advisory: 'Aviso',
    'burn ban': 'Prohibido quemar',
    'not known': 'No se sabe',
  },
};
