/** One page of a list whose newest entry has the highest number. */
export interface NewestFirst<T> {
  readonly items: T[];
  readonly total: number;
  readonly page: number;
  readonly pageSize: number;
}

/** Numbers of the records on a page (from 1) of `count` records, newest first. */
export const pageOfNewest = (count: number, page: number, pageSize: number): number[] => {
  const first = count - 1 - (page - 1) * pageSize;
  const length = Math.max(0, Math.min(pageSize, first + 1));
  return Array.from({ length }, (_, i) => first - i);
};

/** `page` and `pageSize` from a query string, held within sensible bounds. */
export const pageFrom = (
  query: Record<string, unknown>,
  usual = 50,
  highest = 1000,
): { page: number; pageSize: number } => {
  const whole = (value: unknown, fallback: number, most: number) => {
    const number = Math.floor(Number(value));
    return number >= 1 ? Math.min(number, most) : fallback;
  };
  return { page: whole(query.page, 1, 1e9), pageSize: whole(query.pageSize, usual, highest) };
};
