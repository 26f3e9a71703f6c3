import { isKnown, type Quantity } from '@lidwatch/atmosphere';
import type { MeasuredBlock, MeasureName, Purpose } from '@lidwatch/rules';
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
const WHERE = `FROM district_block
  WHERE district_id IN (SELECT value FROM json_each($1)) AND t_end > $2 AND t_end <= $3 ORDER BY t_end`;
const ENDS = `SELECT district_id districtId, t_end tEnd ${WHERE}`;
const STRENGTHS = `SELECT district_id districtId, t_end tEnd, spoke, strength_lo lo, strength_hi hi, reason ${WHERE}`;
const SERIES = `SELECT district_id districtId, t_end tEnd, rev, block_s blockS, spoke, measures, end_spoke endSpoke,
  end_measures endMeasures ${WHERE}`;

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

interface OfDistrict {
  districtId: number;
  tEnd: number;
}

interface StrengthRow extends OfDistrict {
  spoke: string | null;
  lo: number | null;
  hi: number | null;
  reason: string | null;
}

interface SeriesRow extends OfDistrict {
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

  /** Ends of some districts' blocks in (after, until]. */
  async ends(districtIds: readonly number[], after: number, until: number): Promise<Map<number, number[]>> {
    const rows = await this.sql.all<OfDistrict>(ENDS, [JSON.stringify(districtIds), after, until]);
    return byDistrict(rows, ({ tEnd }) => tEnd);
  }

  /** Who spoke and how strong the inversion was in some districts' blocks that end in (after, until], by their end. */
  async strengths(
    districtIds: readonly number[],
    after: number,
    until: number,
  ): Promise<Map<number, Map<number, StrengthAt>>> {
    const rows = await this.sql.all<StrengthRow>(STRENGTHS, [JSON.stringify(districtIds), after, until]);
    const found = byDistrict(rows, ({ tEnd, spoke, lo, hi, reason }): [number, StrengthAt] => [
      tEnd,
      { spoke, strengthC: quantityOf(lo, hi, reason ?? undefined) },
    ]);
    return new Map([...found].map(([districtId, strengths]) => [districtId, new Map(strengths)]));
  }

  /** Some districts' blocks that end in (after, until], oldest first, with the values of these measures only. */
  async series(
    districtIds: readonly number[],
    after: number,
    until: number,
    measures: ReadonlySet<MeasureName>,
  ): Promise<Map<number, EvaluatedInput[]>> {
    const rows = await this.sql.all<SeriesRow>(SERIES, [JSON.stringify(districtIds), after, until]);
    return byDistrict(rows, (row) => inputOf(row, measures));
  }
}

function byDistrict<Row extends OfDistrict, Found>(
  rows: readonly Row[],
  find: (row: Row) => Found,
): Map<number, Found[]> {
  const found = new Map<number, Found[]>();
  for (const row of rows) {
    const own = found.get(row.districtId);
    if (own) own.push(find(row));
    else found.set(row.districtId, [find(row)]);
  }
  return found;
}

function inputOf(row: SeriesRow, measures: ReadonlySet<MeasureName>): EvaluatedInput {
  const { tEnd, rev } = row;
  const common = { tEnd, blockSeconds: row.blockS };
  const begin = { ...common, speaker: row.spoke, values: measuresFromJson(row.measures, measures) };
  if (row.endMeasures === null) return { tEnd, rev, begin, end: begin };
  const values = measuresFromJson(row.endMeasures, measures);
  return { tEnd, rev, begin, end: { ...common, speaker: row.endSpoke, values } };
}
