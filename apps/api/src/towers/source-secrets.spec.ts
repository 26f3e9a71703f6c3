import { authorizationOf, openCredentials, sealCredentials } from './source-secrets';

const SECRET = 'ab'.repeat(32);
const ORIGIN = 'https://loggers.example.org';
const credentials = { auth: 'basic', username: 'mast', password: 'grüner Schnee' } as const;

describe("a source's credentials", () => {
  const sealed = sealCredentials(SECRET, ORIGIN, credentials);

  it('open for their origin with the secret they were sealed with, and are not to be read as kept', () => {
    expect(openCredentials(SECRET, ORIGIN, sealed)).toEqual(credentials);
    expect(Buffer.from(sealed, 'base64url').toString('latin1')).not.toMatch(/mast|Schnee/);
    expect(sealCredentials(SECRET, ORIGIN, credentials)).not.toBe(sealed);
  });

  it.each([
    ['another origin', SECRET, 'https://loggers.example.org:444', sealed],
    ['another secret', 'cd'.repeat(32), ORIGIN, sealed],
    ['damage', SECRET, ORIGIN, `${sealed.slice(0, -2)}AA`],
    ['half of it', SECRET, ORIGIN, sealed.slice(0, 8)],
  ])('do not open for %s', (_, secret, origin, given) => {
    expect(openCredentials(secret, origin, given)).toBeUndefined();
  });

  // RFC 7617 section 2: user "Aladdin", password "open sesame"; RFC 6750 section 2.1.
  it('are written as the standards say', () => {
    const basic = { auth: 'basic', username: 'Aladdin', password: 'open sesame' } as const;
    expect(authorizationOf(basic)).toBe('Basic QWxhZGRpbjpvcGVuIHNlc2FtZQ==');
    expect(authorizationOf({ auth: 'bearer', token: 'mF_9.B5f-4.1JqM' })).toBe('Bearer mF_9.B5f-4.1JqM');
  });
});
