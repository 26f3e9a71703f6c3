import { Injectable } from '@nestjs/common';
import { Clock } from '../common/clock';
import { Sql } from '../database/sql';

/** A status call-back of the provider, as far as it is used. */
export interface StatusReport {
  /** Our id of the message, from the call-back's address. */
  readonly messageId: string;
  readonly providerId: string;
  readonly status: string;
  readonly errorCode?: string;
}

const FAILED = new Set(['failed', 'undelivered']);

/**
 * Writes what the provider reports of texts. Reports may come twice, late, or before our own row says
 * *accepted*, also while it waits for another attempt because the provider's answer never came.
 */
@Injectable()
export class SmsReceiptsService {
  constructor(
    private readonly sql: Sql,
    private readonly clock: Clock,
  ) {}

  /** Takes one report; the ones on the way (queued, sent) change nothing. */
  async take({ messageId, providerId, status, errorCode }: StatusReport): Promise<void> {
    const delivered = status === 'delivered';
    if (!delivered && !FAILED.has(status)) return;
    await this.sql.run(
      `UPDATE outbox SET state = $3, provider_id = coalesce(provider_id, $2), settled_at = $4, detail = $5
       WHERE message_id = $1 AND state IN ('queued', 'sending', 'accepted') AND attempts > 0 AND channel = 'sms'`,
      [
        ...[messageId, providerId, delivered ? 'delivered' : 'failed', this.clock.now()],
        delivered ? null : `the provider reports "${status}"${errorCode ? `, error ${errorCode}` : ''}`,
      ],
    );
  }
}
