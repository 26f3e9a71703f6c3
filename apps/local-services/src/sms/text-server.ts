import { timingSafeEqual } from 'node:crypto';
import { setTimeout as pause } from 'node:timers/promises';
import express, {
  type ErrorRequestHandler,
  type Express,
  type Request,
  type RequestHandler,
  type Response,
} from 'express';
import { hostGuard } from '../host-guard';
import { nextMode } from '../mail/mail-behaviour';
import { asListPage, filterFrom } from './message-list';
import { asResource } from './text-message';
import { Refusal, type TextService } from './text-service';

const authenticated = (account: { sid: string; authToken: string }): RequestHandler => {
  const wanted = Buffer.from(
    'Basic ' + Buffer.from(`${account.sid}:${account.authToken}`).toString('base64'),
  );
  return (request, _response, next) => {
    const shown = Buffer.from(request.headers.authorization ?? '');
    if (shown.length === wanted.length && timingSafeEqual(shown, wanted)) next();
    else next(new Refusal(401, 20003, 'Authenticate'));
  };
};

const sayRefusal: ErrorRequestHandler = (error: unknown, _request, response, _next) => {
  const refusal = error instanceof Refusal ? error : new Refusal(500, 20500, (error as Error).message);
  response.status(refusal.status).json({
    code: refusal.code,
    message: refusal.message,
    more_info: `https://provider.example/errors/${refusal.code}`,
    status: refusal.status,
  });
};

const create = async (
  service: TextService,
  accountSid: string,
  request: Request,
  response: Response,
): Promise<void> => {
  const mode = nextMode(service.behaviour);
  if (mode === 'refuse') throw new Refusal(400, 21610, 'Refused, as told.');
  if (mode === 'error') throw new Refusal(500, 20500, 'Out of order, as told.');
  if (mode === 'tooMany') throw new Refusal(429, 20429, 'Too many requests, as told.');
  if (mode === 'slow') await pause(service.behaviour.delayMs);
  const text = await service.create((request.body ?? {}) as Record<string, unknown>);
  if (mode === 'drop') request.socket.destroy();
  else response.status(201).json(asResource(accountSid, text));
};

/** The provider's message API, version 2010-04-01: create, fetch and list, with its errors and its Basic sign-in. */
export const textApi = (service: TextService, account: { sid: string; authToken: string }): Express => {
  const app = express().disable('x-powered-by').disable('etag').set('query parser', 'simple');
  const messages = `/2010-04-01/Accounts/${account.sid}/Messages`;
  app.use(hostGuard, authenticated(account), express.urlencoded({ extended: false, limit: '32kb' }));
  app.post(`${messages}.json`, (request, response) => create(service, account.sid, request, response));
  app.get(`${messages}.json`, (request, response) => {
    response.json(asListPage(account.sid, service.book.list(filterFrom(request.query)), request.query));
  });
  app.get(`${messages}/:sid.json`, (request, response) => {
    const text = service.book.get(request.params.sid);
    if (!text) throw new Refusal(404, 20404, `The requested resource ${request.path} was not found`);
    response.json(asResource(account.sid, text));
  });
  app.use((request) => {
    throw new Refusal(404, 20404, `The requested resource ${request.path} was not found`);
  });
  return app.use(sayRefusal);
};
