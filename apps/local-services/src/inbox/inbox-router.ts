import { Router, type Request } from 'express';
import { pageFrom, type NewestFirst } from '../journal/newest-first';
import type { MailBox, OpenedMail } from '../mail/mail-box';
import type { MessageBook } from '../sms/message-book';
import type { TextMessage } from '../sms/text-message';
import { mailListPage, mailPage, textListPage } from './inbox-pages';

const one = (value: unknown): string | undefined =>
  typeof value === 'string' && value !== '' ? value : undefined;

const openAll = async (
  box: MailBox,
  request: Request,
  usual?: number,
  highest?: number,
): Promise<NewestFirst<OpenedMail>> => {
  const { page, pageSize } = pageFrom(request.query, usual, highest);
  const list = await box.envelopes(page, pageSize, one(request.query.to));
  return { ...list, items: await Promise.all(list.items.map(({ n }) => box.open(n))) };
};

const texts = (book: MessageBook, request: Request, usual?: number): NewestFirst<TextMessage> => {
  const { page, pageSize } = pageFrom(request.query, usual);
  const found = book.list({ to: one(request.query.to), from: one(request.query.from) });
  return { items: found.slice((page - 1) * pageSize, page * pageSize), total: found.length, page, pageSize };
};

/**
 * What arrived, newest first: `/` for people (`?show=mail|texts&page=`), `/mail/:n` one mail; for programs `/api/mail`
 * (`?to=&page=&pageSize=`, `brief=1` for envelopes only), `/api/mail/:n`, `/api/sms` (`?to=&from=&page=&pageSize=`).
 */
export const inboxRouter = (box: MailBox, book: MessageBook): Router => {
  const router = Router();
  router.get('/', async (request, response) => {
    const html =
      request.query.show === 'texts'
        ? textListPage(texts(book, request, 25), box.count)
        : mailListPage(await openAll(box, request, 25, 100), book.count);
    response
      .set('Content-Security-Policy', "default-src 'none'; style-src 'unsafe-inline'")
      .type('html')
      .send(html);
  });
  router.get('/mail/:n', async (request, response) => {
    response
      .set('Content-Security-Policy', "default-src 'none'; style-src 'unsafe-inline'")
      .type('html')
      .send(mailPage(await box.open(Number(request.params.n))));
  });
  router.get('/api/mail', async (request, response) => {
    const { page, pageSize } = pageFrom(request.query);
    response.json(
      request.query.brief
        ? await box.envelopes(page, pageSize, one(request.query.to))
        : await openAll(box, request, 50, 200),
    );
  });
  router.get(
    '/api/mail/:n',
    async (request, response) => void response.json(await box.open(Number(request.params.n))),
  );
  router.get('/api/sms', (request, response) => void response.json(texts(book, request)));
  return router;
};
