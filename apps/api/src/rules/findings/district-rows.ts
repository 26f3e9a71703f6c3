import { isKnown, type Quantity } from '@lidwatch/atmosphere';

import { Injectable } from '@nestjs/common';
import { Sql } from '../../database/sql';
import { UnitOfWork } from '../../database/unit-of-work';
import type { DistrictBlock } from './district-block';
import type { StrengthAt } from './episode-minutes';
import {
  inputOf,
  keyOf,
  KeptInputs,
  type BlockHead,
  type EvaluatedInput,
  type InputRow,
} from './evaluated-input';
import { measuresToJson, quantityOf } from './measures-json';

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
const HEADS = `SELECT district_id districtId, t_end tEnd, rev ${WHERE}`;
const INPUTS = `SELECT district_id districtId, t_end tEnd, rev, block_s blockS, spoke, measures, end_spoke endSpoke,
  end_measures endMeasures FROM json_each($1) j CROSS JOIN district_block
  ON district_id = j.value->>0 AND t_end = j.value->>1`;

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

/** The statements by which district blocks are kept and read. */
@Injectable()
export class DistrictRows {
  private readonly kept = new KeptInputs();

  constructor(
    private readonly sql: Sql,
    private readonly work: UnitOfWork,
  ) {}

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

  /** Some districts' blocks that end in (after, until], oldest first. Each revision of a block is read once. */
  async series(
    districtIds: readonly number[],
    after: number,
    until: number,
  ): Promise<Map<number, EvaluatedInput[]>> {
    const heads = await this.sql.all<BlockHead>(HEADS, [JSON.stringify(districtIds), after, until]);
    const wanted = heads.filter((head) => !this.kept.of(head));
    const read = wanted.length > 0 ? await this.inputs(wanted) : undefined;
    return byDistrict(heads, (head) => (read?.get(keyOf(head)) ?? this.kept.of(head))!);
  }

  /** What is read is remembered once it is committed: a revision that is rolled back may come again as another. */
  private async inputs(wanted: readonly BlockHead[]): Promise<Map<string, EvaluatedInput>> {
    const ends = wanted.map(({ districtId, tEnd }) => [districtId, tEnd]);
    const rows = await this.sql.all<InputRow>(INPUTS, [JSON.stringify(ends)]);
    const read = new Map(rows.map((row) => [keyOf(row), inputOf(row)]));
    this.work.afterCommit(() => this.kept.add(read));
    return read;
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
