import { existsSync } from 'node:fs';
import { mkdir, readFile, rename, rm, writeFile } from 'node:fs/promises';
import path from 'node:path';
import { Injectable } from '@nestjs/common';
import { Problem } from '../../common/problem';
import { HeaderError } from '../parse/parsed-readings';
import { faultOf, UploadFiles } from './upload-files';
import type { WrittenSheet } from './workbook';
import { writeSheetsInThread } from './workbook-thread';

/** A sheet of a workbook, written out as text. */
export interface Sheet extends WrittenSheet {
  readonly path: string;
}

const LIST = 'sheets.json';

/** The sheets of uploaded workbooks as files of text beside them, written out once. */
@Injectable()
export class WorkbookTexts {
  private readonly writing = new Map<number, Promise<void>>();

  constructor(private readonly files: UploadFiles) {}

  /**
   * The sheets of a workbook in its order.
   *
   * @throws NotTextError where the file is no workbook that can be read, or holds more than is taken.
   */
  async sheetsOf(uploadId: number): Promise<Sheet[]> {
    const folder = this.files.sheetsPathOf(uploadId);
    if (!existsSync(path.join(folder, LIST))) await this.writeOnce(uploadId, folder);
    const sheets = JSON.parse(await readFile(path.join(folder, LIST), 'utf8')) as WrittenSheet[];
    return sheets.map((sheet) => ({ ...sheet, path: path.join(folder, sheet.file) }));
  }

  /** The sheet by name, or the first that is not hidden and holds anything. */
  choose(sheets: readonly Sheet[], wanted: string | undefined): Sheet {
    const shown = sheets.filter(({ isHidden, rows }) => !isHidden && rows > 0);
    const chosen = wanted === undefined ? shown[0] : sheets.find(({ name }) => name === wanted);
    if (chosen) return chosen;
    if (wanted === undefined)
      throw new HeaderError('No sheet of the workbook that is not hidden holds anything.');
    throw new Problem('invalid', `The workbook has no sheet "${wanted}".`, {
      errors: [
        { field: 'mapping.sheet', text: `Choose one of ${shown.map(({ name }) => name).join(', ')}.` },
      ],
    });
  }

  private async writeOnce(uploadId: number, folder: string): Promise<void> {
    const running = this.writing.get(uploadId);
    if (running) return running;
    const written = this.write(uploadId, folder).finally(() => this.writing.delete(uploadId));
    this.writing.set(uploadId, written);
    return written;
  }

  private async write(uploadId: number, folder: string): Promise<void> {
    const unfinished = `${folder}.part`;
    await rm(unfinished, { recursive: true, force: true });
    await mkdir(unfinished, { recursive: true });
    try {
      const sheets = await writeSheetsInThread(this.files.pathOf(uploadId), unfinished);
      await writeFile(path.join(unfinished, LIST), JSON.stringify(sheets));
      await rename(unfinished, folder);
    } catch (error) {
      throw faultOf(error);
    } finally {
      await rm(unfinished, { recursive: true, force: true });
    }
  }
}
