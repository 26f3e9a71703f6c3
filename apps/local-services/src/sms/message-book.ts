import path from 'node:path';
import { Journal } from '../journal/journal';
import { FINAL, type TextMessage, type TextStatus } from './text-message';

/** The newest this many texts are in memory; older ones stay on the disk only. */
export const KEPT_IN_MEMORY = 250_000;

type Entry =
  | { readonly kind: 'text'; readonly text: TextMessage }
  | {
      readonly kind: 'status';
      readonly sid: string;
      readonly status: TextStatus;
      readonly atMs: number;
      readonly errorCode: number | null;
    };

/** Which texts a list holds: recipient, sender, and the span in which they were sent (made, while not yet sent). */
export interface TextFilter {
  readonly to?: string;
  readonly from?: string;
  readonly sentFromMs?: number;
  readonly sentBeforeMs?: number;
}

/** Every text and every change of its status, append-only in `texts.jsonl`, with the newest held in memory. */
export class MessageBook {
  private readonly bySid = new Map<string, TextMessage>();
  private readonly byTo = new Map<string, TextMessage[]>();
  private readonly bodies = new Map<string, string>();
  private journal!: Journal<Entry>;

  private constructor(private readonly keptInMemory: number) {}

  /** Opens the book in a folder that exists and reads what it holds. */
  static async open(stateDir: string, keptInMemory = KEPT_IN_MEMORY): Promise<MessageBook> {
    const book = new MessageBook(keptInMemory);
    book.journal = await Journal.open<Entry>(path.join(stateDir, 'texts.jsonl'), (entry) => book.note(entry));
    return book;
  }

  /** Texts in memory. */
  get count(): number {
    return this.bySid.size;
  }

  /** Writes a text in. */
  async add(text: TextMessage): Promise<void> {
    const entry: Entry = { kind: 'text', text };
    this.note(entry);
    await this.journal.append(entry);
  }

  /** Changes a text's status. An unknown sid is left alone (it has left memory). */
  async setStatus(sid: string, status: TextStatus, errorCode: number | null): Promise<void> {
    const entry: Entry = { kind: 'status', sid, status, atMs: Date.now(), errorCode };
    this.note(entry);
    await this.journal.append(entry);
  }

  /** The text with this sid. */
  get(sid: string): TextMessage | undefined {
    return this.bySid.get(sid);
  }

  /** Texts that match, newest first. */
  list(filter: TextFilter): TextMessage[] {
    const all = filter.to ? (this.byTo.get(filter.to) ?? []) : [...this.bySid.values()];
    const fits = (text: TextMessage) => {
      const at = text.sentMs ?? text.createdMs;
      return (
        (!filter.from || text.from === filter.from) &&
        (filter.sentFromMs === undefined || at >= filter.sentFromMs) &&
        (filter.sentBeforeMs === undefined || at < filter.sentBeforeMs)
      );
    };
    return all.filter(fits).reverse();
  }

  /** Outgoing texts whose last status is still to come, oldest first: what to go on with after a restart. */
  unfinished(): TextMessage[] {
    return [...this.bySid.values()].filter((text) => !FINAL.has(text.status));
  }

  /** Writes what waits and closes the file. */
  close(): Promise<void> {
    return this.journal.close();
  }

  private note(entry: Entry): void {
    if (entry.kind === 'status') return this.noteStatus(entry);
    const known = this.bodies.get(entry.text.body);
    if (known === undefined && this.bodies.size < 10_000) this.bodies.set(entry.text.body, entry.text.body);
    const text = { ...entry.text, body: known ?? entry.text.body };
    this.bySid.set(text.sid, text);
    const others = this.byTo.get(text.to);
    if (others) others.push(text);
    else this.byTo.set(text.to, [text]);
    if (this.bySid.size > this.keptInMemory) this.forgetOldest();
  }

  private noteStatus({ sid, status, atMs, errorCode }: Entry & { kind: 'status' }): void {
    const text = this.bySid.get(sid);
    if (!text) return;
    text.status = status;
    text.updatedMs = atMs;
    text.errorCode = errorCode;
    if (status === 'sent') text.sentMs = atMs;
  }

  private forgetOldest(): void {
    const oldest = this.bySid.values().next().value!;
    this.bySid.delete(oldest.sid);
    const rest = this.byTo.get(oldest.to)!.filter((text) => text !== oldest);
    if (rest.length > 0) this.byTo.set(oldest.to, rest);
    else this.byTo.delete(oldest.to);
  }
}
