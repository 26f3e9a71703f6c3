import { Injectable } from '@nestjs/common';
import { Sql } from '../database/sql';

/** Something the record says was done to a proposal. */
export interface RecordedDeed {
  /** UTC epoch seconds. */
  readonly at: number;
  /** The person's name, or `service`. */
  readonly actor: string;
  readonly act: string;
  /** What was said with it; empty when nothing was. */
  readonly text: string;
}

const DEEDS = `SELECT at, actor, act, coalesce(b.body->>'text', '') text FROM activity a
  LEFT JOIN activity_body b ON b.seq = a.seq WHERE subject = $1 ORDER BY a.seq`;

/** What was done to a proposal, from the record. */
@Injectable()
export class ProposalRecord {
  constructor(private readonly sql: Sql) {}

  /** Everything done to a proposal, oldest first. */
  of(proposalId: number): Promise<RecordedDeed[]> {
    return this.sql.all<RecordedDeed>(DEEDS, [`proposal ${proposalId}`]);
  }
}
