import { Injectable } from '@nestjs/common';
import { Sql } from '../database/sql';
import type { SubscriberCount } from './dto/subscriber-count.dto';

/** How many residents are told, without saying who. */
@Injectable()
export class SubscriberCountsService {
  constructor(private readonly sql: Sql) {}

  /** People and confirmed addresses for each district and kind of notice; districts without any are left out. */
  list(): Promise<SubscriberCount[]> {
    return this.sql.all<SubscriberCount>(
      `SELECT s.district_id districtId, s.kind, count(DISTINCT s.person_id) people,
              count(*) FILTER (WHERE c.channel = 'email') emails, count(*) FILTER (WHERE c.channel = 'sms') texts
       FROM subscription s JOIN person p ON p.id = s.person_id AND p.left_at IS NULL
       JOIN contact c ON c.person_id = s.person_id AND c.confirmed_at IS NOT NULL AND c.stopped_at IS NULL
       GROUP BY s.district_id, s.kind ORDER BY s.district_id, s.kind`,
    );
  }
}
