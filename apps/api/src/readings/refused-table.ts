import { Readable } from 'node:stream';
import { Injectable, StreamableFile } from '@nestjs/common';
import { Sql } from '../database/sql';
import { ImportsService } from './imports.service';
import type { RefusedRowDto } from './dto/import.dto';

type Row = RefusedRowDto & { readonly id: number };

const ROWS_AT_A_TIME = 2_000;
const PAGE = `SELECT id, row_no row, col "column", code, text, raw FROM refused_row
  WHERE import_id = $1 AND (row_no, id) > ($2, $3) ORDER BY row_no, id LIMIT $4`;
/** Begins with one of these: a spreadsheet would work the cell out (OWASP, CSV injection). */
const FORMULA = /^[=+\-@\t\r]/;

const cell = (value: string | number | null): string => {
  const text = String(value ?? '').replace(/[\r\n]+/g, ' ');
  const harmless = typeof value === 'string' && FORMULA.test(text) ? `'${text}` : text;
  return /[",]/.test(harmless) ? `"${harmless.replaceAll('"', '""')}"` : harmless;
};

/** The refused rows of an import as a table to be downloaded, written as it is read. */
@Injectable()
export class RefusedTable {
  constructor(
    private readonly sql: Sql,
    private readonly imports: ImportsService,
  ) {}

  /** Comma-separated text with the row, the column, the reason, and the line as it came; 404 without the import. */
  async download(importId: number): Promise<StreamableFile> {
    await this.imports.get(importId);
    return new StreamableFile(Readable.from(this.lines(importId)), {
      type: 'text/csv; charset=utf-8',
      disposition: `attachment; filename="refused-rows-of-import-${importId}.csv"`,
    });
  }

  private async *lines(importId: number): AsyncGenerator<string> {
    yield '\ufeffrow,column,code,reason,line\n';
    let [row, id] = [-1, 0];
    for (;;) {
      const rows = await this.sql.all<Row>(PAGE, [importId, row, id, ROWS_AT_A_TIME]);
      if (rows.length === 0) return;
      yield rows.map((r) => `${[r.row, r.column, r.code, r.text, r.raw].map(cell).join(',')}\n`).join('');
      ({ row, id } = rows.at(-1)!);
    }
  }
}
