/** Where a text stands, in the provider's words. */
export type TextStatus = 'accepted' | 'queued' | 'sent' | 'delivered' | 'undelivered' | 'failed' | 'received';

/** A text as the provider keeps it. */
export interface TextMessage {
  readonly sid: string;
  readonly direction: 'outbound-api' | 'outbound-reply' | 'inbound';
  readonly to: string;
  readonly from: string | null;
  readonly messagingServiceSid: string | null;
  readonly body: string;
  readonly segments: number;
  readonly statusCallback: string | null;
  readonly createdMs: number;
  sentMs: number | null;
  updatedMs: number;
  status: TextStatus;
  errorCode: number | null;
}

/** Nothing more comes after these. */
export const FINAL: ReadonlySet<TextStatus> = new Set<TextStatus>([
  'delivered',
  'undelivered',
  'failed',
  'received',
]);

const rfc2822 = (ms: number | null) =>
  ms === null ? null : new Date(ms).toUTCString().replace('GMT', '+0000');

/** A text as the provider's API writes it (version 2010-04-01). */
export const asResource = (account: string, text: TextMessage) => ({
  account_sid: account,
  api_version: '2010-04-01',
  body: text.body,
  date_created: rfc2822(text.createdMs),
  date_sent: rfc2822(text.sentMs),
  date_updated: rfc2822(text.updatedMs),
  direction: text.direction,
  error_code: text.errorCode,
  error_message: text.errorCode === null ? null : `Error ${text.errorCode}`,
  from: text.from,
  messaging_service_sid: text.messagingServiceSid,
  num_media: '0',
  num_segments: String(text.segments),
  price: null,
  price_unit: 'USD',
  sid: text.sid,
  status: text.status,
  subresource_uris: { media: `/2010-04-01/Accounts/${account}/Messages/${text.sid}/Media.json` },
  to: text.to,
  uri: `/2010-04-01/Accounts/${account}/Messages/${text.sid}.json`,
});
