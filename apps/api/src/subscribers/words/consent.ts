import type { Language } from '../dto/subscription.dto';

/** What a resident agrees to when they subscribe; kept with each consent as it was worded. */
export const CONSENT_TEXT: Readonly<Record<Language, string>> = {
  en: 'I want notices about burning for the districts I chose. I can leave at any time by link or by texting STOP.',
  es: 'Quiero avisos sobre quemas para los distritos que elegí. Puedo darme de baja con un enlace o enviando ALTO.',
};
