import type { NextFunction, Request, Response } from 'express';

/** What everybody but the text service's call-backs hears while the demo is fed in. */
export class FeedingGate {
  /** How far it is, in a sentence. */
  progress = 'The demo is being fed in …';

  /** Lets call-backs and the sign of life pass; answers all else with 503 and how far it is. */
  readonly pass = (request: Request, response: Response, next: NextFunction): void => {
    if (request.path.startsWith('/api/hooks/') || request.path === '/health/live') return next();
    response.status(503).set({ 'Retry-After': '3', 'Cache-Control': 'no-store' });
    if (request.path.startsWith('/api/') || request.path.startsWith('/health/')) {
      response.json({ status: 'starting', progress: this.progress });
      return;
    }
    response
      .type('html')
      .send(
        '<!doctype html><html lang="en"><meta charset="utf-8"><meta http-equiv="refresh" content="3">' +
          `<title>Starting</title><p>${this.progress}</p>`,
      );
  };
}
