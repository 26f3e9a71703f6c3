import type { IncomingMessage } from 'node:http';
import { Injectable, type OnModuleInit } from '@nestjs/common';
import type { SignedIn } from '../../auth/signed-in';
import { Clock } from '../../common/clock';
import { Problem } from '../../common/problem';
import { UnitOfWork } from '../../database/unit-of-work';
import { JobsService } from '../../scheduler/jobs.service';
import { TowerLayouts } from '../../towers/tower-layouts';
import { showUpload, type UploadDto, type UploadQuery, type UploadsQuery } from './dto/upload.dto';
import { LARGEST_TEXT, UploadFiles } from './upload-files';
import { UploadRows } from './upload-rows';
import { UploadRuns } from './upload-runs.service';

const DAY_S = 86_400;
/** Files that nobody imported are kept this long. */
const KEPT_S = 7 * DAY_S;

/** Files that staff sent, from the first byte on. */
@Injectable()
export class UploadsService implements OnModuleInit {
  constructor(
    private readonly uploads: UploadRows,
    private readonly files: UploadFiles,
    private readonly runs: UploadRuns,
    private readonly layouts: TowerLayouts,
    private readonly work: UnitOfWork,
    private readonly clock: Clock,
    private readonly jobs: JobsService,
  ) {}

  onModuleInit(): void {
    this.jobs.register('clear uploads away', DAY_S, () => this.clear());
  }

  /** Keeps a file that a request brings. */
  async receive(query: UploadQuery, request: IncomingMessage, by: SignedIn): Promise<UploadDto> {
    const tower = await this.layouts.of(query.towerId);
    if (tower.retiredAt !== null) {
      throw new Problem('not-possible-now', `The tower "${tower.name}" is retired and takes no readings.`);
    }
    const { 'content-length': declared, 'content-type': type = '' } = request.headers;
    if (type.startsWith('multipart/')) {
      throw new Problem(
        'bad-request',
        'Send the file itself as the body of the request, not as part of a form.',
      );
    }
    if (Number(declared ?? 0) > LARGEST_TEXT) {
      throw new Problem(
        'too-large',
        `A file may have up to ${LARGEST_TEXT / 1e6} MB. Split it by time, and send the parts.`,
      );
    }
    const { part, ...file } = await this.files.receive(request);
    try {
      if (file.bytes === 0)
        throw new Problem('invalid', 'The file is empty. Choose the one that holds the readings.');
      const id = await this.work.run(async () => {
        const made = await this.uploads.add({ ...file, ...query, byUser: by.id, at: this.clock.now() });
        await this.files.give(part, made);
        return made;
      });
      return showUpload(await this.uploads.find(id));
    } catch (error) {
      await this.files.discard(part);
      throw error;
    }
  }

  /** One upload and how far its import is. */
  async get(id: number): Promise<UploadDto> {
    const upload = await this.uploads.find(id);
    return showUpload(upload, this.runs.progressOf(id));
  }

  /** The newest uploads. */
  async list({ towerId = undefined }: UploadsQuery): Promise<UploadDto[]> {
    const found = await this.uploads.list(towerId ?? null);
    return found.map((upload) => showUpload(upload, this.runs.progressOf(upload.id)));
  }

  /** Takes an upload away that nobody has imported. */
  async remove(id: number): Promise<void> {
    const upload = await this.uploads.find(id);
    if (!(await this.work.run(() => this.uploads.remove(id)))) {
      throw new Problem('not-possible-now', `"${upload.name}" has been imported; undo the import instead.`);
    }
    await this.files.remove(id);
  }

  private async clear(): Promise<string> {
    const ids = await this.uploads.forgotten(this.clock.now() - KEPT_S);
    for (const id of ids) await this.files.remove(id);
    await this.files.sweepParts(this.clock.nowMs() - DAY_S * 1000);
    return `${ids.length} files`;
  }
}
