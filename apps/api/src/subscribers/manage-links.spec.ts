import type { Settings } from '../config/settings';
import { ManageLinks } from './manage-links';

const linksOf = (secret: string) =>
  new ManageLinks({ secret, publicUrl: 'https://air.pellworth.example' } as Settings);

describe('manage links', () => {
  const links = linksOf('one');

  it('reads back the person it was made for', () => {
    for (const id of [1, 42, 3400, 9_000_000]) expect(links.personOf(links.tokenOf(id))).toBe(id);
  });

  it.each(['', '1', '1-', '-x', 'zz-zz', `${'z'.repeat(40)}-x`, '../../etc'])('knows nobody by %p', (token) =>
    expect(links.personOf(token)).toBeUndefined(),
  );

  it("does not take another person's or another installation's signature", () => {
    const signature = links.tokenOf(1).split('-').slice(1).join('-');
    expect(links.personOf(`2-${signature}`)).toBeUndefined();
    expect(linksOf('two').personOf(links.tokenOf(1))).toBeUndefined();
  });
});
