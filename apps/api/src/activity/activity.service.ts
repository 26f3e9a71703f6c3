import { Injectable } from '@nestjs/common';
import { Clock } from '../common/clock';
import { Sql } from '../database/sql';
import { UnitOfWork } from '../database/unit-of-work';
import { linkHash, sha256 } from './digest';

/** Something worth keeping: who did what to what. */
export interface Deed {
  /** A person, or the service itself. */
  actor: { id: number; name: string } | 'service';
  /** A short phrase: `confirmed a proposal`. */
  act: string;
  /** What it was done to: `proposal 12`. */
  subject: string;
  districtId?: number;
  /** Details that may have to be erased one day, for they can name people. */
  body?: object;
}

/** The record of what was done: append-only, each entry chained to the one before by its hash. */
@Injectable()
export class ActivityService {
  constructor(
    private readonly sql: Sql,
    private readonly units: UnitOfWork,
    private readonly clock: Clock,
  ) {}

  /** Adds an entry in the running transaction, so that the deed and its entry stand or fall together. */
  record(deed: Deed): Promise<void> {
    return this.units.run(() => this.append(deed));
  }

  private async append(deed: Deed): Promise<void> {
    const last = await this.sql.get<{ seq: number; hash: string }>(
      'SELECT seq, hash FROM activity ORDER BY seq DESC LIMIT 1',
    );
    const body = JSON.stringify(deed.body ?? {});
    const facts = {
      seq: (last?.seq ?? 0) + 1,
      at: this.clock.now(),
      actor: deed.actor === 'service' ? 'service' : deed.actor.name,
      actorId: deed.actor === 'service' ? null : deed.actor.id,
      act: deed.act,
      subject: deed.subject,
      districtId: deed.districtId ?? null,
      digest: sha256(body),
    };
    const prev = last?.hash ?? '';
    await this.sql.run(
      `INSERT INTO activity (seq, at, actor, actor_id, act, subject, district_id, digest, prev, hash)
       VALUES ($seq, $at, $actor, $actorId, $act, $subject, $districtId, $digest, $prev, $hash)`,
      { ...facts, prev, hash: linkHash(prev, facts) },
    );
    await this.sql.run('INSERT INTO activity_body (seq, body) VALUES ($1, $2)', [facts.seq, body]);
  }
}
