import type { NewestFirst } from '../journal/newest-first';
import type { OpenedMail } from '../mail/mail-box';
import type { TextMessage } from '../sms/text-message';
import { escapeHtml, page, pageLinks } from './html';

type Shown = 'mail' | 'texts';

const head = (shown: Shown, mails: number, texts: number): string => {
  const link = (name: Shown, words: string) =>
    `<a href="/?show=${name}"${name === shown ? ' aria-current="page"' : ''}>${words}</a>`;
  return (
    `<h1>What arrived</h1><p class="quiet">Stand-ins for the mail and text carriers of this machine. Nothing here was sent to anybody.</p>` +
    `<nav>${link('mail', `Mail (${mails})`)}${link('texts', `Texts (${texts})`)}</nav>`
  );
};

const time = (iso: string) => `<time datetime="${iso}">${iso.slice(0, 19).replace('T', ' ')} UTC</time>`;

/** The list of mail, newest first. */
export const mailListPage = (mails: NewestFirst<OpenedMail>, texts: number): string => {
  const item = (mail: OpenedMail) =>
    `<li><a href="/mail/${mail.n}">${escapeHtml(mail.subject || '(no subject)')}</a><br>to ${escapeHtml(mail.to.join(', '))} ${time(mail.at)}</li>`;
  const list = mails.items.length > 0 ? `<ol>${mails.items.map(item).join('')}</ol>` : '<p>No mail yet.</p>';
  return page(
    'Mail',
    head('mail', mails.total, texts) +
      list +
      pageLinks('/?show=mail', mails.page, mails.pageSize, mails.total),
  );
};

/** The list of texts, newest first, both ways. */
export const textListPage = (texts: NewestFirst<TextMessage>, mails: number): string => {
  const item = (text: TextMessage) => {
    const way =
      text.direction === 'inbound' ? `from ${escapeHtml(text.from ?? '')}` : `to ${escapeHtml(text.to)}`;
    const error = text.errorCode === null ? '' : ` (error ${text.errorCode})`;
    const size = `${text.segments} ${text.segments === 1 ? 'segment' : 'segments'}`;
    return `<li>${way} <span class="quiet">${text.status}${error}, ${size}</span> ${time(new Date(text.createdMs).toISOString())}<p class="body">${escapeHtml(text.body)}</p></li>`;
  };
  const list = texts.items.length > 0 ? `<ol>${texts.items.map(item).join('')}</ol>` : '<p>No texts yet.</p>';
  return page(
    'Texts',
    head('texts', mails, texts.total) +
      list +
      pageLinks('/?show=texts', texts.page, texts.pageSize, texts.total),
  );
};

/** One mail: its header lines, its text and, in a frame that may do nothing, its HTML part. */
export const mailPage = (mail: OpenedMail): string => {
  const lines = mail.headers.map(
    ({ key, line }) => `<dt>${escapeHtml(key)}</dt><dd>${escapeHtml(line.slice(key.length + 1).trim())}</dd>`,
  );
  const html = mail.html
    ? `<h2>HTML part</h2><iframe sandbox="" title="HTML part" srcdoc="${escapeHtml(mail.html)}"></iframe>`
    : '';
  return page(
    mail.subject || 'Mail',
    `<p><a href="/?show=mail">All mail</a></p><h1>${escapeHtml(mail.subject || '(no subject)')}</h1><p>to ${escapeHtml(mail.to.join(', '))} ${time(mail.at)}</p>` +
      `<p class="body">${withLinks(mail.text)}</p>${html}<h2>Header</h2><dl>${lines.join('')}</dl>`,
  );
};

/** Escaped text whose web addresses can be followed. */
const withLinks = (text: string): string =>
  escapeHtml(text).replace(
    /https?:\/\/[^\s<>]+/g,
    (address) => `<a href="${address}" rel="noreferrer">${address}</a>`,
  );
