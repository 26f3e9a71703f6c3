import { roles, type Role } from '@lidwatch/contracts';
import type { Agent, Response } from 'supertest';
import { signInAs } from '../src/testing/people';
import { createTestApp, type TestApp } from '../src/testing/test-app';
import { accessTable } from './access-table';
import { servedRoutes } from './served-routes';

const callers = ['nobody', ...roles] as const;
const nothingHere = '999999';

/** Calls a route on things that do not exist, with an empty body: nothing is changed, and access comes first. */
function call(http: Agent, route: string): Promise<Response> {
  const [method = '', path = ''] = route.split(' ');
  const url = path.replace(/:\w+/g, nothingHere);
  return Promise.resolve(
    http[method.toLowerCase() as 'get' | 'post'](url).set('accept', 'application/json').send(),
  );
}

/** What came of it, in the words of the table. */
function outcome({ status, body }: Response): 'let through' | 'sign in first' | 'refused' | 'broken' {
  if (status >= 500) return 'broken';
  if (status === 401 && body.code === 'sign-in-needed') return 'sign in first';
  return status === 403 && body.code === 'not-allowed' ? 'refused' : 'let through';
}

describe('access to every route', () => {
  let test: TestApp;
  const agents = {} as Record<(typeof callers)[number], Agent>;

  beforeAll(async () => {
    test = await createTestApp();
    agents.nobody = test.http;
    for (const role of roles) agents[role] = (await signInAs(test, role)).http;
  });
  afterAll(() => test.close());

  it('has a row for every route, and a route for every row', () => {
    expect(servedRoutes(test.app).sort()).toEqual(Object.keys(accessTable).sort());
  });

  const signOutLast = ([a]: [string, unknown], [b]: [string, unknown]): number =>
    Number(a.endsWith('sign-out')) - Number(b.endsWith('sign-out'));

  it.each(Object.entries(accessTable).sort(signOutLast))('%s is for %s', async (route, access) => {
    for (const caller of callers) {
      const wanted =
        access === 'public' || (access as readonly (Role | 'nobody')[]).includes(caller)
          ? 'let through'
          : caller === 'nobody'
            ? 'sign in first'
            : 'refused';
      expect({ caller, outcome: outcome(await call(agents[caller], route)) }).toEqual({
        caller,
        outcome: wanted,
      });
    }
  });
});
