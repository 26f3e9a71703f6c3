import { backoffS } from './backoff';

describe('waiting after a failed attempt', () => {
  it.each([
    [1, 20],
    [2, 40],
    [3, 80],
    [7, 1280],
    [8, 1800],
    [50, 1800],
  ])('after attempt %i it is %i s, give or take a fifth', (attempts, plain) => {
    expect(backoffS(attempts, 0.5)).toBe(plain);
    expect(backoffS(attempts, 0)).toBe(Math.round(plain * 0.8));
    expect(backoffS(attempts, 0.999999)).toBe(Math.round(plain * 1.2));
  });
});
