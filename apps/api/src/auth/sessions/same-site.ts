import type { Request } from 'express';
import { Problem } from '../../common/problem';

const safeMethods = ['GET', 'HEAD', 'OPTIONS'];

/**
 * Throws 403 `cross-site` when a browser says that another site made it send this request. Browsers tell by
 * Sec-Fetch-Site (Fetch Metadata Request Headers) where the address is trustworthy, by Origin otherwise; programs
 * send neither and are let through, because no browser lends them its cookies.
 */
export function refuseCrossSite(request: Request, publicUrl: string): void {
  if (safeMethods.includes(request.method)) return;
  const site = request.get('sec-fetch-site');
  const origin = request.get('origin');
  const fine = site
    ? site === 'same-origin' || site === 'none'
    : !origin || isOwn(origin, request, publicUrl);
  if (!fine)
    throw new Problem(
      'cross-site',
      'This request came from another site. Open Lidwatch itself and try again.',
    );
}

function isOwn(origin: string, request: Request, publicUrl: string): boolean {
  if (!URL.canParse(origin)) return false;
  return origin === new URL(publicUrl).origin || new URL(origin).host === request.get('host');
}
