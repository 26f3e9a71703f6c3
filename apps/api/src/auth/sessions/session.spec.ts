import { signInAs } from '../../testing/people';
import { createTestApp, testNow, type TestApp } from '../../testing/test-app';

const minute = 60;

describe('a session', () => {
  let test: TestApp;
  beforeEach(async () => (test = await createTestApp()));
  afterEach(() => test.close());

  it('ends 30 minutes after the last request', async () => {
    const { http } = await signInAs(test, 'analyst');
    test.clock.advance(29 * minute);
    await http.get('/api/auth/me').expect(200);
    test.clock.advance(29 * minute);
    await http.get('/api/auth/me').expect(200);
    test.clock.advance(30 * minute);
    await http.get('/api/auth/me').expect(401);
    await http.get('/api/auth/me').expect(401);
  });

  it('ends 12 hours after signing in, however busy', async () => {
    const { http } = await signInAs(test, 'analyst');
    for (let passed = 20; passed < 12 * 60; passed += 20) {
      test.clock.set(testNow + passed * minute);
      await http.get('/api/auth/me').expect(200);
    }
    test.clock.set(testNow + 12 * 60 * minute);
    await http.get('/api/auth/me').expect(401);
  });

  it('is written at most once a minute', async () => {
    const { http } = await signInAs(test, 'analyst');
    const data = () => test.sql.get<{ data: string }>('SELECT data FROM session');
    const first = await data();
    test.clock.advance(59);
    await http.get('/api/auth/me').expect(200);
    expect(await data()).toEqual(first);
    test.clock.advance(1);
    await http.get('/api/auth/me').expect(200);
    expect(await data()).not.toEqual(first);
  });

  it('ends at once for somebody retired, and follows a new role', async () => {
    const administrator = await signInAs(test, 'administrator');
    const analyst = await signInAs(test, 'analyst');
    await administrator.http.patch(`/api/users/${analyst.id}`).send({ role: 'officer' }).expect(200);
    expect((await analyst.http.get('/api/auth/me').expect(200)).body.role).toBe('officer');
    await administrator.http.post(`/api/users/${analyst.id}/retire`).expect(200);
    await analyst.http.get('/api/auth/me').expect(401);
  });

  it('is cleared away when it is over', async () => {
    await signInAs(test, 'analyst');
    const { StaleSessions } = await import('./stale-sessions');
    const stale = test.app.get(StaleSessions, { strict: false });
    expect(await stale.clear()).toMatch(/^0 sessions/);
    test.clock.advance(30 * minute);
    expect(await stale.clear()).toMatch(/^1 sessions/);
  });

  it.each([
    [{ 'sec-fetch-site': 'cross-site' }, 403],
    [{ 'sec-fetch-site': 'same-site' }, 403],
    [{ 'sec-fetch-site': 'same-origin', origin: 'http://localhost:5173' }, 204],
    [{ origin: 'https://elsewhere.example' }, 403],
    [{ origin: 'null' }, 403],
    [{ origin: 'http://127.0.0.1' }, 204],
    [{}, 204],
  ])('takes a write with %j: %d', async (headers, status) => {
    const { http } = await signInAs(test, 'analyst');
    const answer = await http.post('/api/auth/sign-out').set(headers as Record<string, string>);
    expect(answer.status).toBe(status);
    if (status === 403) expect(answer.body.code).toBe('cross-site');
  });

  it('lets another site read nothing but also breaks no plain link', async () => {
    const { http } = await signInAs(test, 'analyst');
    const answer = await http.get('/api/auth/me').set('sec-fetch-site', 'cross-site').expect(200);
    expect(answer.headers['access-control-allow-origin']).toBeUndefined();
  });
});
