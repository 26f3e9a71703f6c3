import { readSettings } from '../config/read-settings';
import type { Settings } from '../config/settings';

/** Settings for a test on a data folder: no demo, silent log, a public address on loopback. */
export function testSettings(dataDir: string, changes: Partial<Settings> = {}): Settings {
  const environment: Record<string, string> = {
    PORT: '0',
    DATA_DIR: dataDir,
    DEMO: 'off',
    LOG_LEVEL: 'silent',
    PUBLIC_URL: 'http://127.0.0.1',
    // Nobody listens there: a test that sends nothing on purpose reaches no stand-in that happens to run.
    SMTP_PORT: '1',
    SMS_BASE_URL: 'http://127.0.0.1:1',
  };
  return Object.assign(
    readSettings((name) => environment[name]),
    changes,
  );
}
