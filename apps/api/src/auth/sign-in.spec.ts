import type { Agent } from 'supertest';
import { AuthService } from './auth.service';
import { Attempts, onAccount } from './passwords/attempts';
import { makeUser, signInAs, testPassword } from '../testing/people';
import { makeDistrict } from '../testing/places';
import { createTestApp, testNow, type TestApp } from '../testing/test-app';

const wrongPassword = 'not the password at all';

describe('signing in', () => {
  let test: TestApp;
  beforeEach(async () => (test = await createTestApp()));
  afterEach(() => test.close());

  const signIn = (email: string, password: string, http: Agent = test.http) =>
    http.post('/api/auth/sign-in').send({ email, password });
  const sessions = async () => (await test.sql.get<{ n: number }>('SELECT count(*) AS n FROM session'))?.n;

  it('lets somebody in and out, and the old session id opens nothing', async () => {
    const district = await makeDistrict(test, { slug: 'mill-flats', name: 'Mill Flats' });
    const { email } = await makeUser(test, 'officer', [district]);
    const signedIn = await signIn(email.toUpperCase(), testPassword).expect(200);
    expect(signedIn.body).toMatchObject({
      email,
      role: 'officer',
      districts: [{ id: district, slug: 'mill-flats', name: 'Mill Flats' }],
    });
    const cookie = String(signedIn.headers['set-cookie']);
    expect(cookie).toMatch(/HttpOnly/);
    expect(cookie).toMatch(/SameSite=Lax/);
    expect(cookie).not.toMatch(/Secure|Expires/);
    await test.http.get('/api/auth/me').expect(200, signedIn.body);
    await test.http.post('/api/auth/sign-out').expect(204);
    await test.http
      .get('/api/auth/me')
      .set('cookie', cookie.split(';')[0] ?? '')
      .expect(401);
    expect(await sessions()).toBe(0);
  });

  it('renews the session id at every sign-in', async () => {
    const { email, http } = await signInAs(test, 'analyst');
    const before = await test.sql.get<{ sid: string }>('SELECT sid FROM session');
    await signIn(email, testPassword, http).expect(200);
    const after = await test.sql.all<{ sid: string }>('SELECT sid FROM session');
    expect(after).toHaveLength(1);
    expect(after[0]?.sid).not.toBe(before?.sid);
  });

  it('marks the cookie for https only where the public address is https', async () => {
    const secure = await createTestApp({ settings: { publicUrl: 'https://air.pellworth.example' } });
    const { email } = await makeUser(secure, 'analyst');
    const answer = await signIn(
      email,
      testPassword,
      secure.http.set('x-forwarded-proto', 'https') as Agent,
    ).expect(200);
    expect(String(answer.headers['set-cookie'])).toMatch(/Secure/);
    await secure.close();
  });

  it('answers the same for an unknown e-mail, a wrong password, somebody invited and somebody retired', async () => {
    const { email } = await makeUser(test, 'officer');
    const administrator = await signInAs(test, 'administrator');
    const retired = await makeUser(test, 'analyst');
    await administrator.http.post(`/api/users/${retired.id}/retire`).expect(200);
    const invited = { email: 'new@pellworth.example', name: 'New', role: 'analyst' };
    await administrator.http.post('/api/users').send(invited).expect(201);
    const answers = [
      await signIn(email, wrongPassword),
      await signIn('nobody@example.org', testPassword),
      await signIn(retired.email, testPassword),
      await signIn(invited.email, testPassword),
    ];
    for (const { status, body } of answers) {
      expect(status).toBe(401);
      expect(body).toEqual(answers[0]?.body);
    }
    expect(answers[0]?.body.code).toBe('sign-in-failed');
  });

  it('refuses more attempts on one account from one address for a quarter of an hour', async () => {
    const { email } = await makeUser(test, 'analyst');
    for (let k = 0; k < 8; k++) await signIn(email, wrongPassword).expect(401);
    const refused = await signIn(email, testPassword).expect(429);
    expect(refused.body.detail).toBe('There were too many attempts. Try again in 15 min.');
    test.clock.advance(15 * 60);
    await signIn(email, testPassword).expect(200);
  });

  it('lets the owner in while somebody guesses from elsewhere, unless it is from everywhere', async () => {
    const { email } = await makeUser(test, 'analyst');
    const auth = test.app.get(AuthService, { strict: false });
    const guess = (address: string) => auth.check({ email, password: wrongPassword }, address);
    for (let k = 0; k < 8; k++) expect(await guess('192.0.2.7')).toBeUndefined();
    await expect(guess('192.0.2.7')).rejects.toMatchObject({ code: 'too-many-attempts' });
    await signIn(email, testPassword).expect(200);
    const attempts = test.app.get(Attempts, { strict: false });
    for (let k = 8; k < 100; k++) await attempts.begin(onAccount(email));
    await signIn(email, testPassword).expect(429);
  });

  it('counts attempts that are made side by side', async () => {
    const { email } = await makeUser(test, 'analyst');
    const answers = await Promise.all(Array.from({ length: 20 }, () => signIn(email, wrongPassword)));
    expect(answers.filter(({ status }) => status === 401)).toHaveLength(8);
    expect(answers.filter(({ status }) => status === 429)).toHaveLength(12);
  });

  it('refuses more attempts from one address on many accounts', async () => {
    for (let k = 0; k < 40; k++)
      await test.sql.run('INSERT INTO sign_in_failure (key, at) VALUES ($1, $2)', [`x${k}`, testNow]);
    const emails = Array.from({ length: 41 }, (_, k) => `nobody${k}@example.org`);
    const answers = await Promise.all(emails.map((email) => signIn(email, wrongPassword)));
    expect(answers.filter(({ status }) => status === 429)).toHaveLength(1);
  }, 30_000);

  it('asks for the password again, and not for ever', async () => {
    const { id } = await makeUser(test, 'officer');
    const auth = test.app.get(AuthService, { strict: false });
    expect(await auth.verifyPassword(id, testPassword)).toBe(true);
    for (let k = 0; k < 8; k++) expect(await auth.verifyPassword(id, wrongPassword)).toBe(false);
    await expect(auth.verifyPassword(id, testPassword)).rejects.toMatchObject({ code: 'too-many-attempts' });
  });
});
