/** How a message travels. */
export type Channel = 'email' | 'sms';

/** A message to one recipient, ready to be sent. */
export interface OutboundMessage {
  readonly id: number;
  /** Ours, the same for every attempt: a mail's Message-ID is made of it. */
  readonly messageId: string;
  readonly channel: Channel;
  readonly topic: string;
  readonly contactId: number;
  readonly personId: number;
  readonly address: string;
  /** To somebody who works here, at their account's e-mail: a mail about the work, which nobody subscribed to. */
  readonly isToStaff: boolean;
  readonly lang: string;
  readonly subject: string | null;
  readonly text: string;
  readonly html: string | null;
  /** When it was queued, UTC epoch seconds. */
  readonly createdAt: number;
  /** Which attempt this is, from 1. */
  readonly attempts: number;
}

/** How an attempt went. */
export type Outcome =
  /** Taken over by the mail server or the provider. */
  | { readonly kind: 'accepted'; readonly providerId?: string }
  /** Not now; worth another try. */
  | { readonly kind: 'retry'; readonly code: string; readonly detail: string }
  /** Never; `stopContact` says why this address is not to be written to again. */
  | {
      readonly kind: 'failed';
      readonly code: string;
      readonly detail: string;
      readonly stopContact?: string;
    };

/** What a room that can send registers with the outbox. */
export interface SendingChannel {
  /** How many messages may be under way at once. */
  readonly atOnce: number;
  /**
   * Makes one attempt. Never throws for what the other side says; a thrown error counts as `retry`. From the second
   * attempt on (`attempts` > 1) the one before may have arrived unheard: its connection broke, or the process died.
   */
  send(message: OutboundMessage): Promise<Outcome>;
}
