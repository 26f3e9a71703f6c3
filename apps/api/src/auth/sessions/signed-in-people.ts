import { Injectable } from '@nestjs/common';
import type { Role } from '@lidwatch/contracts';
import { Sql } from '../../database/sql';
import type { SignedIn } from '../signed-in';
import type { SessionOwner } from './session-data';

interface Row {
  id: number;
  name: string;
  email: string;
  role: Role;
  districtIds: string;
}

/** Looks up who a session belongs to, at every request, so that a retired person or a new role counts at once. */
@Injectable()
export class SignedInPeople {
  constructor(private readonly sql: Sql) {}

  /** The person of a session; undefined when they were retired or their sessions were ended. */
  async find({ id, epoch }: SessionOwner): Promise<SignedIn | undefined> {
    const row = await this.sql.get<Row>(
      `SELECT id, name, email, role,
              (SELECT json_group_array(district_id) FROM user_district WHERE user_id = user.id) AS districtIds
       FROM user WHERE id = $1 AND session_epoch = $2 AND retired_at IS NULL AND password_hash IS NOT NULL`,
      [id, epoch],
    );
    return row && { ...row, districtIds: JSON.parse(row.districtIds) as number[] };
  }

  /** What a new session of somebody keeps. */
  async owner(id: number): Promise<SessionOwner> {
    const row = await this.sql.get<{ epoch: number }>(
      'SELECT session_epoch AS epoch FROM user WHERE id = $1',
      [id],
    );
    if (!row) throw new Error(`There is no user ${id} to begin a session for.`);
    return { id, epoch: row.epoch };
  }
}
