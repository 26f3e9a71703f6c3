import express, { Router } from 'express';
import type { MailBehaviour } from '../mail/mail-behaviour';
import type { TextService } from '../sms/text-service';
import { BadOrder, orderMail, orderTexts } from './orders';

const body = (given: unknown): Record<string, unknown> => {
  if (typeof given !== 'object' || given === null || Array.isArray(given))
    throw new BadOrder('Send the order as a JSON object, with Content-Type: application/json.');
  return given as Record<string, unknown>;
};

/**
 * Where the stand-ins are told how to behave: POST /mail, POST /sms, POST /sms/incoming {from, body}; GET shows the
 * orders in force. JSON only, so that no other site's form can reach it.
 */
export const controlRouter = (mail: MailBehaviour, texts: TextService): Router => {
  const router = Router().use(express.json({ limit: '1mb' }));
  router.get('/mail', (_request, response) => void response.json(mail));
  router.post('/mail', (request, response) => void response.json(orderMail(mail, body(request.body))));
  router.get('/sms', (_request, response) => void response.json(texts.behaviour));
  router.post(
    '/sms',
    (request, response) => void response.json(orderTexts(texts.behaviour, body(request.body))),
  );
  router.post('/sms/incoming', async (request, response) => {
    const { from, body: text } = body(request.body);
    if (typeof from !== 'string' || typeof text !== 'string')
      throw new BadOrder('Give "from" (a number) and "body" (the text).');
    response.json(await texts.incoming(from, text));
  });
  return router;
};
