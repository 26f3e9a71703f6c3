import path from 'node:path';
import { simpleParser, type ParsedMail } from 'mailparser';
import { Journal } from '../journal/journal';
import { pageOfNewest, type NewestFirst } from '../journal/newest-first';

/** A message as it came: its envelope and its bytes (kept as latin-1, so that none is lost). */
export interface KeptMail {
  readonly at: string;
  readonly from: string;
  readonly to: string[];
  readonly messageId: string;
  readonly raw: string;
}

/** A message's envelope. */
export interface MailEnvelope extends Omit<KeptMail, 'raw'> {
  readonly n: number;
}

/** A message opened: header lines as they came (keys in lower case), subject and parts. */
export interface OpenedMail extends MailEnvelope {
  readonly subject: string;
  readonly headers: { key: string; line: string }[];
  readonly text: string;
  readonly html: string;
}

/** A filtered list looks through this many messages, newest first, and says so. */
export const SEARCHED_AT_MOST = 5000;

const opened = (envelope: MailEnvelope, mail: ParsedMail): OpenedMail => ({
  ...envelope,
  subject: mail.subject ?? '',
  headers: mail.headerLines.map(({ key, line }) => ({ key, line })),
  text: mail.text ?? '',
  html: typeof mail.html === 'string' ? mail.html : '',
});

/** Everything the mail server took, append-only in `mail.jsonl`; memory holds one number per message. */
export class MailBox {
  private constructor(private readonly journal: Journal<KeptMail>) {}

  /** Opens the box in a folder that exists. */
  static async open(stateDir: string): Promise<MailBox> {
    return new MailBox(await Journal.open<KeptMail>(path.join(stateDir, 'mail.jsonl')));
  }

  /** Number of messages kept. */
  get count(): number {
    return this.journal.count;
  }

  /** Keeps a message; resolves with its number when written. */
  keep(from: string, to: string[], raw: Buffer): Promise<number> {
    const text = raw.toString('latin1');
    const head = text.slice(0, Math.max(0, text.indexOf('\r\n\r\n'))) || text;
    const messageId = /^message-id:\s*(<[^>]*>)/im.exec(head)?.[1] ?? '';
    return this.journal.append({ at: new Date().toISOString(), from, to, messageId, raw: text });
  }

  /** Envelopes, newest first; with `to`, only those to this address among the newest {@link SEARCHED_AT_MOST}. */
  async envelopes(page: number, pageSize: number, to?: string): Promise<NewestFirst<MailEnvelope>> {
    const numbers = to
      ? await this.numbersTo(to.toLowerCase())
      : Array.from(pageOfNewest(this.count, page, pageSize));
    const shown = to ? numbers.slice((page - 1) * pageSize, page * pageSize) : numbers;
    const items = await Promise.all(shown.map((n) => this.envelope(n)));
    return { items, total: to ? numbers.length : this.count, page, pageSize };
  }

  /** One message, opened. @throws RangeError when there is none with this number. */
  async open(n: number): Promise<OpenedMail> {
    const { raw, ...envelope } = await this.journal.read(n);
    const mail = await simpleParser(Buffer.from(raw, 'latin1'), { skipImageLinks: true });
    return opened({ n, ...envelope }, mail);
  }

  /** Writes what waits and closes the file. */
  close(): Promise<void> {
    return this.journal.close();
  }

  private async envelope(n: number): Promise<MailEnvelope> {
    const { raw: _raw, ...envelope } = await this.journal.read(n);
    return { n, ...envelope };
  }

  private async numbersTo(address: string): Promise<number[]> {
    const found: number[] = [];
    for (const n of pageOfNewest(this.count, 1, SEARCHED_AT_MOST))
      if ((await this.journal.read(n)).to.some((one) => one.toLowerCase() === address)) found.push(n);
    return found;
  }
}
