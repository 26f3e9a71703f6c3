import { signal } from '../../testing/test-store';
import { PasswordHasher } from './password-hasher';
import { Turns } from './turns';

describe('password hashes', () => {
  it('are argon2id with 19 MiB, two passes and one lane, salted', async () => {
    const hasher = new PasswordHasher();
    const [first, second] = [
      await hasher.hash('a quiet winter morning'),
      await hasher.hash('a quiet winter morning'),
    ];
    expect(first).toMatch(/^\$argon2id\$v=19\$m=19456,t=2,p=1\$/);
    expect(first).not.toBe(second);
    expect(await hasher.matches(first, 'a quiet winter morning')).toBe(true);
    expect(await hasher.matches(first, 'a quiet winter evening')).toBe(false);
    expect(await hasher.matches(null, 'the password of nobody')).toBe(false);
  });

  it('are made two at a time', async () => {
    const turns = new Turns(2, 3);
    const go = signal();
    let inside = 0;
    let most = 0;
    const work = async (): Promise<void> => {
      most = Math.max(most, ++inside);
      await go.given;
      inside--;
    };
    const all = Array.from({ length: 5 }, () => turns.take(work));
    expect(turns.full).toBe(true);
    go.give();
    await Promise.all(all);
    expect(most).toBe(2);
    expect(turns.full).toBe(false);
  });

  it('let the next one through when one fails', async () => {
    const turns = new Turns(1, 9);
    const failing = turns.take(() => Promise.reject(new Error('on purpose')));
    const next = turns.take(() => Promise.resolve('next'));
    await expect(failing).rejects.toThrow('on purpose');
    expect(await next).toBe('next');
  });
});
