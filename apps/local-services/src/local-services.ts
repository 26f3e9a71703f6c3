import { mkdir } from 'node:fs/promises';
import express, { type ErrorRequestHandler, type Router } from 'express';
import { BadOrder } from './control/orders';
import { controlRouter } from './control/control-router';
import { hostGuard } from './host-guard';
import { inboxRouter } from './inbox/inbox-router';
import { listen } from './listen';
import { takeEverything } from './mail/mail-behaviour';
import { MailBox } from './mail/mail-box';
import { startMailServer } from './mail/mail-server';
import type { LocalSettings } from './settings';
import { MessageBook } from './sms/message-book';
import { StatusCallbacks } from './sms/status-callbacks';
import { textApi } from './sms/text-server';
import { Refusal, TextService } from './sms/text-service';

/** The running services and the ports they got. */
export interface LocalServices {
  readonly pagePort: number;
  readonly smtpPort: number;
  readonly smsPort: number;
  close(): Promise<void>;
}

/** A further service's routes on the page's server, e.g. `['/control/loggers', router]`. */
export type Mounted = readonly [path: string, router: Router];

const sayError: ErrorRequestHandler = (error: Error & { status?: number }, _request, response, _next) => {
  const status =
    error instanceof BadOrder
      ? 400
      : error instanceof RangeError
        ? 404
        : error instanceof Refusal
          ? error.status
          : (error.status ?? 500);
  if (status >= 500) console.error(error.message);
  response.status(status).json({ error: error.message });
};

/** Starts the mail server, the text service and the page, all on 127.0.0.1. */
export const startLocalServices = async (
  settings: LocalSettings,
  mounted: readonly Mounted[] = [],
): Promise<LocalServices> => {
  await mkdir(settings.stateDir, { recursive: true });
  const account = { sid: settings.smsAccountSid, authToken: settings.smsAuthToken };
  const mail = takeEverything();
  const [box, book] = [await MailBox.open(settings.stateDir), await MessageBook.open(settings.stateDir)];
  const behaviour = {
    mode: 'ok' as const,
    delayMs: 0,
    numbers: {},
    undeliveredShare: settings.smsUndeliveredShare,
    statusDelayMs: settings.smsStatusDelayMs,
  };
  const callbacks = new StatusCallbacks(book, behaviour, account);
  const texts = new TextService(book, behaviour, callbacks, {
    accountSid: account.sid,
    authToken: account.authToken,
    ownNumber: settings.smsFrom,
    incomingUrl: settings.smsIncomingUrl,
  });

  const pages = express().disable('x-powered-by').use(hostGuard);
  pages.get('/ready', (_request, response) => void response.json({ ready: true }));
  pages.use('/control', controlRouter(mail, texts));
  for (const [path, router] of mounted) pages.use(path, router);
  pages.use(inboxRouter(box, book), sayError);

  const smtp = await startMailServer(box, mail, settings.smtpPort);
  const sms = await listen(textApi(texts, account), settings.smsPort);
  const page = await listen(pages, settings.pagePort);
  return {
    pagePort: page.port,
    smtpPort: smtp.port,
    smsPort: sms.port,
    close: async () => {
      await Promise.all([smtp.close(), sms.close(), page.close(), callbacks.close()]);
      await Promise.all([box.close(), book.close()]);
    },
  };
};
