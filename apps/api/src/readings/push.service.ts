import { Injectable } from '@nestjs/common';
import { Problem } from '../common/problem';
import type { Site } from '../towers/keys.service';
import { SourcesService } from '../towers/sources.service';
import { showIngested, type IngestResult } from './dto/ingest-result.dto';
import { decodeText, NotTextError } from './parse/decode-text';
import { readMapping } from './parse/mapping';
import { HeaderError, type ParsedReadings } from './parse/parsed-readings';
import { readCsv, type ReadingContext } from './parse/read-csv';
import { readJson, readNdjson } from './parse/read-json';
import { ReadingContexts } from './reading-contexts';
import { ReadingsService } from './readings.service';

type Read = (text: string, context: ReadingContext) => Promise<ParsedReadings> | ParsedReadings;

const readers: Readonly<Record<string, Read>> = {
  'application/json': readJson,
  'application/x-ndjson': readNdjson,
  'text/csv': readCsv,
  'text/plain': readCsv,
};

/** Readings that a site sends. */
@Injectable()
export class PushService {
  constructor(
    private readonly sources: SourcesService,
    private readonly contexts: ReadingContexts,
    private readonly readings: ReadingsService,
  ) {}

  /**
   * Takes in what a tower's site sent. Bad rows are refused one by one with their reasons; a body that cannot be read
   * at all is answered 422 (415 for another content type), and nothing of it is taken.
   */
  async push({ towerId, name }: Site, contentType: string, body: unknown): Promise<IngestResult> {
    const read = readers[contentType.split(';')[0]!.trim().toLowerCase()];
    if (!read)
      throw new Problem(
        'type-not-served',
        'Send application/json, application/x-ndjson or text/csv, and say so in Content-Type.',
      );
    if (!Buffer.isBuffer(body) || body.length === 0) {
      throw new Problem('invalid', 'The body is empty. Send the readings in it.');
    }
    const mapping = readMapping(await this.sources.pushMapping(towerId));
    const context = await this.contexts.of(towerId, mapping);
    const { rows, refused, ignoredColumns } = await this.parse(read, body, context);
    const ingested = await this.readings.ingest(towerId, rows, { origin: 'push', name, refused });
    return showIngested(ingested, refused, ignoredColumns);
  }

  private async parse(read: Read, body: Buffer, context: ReadingContext): Promise<ParsedReadings> {
    try {
      return await read(decodeText(body), context);
    } catch (error) {
      if (error instanceof HeaderError || error instanceof NotTextError)
        throw new Problem('invalid', error.message);
      throw error;
    }
  }
}
