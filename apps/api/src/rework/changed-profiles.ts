import { Injectable } from '@nestjs/common';
import { Sql } from '../database/sql';
import type { ChangedFindingsDto } from './dto/rework.dto';
import { REACH_S } from './reach';

/** A rework as it is kept while it is followed. */
export interface OpenRework {
  readonly id: number;
  readonly towerId: number;
  readonly cause: string;
  readonly t0: number;
  readonly t1: number;
  readonly begunAt: number;
  /** The newest replaced profile when it began. */
  readonly pastSeq: number;
  /** What rules said then, as JSON. */
  readonly truthsBefore: string;
}

/** What is told of a change apart from the districts. */
export type ChangedProfiles = Omit<ChangedFindingsDto, 'districts'>;

const TEXTS = ['levels', 'surface', 'open', 'other'];
const NUMBERS = ['within_c', 'strength_lo', 'strength_hi', 'heat_lo', 'breakup_lo', 'elevated_base_m'];
/* A replaced profile keeps its numbers as JSON, with 15 digits. */
const was = [...TEXTS.map((c) => `p.body->>'${c}'`), ...NUMBERS.map((c) => `round(p.body->>'${c}', 9)`)];
const is = [...TEXTS.map((c) => `n.${c}`), ...NUMBERS.map((c) => `round(n.${c}, 9)`)];
const HOURS = '* (SELECT block_s FROM tower WHERE id = $2) / 3600';

/*
 * Before: the profile as it was when the rework began, the oldest of those replaced since. After: the one in force,
 * or nothing known where there is none any more.
 */
const CHANGED = `WITH oldest AS (SELECT t_end, min(seq) seq FROM profile_past
    WHERE seq > $1 AND tower_id = $2 AND t_end > $3 AND t_end <= $4 GROUP BY t_end),
  pair AS (SELECT p.body->>'surface' before, coalesce(n.surface, 'not known') after,
      p.body->>'within_c' beforeC, n.within_c afterC,
      CASE p.body->>'surface' WHEN 'present' THEN p.body->>'sure' END wasSure,
      CASE n.surface WHEN 'present' THEN n.sure END isSure
    FROM oldest JOIN profile_past p ON p.seq = oldest.seq
    LEFT JOIN profile n ON n.tower_id = $2 AND n.t_end = oldest.t_end
    WHERE (${was.join(', ')}) IS NOT (${is.join(', ')}))
  SELECT count(*) blocksChanged,
    count(*) FILTER (WHERE before = 'present' AND after = 'absent') presentToAbsent,
    count(*) FILTER (WHERE before = 'absent' AND after = 'present') absentToPresent,
    count(*) FILTER (WHERE before <> 'not known' AND after = 'not known') toNotKnown,
    count(*) FILTER (WHERE before = 'not known' AND after <> 'not known') fromNotKnown,
    count(*) FILTER (WHERE wasSure = 1 AND isSure = 0) toNotSure,
    count(*) FILTER (WHERE wasSure = 0 AND isSure = 1) toSure,
    max(beforeC) FILTER (WHERE before = 'present') strongestBeforeC,
    max(afterC) FILTER (WHERE after = 'present') strongestAfterC,
    total(before = 'present') ${HOURS} inversionHoursBefore,
    total(after = 'present') ${HOURS} inversionHoursAfter
  FROM pair`;

/** Tells how a tower's profiles differ from what they were when a rework began. */
@Injectable()
export class ChangedProfilesReader {
  constructor(private readonly sql: Sql) {}

  /** Compares the blocks that a rework can have altered. */
  async of({ towerId, t0, t1, pastSeq }: OpenRework): Promise<ChangedProfiles> {
    const found = await this.sql.get<ChangedProfiles>(CHANGED, [
      ...[pastSeq, towerId, t0 - REACH_S, t1 + REACH_S],
    ]);
    return found!;
  }
}
