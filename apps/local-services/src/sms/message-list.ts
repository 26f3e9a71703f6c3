import type { TextFilter } from './message-book';
import { asResource, type TextMessage } from './text-message';

const DAY_MS = 86_400_000;

const instant = (value: unknown): number | undefined => {
  const ms = typeof value === 'string' ? Date.parse(value) : NaN;
  return Number.isNaN(ms) ? undefined : ms;
};

/** The list filters of the provider's API: To, From, DateSent (that UTC day), DateSent> and DateSent< (both inclusive). */
export const filterFrom = (query: Record<string, unknown>): TextFilter => {
  const day = instant(query['DateSent']);
  const after = instant(query['DateSent>']);
  const before = instant(query['DateSent<']);
  const dayStart = day === undefined ? undefined : Math.floor(day / DAY_MS) * DAY_MS;
  return {
    to: typeof query.To === 'string' ? query.To : undefined,
    from: typeof query.From === 'string' ? query.From : undefined,
    sentFromMs: dayStart ?? after,
    sentBeforeMs: dayStart !== undefined ? dayStart + DAY_MS : before === undefined ? undefined : before + 1,
  };
};

/** One page of a list as the provider's API writes it. */
export const asListPage = (account: string, texts: TextMessage[], query: Record<string, unknown>) => {
  const pageSize = Math.min(1000, Math.max(1, Math.floor(Number(query.PageSize)) || 50));
  const page = Math.max(0, Math.floor(Number(query.Page)) || 0);
  const shown = texts.slice(page * pageSize, (page + 1) * pageSize);
  const uri = (n: number) => {
    const kept = Object.entries(query).filter(
      ([name, value]) => typeof value === 'string' && !/^Page/.test(name),
    ) as [string, string][];
    return `/2010-04-01/Accounts/${account}/Messages.json?${new URLSearchParams([...kept, ['PageSize', String(pageSize)], ['Page', String(n)]])}`;
  };
  return {
    messages: shown.map((text) => asResource(account, text)),
    page,
    page_size: pageSize,
    start: page * pageSize,
    end: page * pageSize + Math.max(0, shown.length - 1),
    uri: uri(page),
    first_page_uri: uri(0),
    previous_page_uri: page > 0 ? uri(page - 1) : null,
    next_page_uri: (page + 1) * pageSize < texts.length ? uri(page + 1) : null,
  };
};
