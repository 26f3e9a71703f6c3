import path from 'node:path';
import { StartFault } from '../common/start-fault';
import { prepareDataDir } from './data-dir';
import { Environment, type Lookup } from './environment';
import { Settings, type SmsSettings, type SmtpSettings } from './settings';

const repositoryRoot = path.resolve(__dirname, '../../../..');
const logLevels = ['fatal', 'error', 'warn', 'info', 'debug', 'trace', 'silent'];

/** The stand-ins' invented account and fictional number, used when no provider's account is set. */
const standInSms: SmsSettings = {
  accountSid: `AC${'0'.repeat(31)}1`,
  authToken: 'local-services-auth-token',
  from: '+12085550100',
  baseUrl: 'http://127.0.0.1:3026',
};

/**
 * Reads every setting from the environment, makes the data folder and its secret.
 * Throws a StartFault with one sentence for the first value that is of no use.
 */
export function readSettings(lookup: Lookup): Settings {
  const env = new Environment(lookup);
  const port = env.wholeNumber('PORT', 3000, 0, 65535);
  const dataDir = path.resolve(repositoryRoot, env.text('DATA_DIR') ?? 'data');
  return Object.assign(new Settings(), {
    port,
    dataDir,
    demo: env.onOrOff('DEMO', true),
    publicUrl: env.webAddress('PUBLIC_URL') ?? `http://localhost:${port}`,
    production: env.text('NODE_ENV') === 'production',
    loggerDir: path.resolve(repositoryRoot, env.text('LOGGER_DIR') ?? path.join(dataDir, 'loggers')),
    httpSourceHosts: env.hosts('HTTP_SOURCE_HOSTS'),
    webDir: path.resolve(repositoryRoot, 'apps/web/dist'),
    smtp: readSmtp(env),
    sms: readSms(env),
    localServices: { url: env.webAddress('LOCAL_SERVICES_URL') },
    sessionIdleMinutes: env.wholeNumber('SESSION_IDLE_MINUTES', 30, 1, 24 * 60),
    sessionMaxHours: env.wholeNumber('SESSION_MAX_HOURS', 12, 1, 72),
    trustedProxies: env.wholeNumber('TRUSTED_PROXIES', 0, 0, 10),
    logLevel: readLogLevel(env),
    secret: prepareDataDir(dataDir),
  });
}

function readSmtp(env: Environment): SmtpSettings {
  const port = env.wholeNumber('SMTP_PORT', 3025, 1, 65535);
  const account = env.together('SMTP_USER', 'SMTP_PASS');
  return {
    host: env.text('SMTP_HOST') ?? '127.0.0.1',
    port,
    secure: port === 465,
    ...(account && { user: account.SMTP_USER, pass: account.SMTP_PASS }),
    from: env.text('MAIL_FROM') ?? 'Lidwatch <notices@lidwatch.example>',
  };
}

function readSms(env: Environment): SmsSettings {
  const account = env.together('SMS_ACCOUNT_SID', 'SMS_AUTH_TOKEN', 'SMS_FROM');
  const baseUrl = env.webAddress('SMS_BASE_URL');
  if (!account) return { ...standInSms, ...(baseUrl && { baseUrl }) };
  const { SMS_ACCOUNT_SID: accountSid, SMS_AUTH_TOKEN: authToken, SMS_FROM: from } = account;
  if (!/^AC[0-9a-f]{32}$/i.test(accountSid))
    throw new StartFault('SMS_ACCOUNT_SID is not an account id: it is AC and 32 hexadecimal digits.');
  if (!/^\+[1-9]\d{6,14}$/.test(from))
    throw new StartFault(`SMS_FROM is "${from}": write the number in full, such as +12085550100.`);
  return { accountSid, authToken, from, ...(baseUrl && { baseUrl }) };
}

function readLogLevel(env: Environment): string {
  const level = env.text('LOG_LEVEL') ?? 'info';
  if (logLevels.includes(level)) return level;
  throw new StartFault(`LOG_LEVEL is "${level}": set it to one of ${logLevels.join(', ')}.`);
}
