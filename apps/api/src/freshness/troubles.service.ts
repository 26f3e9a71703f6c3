import { Injectable, type OnModuleInit } from '@nestjs/common';
import { Clock } from '../common/clock';
import { toIso } from '../common/instants';
import { Sql } from '../database/sql';
import { UnitOfWork } from '../database/unit-of-work';
import { JobsService } from '../scheduler/jobs.service';
import type { TroubleDto } from './dto/trouble.dto';
import { TroubleFinder, type FoundTrouble } from './trouble-finder';
import { TroubleTeller } from './trouble-teller';

const EVERY_S = 60;
/** A trouble is over when it has not been seen for so long, s: a tower that comes and goes is one trouble. */
const CLEAR_S = 30 * 60;
const NEWEST = 100;

const OPEN = `INSERT INTO tower_trouble (tower_id, kind, since_t, seen_at, text)
  SELECT value->>'towerId', value->>'kind', value->>'since', $2, value->>'text' FROM json_each($1) WHERE true
  ON CONFLICT (tower_id, kind) WHERE ended_at IS NULL DO UPDATE SET text = excluded.text, clear_since = NULL`;
const NOT_SEEN = `ended_at IS NULL AND (tower_id, kind) NOT IN (SELECT value->>'towerId', value->>'kind' FROM json_each($1))`;
/** A tower that was late and now is silent has one trouble, whose end is told once: that of the silence. */
const REPLACED = `UPDATE tower_trouble AS late SET ended_at = $2, end_told_at = $2 WHERE late.ended_at IS NULL AND late.kind = 'late'
  AND EXISTS (SELECT 1 FROM json_each($1) WHERE value->>'towerId' = late.tower_id AND value->>'kind' = 'silent')`;
const RETIRED = `UPDATE tower_trouble SET ended_at = $1, end_told_at = $1 WHERE ended_at IS NULL
  AND tower_id IN (SELECT id FROM tower WHERE retired_at IS NOT NULL)`;
const LIST = `SELECT b.id, b.tower_id towerId, t.name towerName, b.kind, b.text, b.since_t since, b.seen_at seenAt, b.told_at toldAt,
    b.ended_at endedAt, count(o.id) FILTER (WHERE o.state IN ('accepted', 'delivered')) mailsAccepted,
    count(o.id) FILTER (WHERE o.state NOT IN ('accepted', 'delivered', 'suppressed')) mailsNotAccepted
  FROM tower_trouble b JOIN tower t ON t.id = b.tower_id
    LEFT JOIN outbox o ON o.topic = 'tower troubles' AND o.revision = b.mail_revision
  WHERE $1 = 0 OR b.ended_at IS NULL
  GROUP BY b.id ORDER BY b.ended_at IS NOT NULL, b.seen_at DESC, b.id DESC LIMIT ${NEWEST}`;

/** What is wrong with the towers' data: seen every minute, kept, told to the analysts once, and seen to be over. */
@Injectable()
export class TroublesService implements OnModuleInit {
  constructor(
    private readonly finder: TroubleFinder,
    private readonly teller: TroubleTeller,
    private readonly sql: Sql,
    private readonly work: UnitOfWork,
    private readonly clock: Clock,
    private readonly jobs: JobsService,
  ) {}

  onModuleInit(): void {
    this.jobs.register('look after the towers', EVERY_S, () => this.look());
  }

  /** Looks once, keeps what is found, and tells the analysts what they have not been told. */
  async look(): Promise<string> {
    const found = await this.finder.find();
    const told = await this.work.run(async () => {
      await this.keep(found);
      return this.teller.tell();
    });
    return `${found.length} troubles, ${told} mails`;
  }

  /** The open ones first, then the newest of those that are over. */
  async list(open = false): Promise<TroubleDto[]> {
    type Row = Omit<TroubleDto, 'since' | 'seenAt' | 'toldAt' | 'endedAt'> &
      Record<'since' | 'seenAt', number> &
      Record<'toldAt' | 'endedAt', number | null>;
    const rows = await this.sql.all<Row>(LIST, [open ? 1 : 0]);
    const orNull = (t: number | null) => (t === null ? null : toIso(t));
    return rows.map(({ since, seenAt, toldAt, endedAt, ...row }) => ({
      ...row,
      ...{ since: toIso(since), seenAt: toIso(seenAt), toldAt: orNull(toldAt), endedAt: orNull(endedAt) },
    }));
  }

  private async keep(found: readonly FoundTrouble[]): Promise<void> {
    const now = this.clock.now();
    const seen = JSON.stringify(found);
    await this.sql.run(OPEN, [seen, now]);
    await this.sql.run(REPLACED, [seen, now]);
    await this.sql.run(RETIRED, [now]);
    await this.sql.run(
      `UPDATE tower_trouble SET ended_at = clear_since WHERE ${NOT_SEEN} AND clear_since <= $2`,
      [seen, now - CLEAR_S],
    );
    await this.sql.run(
      `UPDATE tower_trouble SET clear_since = $2 WHERE ${NOT_SEEN} AND clear_since IS NULL`,
      [seen, now],
    );
  }
}
