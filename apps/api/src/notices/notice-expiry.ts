import { Injectable, type OnModuleInit } from '@nestjs/common';
import { InjectModel } from '@nestjs/sequelize';
import { Op } from 'sequelize';
import { ActivityService } from '../activity/activity.service';
import { Clock } from '../common/clock';
import { UnitOfWork } from '../database/unit-of-work';
import { JobsService } from '../scheduler/jobs.service';
import { Notice } from './models/notice.model';
import { NoticeEvents } from './notice-events';

const EVERY_S = 20;

/** Closes notices whose written end has come. Residents were told that end when it was issued. */
@Injectable()
export class NoticeExpiry implements OnModuleInit {
  constructor(
    @InjectModel(Notice) private readonly notices: typeof Notice,
    private readonly events: NoticeEvents,
    private readonly activity: ActivityService,
    private readonly work: UnitOfWork,
    private readonly clock: Clock,
    private readonly jobs: JobsService,
  ) {}

  onModuleInit(): void {
    this.jobs.register('notices at their written end', EVERY_S, () => this.closeDue());
  }

  /** Closes every notice that is due; says how many. */
  async closeDue(): Promise<string> {
    const due = await this.notices.findAll({
      where: { state: 'in force', expiresAt: { [Op.lte]: this.clock.now() } },
    });
    for (const notice of due) await this.close(notice);
    return `${due.length} closed`;
  }

  private async close(notice: Notice): Promise<void> {
    const { id, version, expiresAt, districtId, ref } = notice;
    await this.work.run(async () => {
      const [changed] = await this.notices.update(
        { state: 'ended', endedAt: expiresAt, version: version + 1 },
        { where: { id, version, state: 'in force' } },
      );
      if (changed === 0) return;
      await this.events.add(notice, 'expired', null, 'It came to its written end.');
      await this.events.silence(notice);
      await this.activity.record({
        ...{
          actor: 'service',
          act: 'closed a notice at its written end',
          subject: `notice ${id}`,
          districtId,
        },
        body: { ref },
      });
    });
  }
}
