import { errorCodes, type ErrorCode } from '@lidwatch/contracts';
import type { Server } from 'node:http';
import request, { type Response } from 'supertest';
import { signInAs } from '../src/testing/people';
import { createTestApp, type TestApp } from '../src/testing/test-app';
import { accessTable } from './access-table';

/** A body no route understands: valid JSON, but not an object. */
const nonsense = '[1, 2, 3]';

function expectProblem(response: Response, instance: string): void {
  expect(response.headers['content-type']).toBe('application/problem+json; charset=utf-8');
  const body = JSON.parse(response.text || JSON.stringify(response.body)) as Record<string, unknown>;
  const code = body.code as ErrorCode;
  expect(body).toMatchObject({ type: 'about:blank', status: response.status, instance });
  expect(errorCodes[code]).toEqual({ status: response.status, title: body.title });
  expect(body.detail).toMatch(/\S/);
  expect(JSON.stringify(body)).not.toMatch(/node_modules|SQLITE|at .*\.ts/);
}

describe('one error shape', () => {
  let test: TestApp;
  beforeAll(async () => (test = await createTestApp()));
  afterAll(() => test.close());

  const apiRoutes = Object.keys(accessTable).filter((route) => !/docs|openapi|health/.test(route));

  it.each(apiRoutes)('%s answers a fault as a problem', async (route) => {
    const [method = '', path = ''] = route.split(' ');
    const url = path.replace(/:\w+/g, 'no-such-thing');
    const send = request(test.app.getHttpServer() as Server)[method.toLowerCase() as 'get'](url);
    const response = await send
      .set('content-type', 'application/json')
      .send(method === 'GET' ? undefined : nonsense);
    if (response.status >= 400) expectProblem(response, url);
    else expect(accessTable[route]).toBe('public');
  });

  it('answers an unknown address', async () => {
    const response = await test.http.get('/api/no/such/address?secret=1');
    expect(response.status).toBe(404);
    expectProblem(response, '/api/no/such/address');
  });

  it.each([
    ['JSON that is none', 400, 'application/json', '{"email":'],
    ['a body too large', 413, 'application/json', JSON.stringify({ email: 'x'.repeat(600_000) })],
    ['a character set nobody reads', 415, 'application/json; charset=x-nonsense', '{}'],
    ['an address that cannot be decoded', 400, 'application/json', '{}', '/api/auth/link/%E0%A4%A'],
  ])('answers %s', async (_, status, type, body, url = '/api/auth/sign-in') => {
    const to = url === '/api/auth/sign-in' ? test.http.post(url) : test.http.get(url);
    const response = await to.set('content-type', type).send(url === '/api/auth/sign-in' ? body : undefined);
    expect(response.status).toBe(status);
    expectProblem(response, url);
  });

  it('names each field that is wrong', async () => {
    const { http } = await signInAs(test, 'administrator');
    const response = await http
      .post('/api/users')
      .send({ email: 'x', name: '', role: 'king', extra: 1 })
      .expect(422);
    expectProblem(response, '/api/users');
    const fields = (response.body.errors as { field: string }[]).map(({ field }) => field);
    expect(new Set(fields)).toEqual(new Set(['email', 'name', 'role', 'extra']));
  });
});
