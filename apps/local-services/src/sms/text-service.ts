import { randomBytes } from 'node:crypto';
import type { MessageBook } from './message-book';
import { signedPost } from './signed-post';
import type { StatusCallbacks } from './status-callbacks';
import type { TextBehaviour } from './text-behaviour';
import type { TextMessage } from './text-message';

/** A refusal as the provider words it: HTTP status, its own code, and a message. */
export class Refusal extends Error {
  constructor(
    readonly status: number,
    readonly code: number,
    message: string,
  ) {
    super(message);
  }
}

const E164 = /^\+[1-9]\d{6,14}$/;
const LONGEST_BODY = 1600;

/** Characters that fit GSM-7's basic table, roughly: enough to count a stand-in's segments (the API counts exactly). */
const segmentsOf = (body: string): number => {
  const gsm = /^[\n\r -~£¥èéùìòÇØøÅåÆæßÉ¡ÄÖÑÜ§¿äöñüà€]*$/.test(body);
  const [single, joined] = gsm ? [160, 153] : [70, 67];
  return body.length <= single ? 1 : Math.ceil(body.length / joined);
};

const xmlText = (text: string) =>
  text.replace(
    /&(lt|gt|quot|apos|amp);/g,
    (_, name: string) => ({ lt: '<', gt: '>', quot: '"', apos: "'", amp: '&' })[name]!,
  );

/** Makes texts as the provider would, and brings in those that residents send. */
export class TextService {
  constructor(
    readonly book: MessageBook,
    readonly behaviour: TextBehaviour,
    private readonly callbacks: StatusCallbacks,
    private readonly settings: {
      accountSid: string;
      authToken: string;
      ownNumber: string;
      incomingUrl: string;
    },
  ) {}

  /** Takes a request for a text. @throws Refusal with the provider's codes. */
  async create(form: Record<string, unknown>): Promise<TextMessage> {
    const field = (name: string) =>
      typeof form[name] === 'string' && form[name] !== '' ? form[name] : undefined;
    const [to, body, from, service] = [
      field('To'),
      field('Body'),
      field('From'),
      field('MessagingServiceSid'),
    ];
    if (!to) throw new Refusal(400, 21604, "A 'To' phone number is required.");
    if (!E164.test(to)) throw new Refusal(400, 21211, `The 'To' number ${to} is not a valid phone number.`);
    if (!from && !service)
      throw new Refusal(400, 21603, "A 'From' phone number or a MessagingServiceSid is required.");
    if (!body) throw new Refusal(400, 21602, 'Message body is required.');
    if (body.length > LONGEST_BODY)
      throw new Refusal(400, 21617, `The message body exceeds ${LONGEST_BODY} characters.`);
    const refuseCode = this.behaviour.numbers[to]?.refuseCode;
    if (refuseCode) throw new Refusal(400, refuseCode, `Refused with ${refuseCode}, as told.`);
    return this.put({
      direction: 'outbound-api',
      to,
      from: from ?? null,
      messagingServiceSid: service ?? null,
      body,
      statusCallback: field('StatusCallback') ?? null,
      status: service ? 'accepted' : 'queued',
    });
  }

  /**
   * A resident's text: written in, posted to the hook, signed; a `<Message>` in the answer is sent back to them.
   * @throws Refusal when the sender is no number or the hook does not take it.
   */
  async incoming(from: string, body: string): Promise<{ sid: string; replies: string[] }> {
    if (!E164.test(from))
      throw new Refusal(400, 21212, `The sender ${from} is not a number like +12085550123.`);
    const { accountSid, authToken, ownNumber, incomingUrl } = this.settings;
    const text = await this.put({
      direction: 'inbound',
      to: ownNumber,
      from,
      messagingServiceSid: null,
      body,
      statusCallback: null,
      status: 'received',
    });
    const form = {
      AccountSid: accountSid,
      ApiVersion: '2010-04-01',
      MessageSid: text.sid,
      SmsSid: text.sid,
      SmsStatus: 'received',
    };
    const answer = await signedPost(authToken, incomingUrl, {
      ...form,
      From: from,
      To: ownNumber,
      Body: body,
      NumMedia: '0',
      NumSegments: '1',
    });
    if (answer.status >= 400)
      throw new Refusal(502, 11200, `${incomingUrl} answered ${answer.status}: ${answer.text.slice(0, 300)}`);
    const replies = [...answer.text.matchAll(/<Message[^>]*>([\s\S]*?)<\/Message>/g)].map((match) =>
      xmlText(match[1]!),
    );
    for (const reply of replies)
      await this.put({
        direction: 'outbound-reply',
        to: from,
        from: ownNumber,
        messagingServiceSid: null,
        body: reply,
        statusCallback: null,
        status: 'queued',
      });
    return { sid: text.sid, replies };
  }

  private async put(
    made: Omit<TextMessage, 'sid' | 'segments' | 'createdMs' | 'sentMs' | 'updatedMs' | 'errorCode'>,
  ): Promise<TextMessage> {
    const now = Date.now();
    const text: TextMessage = {
      ...made,
      sid: 'SM' + randomBytes(16).toString('hex'),
      segments: segmentsOf(made.body),
      createdMs: now,
      sentMs: null,
      updatedMs: now,
      errorCode: null,
    };
    await this.book.add(text);
    if (text.direction !== 'inbound') this.callbacks.follow(text);
    return text;
  }
}
