import { ApiProperty } from '@nestjs/swagger';
import type { Ingested } from '../readings.service';
import type { RefusedRow } from '../refusal';

/** A row that was not taken in, and why. */
export class RefusedRowShown {
  @ApiProperty({ description: 'The header is row 1; in JSON the place in the list, from 1' }) row!: number;
  @ApiProperty({ type: String, nullable: true }) column!: string | null;
  @ApiProperty() code!: string;
  @ApiProperty({ description: 'Names the row, the column and the cure' }) text!: string;
}

/** What taking readings in gave. */
export class IngestResult {
  @ApiProperty() importId!: number;
  @ApiProperty() new!: number;
  @ApiProperty({ description: 'Known already; nothing changed' }) repeated!: number;
  @ApiProperty({ description: 'Took the place of another value' }) corrected!: number;
  @ApiProperty() refused!: number;
  @ApiProperty({ type: [RefusedRowShown], description: 'The first 100' }) refusedRows!: RefusedRowShown[];
  @ApiProperty({ type: [String], description: 'Columns that no sensor of the tower has' })
  ignoredColumns!: string[];
}

const SHOWN = 100;

/** The answer to whoever sent the readings. */
export function showIngested(
  ingested: Ingested,
  refused: readonly RefusedRow[],
  ignoredColumns: readonly string[],
): IngestResult {
  return {
    ...ingested,
    refusedRows: refused
      .slice(0, SHOWN)
      .map(({ rowNo, column, code, text }) => ({ row: rowNo, column: column ?? null, code, text })),
    ignoredColumns: [...ignoredColumns],
  };
}
