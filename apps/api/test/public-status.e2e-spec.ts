import { randomUUID } from 'node:crypto';
import { signInAs } from '../src/testing/people';
import { makeDistrict } from '../src/testing/places';
import { createTestApp, type TestApp } from '../src/testing/test-app';

let test: TestApp;
beforeAll(async () => {
  test = await createTestApp();
});
afterAll(() => test.close());

const page = async (path: string): Promise<string> => (await test.http.get(path).expect(200)).text;
/** The page without its script part, as somebody without scripts reads it. */
const seen = (html: string): string => html.replace(/<script[\s\S]*?<\/script>/g, '');

async function issueAdvisory(district: number): Promise<{ ref: string }> {
  const officer = await signInAs(test, 'officer', { districts: [district] });
  const notice = {
    ...{ districtId: district, kind: 'advisory', reason: 'Smoke lies in the valley.' },
    expiresAt: new Date((test.clock.now() + 12 * 3600) * 1000).toISOString(),
  };
  const { body: preview } = await officer.http.post('/api/notices/preview').send(notice).expect(200);
  const { body } = await officer.http
    .post('/api/notices')
    .send({ ...notice, previewHash: preview.hash, requestKey: randomUUID() })
    .expect(201);
  return body as { ref: string };
}

describe('the public page', () => {
  it('says not known, never clear, where nothing is measured', async () => {
    await makeDistrict(test, { slug: 'silent', name: 'Silent Hollow' });
    await test.http.get('/').expect(200);
    test.clock.set(test.clock.now() + 300);
    const html = seen(await page('/d/silent'));
    expect(html).toContain('We cannot see the air in Silent Hollow right now');
    expect(html).not.toMatch(/no restriction in force|air is clean|all clear/i);
    const { body } = await test.http.get('/api/public/districts/silent').expect(200);
    expect(body.state).toBe('not known');
  });

  it('carries the answer in its served HTML, in both languages, as soon as a notice is issued', async () => {
    const district = await makeDistrict(test, { slug: 'mill-flats', name: 'Mill Flats' });
    await issueAdvisory(district);
    for (const [path, words, lang] of [
      ['/d/mill-flats', 'Advisory in Mill Flats: please do not burn', 'en'],
      ['/d/mill-flats?lang=es', 'Aviso en Mill Flats: por favor, no queme', 'es'],
    ] as const) {
      const html = await page(path);
      expect(seen(html)).toContain(words);
      expect(seen(html)).toMatch(/Carbon monoxide kills|monóxido de carbono mata/);
      expect(html).toContain(`<html lang="${lang}"`);
    }
    expect(seen(await page('/'))).toContain('href="/d/mill-flats"');
    const { body } = await test.http.get('/api/public/status').expect(200);
    expect(body.find(({ slug }: { slug: string }) => slug === 'mill-flats').state).toBe('advisory');
  });

  it('stops saying so at the written end, whether or not a job has run', async () => {
    const district = await makeDistrict(test, { slug: 'short', name: 'Short Reach' });
    await issueAdvisory(district);
    expect(seen(await page('/d/short'))).toContain('Advisory in Short Reach');
    test.clock.set(test.clock.now() + 12 * 3600 + 1);
    expect(seen(await page('/d/short'))).not.toContain('Advisory in Short Reach');
  });

  it('makes every name safe and embeds its data so that it cannot break out', async () => {
    const name = '</script><img src=x onerror=alert(1)> $& "Flats"';
    await makeDistrict(test, { slug: 'hostile', name });
    test.clock.set(test.clock.now() + 300);
    const html = await page('/d/hostile');
    expect(html).not.toContain('<img src=x');
    const data = /id="public-status">([\s\S]*?)<\/script>/.exec(html)![1]!;
    expect((JSON.parse(data) as { name: string }).name).toBe(name);
  });

  it('is asked for again only when it changed', async () => {
    const { headers } = await test.http.get('/d/mill-flats').expect(200);
    await test.http.get('/d/mill-flats').set('If-None-Match', headers.etag!).expect(304);
    expect(headers['content-security-policy']).toContain("script-src 'self'");
    expect(headers['set-cookie']).toBeUndefined();
  });

  it('knows no district that does not exist', async () => {
    await test.http.get('/api/public/districts/nowhere').expect(404);
  });
});
