import { Injectable } from '@nestjs/common';
import { createHmac, timingSafeEqual } from 'node:crypto';
import { Settings } from '../config/settings';

/**
 * The link by which a resident changes their wishes or leaves. Its token is the person's number and a signature under
 * the installation's secret, so every message can carry it without being stored, and nobody can guess another's.
 */
@Injectable()
export class ManageLinks {
  constructor(private readonly settings: Settings) {}

  /** The token of a person. */
  tokenOf(personId: number): string {
    return `${personId.toString(36)}-${this.sign(personId)}`;
  }

  /** The address of a person's page, for mail and texts. */
  urlOf(personId: number): string {
    return `${this.settings.publicUrl}/s/${this.tokenOf(personId)}`;
  }

  /** Where a mail program may send its one-click request to leave (RFC 8058). */
  leaveUrlOf(personId: number): string {
    return `${this.settings.publicUrl}/api/public/subscriptions/${this.tokenOf(personId)}/leave`;
  }

  /** The person a token belongs to; undefined when it was not made here. */
  personOf(token: string): number | undefined {
    const [number = '', signature = ''] = token.split(/-(.*)/s);
    if (!/^[0-9a-z]{1,11}$/.test(number)) return undefined;
    const personId = parseInt(number, 36);
    const [given, expected] = [Buffer.from(signature), Buffer.from(this.sign(personId))];
    return given.length === expected.length && timingSafeEqual(given, expected) ? personId : undefined;
  }

  private sign(personId: number): string {
    return createHmac('sha256', this.settings.secret)
      .update(`manage:${personId}`)
      .digest('base64url')
      .slice(0, 27);
  }
}
