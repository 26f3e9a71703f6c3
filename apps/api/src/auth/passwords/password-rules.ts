import { commonPasswords } from './common-passwords';

/** The fewest characters a password may have. */
export const leastPasswordLength = 12;
/** The most: enough for any sentence, few enough to hash. */
export const mostPasswordLength = 128;

/**
 * What is wrong with a password, undefined when nothing is. Length counts, composition does not (NIST SP 800-63B,
 * section 3.1.1.2): no rule about digits or marks, but not the e-mail, and not one of those that are guessed first.
 */
export function passwordFault(password: string, email: string): string | undefined {
  const length = [...password].length;
  if (length < leastPasswordLength)
    return `Use at least ${leastPasswordLength} characters. A short sentence is good.`;
  if (length > mostPasswordLength) return `Use at most ${mostPasswordLength} characters.`;
  const plain = password.toLowerCase().replace(/[\s\p{P}\p{S}]/gu, '');
  if (plain === plainEmail(email)) return 'Your e-mail is not a password. Choose something else.';
  if (commonPasswords.has(plain) || new Set(plain).size < 4)
    return 'This password is one of the first that are tried. Choose something else.';
  return undefined;
}

function plainEmail(email: string): string {
  return email.toLowerCase().replace(/[\s\p{P}\p{S}]/gu, '');
}
