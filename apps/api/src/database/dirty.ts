import { Injectable, Logger, type OnModuleDestroy } from '@nestjs/common';
import { Sql } from './sql';
import { UnitOfWork } from './unit-of-work';

/**
 * The steps from a reading to a finding. 1: blocks of a tower whose readings changed, to be screened and averaged.
 * 2: blocks of a tower whose means changed, to become a profile. 3: blocks of a district whose profiles changed.
 */
export type Stage = 1 | 2 | 3;
const STAGES: readonly Stage[] = [1, 2, 3];

/** Something to be worked out anew. `gen` counts the changes, so that one that comes meanwhile is not lost. */
export interface DirtyRow {
  /** Tower id (stages 1 and 2) or district id (stage 3). */
  readonly subject: number;
  /** End of the block, UTC epoch seconds. */
  readonly t: number;
  readonly gen: number;
}

/** Blocks of a tower that whoever marked them works out otherwise, if all goes well: those that end in (afterT, untilT]. */
export interface Held {
  readonly towerId: number;
  readonly afterT: number;
  readonly untilT: number;
}

/** Works out one batch of a stage, settling its rows in the transaction of its results; says how many it settled. */
export type StageHandler = () => Promise<number>;

/** Changes that come within this time are worked out together, ms. */
const GATHER_MS = 25;

const MARK = `INSERT INTO dirty (stage, subject, t) SELECT $1, value->>0, value->>1 FROM jsonb_each($2) WHERE true
  ON CONFLICT DO UPDATE SET gen = gen + 1`;
const NEAR_END = '(own.t + near.block_s - 1) / near.block_s * near.block_s';
/** Blocks, of at most an hour, that have an instant in common with those of `own`, at the towers whose neighbour it is. */
const OF_NEIGHBOURS = `SELECT 1, near.id, ${NEAR_END} - k.value * near.block_s
  FROM own JOIN tower ON tower.id = own.subject JOIN tower_neighbour n ON n.neighbour_id = tower.id
  JOIN tower near ON near.id = n.tower_id JOIN json_each('${JSON.stringify([...Array(60).keys()])}') k
    ON ${NEAR_END} - k.value * near.block_s > own.t - tower.block_s`;
const AS_CHANGED = 'ON CONFLICT DO UPDATE SET gen = gen + 1';
const OWN_LISTED = `WITH own(subject, t) AS (SELECT value->>0, value->>1 FROM jsonb_each($1))`;
const MARK_READ = `${OWN_LISTED} INSERT INTO dirty (stage, subject, t)
  SELECT 1, subject, t FROM own UNION ALL ${OF_NEIGHBOURS} WHERE true ${AS_CHANGED}`;
const MARK_NEIGHBOURS = `${OWN_LISTED} INSERT INTO dirty (stage, subject, t) ${OF_NEIGHBOURS} WHERE true ${AS_CHANGED}`;
const MARK_NEIGHBOURS_OF = `WITH own AS (SELECT subject, t FROM dirty
    WHERE stage = 1 AND subject = $1 AND t > $2 AND t <= $3)
  INSERT INTO dirty (stage, subject, t) ${OF_NEIGHBOURS} WHERE true ${AS_CHANGED}`;
const SETTLE = `DELETE FROM dirty WHERE (stage, subject, t) IN (
  SELECT d.stage, d.subject, d.t FROM jsonb_each($2) j CROSS JOIN dirty d
  ON d.stage = $1 AND d.subject = j.value->>0 AND d.t = j.value->>1 AND d.gen = j.value->>2)`;
const UNMARK = `DELETE FROM dirty WHERE stage = $1 AND subject = $2 AND t > $3 AND t <= $4 AND gen = 1`;
const NEWEST = `SELECT subject, t, gen FROM dirty WHERE stage = $1 AND t <= $2 AND NOT EXISTS (
  SELECT 1 FROM json_each($4) h WHERE h.value->>0 = subject AND t > h.value->>1 AND t <= h.value->>2)
  ORDER BY t DESC LIMIT $3`;
const MARK_TOWER = `INSERT INTO dirty (stage, subject, t)
  SELECT DISTINCT stage.value, $1, b.t_end FROM json_each('[1,2]') stage, block_mean b
  WHERE b.sensor_id IN (SELECT id FROM sensor WHERE tower_id = $1) AND b.t_end > $2 AND b.t_end <= $3
  ON CONFLICT DO UPDATE SET gen = gen + 1`;
const MARK_DISTRICTS = `INSERT INTO dirty (stage, subject, t)
  SELECT DISTINCT 3, d.district_id, j.value->>1 FROM jsonb_each($1) j JOIN (
    SELECT district_id, tower_id FROM district_tower
    UNION SELECT id, floor_tower_id FROM district UNION SELECT id, bench_tower_id FROM district
    UNION SELECT id, pm25_tower_id FROM district) d ON d.tower_id = j.value->>0
  WHERE true ON CONFLICT DO UPDATE SET gen = gen + 1`;
const MARK_DISTRICT = `INSERT INTO dirty (stage, subject, t)
  SELECT DISTINCT 3, $1, t_end FROM profile WHERE tower_id IN (SELECT value FROM json_each($2))
  ON CONFLICT DO UPDATE SET gen = gen + 1`;

/**
 * What has changed and waits to be worked out, and who works it out. A mark is made in the transaction of the change
 * itself, so nothing is lost when the process dies; each stage runs once at a time.
 */
@Injectable()
export class DirtyStages implements OnModuleDestroy {
  private readonly log = new Logger(DirtyStages.name);
  private readonly handlers = new Map<Stage, StageHandler>();
  private readonly running = new Map<Stage, Promise<void>>();
  private readonly again = new Set<Stage>();
  /** How many blocks were read last, where they were all that waited. */
  private readonly readAll = new Map<Stage, number>();
  private readonly timers = new Map<Stage, NodeJS.Timeout>();
  /** By who holds them; kept in memory only, so that after a crash nothing is held. */
  private readonly held = new Map<object, Held>();
  private closing = false;
  private onlyAsked = false;

  constructor(
    private readonly sql: Sql,
    private readonly work: UnitOfWork,
  ) {}

  /** Says who works out a stage. */
  registerStage(stage: Stage, handler: StageHandler): void {
    this.handlers.set(stage, handler);
  }

  /** Marks blocks ([subject, t]) in the running transaction; after its commit they are worked out. */
  async mark(stage: Stage, blocks: readonly (readonly [number, number])[]): Promise<void> {
    if (blocks.length === 0) return;
    await this.sql.run(MARK, [stage, JSON.stringify(blocks)]);
    this.work.afterCommit(() => this.soon(stage));
  }

  /**
   * Marks, in the running transaction, blocks ([tower id, t]) whose readings changed, and what they fall together with
   * at the towers whose neighbour theirs is.
   */
  async markRead(blocks: readonly (readonly [number, number])[]): Promise<void> {
    if (blocks.length === 0) return;
    await this.sql.run(MARK_READ, [JSON.stringify(blocks)]);
    this.work.afterCommit(() => this.soon(1));
  }

  /** As `markRead`, for the towers whose neighbour theirs is alone: the blocks themselves are worked out otherwise. */
  async markNeighbours(blocks: readonly (readonly [number, number])[]): Promise<void> {
    if (blocks.length === 0) return;
    const marked = await this.sql.run(MARK_NEIGHBOURS, [JSON.stringify(blocks)]);
    if (marked > 0) this.work.afterCommit(() => this.soon(1));
  }

  /** Marks blocks of stage 1 in the running transaction that are held; they are worked out once they are let go. */
  async markHeld(blocks: readonly (readonly [number, number])[]): Promise<void> {
    if (blocks.length > 0) await this.sql.run(MARK, [1, JSON.stringify(blocks)]);
  }

  /** Takes the marks off held blocks in the running transaction, save those that somebody else has made again. */
  async unmarkHeld({ towerId, afterT, untilT }: Held): Promise<void> {
    await this.sql.run(UNMARK, [1, towerId, afterT, untilT]);
  }

  /** Keeps stage 1 off some blocks of a tower; a holder has one span at a time, undefined lets it go. */
  hold(holder: object, held: Held | undefined): void {
    if (held) this.held.set(holder, held);
    else if (this.held.delete(holder)) this.soon(1);
  }

  /**
   * Marks every block of a tower that ends in (afterT, untilT], and of those whose neighbour it is: its settings,
   * sensors or set spans changed.
   */
  async markTower(towerId: number, afterT = 0, untilT = Number.MAX_SAFE_INTEGER): Promise<void> {
    await this.sql.run(MARK_TOWER, [towerId, afterT, untilT]);
    await this.sql.run(MARK_NEIGHBOURS_OF, [towerId, afterT, untilT]);
    this.work.afterCommit(() => this.soon(1));
  }

  /** Marks blocks ([tower id, t]) for every district in which the tower has a part. */
  async markDistricts(blocks: readonly (readonly [number, number])[]): Promise<void> {
    if (blocks.length === 0) return;
    await this.sql.run(MARK_DISTRICTS, [JSON.stringify(blocks)]);
    this.work.afterCommit(() => this.soon(3));
  }

  /** Marks every block of a district for which one of these towers has a profile. */
  async markDistrict(districtId: number, towerIds: readonly number[]): Promise<void> {
    await this.sql.run(MARK_DISTRICT, [districtId, JSON.stringify(towerIds)]);
    this.work.afterCommit(() => this.soon(3));
  }

  /** The newest blocks of a stage that wait, are not held and end by `untilT`. */
  async newest(stage: Stage, limit: number, untilT: number): Promise<DirtyRow[]> {
    const held = stage === 1 ? [...this.held.values()] : [];
    const asked = JSON.stringify(held.map(({ towerId, afterT, untilT: until }) => [towerId, afterT, until]));
    const rows = await this.sql.all<DirtyRow>(NEWEST, [stage, untilT, limit, asked]);
    if (rows.length < limit) this.readAll.set(stage, rows.length);
    else this.readAll.delete(stage);
    return rows;
  }

  /** Takes the marks away, in the running transaction, except where another change has come since they were read. */
  async settle(stage: Stage, rows: readonly DirtyRow[]): Promise<void> {
    const read = rows.map(({ subject, t, gen }) => [subject, t, gen]);
    await this.sql.run(SETTLE, [stage, JSON.stringify(read)]);
  }

  /** How many blocks of a tower that ended by `untilT` wait. */
  async pending(towerId: number, untilT: number): Promise<number> {
    const row = await this.sql.get<{ n: number }>(
      'SELECT count(*) n FROM dirty WHERE stage IN (1, 2) AND subject = $1 AND t <= $2',
      [towerId, untilT],
    );
    return row?.n ?? 0;
  }

  /** Works out a stage until nothing of it waits; one at a time, later callers wait for the same. */
  drain(stage: Stage): Promise<void> {
    const running = this.running.get(stage);
    if (running) {
      this.again.add(stage);
      return running;
    }
    const done = this.run(stage).finally(() => this.running.delete(stage));
    this.running.set(stage, done);
    return done;
  }

  /** From now on a commit calls nobody: whoever lives through a past step by step asks when a step is complete. */
  waitToBeAsked(): void {
    this.onlyAsked = true;
  }

  /** Works out everything that waits, in the order of the stages. */
  async drainAll(): Promise<void> {
    for (const stage of STAGES) {
      this.cancel(stage);
      await this.drain(stage);
    }
  }

  /** Stops after the batch at hand. */
  async onModuleDestroy(): Promise<void> {
    this.closing = true;
    for (const stage of STAGES) this.cancel(stage);
    await Promise.allSettled(this.running.values());
  }

  private async run(stage: Stage): Promise<void> {
    const handler = this.handlers.get(stage);
    do {
      this.again.delete(stage);
      while (handler && !this.closing && (await this.workOutBatch(stage, handler)));
    } while (this.again.has(stage) && !this.closing);
  }

  /** Whether another batch may be worth a look: not when all that waited was read and settled. */
  private async workOutBatch(stage: Stage, handler: StageHandler): Promise<boolean> {
    const settled = await handler();
    return settled > 0 && settled !== this.readAll.get(stage);
  }

  private soon(stage: Stage): void {
    if (this.closing || this.onlyAsked || this.timers.has(stage)) return;
    const timer = setTimeout(() => {
      this.timers.delete(stage);
      this.drain(stage).catch((error: unknown) => {
        this.log.error(`Stage ${stage} could not be worked out; it is tried again within a minute`, error);
      });
    }, GATHER_MS);
    this.timers.set(stage, timer.unref());
  }

  private cancel(stage: Stage): void {
    clearTimeout(this.timers.get(stage));
    this.timers.delete(stage);
  }
}
