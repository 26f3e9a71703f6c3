import { maskedAddress } from './masked-address';

describe('a masked address', () => {
  it('shows no more than tells it apart', () => {
    expect(maskedAddress('email', 'ada@pellworth.example')).toBe('a…@pellworth.example');
    expect(maskedAddress('sms', '+12085550142')).toBe('… 42');
    expect(maskedAddress('sms', null)).toBe('forgotten');
  });
});
