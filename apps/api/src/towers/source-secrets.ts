import { createCipheriv, createDecipheriv, hkdfSync, randomBytes } from 'node:crypto';

/** What a source over HTTP asks for before it gives its file. */
export type Credentials =
  | { readonly auth: 'basic'; readonly username: string; readonly password: string }
  | { readonly auth: 'bearer'; readonly token: string };

const CIPHER = 'aes-256-gcm';
const IV_BYTES = 12;
const TAG_BYTES = 16;

const keyFrom = (secret: string): Buffer =>
  Buffer.from(hkdfSync('sha256', secret, '', 'lidwatch source credentials', 32));

/**
 * Credentials as they are kept: sealed with AES-256-GCM by a key derived (HKDF, RFC 5869) from the service's secret, and
 * bound to the origin they were given for, so that they open for no other.
 */
export function sealCredentials(secret: string, origin: string, credentials: Credentials): string {
  const iv = randomBytes(IV_BYTES);
  const cipher = createCipheriv(CIPHER, keyFrom(secret), iv).setAAD(Buffer.from(origin));
  const sealed = Buffer.concat([cipher.update(JSON.stringify(credentials)), cipher.final()]);
  return Buffer.concat([iv, cipher.getAuthTag(), sealed]).toString('base64url');
}

/** Opens sealed credentials for their origin; undefined where they are another origin's, or the secret was changed. */
export function openCredentials(secret: string, origin: string, sealed: string): Credentials | undefined {
  const bytes = Buffer.from(sealed, 'base64url');
  try {
    const decipher = createDecipheriv(CIPHER, keyFrom(secret), bytes.subarray(0, IV_BYTES), {
      authTagLength: TAG_BYTES,
    })
      .setAAD(Buffer.from(origin))
      .setAuthTag(bytes.subarray(IV_BYTES, IV_BYTES + TAG_BYTES));
    const opened = Buffer.concat([decipher.update(bytes.subarray(IV_BYTES + TAG_BYTES)), decipher.final()]);
    return JSON.parse(opened.toString()) as Credentials;
  } catch {
    return undefined;
  }
}

/** The Authorization header of credentials (RFC 7617, RFC 6750). */
export function authorizationOf(credentials: Credentials): string {
  if (credentials.auth === 'bearer') return `Bearer ${credentials.token}`;
  const { username, password } = credentials;
  return `Basic ${Buffer.from(`${username}:${password}`).toString('base64')}`;
}
