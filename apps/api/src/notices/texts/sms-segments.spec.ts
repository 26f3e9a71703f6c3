import { smsSize, toGsm7 } from './sms-segments';

const a = (n: number) => 'a'.repeat(n);

/** 3GPP TS 23.038 and 23.040: 160 septets alone, 153 in a part; 70 and 67 in UCS-2; extension characters cost two. */
const CASES: readonly [string, string, 'GSM-7' | 'UCS-2', number, number][] = [
  ['a full single part', a(160), 'GSM-7', 160, 1],
  ['one more needs two', a(161), 'GSM-7', 161, 2],
  ['two full parts', a(306), 'GSM-7', 306, 2],
  ['one more needs three', a(307), 'GSM-7', 307, 3],
  ['three full parts', a(459), 'GSM-7', 459, 3],
  ['one more needs four', a(460), 'GSM-7', 460, 4],
  ['the euro sign costs two', `${a(159)}€`, 'GSM-7', 161, 2],
  ['and still fits', `${a(158)}€`, 'GSM-7', 160, 1],
  ['a pair is not split over parts', `${a(152)}€${a(152)}`, 'GSM-7', 306, 3],
  ['other alphabets take UCS-2', 'ж'.repeat(70), 'UCS-2', 70, 1],
  ['one more of them needs two', 'ж'.repeat(71), 'UCS-2', 71, 2],
  ['two full UCS-2 parts', 'ж'.repeat(134), 'UCS-2', 134, 2],
  ['one more needs three', 'ж'.repeat(135), 'UCS-2', 135, 3],
  ['a surrogate pair is two units', '🔥', 'UCS-2', 2, 1],
  ['the degree sign is not in the alphabet', 'Air temp -20 °C', 'UCS-2', 15, 1],
  ['the micro sign is not', 'PM2.5 35 µg/m3', 'UCS-2', 14, 1],
  ['brackets cost two each', '[A]', 'GSM-7', 5, 1],
  ['small c with cedilla is not in it', 'ça', 'UCS-2', 2, 1],
  ['the capital is', 'Ça', 'GSM-7', 2, 1],
  ['the typographic apostrophe is not', 'don’t', 'UCS-2', 5, 1],
  ['nothing is one part', '', 'GSM-7', 0, 1],
];

describe('the size of a text message', () => {
  it.each(CASES)('%s', (_, text, encoding, units, segments) =>
    expect(smsSize(text)).toEqual({ encoding, units, segments }),
  );

  it.each([
    ['aquí, mañana, avisó', 'aqui, mañana, aviso'],
    ['don’t – 5 °C', "don't - 5 C"],
    ['тепло', '?????'],
  ])('writes %p in the GSM alphabet', (text, expected) => {
    expect(toGsm7(text)).toBe(expected);
    expect(smsSize(toGsm7(text)).encoding).toBe('GSM-7');
  });
});
