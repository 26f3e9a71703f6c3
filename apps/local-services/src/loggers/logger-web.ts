import { createReadStream, type Stats } from 'node:fs';
import { stat } from 'node:fs/promises';
import path from 'node:path';
import { setTimeout as pause } from 'node:timers/promises';
import express, { Router, type Request, type Response } from 'express';
import { nextMode } from '../mail/mail-behaviour';
import { wantedHeader, type WebMode, type WebOrders } from './web-orders';

const RETRY_AFTER_S = 120;
const FILLER = `${'0'.repeat(99)}\n`.repeat(100);

/**
 * The loggers' files over HTTP, as a logger with a modem serves them: GET /<tower>/<file>, with ETag and Last-Modified,
 * so that an unchanged file is answered 304. Its orders make it slow, broken, or ask for credentials.
 */
export function loggerWeb(loggerDir: string, orders: WebOrders): Router {
  const router = Router();
  router.use((request, response, next) => {
    const wanted = wantedHeader(orders.auth);
    if (wanted === undefined || request.headers.authorization === wanted) return next();
    const scheme = wanted.startsWith('Basic') ? 'Basic realm="logger"' : 'Bearer realm="logger"';
    response.status(401).set('WWW-Authenticate', scheme).type('text').send('Credentials, please.\n');
  });
  router.use(async (request, response, next) => {
    const mode = nextMode<WebMode>(orders);
    if (mode === 'slow') await pause(orders.delayMs, undefined, { ref: false });
    const spoil = spoiled[mode];
    if (!spoil) return next();
    await spoil(request, response, loggerDir);
  });
  // Whoever asks may keep a file but has to ask whether it is still the same.
  router.use(express.static(loggerDir, { cacheControl: false, index: false, redirect: false }));
  router.use((_request, response) => void response.status(404).type('text').send('There is no such file.\n'));
  return router;
}

type Spoil = (request: Request, response: Response, loggerDir: string) => void | Promise<void>;

const spoiled: Partial<Record<WebMode, Spoil>> = {
  error: (_request, response) => void response.status(500).type('text').send('The logger has a fault.\n'),
  busy: (_request, response) =>
    void response.status(503).set('Retry-After', String(RETRY_AFTER_S)).type('text').send('Later.\n'),
  redirect: (_request, response) => response.redirect('https://elsewhere.pellworth.example/mast.csv'),
  page: (_request, response) => void response.type('html').send('<!doctype html><title>Sign in</title>'),
  cut: sendHalf,
  endless: sendForEver,
};

async function sendHalf(request: Request, response: Response, loggerDir: string): Promise<void> {
  const file = path.join(loggerDir, path.normalize(`/${request.path}`));
  const found: Stats | undefined = await stat(file).catch(() => undefined);
  if (!found?.isFile()) return void response.status(404).end();
  response.set({ 'Content-Type': 'text/csv', 'Content-Length': String(found.size) });
  const half = createReadStream(file, { end: Math.floor(found.size / 2) });
  half.pipe(response, { end: false });
  half.once('end', () => response.destroy());
}

function sendForEver(_request: Request, response: Response): void {
  const more = (): void => {
    if (!response.destroyed) response.write(FILLER, () => setImmediate(more));
  };
  response.type('csv');
  more();
}
