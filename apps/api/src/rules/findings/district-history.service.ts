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
  lowestC: number | null;
}

const WHERE = 'FROM district_block WHERE district_id = $1 AND t_end > $2 AND t_end <= $3';
const COLUMNS = 't_end tEnd, strength_lo lo, strength_hi hi, sure, speaker_id speakerId, reason';
const BLOCK_S = `SELECT block_s blockS ${WHERE} ORDER BY t_end DESC LIMIT 1`;
const BLOCKS = `SELECT ${COLUMNS}, within_c withinC ${WHERE} ORDER BY t_end LIMIT ${MOST_POINTS}`;
const OF_STEP = 'district_id = $1 AND t_end > s.value->>0 AND t_end <= s.value->>1';
/* Along the index alone, step by step: grouping the blocks of a year would sort them first. */
const STEPS = `SELECT s.key step, within_c withinC, ${COLUMNS},
    (SELECT min(within_c) FROM district_block WHERE ${OF_STEP}) lowestC
  FROM json_each($2) s CROSS JOIN district_block ON district_id = $1 AND t_end =
    (SELECT t_end FROM district_block WHERE ${OF_STEP} ORDER BY within_c DESC, t_end LIMIT 1)`;

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
    const steps = stepsOf(from, to, stepS);
    const rows = await this.sql.all<StepRow>(STEPS, [districtId, JSON.stringify(steps)]);
    const points = rows.map(({ step, lowestC, ...row }) => ({
      ...pointOf(row),
      tEnd: (Math.floor(steps[step]![0] / stepS) + 1) * stepS,
      step: { lowestC, strongestAt: row.tEnd },
    }));
    return { stepS, points };
  }
}

/** The parts (from, to] of a span that lie between the multiples of a step. */
function stepsOf(from: number, to: number, stepS: number): [number, number][] {
  const steps: [number, number][] = [];
  for (let start = from; start < to;) {
    const end = Math.min((Math.floor(start / stepS) + 1) * stepS, to);
    steps.push([start, end]);
    start = end;
  }
  return steps;
}
