import { readFileSync, statSync, writeFileSync } from 'node:fs';
import path from 'node:path';
import { temporaryFolder } from '../testing/temporary-folder';
import { readSettings } from './read-settings';

const example = path.resolve(__dirname, '../../.env.example');

describe('reading the settings', () => {
  const { folder, remove } = temporaryFolder();
  afterAll(remove);

  const read = (environment: Record<string, string> = {}) =>
    readSettings((name) => ({ DATA_DIR: folder, ...environment })[name]);

  it('has a default for everything', () => {
    expect(read()).toMatchObject({
      port: 3000,
      demo: true,
      publicUrl: 'http://localhost:3000',
      loggerDir: path.join(folder, 'loggers'),
      smtp: { host: '127.0.0.1', port: 3025, secure: false },
      sms: { baseUrl: 'http://127.0.0.1:3026' },
      sessionIdleMinutes: 30,
      sessionMaxHours: 12,
      httpSourceHosts: [],
      production: false,
    });
  });

  it('takes what is set', () => {
    const sid = `AC${'ab'.repeat(16)}`;
    const account = { SMS_ACCOUNT_SID: sid, SMS_AUTH_TOKEN: 'token', SMS_FROM: '+12085550123' };
    const settings = read({
      PORT: '4000',
      DEMO: 'OFF',
      PUBLIC_URL: 'https://air.example.org/',
      SMTP_PORT: '465',
      HTTP_SOURCE_HOSTS: 'Loggers.example.org, 192.0.2.7:8080,[::1]:81',
      ...account,
    });
    expect(settings).toMatchObject({
      port: 4000,
      demo: false,
      publicUrl: 'https://air.example.org',
      smtp: { secure: true },
      httpSourceHosts: ['loggers.example.org', '192.0.2.7:8080', '[::1]:81'],
    });
    expect(settings.sms).toEqual({ accountSid: sid, authToken: 'token', from: '+12085550123' });
  });

  it('keeps its secret to itself and from start to start', () => {
    const { secret } = read();
    expect(secret).toMatch(/^[0-9a-f]{64}$/);
    expect(read().secret).toBe(secret);
    expect(statSync(path.join(folder, 'secret')).mode & 0o077).toBe(0);
  });

  it('says so when the secret is damaged', () => {
    const other = temporaryFolder();
    writeFileSync(path.join(other.folder, 'secret'), 'half of it');
    expect(() => read({ DATA_DIR: other.folder })).toThrow(/secret is damaged: remove it/);
    other.remove();
  });

  it.each([
    [{ PORT: '70000' }, 'PORT is "70000": set it to a whole number from 0 to 65535.'],
    [{ SESSION_IDLE_MINUTES: '0' }, 'SESSION_IDLE_MINUTES is "0": set it to a whole number from 1 to 1440.'],
    [{ LOG_LEVEL: 'loud' }, /LOG_LEVEL is "loud"/],
    [{ SMS_FROM: '+12085550123' }, /set SMS_ACCOUNT_SID and SMS_AUTH_TOKEN too/],
    [{ SMS_ACCOUNT_SID: 'x', SMS_AUTH_TOKEN: 'y', SMS_FROM: '+12085550123' }, /32 hexadecimal digits/],
    [{ HTTP_SOURCE_HOSTS: 'loggers.example.org, http://x' }, /HTTP_SOURCE_HOSTS has "http:\/\/x"/],
    [{ HTTP_SOURCE_HOSTS: '*.example.org' }, /write each as host or host:port/],
    [{ SMS_BASE_URL: 'ftp://x' }, /SMS_BASE_URL is "ftp:\/\/x"/],
  ])('refuses %j', (environment, words) => {
    expect(() => read(environment as unknown as Record<string, string>)).toThrow(words);
  });

  it('is described in the example, each name once', () => {
    const named: string[] = [];
    readSettings((name) => {
      named.push(name);
      return name === 'DATA_DIR' ? folder : undefined;
    });
    const described = [...readFileSync(example, 'utf8').matchAll(/^#?([A-Z_]+)=/gm)].map(
      ([, name]) => name ?? '',
    );
    expect(new Set(described).size).toBe(described.length);
    expect(described.sort()).toEqual([...new Set(named)].sort());
  });
});
