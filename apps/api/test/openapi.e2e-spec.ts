import type { OpenAPIObject } from '@nestjs/swagger';
import { createTestApp, type TestApp } from '../src/testing/test-app';
import { accessTable } from './access-table';

interface Operation {
  responses: Record<string, { content?: Record<string, { schema?: object }> }>;
}

/** The shape of health is the library's own; the providers' call-backs are left out of the description. */
const notDescribed = /^GET \/health\//;

describe('the description of the API', () => {
  let test: TestApp;
  let description: OpenAPIObject;
  beforeAll(async () => {
    test = await createTestApp();
    description = (await test.http.get('/api/openapi.json').expect(200)).body as OpenAPIObject;
  });
  afterAll(() => test.close());

  const operations = (): [string, Operation][] =>
    Object.entries(description.paths).flatMap(([path, methods]) =>
      Object.entries(methods as Record<string, Operation>).map(([method, operation]): [string, Operation] => [
        `${method.toUpperCase()} ${path.replace(/\{(\w+)\}/g, ':$1')}`,
        operation,
      ]),
    );

  it('holds every route', () => {
    const described = operations().map(([route]) => route);
    const routes = Object.keys(accessTable).filter((route) => !/docs|openapi|hooks/.test(route));
    expect(described.sort()).toEqual(routes.sort());
  });

  it('says what every route answers', () => {
    const silent = operations()
      .filter(([route]) => !notDescribed.test(route))
      .filter(([, { responses }]) =>
        Object.entries(responses).some(
          ([status, { content }]) =>
            status.startsWith('2') &&
            status !== '204' &&
            !Object.values(content ?? {}).some(({ schema }) => schema),
        ),
      )
      .map(([route]) => route);
    expect(silent).toEqual([]);
  });

  it('can be browsed with files of its own', async () => {
    const page = await test.http.get('/api/docs').expect(200);
    const files = [...page.text.matchAll(/(?:src|href)="([^"]+)"/g)].map(([, file]) => file ?? '');
    expect(files.length).toBeGreaterThan(3);
    for (const file of files) {
      expect(file).not.toMatch(/^(https?:)?\/\//);
      await test.http.get(new URL(file, 'http://x/api/docs').pathname).expect(200);
    }
  });
});
