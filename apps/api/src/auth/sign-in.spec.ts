import { makeUser, signInAs, testPassword } from '../testing/people';
import { createTestApp, type TestApp } from '../testing/test-app';

describe('signing in', () => {
  let test: TestApp;
  beforeAll(async () => (test = await createTestApp()));
  afterAll(() => test.close());

  it('lets somebody in and out', async () => {
    const { http, email } = await signInAs(test, 'analyst');
    const me = await http.get('/api/auth/me').expect(200);
    expect(me.body).toMatchObject({ email, role: 'analyst', districts: [] });
    await http.post('/api/auth/sign-out').expect(204);
    await http.get('/api/auth/me').expect(401);
  });

  it('answers the same for an unknown e-mail and a wrong password', async () => {
    const { email } = await makeUser(test, 'officer');
    const wrong = await test.http.post('/api/auth/sign-in').send({ email, password: 'not the password' });
    const unknown = await test.http
      .post('/api/auth/sign-in')
      .send({ email: 'nobody@example.org', password: testPassword });
    expect(wrong.status).toBe(401);
    expect(unknown.status).toBe(401);
    expect(unknown.body).toEqual(wrong.body);
  });
});
