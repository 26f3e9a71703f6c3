import { addressHash, normalEmail, normalPhone } from './addresses';

describe('addresses', () => {
  it.each([
    [' Ada@Pellworth.Example ', 'ada@pellworth.example'],
    ['ada@pellworth', undefined],
    ['ada', undefined],
    ['', undefined],
  ])('reads the e-mail %p as %p', (text, expected) => expect(normalEmail(text)).toBe(expected));

  it.each([
    ['208 555 0142', '+12085550142'],
    ['(208) 555-0142', '+12085550142'],
    ['1 208 555 0142', '+12085550142'],
    ['+44 1632 960983', '+441632960983'],
    ['555 0142', undefined],
    ['108 555 0142', undefined],
    ['+1', undefined],
    ['call me', undefined],
    ['+0 208 555 0142', undefined],
  ])('reads the telephone number %p as %p', (text, expected) => expect(normalPhone(text)).toBe(expected));

  it('finds an address by its hash, told apart by channel and installation', () => {
    const hash = addressHash('secret', 'sms', '+12085550142');
    expect(addressHash('secret', 'sms', '+12085550142')).toBe(hash);
    expect(addressHash('secret', 'email', '+12085550142')).not.toBe(hash);
    expect(addressHash('other', 'sms', '+12085550142')).not.toBe(hash);
    expect(hash).not.toContain('0142');
  });
});
