import { temporaryFolder } from '../src/testing/temporary-folder';
import { startBuilt, type BuiltService } from './built-service';

describe('the built service with the built web application', () => {
  const { folder, remove } = temporaryFolder();
  let service: BuiltService;
  let url: string;
  beforeAll(async () => {
    service = startBuilt(folder);
    url = await service.address;
  }, 60_000);
  afterAll(async () => {
    service.kill('SIGTERM');
    await service.ended;
    remove();
  });

  it.each(['/desk', '/proposals/12', '/welcome/some-token', '/s/confirm/some-token', '/subscribe'])(
    'answers %s with the page, asked for anew each time',
    async (path) => {
      const answer = await fetch(url + path);
      expect(answer.status).toBe(200);
      expect(answer.headers.get('content-type')).toMatch(/^text\/html/);
      expect(answer.headers.get('cache-control')).toBe('no-cache');
      expect(await answer.text()).toContain('<div id="root">');
    },
  );

  it('serves built files for a year, compressed', async () => {
    const page = await (await fetch(`${url}/desk`)).text();
    const file = /src="(\/assets\/[^"]+\.js)"/.exec(page)?.[1] ?? 'no script in the page';
    const answer = await fetch(url + file, { headers: { 'accept-encoding': 'gzip' } });
    expect(answer.status).toBe(200);
    expect(answer.headers.get('cache-control')).toBe('public, max-age=31536000, immutable');
    expect(answer.headers.get('content-encoding')).toBe('gzip');
  });

  it.each(['/assets/gone.js', '/api/gone', '/feeds/gone', '/health/gone'])(
    'answers %s with 404, not the page',
    async (path) => {
      const answer = await fetch(url + path);
      expect(answer.status).toBe(404);
      expect(answer.headers.get('content-type')).toMatch(/^application\/problem\+json/);
    },
  );

  it('lets the page load its own files only, also over plain http', async () => {
    const { headers } = await fetch(`${url}/desk`);
    const policy = headers.get('content-security-policy') ?? '';
    expect(policy).toContain("script-src 'self';");
    expect(policy).toContain("style-src 'self' 'unsafe-inline'");
    expect(policy).toContain("frame-ancestors 'none'");
    expect(policy).not.toContain('upgrade-insecure-requests');
    for (const absent of ['strict-transport-security', 'x-powered-by', 'set-cookie'])
      expect(headers.has(absent)).toBe(false);
  });
});
