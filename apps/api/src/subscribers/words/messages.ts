import type { Channel } from '../addresses';
import type { Language } from '../dto/subscription.dto';

/** A message to one resident about their own subscription. Texts keep to the GSM alphabet, so that one part is enough. */
export interface Message {
  subject: string;
  text: string;
}

/** The message with the link that confirms an address. */
export function confirmMessage(lang: Language, channel: Channel, office: string, url: string): Message {
  const subject = lang === 'en' ? `Confirm: notices from ${office}` : `Confirme: avisos de ${office}`;
  if (channel === 'sms') {
    const text =
      lang === 'en'
        ? `${office}: confirm burning notices to this number: ${url} Not you? Do nothing.`
        : `${office}: confirme los avisos de quemas a este numero: ${url} No fue usted? No haga nada.`;
    return { subject, text };
  }
  const text =
    lang === 'en'
      ? `Somebody, we hope you, asked ${office} to write to this address when burning is limited.\n\nTo confirm, open this page and press the button (it works for three days):\n${url}\n\nIf it was not you, do nothing: without the button you get no notices.`
      : `Alguien, esperamos que usted, pidió a ${office} que escriba a esta dirección cuando se limiten las quemas.\n\nPara confirmar, abra esta página y pulse el botón (sirve durante tres días):\n${url}\n\nSi no fue usted, no haga nada: sin el botón no recibirá avisos.`;
  return { subject, text };
}

/** The message to somebody who is subscribed already and asked again: the link to their own page. */
export function manageMessage(lang: Language, channel: Channel, office: string, url: string): Message {
  const subject = lang === 'en' ? `Your notices from ${office}` : `Sus avisos de ${office}`;
  if (channel === 'sms') {
    const text =
      lang === 'en'
        ? `${office}: this number gets notices already. Change or leave: ${url}`
        : `${office}: este numero ya recibe avisos. Cambiar o darse de baja: ${url}`;
    return { subject, text };
  }
  const text =
    lang === 'en'
      ? `This address already gets notices about burning from ${office}.\n\nTo change districts, kinds or language, or to leave:\n${url}\n\nIf you did not ask for this message, do nothing.`
      : `Esta dirección ya recibe avisos sobre quemas de ${office}.\n\nPara cambiar distritos, tipos o idioma, o para darse de baja:\n${url}\n\nSi no pidió este mensaje, no haga nada.`;
  return { subject, text };
}
