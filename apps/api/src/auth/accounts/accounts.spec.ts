import { makeDistrict } from '../../testing/places';
import { signInAs, testPassword } from '../../testing/people';
import { createTestApp, type TestApp } from '../../testing/test-app';
import { FirstAdministratorLink } from './first-administrator';

const day = 24 * 3600;
const tokenOf = (url: string): string => url.split('/').at(-1) ?? '';

describe('accounts', () => {
  let test: TestApp;
  beforeEach(async () => (test = await createTestApp()));
  afterEach(() => test.close());

  const firstLink = () => test.app.get(FirstAdministratorLink, { strict: false }).makeIfNeeded();
  const begin = (token: string, password = testPassword) =>
    test.http
      .post('/api/auth/first-administrator')
      .send({ token, name: 'L. Brandt', email: 'l.brandt@pellworth.example', password });

  it('begin with the first administrator, by a link that works once', async () => {
    const token = tokenOf((await firstLink()) ?? '');
    expect((await test.http.get(`/api/auth/link/${token}`).expect(200)).body).toEqual({
      purpose: 'first-administrator',
    });
    expect((await begin(token).expect(200)).body).toMatchObject({ name: 'L. Brandt', role: 'administrator' });
    await test.http.get('/api/users').expect(200);
    await begin(token).expect(410);
    expect(await firstLink()).toBeUndefined();
  });

  it('make a new first link at every start, and the old one stops working', async () => {
    const old = tokenOf((await firstLink()) ?? '');
    const fresh = tokenOf((await firstLink()) ?? '');
    await begin(old).expect(410);
    await begin(fresh).expect(200);
  });

  it('go on by invitations, for seven days', async () => {
    const { http } = await signInAs(test, 'administrator');
    const district = await makeDistrict(test);
    const wanted = {
      email: 'r.ortega@pellworth.example',
      name: 'R. Ortega',
      role: 'officer',
      districtIds: [district],
    };
    const { body } = await http.post('/api/users').send(wanted).expect(201);
    expect(body.user).toMatchObject({ ...wanted, state: 'invited' });
    expect(body.invitationUrl).toMatch(/^http:\/\/127\.0\.0\.1\/welcome\/[\w-]{43}$/);
    const token = tokenOf(body.invitationUrl as string);
    const link = await test.http.get(`/api/auth/link/${token}`).expect(200);
    expect(link.body).toEqual({ purpose: 'invitation', email: wanted.email, name: wanted.name });
    test.clock.advance(7 * day);
    await test.http.post('/api/auth/invitations/accept').send({ token, password: testPassword }).expect(410);
    const again = await signInAs(test, 'administrator');
    const renewed = await again.http.post(`/api/users/${body.user.id}/password-link`).expect(200);
    const accept = { token: tokenOf(renewed.body.url as string), password: testPassword };
    const me = await test.http.post('/api/auth/invitations/accept').send(accept).expect(200);
    expect(me.body).toMatchObject({ email: wanted.email, districts: [{ id: district }] });
    await test.http.get('/api/auth/me').expect(200);
  });

  it.each([
    ['eleven cha.', 'at least 12'],
    ['x'.repeat(129), 'at most 128'],
    ['password1234', 'first that are tried'],
    ['Password 1234!', 'first that are tried'],
    ['aaaaaaaaaaaaaaaa', 'first that are tried'],
    ['L.Brandt@pellworth.example', 'Your e-mail'],
  ])('refuse the password %j', async (password, words) => {
    const answer = await begin(tokenOf((await firstLink()) ?? ''), password).expect(422);
    expect(answer.body.errors).toEqual([{ field: 'password', text: expect.stringContaining(words) }]);
  });

  it('take a plain sentence as a password', async () => {
    await begin(tokenOf((await firstLink()) ?? ''), 'snow on the far ridge').expect(200);
  });

  it('keep an administrator', async () => {
    const { http, id } = await signInAs(test, 'administrator');
    const retire = await http.post(`/api/users/${id}/retire`).expect(409);
    expect(retire.body.detail).toContain('only administrator');
    await http.patch(`/api/users/${id}`).send({ role: 'analyst' }).expect(409);
    const second = await signInAs(test, 'administrator');
    await http.post(`/api/users/${second.id}/retire`).expect(200);
    await http.post(`/api/users/${second.id}/retire`).expect(409);
  });

  it('refuse an e-mail twice and a district that does not exist', async () => {
    const { http, email } = await signInAs(test, 'administrator');
    const twice = { email: email.toUpperCase(), name: 'Again', role: 'analyst' };
    expect((await http.post('/api/users').send(twice).expect(409)).body.code).toBe('name-taken');
    const lost = { email: 'lost@pellworth.example', name: 'Lost', role: 'officer', districtIds: [77] };
    expect((await http.post('/api/users').send(lost).expect(422)).body.errors[0].field).toBe('districtIds');
    expect((await http.get('/api/users').expect(200)).body.total).toBe(1);
  });

  it('end every session when a new password is set', async () => {
    const administrator = await signInAs(test, 'administrator');
    const analyst = await signInAs(test, 'analyst');
    const { body } = await administrator.http.post(`/api/users/${analyst.id}/password-link`).expect(200);
    const accept = { token: tokenOf(body.url as string), password: 'another quiet morning' };
    await test.http.post('/api/auth/invitations/accept').send(accept).expect(200);
    await analyst.http.get('/api/auth/me').expect(401);
  });
});
