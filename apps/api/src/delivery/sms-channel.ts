import { Injectable, type OnModuleInit } from '@nestjs/common';
import type { Twilio } from 'twilio';
import { Settings } from '../config/settings';
import type { OutboundMessage, Outcome, SendingChannel } from '../outbox/channel';
import { OutboxDispatcher } from '../outbox/outbox-dispatcher';
import { providerClient } from './provider-client';

/** The provider's error codes that end it for an address: stopped by its owner; no such number; no mobile number. */
const STOPS: Readonly<Record<number, string>> = {
  21610: 'the recipient texted STOP',
  21211: 'the number does not exist',
  21614: 'the number takes no text messages',
};
const ABOUT_US = new Set([401, 403, 404, 408, 429]);
/** The provider's error codes for a sender it does not know or take: 21212, 21603, 21606, 21659. */
const ABOUT_OUR_NUMBER = new Set([21212, 21603, 21606, 21659]);
/** How many earlier texts to a number are looked through for one that was under way. */
const LOOK_BACK = 100;
/** How much older than our own row a text may be, so that clocks may differ, seconds. */
const CLOCKS_DIFFER_S = 24 * 3600;

/** What the SDK throws for an answer that is no success; without a status the provider was not reached. */
interface ProviderError extends Error {
  status?: number;
  code?: number | string;
}

/** Text messages through the provider's SDK. *Accepted* means the provider took it; *delivered* comes by its call-back. */
@Injectable()
export class SmsChannel implements SendingChannel, OnModuleInit {
  readonly atOnce = 24;
  private readonly provider: Twilio;

  constructor(
    private readonly dispatcher: OutboxDispatcher,
    private readonly settings: Settings,
  ) {
    const { accountSid, authToken, baseUrl } = settings.sms;
    this.provider = providerClient(accountSid, authToken, baseUrl);
  }

  onModuleInit(): void {
    this.dispatcher.registerChannel('sms', this);
  }

  /**
   * Hands one text to the provider. A text cannot be told from its double as a mail can, so before a further attempt
   * the provider is asked whether the one before arrived after all.
   */
  async send(message: OutboundMessage): Promise<Outcome> {
    try {
      const earlier = message.attempts > 1 ? await this.arrived(message) : undefined;
      return { kind: 'accepted', providerId: earlier ?? (await this.create(message)) };
    } catch (error) {
      return outcomeOf(error as ProviderError);
    }
  }

  private async create({ address, text, messageId }: OutboundMessage): Promise<string> {
    const { sid } = await this.provider.messages.create({
      ...{ to: address, from: this.settings.sms.from, body: text },
      statusCallback: `${this.settings.publicUrl}/api/hooks/sms/status?message=${messageId}`,
    });
    return sid;
  }

  /**
   * The provider's id of a text to the same number with the same words, made since this message was queued; each
   * carries its notice's reference or a link of its own, so it is this one.
   */
  private async arrived({ address, text, createdAt }: OutboundMessage): Promise<string | undefined> {
    const listed = await this.provider.messages.list({ to: address, limit: LOOK_BACK });
    const since = (createdAt - CLOCKS_DIFFER_S) * 1000;
    return listed.find(({ body, dateCreated }) => body === text && dateCreated.getTime() >= since)?.sid;
  }
}

/**
 * A 4xx answer is final for the recipient, except where it is about us (sign-in, account, sender, pace): a wrong
 * setting must not lose everybody's message. No answer or a 5xx may pass.
 */
function outcomeOf({ status, code, message }: ProviderError): Outcome {
  const shown = String(code ?? status ?? 'unknown');
  if (!status || status >= 500 || ABOUT_US.has(status) || ABOUT_OUR_NUMBER.has(Number(code)))
    return { kind: 'retry', code: shown, detail: message };
  const stopContact = STOPS[Number(code)];
  return { kind: 'failed', code: shown, detail: message, ...(stopContact !== undefined && { stopContact }) };
}
