import { isEmail } from 'class-validator';
import { createHmac } from 'node:crypto';

/** How a resident is reached. */
export type Channel = 'email' | 'sms';

/** Numbers written without a country are taken as numbers of the North American Numbering Plan. */
const HOME_COUNTRY = '1';
const HOME_DIGITS = 10;

/**
 * An e-mail address as it is kept: without outer spaces, in small letters (in practice no mail provider tells letters
 * of different case apart). Undefined when it is no address.
 */
export function normalEmail(text: string): string | undefined {
  const address = text.trim().toLowerCase();
  return isEmail(address) ? address : undefined;
}

/** A telephone number in E.164 (`+` and at most 15 digits). Undefined when it is no number. */
export function normalPhone(text: string): string | undefined {
  const trimmed = text.trim();
  if (!/^\+?[\d\s().\-/]+$/.test(trimmed)) return undefined;
  const digits = trimmed.replace(/\D/g, '');
  if (trimmed.startsWith('+')) return /^[1-9]\d{6,14}$/.test(digits) ? `+${digits}` : undefined;
  if (digits.length === HOME_DIGITS)
    return /^[2-9]\d{2}[2-9]/.test(digits) ? `+${HOME_COUNTRY}${digits}` : undefined;
  return digits.length === HOME_DIGITS + 1 && digits.startsWith(HOME_COUNTRY) ? `+${digits}` : undefined;
}

/** Finds an address again without keeping it: an HMAC-SHA-256 of channel and address under the installation's secret. */
export function addressHash(secret: string, channel: Channel, address: string): string {
  return createHmac('sha256', secret).update(`${channel}:${address}`).digest('base64url');
}
