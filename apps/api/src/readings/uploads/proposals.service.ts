import { Injectable } from '@nestjs/common';
import { Problem } from '../../common/problem';
import type { MappingInput } from '../../towers/dto/mapping.dto';
import { TowerLayouts } from '../../towers/tower-layouts';
import type { TowerLayout } from '../../towers/tower-layout';
import { NotTextError } from '../parse/decode-text';
import { HeaderError } from '../parse/parsed-readings';
import { keepMapping } from '../parse/propose/keep-mapping';
import { proposeMapping, type ForTower, type FoundLayout } from '../parse/propose/propose-mapping';
import { readMapping, type Mapping } from '../parse/mapping';
import type { Question } from '../parse/propose/questions';
import type { ProposalDto } from './dto/proposal.dto';
import { noteOf } from './encoding';
import { UploadFiles } from './upload-files';
import { UploadRows, type StoredUpload } from './upload-rows';
import { UploadTexts, type UploadedText } from './upload-texts';

const SHOWN_LINES = 20;
const SHOWN_CHARACTERS = 400;

const forTower = (tower: TowerLayout): ForTower => ({
  sensors: tower.sensors
    .filter(({ retiredAt }) => retiredAt === null)
    .map(({ name, quantity, versions }) => ({ name, quantity, heightM: versions.at(-1)!.heightM })),
  intervalS: tower.intervalS,
  clock: tower.clock,
});

const formulaNotes = ({ sheets, sheet }: UploadedText): string[] => {
  const formulas = sheets?.find(({ name }) => name === sheet)?.formulas ?? 0;
  return formulas === 0
    ? []
    : [`${formulas} cells are formulas: the results the spreadsheet last had are read.`];
};

/** What the last file's mapping does not answer: units of columns that it takes as they are, rows it does not leave out. */
const stillOpen = ({ questions, columns }: FoundLayout, { units = {}, leaveOut }: Mapping): Question[] =>
  questions.filter(
    ({ id }) =>
      (id === 'unit' && columns.some(({ name, unitOpen }) => unitOpen && units[name] === undefined)) ||
      (id === 'rows-off-the-step' && leaveOut === undefined),
  );

/** How an uploaded file seems to be laid out. */
@Injectable()
export class ProposalsService {
  constructor(
    private readonly uploads: UploadRows,
    private readonly files: UploadFiles,
    private readonly texts: UploadTexts,
    private readonly layouts: TowerLayouts,
  ) {}

  /** Looks at an upload, and proposes how to read it; the tower's last mapping where it fits. */
  async propose(uploadId: number, sheet?: string): Promise<ProposalDto> {
    const upload = await this.uploads.find(uploadId);
    const tower = await this.layouts.of(upload.towerId);
    return this.readable(upload, async () => {
      const text = await this.texts.look(upload, sheet);
      const [about, before] = [forTower(tower), await this.uploads.keptMapping(upload.towerId)];
      const found = proposeMapping(text.sample, about);
      const names = about.sensors.map(({ name }) => name);
      const kept = before && keepMapping(readMapping(before), found, text.sample, names);
      const mapping = {
        ...(kept ?? found.mapping),
        ...(text.sheet === undefined ? {} : { sheet: text.sheet }),
      };
      return {
        mapping: mapping as MappingInput,
        from: kept ? ('last file' as const) : ('sample' as const),
        columnNames: [...found.columnNames],
        columns: found.columns.map(({ unitOpen: _, samples, ...column }) => ({
          ...column,
          samples: [...samples],
        })),
        written: [...found.written],
        sheets: text.sheets?.filter(({ rows }) => rows > 0).map(({ name }) => name) ?? null,
        notes: [...noteOf(text.encoding), ...formulaNotes(text), ...found.notes],
        questions: structuredClone(
          kept ? stillOpen(found, kept) : found.questions,
        ) as ProposalDto['questions'],
        sampleLines: text.sample.head.slice(0, SHOWN_LINES).map((line) => line.slice(0, SHOWN_CHARACTERS)),
      };
    });
  }

  /**
   * Does something with an upload's file; what makes the file no use is told as 422 with the cure.
   *
   * @throws Problem `not-found` where the file is gone, `invalid` where it cannot be read.
   */
  async readable<T>(upload: StoredUpload, read: () => Promise<T>): Promise<T> {
    if (!this.files.has(upload.id)) {
      throw new Problem('not-found', `The file "${upload.name}" is not kept any more. Send it again.`);
    }
    try {
      return await read();
    } catch (error) {
      if (error instanceof HeaderError || error instanceof NotTextError)
        throw new Problem('invalid', error.message);
      throw error;
    }
  }
}
