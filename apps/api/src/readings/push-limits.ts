import { Injectable } from '@nestjs/common';
import type { Response } from 'express';
import { Clock } from '../common/clock';
import { Problem } from '../common/problem';
import { RateWindow } from '../common/rate-window';

/** Requests of one key within a minute: a logger sends a few, one that catches up many more. */
const MOST_REQUESTS = 120;
/** Bytes of one key within a minute, unpacked. */
const MOST_BYTES = 50_000_000;
const WINDOW_S = 60;
/** Requests of one key that are worked on side by side. */
const MOST_AT_ONCE = 4;
/** Wrong keys from one address within ten minutes. */
const MOST_WRONG = 30;
const WRONG_WINDOW_S = 600;

const POLICY = `"requests";q=${MOST_REQUESTS};w=${WINDOW_S}, "bytes";q=${MOST_BYTES};w=${WINDOW_S};qu="content-bytes"`;

const tooMany = (detail: string, retryAfterSeconds: number): Problem =>
  new Problem('too-many-requests', detail, { retryAfterSeconds });

/**
 * How much sites may push. Every answer says what is left in the fields `RateLimit-Policy` and `RateLimit` of the IETF's
 * draft-ietf-httpapi-ratelimit-headers (work in progress), and a refusal when to come again in `Retry-After` (RFC 9110).
 */
@Injectable()
export class PushLimits {
  private readonly requests = new RateWindow(MOST_REQUESTS, WINDOW_S);
  private readonly bytes = new RateWindow(MOST_BYTES, WINDOW_S);
  private readonly wrong = new RateWindow(MOST_WRONG, WRONG_WINDOW_S);
  private readonly atOnce = new Map<number, number>();

  constructor(private readonly clock: Clock) {}

  /** Lets a key's request in, or throws 429; call it before the body is read. */
  admit(keyId: number, response: Response): void {
    const [now, key] = [this.clock.now(), String(keyId)];
    const [requests, bytes] = [this.requests.quota(key, now), this.bytes.quota(key, now)];
    const left = Math.max(0, requests.left - 1);
    response.setHeader('RateLimit-Policy', POLICY);
    response.setHeader(
      'RateLimit',
      `"requests";r=${left};t=${requests.resetS}, "bytes";r=${bytes.left};t=${bytes.resetS}`,
    );
    if (requests.left === 0)
      throw tooMany(
        `This key has sent ${MOST_REQUESTS} requests within a minute. Send again in ${requests.resetS} s; many readings fit into one request.`,
        requests.resetS,
      );
    if (bytes.left === 0)
      throw tooMany(
        `This key has sent ${MOST_BYTES / 1e6} MB within a minute. Send the rest in ${bytes.resetS} s.`,
        bytes.resetS,
      );
    this.enter(keyId, response);
    this.requests.use(key, now);
  }

  /** Counts what a request's body held, unpacked. */
  count(keyId: number, bytes: number): void {
    this.bytes.use(String(keyId), this.clock.now(), bytes);
  }

  /** Counts a key that is not valid; throws 429 instead of the usual answer where its address has sent too many. */
  countWrong(address: string): void {
    const now = this.clock.now();
    const { left, resetS } = this.wrong.quota(address, now);
    if (left === 0)
      throw tooMany(
        `Too many wrong keys came from this address. Look at the logger's key, and send again in ${Math.ceil(resetS / 60)} min.`,
        resetS,
      );
    this.wrong.use(address, now);
  }

  private enter(keyId: number, response: Response): void {
    const others = this.atOnce.get(keyId) ?? 0;
    if (others >= MOST_AT_ONCE)
      throw tooMany(
        `Another ${others} requests with this key are being worked on. Send one after the other.`,
        1,
      );
    this.atOnce.set(keyId, others + 1);
    response.once('close', () => {
      const left = (this.atOnce.get(keyId) ?? 1) - 1;
      if (left > 0) this.atOnce.set(keyId, left);
      else this.atOnce.delete(keyId);
    });
  }
}
