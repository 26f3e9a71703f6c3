import path from 'node:path';

/** What the local services need to know; read once from the environment by {@link readSettings}. */
export interface LocalSettings {
  /** Ports on 127.0.0.1; 0 lets the system choose one (printed at start). */
  readonly pagePort: number;
  readonly smtpPort: number;
  readonly smsPort: number;
  /** Folder in which mail and texts are kept, append-only. */
  readonly stateDir: string;
  /** Folder into which the towers' loggers write, one folder a tower. */
  readonly loggerDir: string;
  /** Credentials the SMS clients must show; the token also signs the call-backs. */
  readonly smsAccountSid: string;
  readonly smsAuthToken: string;
  /** The number incoming texts are addressed to. */
  readonly smsFrom: string;
  /** Where incoming texts are posted, as the provider's console would hold it. */
  readonly smsIncomingUrl: string;
  /** Pause between two status call-backs of one text, ms. */
  readonly smsStatusDelayMs: number;
  /** Share of texts (0 to 1) that end as undelivered; chosen by the number, so the same number always fares alike. */
  readonly smsUndeliveredShare: number;
}

const number = (env: NodeJS.ProcessEnv, name: string, fallback: number, highest: number): number => {
  const text = env[name];
  if (text === undefined || text === '') return fallback;
  const value = Number(text);
  if (!Number.isFinite(value) || value < 0 || value > highest)
    throw new Error(`${name} is "${text}": give a number from 0 to ${highest}, or leave it out.`);
  return value;
};

const port = (env: NodeJS.ProcessEnv, name: string, fallback: number): number => {
  const value = number(env, name, fallback, 65535);
  if (!Number.isInteger(value)) throw new Error(`${name} is "${value}": a port is a whole number.`);
  return value;
};

/**
 * Reads the settings from the environment.
 * @throws Error naming the setting and the cure; also under NODE_ENV=production, where stand-ins have no business.
 */
export const readSettings = (env: NodeJS.ProcessEnv): LocalSettings => {
  if (env.NODE_ENV === 'production')
    throw new Error(
      'The local services are stand-ins and refuse to start with NODE_ENV=production. Point SMTP_HOST and the SMS settings at real services.',
    );
  return {
    pagePort: port(env, 'LOCAL_PAGE_PORT', 3001),
    smtpPort: port(env, 'LOCAL_SMTP_PORT', 3025),
    smsPort: port(env, 'LOCAL_SMS_PORT', 3026),
    stateDir: path.resolve(env.STATE_DIR || 'local-services-state'),
    loggerDir: path.resolve(env.LOGGER_DIR || 'loggers'),
    smsAccountSid: env.SMS_ACCOUNT_SID || 'AC00000000000000000000000000000000',
    smsAuthToken: env.SMS_AUTH_TOKEN || 'local-auth-token',
    smsFrom: env.SMS_FROM || '+12085550100',
    smsIncomingUrl: env.SMS_INCOMING_URL || 'http://127.0.0.1:3000/api/hooks/sms/incoming',
    smsStatusDelayMs: number(env, 'SMS_STATUS_DELAY_MS', 400, 600_000),
    smsUndeliveredShare: number(env, 'SMS_UNDELIVERED_SHARE', 0.03, 1),
  };
};
