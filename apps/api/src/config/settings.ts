import { Injectable } from '@nestjs/common';

/** Where mail is handed over. */
export interface SmtpSettings {
  host: string;
  port: number;
  /** TLS from the first byte (port 465); otherwise STARTTLS is used when offered. */
  secure: boolean;
  user?: string;
  pass?: string;
  /** The sender as it stands in the mail's From. */
  from: string;
}

/** The text-message provider's account. */
export interface SmsSettings {
  accountSid: string;
  authToken: string;
  /** The number texts come from, E.164. */
  from: string;
  /** Another origin for the provider's API, for a stand-in; undefined means the provider itself. */
  baseUrl?: string;
}

/** Everything that can be set from outside, read once at start (`readSettings`); see apps/api/.env.example. */
@Injectable()
export class Settings {
  /** The port that is listened on; 0 lets the system choose. */
  port!: number;
  /** The folder that holds the database, the secret and the lock; one process owns it. */
  dataDir!: string;
  /** Whether the first start feeds in the invented demo. */
  demo!: boolean;
  /** The address people reach the service at, without a trailing slash. */
  publicUrl!: string;
  production!: boolean;
  /** The folder the loggers write into. */
  loggerDir!: string;
  /** The hosts that sources over HTTP may be collected from, each `host` or `host:port`; none when empty. */
  httpSourceHosts!: string[];
  /** The folder of the built web application. */
  webDir!: string;
  /** Random, made at the first start and kept in the data folder; signs cookies and links. */
  secret!: string;
  smtp!: SmtpSettings;
  sms!: SmsSettings;
  localServices!: { url?: string };
  /** A session without a request ends after this many minutes. */
  sessionIdleMinutes!: number;
  /** Every session ends this many hours after signing in. */
  sessionMaxHours!: number;
  /** How many reverse proxies stand in front and may say who the client is. */
  trustedProxies!: number;
  logLevel!: string;
}
