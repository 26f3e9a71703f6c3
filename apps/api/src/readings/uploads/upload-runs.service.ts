import { Injectable, Logger, type OnApplicationBootstrap, type OnModuleDestroy } from '@nestjs/common';
import { ActivityService } from '../../activity/activity.service';
import type { SignedIn } from '../../auth/signed-in';
import { Clock } from '../../common/clock';
import { Problem } from '../../common/problem';
import { UnitOfWork } from '../../database/unit-of-work';
import type { MappingInput } from '../../towers/dto/mapping.dto';
import { TowerLayouts } from '../../towers/tower-layouts';
import { ImportRunner, type Imported } from '../importing/import-runner';
import { NotTextError } from '../parse/decode-text';
import { readMapping } from '../parse/mapping';
import { HeaderError } from '../parse/parsed-readings';
import { ReadingContexts } from '../reading-contexts';
import { showUpload, type UploadDto } from './dto/upload.dto';
import { MappingChecks } from './mapping-checks';
import { ProposalsService } from './proposals.service';
import { UploadFiles } from './upload-files';
import { UploadRows, type StoredUpload } from './upload-rows';
import { UploadTexts } from './upload-texts';

interface Run {
  bytesDone: number;
  isCancelled: boolean;
}

const INTERRUPTED =
  'The service stopped in the middle of the import. Import the file again: what is known already changes nothing.';

/** Imports of uploaded files: one after the other in the background, each with its progress. */
@Injectable()
export class UploadRuns implements OnApplicationBootstrap, OnModuleDestroy {
  private readonly log = new Logger(UploadRuns.name);
  private readonly runs = new Map<number, Run>();
  private last: Promise<void> = Promise.resolve();

  constructor(
    private readonly uploads: UploadRows,
    private readonly files: UploadFiles,
    private readonly texts: UploadTexts,
    private readonly proposals: ProposalsService,
    private readonly checks: MappingChecks,
    private readonly runner: ImportRunner,
    private readonly contexts: ReadingContexts,
    private readonly layouts: TowerLayouts,
    private readonly work: UnitOfWork,
    private readonly clock: Clock,
    private readonly activity: ActivityService,
  ) {}

  async onApplicationBootstrap(): Promise<void> {
    await this.uploads.endInterrupted(INTERRUPTED, this.clock.now());
  }

  async onModuleDestroy(): Promise<void> {
    for (const run of this.runs.values()) run.isCancelled = true;
    await this.last;
  }

  /** How many bytes of a running import are done. */
  progressOf(uploadId: number): number | undefined {
    return this.runs.get(uploadId)?.bytesDone;
  }

  /** Waits until no import of an upload is under way. */
  async idle(): Promise<void> {
    await this.last;
  }

  /** Begins to import an upload by a mapping, which is kept for the tower's next file. */
  async commit(uploadId: number, mapping: MappingInput, by: SignedIn): Promise<UploadDto> {
    const upload = await this.uploads.find(uploadId);
    this.checks.check(await this.layouts.of(upload.towerId), mapping);
    await this.proposals.readable(upload, () => this.texts.look(upload, mapping.sheet));
    const kept = JSON.stringify(mapping);
    await this.work.run(async () => {
      if (!(await this.uploads.begin(uploadId, kept))) {
        throw new Problem('already-done', `"${upload.name}" is being imported already, or has been.`);
      }
      await this.uploads.keepMapping(upload.towerId, kept, by.id, this.clock.now());
      const body = { upload: uploadId, name: upload.name, mapping };
      await this.activity.record({
        actor: by,
        act: 'import begun',
        subject: `tower ${upload.towerId}`,
        body,
      });
    });
    const run: Run = { bytesDone: 0, isCancelled: false };
    this.runs.set(uploadId, run);
    this.last = this.last.then(() => this.run(upload, kept, run, by));
    return showUpload(await this.uploads.find(uploadId), 0);
  }

  /** Stops an import after the rows at hand; what was taken so far is kept, and can be undone as a whole. */
  async cancel(uploadId: number, by: SignedIn): Promise<UploadDto> {
    const upload = await this.uploads.find(uploadId);
    const run = this.runs.get(uploadId);
    if (!run) throw new Problem('not-possible-now', `"${upload.name}" is not being imported now.`);
    run.isCancelled = true;
    const body = { upload: uploadId, name: upload.name };
    await this.work.run(() =>
      this.activity.record({ actor: by, act: 'import cancelled', subject: `tower ${upload.towerId}`, body }),
    );
    return showUpload(upload, run.bytesDone);
  }

  private async run(upload: StoredUpload, kept: string, run: Run, by: SignedIn): Promise<void> {
    try {
      const imported = await this.import(upload, kept, run, by);
      const state = imported.cancelled ? 'cancelled' : 'done';
      await this.end(upload, {
        state,
        importId: imported.importId,
        bytesDone: imported.cancelled ? run.bytesDone : upload.bytes,
      });
      if (state === 'done') await this.files.remove(upload.id);
    } catch (error) {
      await this.end(upload, { state: 'failed', fault: this.faultOf(error), bytesDone: run.bytesDone }).catch(
        (fault: unknown) => this.log.error(`How upload ${upload.id} ended could not be kept`, fault),
      );
    } finally {
      this.runs.delete(upload.id);
    }
  }

  private async import(upload: StoredUpload, kept: string, run: Run, by: SignedIn): Promise<Imported> {
    const mapping = readMapping(kept);
    const text = await this.texts.look(upload, mapping.sheet);
    return this.runner.run({
      towerId: upload.towerId,
      origin: { origin: 'upload', name: upload.name, sha256: upload.sha256, byUser: by.id },
      context: await this.contexts.of(upload.towerId, mapping),
      bytes: this.texts.bytes(text),
      onProgress: (bytesDone) =>
        (run.bytesDone = Math.round((bytesDone / Math.max(text.bytes, 1)) * upload.bytes)),
      isCancelled: () => run.isCancelled,
    });
  }

  private async end(
    upload: StoredUpload,
    ended: { state: 'done' | 'cancelled' | 'failed'; importId?: number; fault?: string; bytesDone: number },
  ): Promise<void> {
    await this.work.run(() => this.uploads.end(upload.id, { ...ended, at: this.clock.now() }), 'bulk');
  }

  private faultOf(error: unknown): string {
    if (error instanceof HeaderError || error instanceof NotTextError) return error.message;
    if (error instanceof Problem) return error.detail;
    this.log.error('An upload could not be imported', error);
    return 'Something went wrong on our side; the log says what. Import the file again: nothing is taken twice.';
  }
}
