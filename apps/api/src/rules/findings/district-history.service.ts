import type { Quantity, Truth } from '@lidwatch/atmosphere';
import { Injectable } from '@nestjs/common';
import { Sql } from '../../database/sql';
import { quantityOf } from './measures-json';

/** No series the API answers has more points than this. */
export const MOST_POINTS = 2_000;
const HOUR_S = 3600;
/** What a point may stand for where every block would be too many, s. */
const STEPS_S = [1, 2, 3, 4, 6, 8, 12, 24].map((hours) => hours * HOUR_S);

/** One point of a district's history: a block, or the strongest block of a step. */
export interface HistoryPoint {
  /** End of the block, or of the step. */
  readonly tEnd: number;
  readonly strengthC: Quantity;
  readonly withinC: number | null;
  readonly sure: Truth;
  readonly speakerId: number | null;
  readonly reason: string | null;
  /** Of a step: the least strength within the tower, and when the strongest block ended. */
  readonly step?: { readonly lowestC: number | null; readonly strongestAt: number };
}

interface Row {
  tEnd: number;
  lo: number | null;
  hi: number | null;
  withinC: number | null;
  sure: number | null;
  speakerId: number | null;
  reason: string | null;
}

interface StepRow extends Row {
  step: number;
}

const WHERE = 'FROM district_block WHERE district_id = $1 AND t_end > $2 AND t_end <= $3';
const COLUMNS = 't_end tEnd, strength_lo lo, strength_hi hi, sure, speaker_id speakerId, reason';
const BLOCK_S = `SELECT block_s blockS ${WHERE} ORDER BY t_end DESC LIMIT 1`;
const BLOCKS = `SELECT ${COLUMNS}, within_c withinC ${WHERE} ORDER BY t_end LIMIT ${MOST_POINTS}`;
/* With one max() alone SQLite takes the other columns from the row that has it. */
const STRONGEST = `SELECT (t_end - 1) / $4 step, max(within_c) withinC, ${COLUMNS} ${WHERE} GROUP BY 1 ORDER BY 1`;
const LOWEST = `SELECT (t_end - 1) / $4 step, min(within_c) lowestC ${WHERE} GROUP BY 1`;

const truthOf = (sure: number | null): Truth => (sure === null ? 'not known' : sure === 1 ? 'true' : 'false');

const pointOf = ({ tEnd, lo, hi, withinC, sure, speakerId, reason }: Row): HistoryPoint => ({
  ...{ tEnd, withinC, speakerId, reason, sure: truthOf(sure) },
  strengthC: quantityOf(lo, hi, reason ?? undefined),
});

/** How strong the inversion was over a district in the past. */
@Injectable()
export class DistrictHistoryService {
  constructor(private readonly sql: Sql) {}

  /**
   * A district's inversion strength over (from, to]: every block; where those would be more than `MOST_POINTS`, the
   * strongest and the lowest of each step, so that no peak is lost. A step of which nothing is known is not known.
   */
  async of(districtId: number, from: number, to: number): Promise<{ stepS: number; points: HistoryPoint[] }> {
    const span = [districtId, from, to];
    const blockS = (await this.sql.get<{ blockS: number }>(BLOCK_S, span))?.blockS ?? HOUR_S;
    const stepS =
      [blockS, ...STEPS_S].find((each) => each >= blockS && (to - from) / each <= MOST_POINTS) ??
      STEPS_S.at(-1)!;
    if (stepS === blockS) return { stepS, points: (await this.sql.all<Row>(BLOCKS, span)).map(pointOf) };
    const [strongest, lowest] = await Promise.all([
      this.sql.all<StepRow>(STRONGEST, [...span, stepS]),
      this.sql.all<{ step: number; lowestC: number | null }>(LOWEST, [...span, stepS]),
    ]);
    const lowestOf = new Map(lowest.map(({ step, lowestC }) => [step, lowestC]));
    const points = strongest.map(({ step, ...row }) => ({
      ...pointOf(row),
      tEnd: (step + 1) * stepS,
      step: { lowestC: lowestOf.get(step) ?? null, strongestAt: row.tEnd },
    }));
    return { stepS, points };
  }
}
