import { looksLikeEmail, looksLikePhone } from './address-shapes';

it.each([
  ['ada@pellworth.example', true],
  [' ada@pellworth.example ', true],
  ['ada@pellworth', false],
  ['ada pellworth.example', false],
  ['', false],
])('"%s" looks like an e-mail address: %s', (text, expected) => {
  expect(looksLikeEmail(text)).toBe(expected);
});

it.each([
  ['208 555 0142', true],
  ['+1 (208) 555-0142', true],
  ['208.555.0142', true],
  ['555', false],
  ['call me', false],
  ['1234567890123456', false],
])('"%s" looks like a telephone number: %s', (text, expected) => {
  expect(looksLikePhone(text)).toBe(expected);
});
