const ENTITIES: Record<string, string> = {
  '&': '&amp;',
  '<': '&lt;',
  '>': '&gt;',
  '"': '&quot;',
  "'": '&#39;',
};

/** Text made safe for HTML text and double-quoted attributes. */
export const escapeHtml = (text: string): string => text.replace(/[&<>"']/g, (sign) => ENTITIES[sign]!);

const STYLE = `:root{color-scheme:light dark;--line:#8886;--quiet:#777}
body{font:16px/1.45 system-ui,sans-serif;margin:0 auto;max-width:60rem;padding:1rem}
nav a,.pages a{margin-right:1rem}nav [aria-current]{font-weight:700;text-decoration:none;color:inherit}
ol{list-style:none;padding:0}li{border-top:1px solid var(--line);padding:.6rem 0}
time,.quiet{color:var(--quiet);font-size:.9em}.body{white-space:pre-wrap;overflow-wrap:anywhere;margin:.2rem 0}
dl{display:grid;grid-template-columns:max-content 1fr;gap:.1rem 1rem}dd{margin:0;overflow-wrap:anywhere}
iframe{width:100%;height:32rem;border:1px solid var(--line);background:#fff}`;

/** A whole page, without script. */
export const page = (title: string, body: string): string =>
  `<!doctype html><html lang="en"><head><meta charset="utf-8"><meta name="viewport" content="width=device-width,initial-scale=1">` +
  `<title>${escapeHtml(title)}</title><style>${STYLE}</style></head><body>${body}</body></html>`;

/** Links to the neighbouring pages of a list. */
export const pageLinks = (href: string, page: number, pageSize: number, total: number): string => {
  const links = [
    page > 1 ? `<a href="${href}&amp;page=${page - 1}">Newer</a>` : '',
    page * pageSize < total ? `<a href="${href}&amp;page=${page + 1}">Older</a>` : '',
  ];
  return `<p class="pages">${links.join('')}<span class="quiet">${total} in all, page ${page} of ${Math.max(1, Math.ceil(total / pageSize))}</span></p>`;
};
