import { createHash } from 'node:crypto';
import { readFileSync } from 'node:fs';
import path from 'node:path';
import { Injectable, type OnModuleInit } from '@nestjs/common';
import { OnEvent } from '@nestjs/event-emitter';
import type { Request, RequestHandler, Response } from 'express';
import { Clock } from '../common/clock';
import { Settings } from '../config/settings';
import { JobsService } from '../scheduler/jobs.service';
import type { Language } from '../notices/texts/notice-facts';
import { PLAIN_PAGE, renderDistrictPage, renderListPage } from './page/render-page';
import { PublicStatusService, stillHolds } from './public-status.service';
import type { PublicStatusDto } from './dto/public-status.dto';

interface ReadyPage {
  readonly html: string;
  readonly etag: string;
}

const EVERY_S = 30;
/** Older than this, a page is not served any more without working it out anew. */
const OLDEST_S = 120;
const LANGUAGES: readonly Language[] = ['en', 'es'];
const DISTRICT_PAGE = /^\/d\/([a-z0-9-]+)\/?$/;

/**
 * The residents' pages, worked out beforehand with the answer in their HTML, so that thousands can ask at once while
 * other work runs. They are worked out anew when a notice or a finding changes, and every half minute.
 */
@Injectable()
export class PublicPages implements OnModuleInit {
  private pages = new Map<string, ReadyPage>();
  private statuses: readonly PublicStatusDto[] = [];
  private madeAt = -Infinity;
  private making: Promise<void> | undefined;
  private again = false;
  private changed = false;

  constructor(
    private readonly status: PublicStatusService,
    private readonly settings: Settings,
    private readonly clock: Clock,
    private readonly jobs: JobsService,
  ) {}

  onModuleInit(): void {
    this.jobs.register('public pages', EVERY_S, async () => {
      await this.refresh();
      return `${this.pages.size} pages`;
    });
  }

  /** Answers `/` and `/d/:slug`; everything else goes on to the next handler. */
  readonly handle: RequestHandler = (request, response, next) => {
    if (request.method !== 'GET' && request.method !== 'HEAD') return next();
    const slug = DISTRICT_PAGE.exec(request.path)?.[1];
    if (slug === undefined && request.path !== '/') return next();
    this.upToDate().then(() => this.answer(slug, request, response, next), next);
  };

  /** Something that the pages say has changed: the next request waits for them to be worked out anew. */
  @OnEvent('notice.changed')
  @OnEvent('district.changed')
  @OnEvent('district.evaluated')
  outOfDate(): void {
    this.changed = true;
    this.madeAt = -Infinity;
  }

  /** Works every page out anew. */
  refresh(): Promise<void> {
    if (this.making) {
      this.again = true;
      return this.making;
    }
    this.making = this.make().finally(() => (this.making = undefined));
    return this.making;
  }

  private async make(): Promise<void> {
    do {
      this.again = false;
      this.changed = false;
      const madeAt = this.clock.now();
      const statuses = await this.status.list();
      const template = this.template();
      const pages = new Map<string, ReadyPage>();
      for (const lang of LANGUAGES) {
        pages.set(`${lang} /`, ready(renderListPage(template, statuses, lang)));
        for (const status of statuses)
          pages.set(`${lang} ${status.slug}`, ready(renderDistrictPage(template, status, lang)));
      }
      [this.pages, this.statuses] = [pages, statuses];
      if (!this.changed) this.madeAt = madeAt;
    } while (this.again);
  }

  /** A notice whose written end has come, or pages that grew old, are never served. */
  private async upToDate(): Promise<void> {
    const now = this.clock.now();
    const old = now - this.madeAt > OLDEST_S;
    if (old || !this.statuses.every((status) => stillHolds(status, now))) await this.refresh();
  }

  private answer(slug: string | undefined, request: Request, response: Response, next: () => void): void {
    const lang: Language = request.query.lang === 'es' ? 'es' : 'en';
    const page = this.pages.get(`${lang} ${slug ?? '/'}`);
    if (!page) return next();
    response.setHeader('Content-Type', 'text/html; charset=utf-8');
    response.setHeader('Cache-Control', 'public, no-cache');
    response.setHeader('ETag', page.etag);
    if (request.headers['if-none-match'] === page.etag) response.status(304).end();
    else response.end(request.method === 'HEAD' ? undefined : page.html);
  }

  private template(): string {
    try {
      return readFileSync(path.join(this.settings.webDir, 'index.html'), 'utf8');
    } catch (error) {
      if ((error as NodeJS.ErrnoException).code !== 'ENOENT') throw error;
      return PLAIN_PAGE;
    }
  }
}

function ready(html: string): ReadyPage {
  return { html, etag: `"${createHash('sha256').update(html).digest('base64url').slice(0, 22)}"` };
}
