import { Injectable, type OnModuleInit } from '@nestjs/common';
import { ActivityService } from '../activity/activity.service';
import { Clock } from '../common/clock';
import { Sql } from '../database/sql';
import { UnitOfWork } from '../database/unit-of-work';
import { JobsService } from '../scheduler/jobs.service';
import { ChangedProfilesReader, type OpenRework } from './changed-profiles';
import type { ChangedFindingsDto } from './dto/rework.dto';
import { Pending } from './pending';
import { RuleTruths } from './rule-truths';

const LOOK_EVERY_S = 3;
const OPEN = `SELECT id, tower_id towerId, cause, t0, t1, begun_at begunAt, past_seq pastSeq, truths_before truthsBefore FROM rework
  WHERE ended_at IS NULL AND blocks > 0 ORDER BY id`;
/** What a former process prepared and did not come to follow. */
const LEFT = 'UPDATE rework SET blocks = 1 WHERE ended_at IS NULL AND blocks = 0';

/** Ends a rework once nothing that depends on its change waits any more, and keeps what is different now. */
@Injectable()
export class ReworkWatch implements OnModuleInit {
  constructor(
    private readonly jobs: JobsService,
    private readonly sql: Sql,
    private readonly work: UnitOfWork,
    private readonly pending: Pending,
    private readonly profiles: ChangedProfilesReader,
    private readonly truths: RuleTruths,
    private readonly activity: ActivityService,
    private readonly clock: Clock,
  ) {}

  async onModuleInit(): Promise<void> {
    await this.sql.run(LEFT);
    this.jobs.register('what was worked out anew', LOOK_EVERY_S, () => this.endFinished());
  }

  /** Ends every rework that is finished; says how many. */
  async endFinished(): Promise<string> {
    const open = await this.sql.all<OpenRework>(OPEN);
    let ended = 0;
    for (const rework of open) {
      const { blocks, districtBlocks } = await this.pending.of(rework);
      if (blocks + districtBlocks > 0) continue;
      await this.end(rework);
      ended += 1;
    }
    return `${ended} ended, ${open.length - ended} under way`;
  }

  private async end(rework: OpenRework): Promise<void> {
    const changes: ChangedFindingsDto = {
      ...(await this.profiles.of(rework)),
      districts: await this.truths.changed(rework.truthsBefore),
    };
    await this.work.run(async () => {
      const changed = await this.sql.run(
        'UPDATE rework SET ended_at = $2, changes = $3 WHERE id = $1 AND ended_at IS NULL',
        [rework.id, this.clock.now(), JSON.stringify(changes)],
      );
      if (changed === 0) return;
      const { towerId, cause } = rework;
      await this.activity.record({
        ...{ actor: 'service', act: 'worked findings out anew', subject: `tower ${towerId}` },
        body: { cause, ...changes },
      });
    });
  }
}
