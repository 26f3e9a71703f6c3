import { setTimeout as pause } from 'node:timers/promises';
import { Injectable } from '@nestjs/common';
import { Clock } from '../common/clock';
import { Sql } from '../database/sql';
import { OutboxDispatcher } from '../outbox/outbox-dispatcher';

/** How often it is looked whether the receipts are in, and how long they are waited for, ms. */
const LOOK_EVERY_MS = 15;
const PATIENCE_MS = 20_000;

/** Waits until a notice's messages are with the local services and their receipts are back, before time goes on. */
@Injectable()
export class DemoDelivery {
  constructor(
    private readonly dispatcher: OutboxDispatcher,
    private readonly sql: Sql,
    private readonly clock: Clock,
  ) {}

  /** Sends what is due and waits for what comes back; an error when that takes more than twenty seconds. */
  async settle(): Promise<void> {
    await this.dispatcher.dispatch();
    for (let waitedMs = 0; await this.underWay(); waitedMs += LOOK_EVERY_MS) {
      if (waitedMs > PATIENCE_MS)
        throw new Error('The receipts of the demo’s texts did not come back. Start again.');
      await pause(LOOK_EVERY_MS);
    }
  }

  private async underWay(): Promise<boolean> {
    const row = await this.sql.get(
      `SELECT 1 FROM outbox WHERE state = 'sending' OR (state = 'accepted' AND channel = 'sms')
         OR (state = 'queued' AND next_at <= $1) LIMIT 1`,
      [this.clock.now()],
    );
    return row !== undefined;
  }
}
