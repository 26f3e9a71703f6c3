import { Injectable } from '@nestjs/common';
import { ActivityService } from '../activity/activity.service';
import type { SignedIn } from '../auth/signed-in';
import { Sql } from '../database/sql';
import { UnitOfWork } from '../database/unit-of-work';
import type { OfficeDto } from './dto/office.dto';

/** What stands in notices until an administrator has said who the office is. */
const UNNAMED: OfficeDto = { name: 'Clean air office', phone: '' };

/** The office that speaks in every notice: its name and the telephone number residents may call. */
@Injectable()
export class OfficeService {
  constructor(
    private readonly sql: Sql,
    private readonly work: UnitOfWork,
    private readonly activity: ActivityService,
  ) {}

  /** The office as it signs. */
  async get(): Promise<OfficeDto> {
    const row = await this.sql.get<{ value: string }>("SELECT value FROM setting WHERE key = 'office'");
    return row ? (JSON.parse(row.value) as OfficeDto) : UNNAMED;
  }

  /** Changes how the office signs. Notices that were sent keep the words they were sent with. */
  set(office: OfficeDto, by: SignedIn): Promise<OfficeDto> {
    const { name, phone } = office;
    return this.work.run(async () => {
      await this.sql.run(
        `INSERT INTO setting (key, value) VALUES ('office', $1) ON CONFLICT DO UPDATE SET value = excluded.value`,
        [JSON.stringify({ name, phone })],
      );
      await this.activity.record({
        actor: by,
        act: 'office changed',
        subject: 'office',
        body: { name, phone },
      });
      return this.get();
    });
  }
}
