import fc from 'fast-check';
import { shortExp } from './short-exp';

describe('shortExp', () => {
  it('is the exponential, within 1e-12, on both sides of where the series ends', () => {
    fc.assert(
      fc.property(fc.double({ min: -0.1, max: 0.1, noNaN: true }), (x) => {
        expect(Math.abs(shortExp(x) / Math.exp(x) - 1)).toBeLessThan(1e-12);
      }),
    );
    expect(shortExp(NaN)).toBeNaN();
    expect(shortExp(-2)).toBe(Math.exp(-2));
  });
});
