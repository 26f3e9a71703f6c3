import { randomBytes } from 'node:crypto';
import { accessSync, constants, mkdirSync, readFileSync, writeFileSync } from 'node:fs';
import path from 'node:path';
import { Fault } from './fault.mjs';
import { localPort, serverPort } from './ports.mjs';
import { root } from './root.mjs';

/** Makes the data folder; one sentence when it cannot be written. */
function dataFolder(given) {
  const dir = path.resolve(root, given || 'data');
  try {
    mkdirSync(dir, { recursive: true });
    accessSync(dir, constants.W_OK | constants.X_OK);
    return dir;
  } catch (error) {
    throw new Fault(
      `The data folder ${dir} cannot be written (${error.code}): set DATA_DIR to a folder that can.`,
    );
  }
}

/** The token with which the local text service and the server know each other, kept in the data folder. */
function localToken(dataDir) {
  const file = path.join(dataDir, 'local-services-token');
  try {
    writeFileSync(file, randomBytes(16).toString('hex'), { flag: 'wx', mode: 0o600 });
  } catch (error) {
    if (error.code !== 'EEXIST') throw error;
  }
  return readFileSync(file, 'utf8');
}

/** What both processes are told. Mail or text settings of one's own are kept, and the stand-in is then left aside. */
function localSettings({ dataDir, port, page, smtp, sms }) {
  const ownTexts = process.env.SMS_ACCOUNT_SID !== undefined;
  const ownMail = process.env.SMTP_HOST !== undefined || process.env.SMTP_PORT !== undefined;
  const publicUrl = process.env.PUBLIC_URL || `http://localhost:${port}`;
  return {
    PORT: String(port),
    DATA_DIR: dataDir,
    DEMO: process.env.DEMO || 'on',
    PUBLIC_URL: publicUrl,
    LOG_LEVEL: process.env.LOG_LEVEL || 'warn',
    LOGGER_DIR: path.resolve(root, process.env.LOGGER_DIR || path.join(dataDir, 'loggers')),
    STATE_DIR: path.join(dataDir, 'local-services'),
    LOCAL_PAGE_PORT: String(page),
    LOCAL_SMTP_PORT: String(smtp),
    LOCAL_SMS_PORT: String(sms),
    LOCAL_SERVICES_URL: `http://127.0.0.1:${page}`,
    // The local loggers serve their files over HTTP, too.
    HTTP_SOURCE_HOSTS: [process.env.HTTP_SOURCE_HOSTS, `127.0.0.1:${page}`].filter(Boolean).join(','),
    SMS_INCOMING_URL: `${publicUrl}/api/hooks/sms/incoming`,
    ...(!ownMail && { SMTP_HOST: '127.0.0.1', SMTP_PORT: String(smtp) }),
    ...(!ownTexts && {
      SMS_ACCOUNT_SID: `AC${'0'.repeat(31)}1`,
      SMS_AUTH_TOKEN: localToken(dataDir),
      SMS_FROM: '+12085550100',
      SMS_BASE_URL: `http://127.0.0.1:${sms}`,
    }),
  };
}

/**
 * Reads PORT, DATA_DIR and DEMO, finds ports for the local services, and returns the environment of both processes.
 * Throws a Fault with one sentence for whatever is of no use.
 */
export async function startSettings() {
  const demo = process.env.DEMO || 'on';
  if (!['on', 'off'].includes(demo.toLowerCase())) throw new Fault(`DEMO is "${demo}": set it to on or off.`);
  const dataDir = dataFolder(process.env.DATA_DIR);
  const port = await serverPort(process.env.PORT || '3000');
  const page = await localPort(process.env.LOCAL_PAGE_PORT, 3001, 'LOCAL_PAGE_PORT');
  const smtp = await localPort(process.env.LOCAL_SMTP_PORT, 3025, 'LOCAL_SMTP_PORT');
  const sms = await localPort(process.env.LOCAL_SMS_PORT, 3026, 'LOCAL_SMS_PORT');
  return localSettings({ dataDir, port, page, smtp, sms });
}
