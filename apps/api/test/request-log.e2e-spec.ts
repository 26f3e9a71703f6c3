import { temporaryFolder } from '../src/testing/temporary-folder';
import { startBuilt } from './built-service';

describe('the log of the built service', () => {
  const { folder, remove } = temporaryFolder();
  afterAll(remove);

  it('holds no password, cookie, link or query, and is quiet about health and pages', async () => {
    const service = startBuilt(folder, { LOG_LEVEL: 'debug' });
    const url = await service.address;
    const before = service.log().length;
    await fetch(`${url}/health/ready`);
    await fetch(`${url}/desk`);
    await fetch(`${url}/api/auth/link/a-secret-token?and=a-secret-query`);
    await fetch(`${url}/api/public/subscriptions/a-secret-token`);
    await fetch(`${url}/api/auth/sign-in`, {
      method: 'POST',
      headers: {
        'content-type': 'application/json',
        cookie: 'lidwatch=a-secret',
        authorization: 'Bearer a-secret',
      },
      body: JSON.stringify({ email: 'secret@example.org', password: 'a-secret-password' }),
    });
    service.kill('SIGTERM');
    await service.ended;
    const requests = service.log().slice(before);
    expect(requests).not.toMatch(/secret|health|desk/);
    expect(requests).toMatch(/"path":"\/api\/auth\/sign-in"/);
    expect(requests).toMatch(/"path":"\/api\/auth\/link\/…"/);
    expect(requests).toMatch(/"path":"\/api\/public\/subscriptions\/…"/);
  }, 60_000);
});
