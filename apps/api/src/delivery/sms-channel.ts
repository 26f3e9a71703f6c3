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
/** How many earlier texts to a number are looked through for one that was under way. */
const LOOK_BACK = 100;

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

  /** Hands one text to the provider. */
  async send({ address, text, messageId }: OutboundMessage): Promise<Outcome> {
    try {
      const { sid } = await this.provider.messages.create({
        ...{ to: address, from: this.settings.sms.from, body: text },
        statusCallback: `${this.settings.publicUrl}/api/hooks/sms/status?message=${messageId}`,
      });
      return { kind: 'accepted', providerId: sid };
    } catch (error) {
      return outcomeOf(error as ProviderError);
    }
  }

  /**
   * A text that was under way when the service stopped: the provider has it when it lists one to the same number with
   * the same words (each carries its notice's reference or a link of its own).
   */
  async recall({ address, text }: OutboundMessage): Promise<Outcome | undefined> {
    const listed = await this.provider.messages.list({ to: address, limit: LOOK_BACK });
    const found = listed.find(({ body }) => body === text);
    return found && { kind: 'accepted', providerId: found.sid };
  }
}

/** A 4xx answer is final except "too many requests"; no answer or a 5xx may pass. */
function outcomeOf({ status, code, message }: ProviderError): Outcome {
  const shown = String(code ?? status ?? 'unknown');
  if (!status || status >= 500 || status === 429) return { kind: 'retry', code: shown, detail: message };
  const stopContact = STOPS[Number(code)];
  return { kind: 'failed', code: shown, detail: message, ...(stopContact !== undefined && { stopContact }) };
}
