import express, { Router } from 'express';
import { BadOrder } from '../control/orders';
import type { LiveLoggers } from './live-loggers';
import { orderWeb, type WebOrders } from './web-orders';

/** An instant in an order: UTC epoch seconds, or ISO 8601 with an offset. */
function instant(given: unknown, name: string): number {
  const ms = typeof given === 'number' ? given * 1000 : typeof given === 'string' ? Date.parse(given) : NaN;
  if (Number.isFinite(ms)) return Math.floor(ms / 1000);
  throw new BadOrder(`"${name}" is ${JSON.stringify(given)}: give UTC epoch seconds or an ISO 8601 instant.`);
}

/**
 * Where the loggers are told what to do: POST /begin {now, anew?}, /write {until}, /skip {until}, /live {on}, and how
 * their files are served: /web {mode, delayMs, times, auth}. JSON only, so that no other site's form can reach it.
 */
export function loggersRouter(loggers: LiveLoggers, web: WebOrders): Router {
  const router = Router().use(express.json());
  router.post('/begin', async ({ body }, response) => {
    const firstStart = await loggers.begin(instant(body?.now, 'now'), body?.anew === true);
    response.json({ firstStart });
  });
  router.post('/write', async ({ body }, response) => {
    response.json({ rows: await loggers.write(instant(body?.until, 'until')) });
  });
  router.post('/skip', async ({ body }, response) => {
    await loggers.skip(instant(body?.until, 'until'));
    response.json({ skipped: true });
  });
  router.post('/live', async ({ body }, response) => {
    if (typeof body?.on !== 'boolean') throw new BadOrder('Give "on": true or false.');
    await loggers.live(body.on);
    response.json({ on: body.on });
  });
  router.post('/web', ({ body }, response) => {
    if (typeof body !== 'object' || body === null) throw new BadOrder('Send the order as a JSON object.');
    response.json(orderWeb(web, body as Record<string, unknown>));
  });
  return router;
}
