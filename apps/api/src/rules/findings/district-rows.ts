import { isKnown, type Quantity } from '@lidwatch/atmosphere';
import type { MeasuredBlock, Purpose } from '@lidwatch/rules';
import { Injectable } from '@nestjs/common';
import { Sql } from '../../database/sql';
import type { DistrictBlock } from './district-block';
import type { StrengthAt } from './episode-minutes';
import { measuresFromJson, measuresToJson, quantityOf } from './measures-json';

const COLUMNS = [
  'district_id',
  't_end',
  'block_s',
  'speaker_id',
  'spoke',
  'silent',
  'measures',
  'end_spoke',
  'end_measures',
  'strength_lo',
  'strength_hi',
  'within_c',
  'sure',
  'reason',
];
const REAL = new Set(['strength_lo', 'strength_hi', 'within_c']);
const CONTENT = COLUMNS.slice(2);
const given = COLUMNS.map((name, i) => (REAL.has(name) ? `CAST(value->>${i} AS REAL)` : `value->>${i}`)).join(
  ', ',
);
const of = (table: string): string => CONTENT.map((name) => `${table}.${name}`).join(', ');

const WRITE = `WITH j AS (SELECT value FROM json_each($1)) INSERT INTO district_block AS b (${COLUMNS.join(', ')}, rev)
  SELECT ${given}, 1 FROM j WHERE true
  ON CONFLICT DO UPDATE SET ${CONTENT.map((name) => `${name} = excluded.${name}`).join(', ')}, rev = b.rev + 1
  WHERE (${of('b')}) IS NOT (${of('excluded')}) RETURNING district_id districtId, t_end tEnd`;
const ENDS = `SELECT t_end tEnd FROM district_block WHERE district_id = $1 AND t_end > $2 AND t_end <= $3`;
const STRENGTHS = `SELECT t_end tEnd, spoke, strength_lo lo, strength_hi hi, reason FROM district_block
  WHERE district_id = $1 AND t_end > $2 AND t_end <= $3`;
const SERIES = `SELECT t_end tEnd, rev, block_s blockS, spoke, measures, end_spoke endSpoke, end_measures endMeasures
  FROM district_block WHERE district_id = $1 AND t_end > $2 AND t_end <= $3 ORDER BY t_end`;

const end = (value: number | undefined): number | null => (Number.isFinite(value) ? value! : null);
const one = (quantity: Quantity | undefined): number | null =>
  quantity && isKnown(quantity) ? quantity.lo : null;

function rowOf(block: DistrictBlock): (number | string | null)[] {
  const { values } = block;
  return [
    block.districtId,
    block.tEnd,
    block.blockS,
    block.speakerId,
    block.spoke,
    JSON.stringify(block.silent),
    measuresToJson(values),
    block.end?.spoke ?? null,
    block.end && measuresToJson(block.end.values),
    end(values.inversionStrengthC?.lo),
    end(values.inversionStrengthC?.hi),
    one(values.strengthWithinTowerC),
    one(values.inversionSure),
    block.reason,
  ];
}

/** A district's block as it is read for evaluation: its revision, and a series' block for each purpose. */
export interface EvaluatedInput extends Readonly<Record<Purpose, MeasuredBlock>> {
  readonly tEnd: number;
  readonly rev: number;
}

interface SeriesRow {
  tEnd: number;
  rev: number;
  blockS: number;
  spoke: string | null;
  measures: string;
  endSpoke: string | null;
  endMeasures: string | null;
}

/** The statements by which district blocks are kept and read. */
@Injectable()
export class DistrictRows {
  constructor(private readonly sql: Sql) {}

  /** Writes blocks within the caller's transaction; gives those that are new or differ. */
  async write(blocks: readonly DistrictBlock[]): Promise<{ districtId: number; tEnd: number }[]> {
    if (blocks.length === 0) return [];
    return this.sql.returning(WRITE, [JSON.stringify(blocks.map(rowOf))]);
  }

  /** Ends of a district's blocks in (after, until]. */
  async ends(districtId: number, after: number, until: number): Promise<number[]> {
    const rows = await this.sql.all<{ tEnd: number }>(ENDS, [districtId, after, until]);
    return rows.map(({ tEnd }) => tEnd);
  }

  /** Who spoke and how strong the inversion was in a district's blocks that end in (after, until]. */
  async strengths(districtId: number, after: number, until: number): Promise<Map<number, StrengthAt>> {
    const rows = await this.sql.all<{
      tEnd: number;
      spoke: string | null;
      lo: number | null;
      hi: number | null;
      reason: string | null;
    }>(STRENGTHS, [districtId, after, until]);
    return new Map(
      rows.map(({ tEnd, spoke, lo, hi, reason }) => [
        tEnd,
        { spoke, strengthC: quantityOf(lo, hi, reason ?? undefined) },
      ]),
    );
  }

  /** A district's blocks that end in (after, until], for evaluation, oldest first. */
  async series(districtId: number, after: number, until: number): Promise<EvaluatedInput[]> {
    const rows = await this.sql.all<SeriesRow>(SERIES, [districtId, after, until]);
    return rows.map(inputOf);
  }
}

function inputOf(row: SeriesRow): EvaluatedInput {
  const { tEnd, rev } = row;
  const common = { tEnd, blockSeconds: row.blockS };
  const begin = { ...common, speaker: row.spoke, values: measuresFromJson(row.measures) };
  if (row.endMeasures === null) return { tEnd, rev, begin, end: begin };
  return {
    tEnd,
    rev,
    begin,
    end: { ...common, speaker: row.endSpoke, values: measuresFromJson(row.endMeasures) },
  };
}
