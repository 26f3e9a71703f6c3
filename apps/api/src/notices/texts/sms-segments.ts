/**
 * How many parts a text message needs.
 *
 * Source: 3GPP TS 23.038 (GSM 7-bit default alphabet and its extension table), TS 23.040 (concatenation).
 */

const BASIC =
  '@£$¥èéùìòÇ\nØø\rÅåΔ_ΦΓΛΩΠΨΣΘΞÆæßÉ !"#¤%&\'()*+,-./0123456789:;<=>?¡ABCDEFGHIJKLMNOPQRSTUVWXYZÄÖÑÜ§¿abcdefghijklmnopqrstuvwxyzäöñüà';
const EXTENSION = '\f^{}\\[~]|€';

const LOOKALIKE: Record<string, string> = {
  '’': "'",
  '‘': "'",
  '“': '"',
  '”': '"',
  '–': '-',
  '—': '-',
  '…': '...',
  '°': '',
  µ: 'u',
};

const GSM7 = { single: 160, part: 153 };
const UCS2 = { single: 70, part: 67 };

/** What a text message costs to send. */
export interface SmsSize {
  encoding: 'GSM-7' | 'UCS-2';
  /** Septets (GSM-7) or 16-bit units (UCS-2). */
  units: number;
  segments: number;
}

/** The size of a text: GSM-7 when every character is in its alphabet, UCS-2 otherwise. The empty text is one part. */
export function smsSize(text: string): SmsSize {
  const characters = [...text];
  const gsm = characters.every(inAlphabet);
  if (!gsm) {
    const widths = characters.map(({ length }) => length);
    return { encoding: 'UCS-2', ...parts(widths, UCS2) };
  }
  return {
    encoding: 'GSM-7',
    ...parts(
      characters.map((each) => (EXTENSION.includes(each) ? 2 : 1)),
      GSM7,
    ),
  };
}

const inAlphabet = (character: string): boolean => BASIC.includes(character) || EXTENSION.includes(character);

/** A text in GSM-7 characters: accents the alphabet lacks are left off (`aquí` → `aqui`), anything else becomes `?`. */
export function toGsm7(text: string): string {
  return [...text]
    .map((each) => {
      if (inAlphabet(each)) return each;
      const bare = each.normalize('NFD').replace(/\p{M}/gu, '');
      return [...bare].every(inAlphabet) ? bare : (LOOKALIKE[each] ?? '?');
    })
    .join('');
}

/** A character of two units is never split over two parts. */
function parts(
  widths: number[],
  limit: { single: number; part: number },
): { units: number; segments: number } {
  const units = widths.reduce((sum, width) => sum + width, 0);
  if (units <= limit.single) return { units, segments: 1 };
  let segments = 1;
  let room = limit.part;
  for (const width of widths) {
    if (width > room) {
      segments += 1;
      room = limit.part;
    }
    room -= width;
  }
  return { units, segments };
}
