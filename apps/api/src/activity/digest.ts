import { createHash } from 'node:crypto';

/** SHA-256 of a text as lower-case hexadecimal. */
export function sha256(text: string): string {
  return createHash('sha256').update(text).digest('hex');
}

/** What one entry of the record says, apart from its body. */
export interface EntryFacts {
  seq: number;
  at: number;
  actor: string;
  actorId: number | null;
  act: string;
  subject: string;
  districtId: number | null;
  /** SHA-256 of the body, so that the body can be erased and the chain still holds. */
  digest: string;
}

/** An entry's link in the chain: it covers the entry before and every fact of this one. */
export function linkHash(prev: string, facts: EntryFacts): string {
  const { seq, at, actor, actorId, act, subject, districtId, digest } = facts;
  return sha256(JSON.stringify([prev, seq, at, actor, actorId, act, subject, districtId, digest]));
}
