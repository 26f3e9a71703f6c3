import { SourceFault } from '../collector/source-fault';

const REDIRECTS = new Set([301, 302, 303, 307, 308]);

/** What is asked of an address. */
export interface Asked {
  readonly headers: Record<string, string>;
  readonly mostRedirects: number;
  readonly signal: AbortSignal;
}

/**
 * Asks for a file. Redirects are followed within the same origin only, a few at most: neither the request nor its
 * credentials ever reach a place that nobody has named.
 */
export async function ask(address: URL, { headers, mostRedirects, signal }: Asked): Promise<Response> {
  let at = address;
  for (let redirects = 0; redirects <= mostRedirects; redirects += 1) {
    const response = await fetch(at, { headers, signal, redirect: 'manual' });
    if (!REDIRECTS.has(response.status)) return response;
    await response.body?.cancel();
    at = within(address, at, response.headers.get('location'));
  }
  throw new SourceFault(`${address.host}: It sends the service in a circle. Look at the address.`);
}

function within(address: URL, at: URL, location: string | null): URL {
  if (location === null || !URL.canParse(location, at.href))
    throw new SourceFault(`${address.host}: It redirects to no address. Tell whoever runs it.`);
  const next = new URL(location, at);
  if (next.origin === address.origin) return next;
  // Without the query: it may hold a secret of the other place.
  const where = `${next.origin}${next.pathname}`;
  throw new SourceFault(
    `${address.host}: It redirects to another place, which is not followed. If that is right, enter ${where} instead.`,
  );
}
