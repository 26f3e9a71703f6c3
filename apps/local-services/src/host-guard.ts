import type { RequestHandler } from 'express';

const LOOPBACK_NAMES = new Set(['127.0.0.1', 'localhost', '[::1]']);

/**
 * Refuses requests whose Host header is not this machine's loopback name, so that no web page can reach the
 * stand-ins through a name that it has pointed at 127.0.0.1.
 */
export const hostGuard: RequestHandler = (request, response, next) => {
  const host = request.headers.host ?? '';
  if (LOOPBACK_NAMES.has(host.replace(/:\d+$/, ''))) next();
  else response.status(421).type('text').send('These services answer to 127.0.0.1 and localhost only.\n');
};
