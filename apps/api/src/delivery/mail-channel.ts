import { Injectable, type OnApplicationShutdown, type OnModuleInit } from '@nestjs/common';
import { createTransport, type Transporter } from 'nodemailer';
import { Settings } from '../config/settings';
import type { OutboundMessage, Outcome, SendingChannel } from '../outbox/channel';
import { OutboxDispatcher } from '../outbox/outbox-dispatcher';
import { MailWriter } from './mail-writer';

const CONNECTIONS = 8;
const MESSAGES_PER_CONNECTION = 500;
const NO_SUCH_MAILBOX = /\b5\.1\.[1-3]\b/;

const ABOUT_THE_MAIL = new Set(['RCPT TO', 'DATA']);

/** What nodemailer adds to an error. */
interface MailError extends Error {
  code?: string;
  /** The SMTP command that was answered. */
  command?: string;
  responseCode?: number;
  response?: string;
}

/**
 * Mail by SMTP over a few lasting connections. Accepted by the mail server is the last that is known of a mail: SMTP
 * gives no receipt from the reader's mailbox.
 */
@Injectable()
export class MailChannel implements SendingChannel, OnModuleInit, OnApplicationShutdown {
  readonly atOnce = CONNECTIONS * 2;
  private readonly transport: Transporter;

  constructor(
    private readonly writer: MailWriter,
    private readonly dispatcher: OutboxDispatcher,
    { smtp }: Settings,
  ) {
    const { host, port, secure, user, pass } = smtp;
    this.transport = createTransport({
      ...{
        host,
        port,
        secure,
        pool: true,
        maxConnections: CONNECTIONS,
        maxMessages: MESSAGES_PER_CONNECTION,
      },
      ...{ connectionTimeout: 10_000, greetingTimeout: 10_000, socketTimeout: 60_000 },
      ...(user !== undefined && { auth: { user, pass } }),
    });
  }

  onModuleInit(): void {
    this.dispatcher.registerChannel('email', this);
  }

  /** Hands one mail to the mail server. */
  async send(message: OutboundMessage): Promise<Outcome> {
    try {
      await this.transport.sendMail(this.writer.write(message));
      return { kind: 'accepted' };
    } catch (error) {
      return outcomeOf(error as MailError);
    }
  }

  onApplicationShutdown(): void {
    this.transport.close();
  }
}

/**
 * A 5xx answer to the recipient or the message is final; one to the sign-in or the sender is about us, and a wrong
 * setting must not lose everybody's mail. An address that does not exist is not written to again.
 */
function outcomeOf({ code, command, responseCode, response, message }: MailError): Outcome {
  const said = response ?? message;
  const shown = String(responseCode ?? code ?? 'unknown');
  if (!responseCode || responseCode < 500 || !ABOUT_THE_MAIL.has(command ?? ''))
    return { kind: 'retry', code: shown, detail: said };
  const stop = NO_SUCH_MAILBOX.test(said) && { stopContact: 'the mailbox does not exist' };
  return { kind: 'failed', code: shown, detail: said, ...stop };
}
