import type { Language } from '../../../components/public/language';
import type { AqiCategory } from '@lidwatch/atmosphere';
import type { PublicState } from '../public-status';

/** The page's own words, beside those the notice brings. */
export interface PageWords {
  listTitle: string;
  listLead: string;
  states: Record<PublicState, string>;
  noDistricts: string;
  myStove: string;
  whatToDo: string;
  why: string;
  column: string;
  smokeNow: string;
  smokeNotKnown: string;
  smokeBy: string;
  category: Record<AqiCategory, string>;
  advice: Record<AqiCategory, string>;
  beyondIndex: string;
  staySafe: string;
  tellMe: string;
  checked: string;
  loading: string;
  failed: string;
  notFound: string;
  stale: string;
  atLeast: string;
}
const en: PageWords = {
  listTitle: 'May I burn today?',
  listLead: 'Choose where you live.',
  states: {
    'no restriction': 'No restriction',
    advisory: 'Advisory',
    'burn ban': 'Burn ban',
    'not known': 'Not known',
  },
  noDistricts: 'No district has been set up yet.',
  myStove: 'My stove is…',
  whatToDo: 'What to do',
  why: 'Why',
  column: 'The air above the ground, from our mast',
  smokeNow: 'Smoke now',
  smokeNotKnown: 'Smoke now: not known',
  smokeBy: 'PM2.5 by NowCast',
  category: {
    Good: 'Good',
    Moderate: 'Moderate',
    'Unhealthy for Sensitive Groups': 'Unhealthy for Sensitive Groups',
    Unhealthy: 'Unhealthy',
    'Very Unhealthy': 'Very Unhealthy',
    Hazardous: 'Hazardous',
  },
  advice: {
    Good: 'Little smoke at the monitor. It can be worse beside a chimney.',
    Moderate: 'If smoke makes you cough or short of breath, take it easier outdoors.',
    'Unhealthy for Sensitive Groups':
      'With asthma, a heart or lung illness, when pregnant, for children and older people: stay in, close windows, keep medicine near.',
    Unhealthy:
      'Everyone: do less outdoors and close windows. With asthma or a heart or lung illness: stay in.',
    'Very Unhealthy': 'Everyone: stay in, close windows, clean the air with a filter if you have one.',
    Hazardous: 'Everyone: stay in and keep the air indoors clean. If you feel ill, call a doctor.',
  },
  beyondIndex: 'beyond the index',
  staySafe: 'Stay safe',
  tellMe: 'Tell me next time',
  checked: 'Looked at',
  loading: 'Looking…',
  failed: 'We cannot tell you right now what holds. Check your connection and try again, or call us.',
  notFound: 'There is no district at this address. Choose yours from the list.',
  stale: 'This page could not be renewed. What you see may be old.',
  atLeast: 'at least',
};

const es: PageWords = {
  listTitle: '¿Puedo quemar hoy?',
  listLead: 'Elija dónde vive.',
  states: {
    'no restriction': 'Sin restricción',
    advisory: 'Aviso',
    'burn ban': 'Prohibido quemar',
    'not known': 'No se sabe',
  },
  noDistricts: 'Todavía no hay ningún distrito.',
  myStove: 'Mi estufa es…',
  whatToDo: 'Qué hacer',
  why: 'Por qué',
  column: 'El aire sobre el suelo, según nuestra torre',
  smokeNow: 'Humo ahora',
  smokeNotKnown: 'Humo ahora: no se sabe',
  smokeBy: 'PM2.5 por NowCast',
  category: {
    Good: 'Buena',
    Moderate: 'Moderada',
    'Unhealthy for Sensitive Groups': 'Dañina para grupos sensibles',
    Unhealthy: 'Dañina',
    'Very Unhealthy': 'Muy dañina',
    Hazardous: 'Peligrosa',
  },
  advice: {
    Good: 'Poco humo en el medidor. Junto a una chimenea puede haber más.',
    Moderate: 'Si el humo le hace toser o le falta el aire, esfuércese menos al aire libre.',
    'Unhealthy for Sensitive Groups':
      'Con asma, una enfermedad del corazón o del pulmón, embarazo, niños y personas mayores: quédese dentro, cierre las ventanas, tenga cerca su medicina.',
    Unhealthy:
      'Todos: hagan menos al aire libre y cierren las ventanas. Con asma o una enfermedad del corazón o del pulmón: quédese dentro.',
    'Very Unhealthy':
      'Todos: quédense dentro, cierren las ventanas y limpien el aire con un filtro si tienen.',
    Hazardous: 'Todos: quédense dentro y mantengan limpio el aire. Si se siente mal, llame a un médico.',
  },
  beyondIndex: 'más allá del índice',
  staySafe: 'Cuídese',
  tellMe: 'Avíseme la próxima vez',
  checked: 'Revisado',
  loading: 'Un momento…',
  failed: 'Ahora no podemos decirle qué rige. Revise su conexión e intente de nuevo, o llámenos.',
  notFound: 'No hay ningún distrito en esta dirección. Elija el suyo en la lista.',
  stale: 'Esta página no se pudo renovar. Lo que ve puede ser antiguo.',
  atLeast: 'al menos',
};

/** The page's words by language. */
export const PAGE_WORDS: Readonly<Record<Language, PageWords>> = { en, es };
