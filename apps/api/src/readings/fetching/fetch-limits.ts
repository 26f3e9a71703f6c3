import { Injectable } from '@nestjs/common';

/** How long a source over HTTP is waited for, and how much of it is taken. */
@Injectable()
export class FetchLimits {
  /** Until its server has been reached and has begun to answer, ms. */
  answerMs = 20_000;
  /** Until the whole body has come, ms. */
  overallMs = 120_000;
  /** Of the body as it comes and as it inflates, bytes. */
  mostBytes = 100_000_000;
  /** Redirects within the same origin. */
  mostRedirects = 3;
}
