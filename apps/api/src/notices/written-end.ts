import { Problem } from '../common/problem';

const SOONEST_S = 15 * 60;
const LATEST_S = 7 * 24 * 3600;

/** Throws 422 unless a written end lies at least a quarter of an hour and at most seven days ahead. */
export function refuseEnd(expiresAt: number, now: number): void {
  const text =
    expiresAt < now + SOONEST_S
      ? 'Choose an end at least 15 minutes from now.'
      : expiresAt > now + LATEST_S
        ? 'Choose an end within seven days; a notice can be issued again.'
        : undefined;
  if (text) throw new Problem('invalid', text, { errors: [{ field: 'expiresAt', text }] });
}

/** The written end of a notice, checked. */
export function writtenEnd(expiresAt: number, now: number): number {
  refuseEnd(expiresAt, now);
  return expiresAt;
}
