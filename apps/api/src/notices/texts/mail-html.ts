import type { NoticeKind } from '@lidwatch/contracts';
import { escapeHtml } from '../../common/escape-html';

/** Colours of the band above the words; the words alone say it too. */
const BAND: Record<NoticeKind, string> = { burnBan: '#8a1c2c', advisory: '#7a5200' };
const ENDED_BAND = '#2f6b4f';

/** A mail's HTML: one column, no pictures, nothing loaded from elsewhere, readable without its styles. */
export function mailHtml(
  headline: string,
  paragraphs: string[],
  kind: NoticeKind,
  act: 'begin' | 'end',
): string {
  const band = act === 'end' ? ENDED_BAND : BAND[kind];
  const body = paragraphs.map((paragraph) => `<p style="margin:0 0 14px">${linked(paragraph)}</p>`).join('');
  return `<!doctype html><html><body style="margin:0;background:#faf8f4"><div style="max-width:600px;margin:0 auto;padding:16px;font:16px/1.5 'Source Sans 3',Arial,sans-serif;color:#1d2733"><h1 style="margin:0 0 16px;padding:14px 16px;border-left:6px solid ${band};background:#ffffff;font-size:22px;line-height:1.25;color:${band}">${escapeHtml(headline)}</h1>${body}</div></body></html>`;
}

function linked(paragraph: string): string {
  return escapeHtml(paragraph)
    .replace(/(https?:\/\/[^\s<]+|\{manageUrl\})/g, '<a href="$1" style="color:#1c5b78">$1</a>')
    .replaceAll('\n', '<br>');
}
