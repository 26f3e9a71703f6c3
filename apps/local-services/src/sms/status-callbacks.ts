import type { MessageBook } from './message-book';
import { signedPost } from './signed-post';
import { endOf, type TextBehaviour } from './text-behaviour';
import type { TextMessage, TextStatus } from './text-message';

const AT_ONCE = 8;
const TRIES = 6;

interface Step {
  readonly sid: string;
  readonly dueMs: number;
  readonly status: TextStatus;
  readonly tries: number;
}

/**
 * Moves each text on (queued, sent, then its end) and posts every step to the text's call-back address, signed.
 * A call-back that finds nobody, or a 5xx, is tried again a few times, later each time.
 */
export class StatusCallbacks {
  /** Ordered by dueMs; entries before `made` are done (cut off now and then, since shifting a long array is slow). */
  private readonly steps: Step[] = [];
  private made = 0;
  private timer: NodeJS.Timeout | undefined;
  private running = 0;
  private closed = false;
  private complainedMs = 0;

  constructor(
    private readonly book: MessageBook,
    private readonly behaviour: TextBehaviour,
    private readonly account: { sid: string; authToken: string },
  ) {
    for (const text of book.unfinished()) this.follow(text);
  }

  /** Takes charge of a text from where it stands. */
  follow(text: TextMessage): void {
    this.plan(
      text.sid,
      text.status === 'sent'
        ? endOf(this.behaviour, text.to).status
        : text.status === 'queued'
          ? 'sent'
          : 'queued',
      0,
    );
  }

  /** Stops; steps not yet made are taken up at the next start. */
  async close(): Promise<void> {
    this.closed = true;
    clearTimeout(this.timer);
    while (this.running > 0) await new Promise((resolve) => setTimeout(resolve, 5));
  }

  private plan(sid: string, status: TextStatus, tries: number): void {
    const dueMs = Date.now() + this.behaviour.statusDelayMs * 2 ** tries;
    let at = this.steps.length;
    while (at > this.made && this.steps[at - 1]!.dueMs > dueMs) at -= 1;
    this.steps.splice(at, 0, { sid, status, dueMs, tries });
    this.pump();
  }

  private pump(): void {
    if (this.closed) return;
    for (
      let step = this.next();
      step && step.dueMs <= Date.now() && this.running < AT_ONCE;
      step = this.next()
    ) {
      this.made += 1;
      this.running += 1;
      void this.make(step).finally(() => {
        this.running -= 1;
        this.pump();
      });
    }
    clearTimeout(this.timer);
    const waiting = this.next();
    if (waiting && this.running < AT_ONCE)
      this.timer = setTimeout(() => this.pump(), Math.max(1, waiting.dueMs - Date.now()));
  }

  private next(): Step | undefined {
    if (this.made > 10_000) {
      this.steps.splice(0, this.made);
      this.made = 0;
    }
    return this.steps[this.made];
  }

  private async make({ sid, status, tries }: Step): Promise<void> {
    const text = this.book.get(sid);
    if (!text) return;
    const end = endOf(this.behaviour, text.to);
    if (tries === 0) await this.book.setStatus(sid, status, status === end.status ? end.errorCode : null);
    const heard = await this.tell(text, status);
    if (!heard && tries + 1 < TRIES) this.plan(sid, status, tries + 1);
    if (tries === 0 && (status === 'queued' || status === 'sent'))
      this.plan(sid, status === 'queued' ? 'sent' : end.status, 0);
  }

  private async tell(text: TextMessage, status: TextStatus): Promise<boolean> {
    if (!text.statusCallback) return true;
    const form: Record<string, string> = {
      AccountSid: this.account.sid,
      ApiVersion: '2010-04-01',
      MessageSid: text.sid,
      MessageStatus: status,
      SmsSid: text.sid,
      SmsStatus: status,
      To: text.to,
      ...(text.from && { From: text.from }),
      ...(text.messagingServiceSid && { MessagingServiceSid: text.messagingServiceSid }),
      ...(text.errorCode !== null && { ErrorCode: String(text.errorCode) }),
    };
    try {
      return (await signedPost(this.account.authToken, text.statusCallback, form)).status < 500;
    } catch (error) {
      this.complain(text.statusCallback, error);
      return false;
    }
  }

  /** Says once a minute that nobody answers, not once per text. */
  private complain(url: string, error: unknown): void {
    if (Date.now() - this.complainedMs < 60_000) return;
    this.complainedMs = Date.now();
    console.error(
      `Nobody takes status call-backs at ${url} (${(error as Error).message}); trying again later.`,
    );
  }
}
