import { appendFile, mkdtemp, rm } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import path from 'node:path';
import { Journal } from './journal';
import { pageFrom, pageOfNewest } from './newest-first';

describe('the journal', () => {
  let folder: string;
  beforeEach(async () => (folder = await mkdtemp(path.join(tmpdir(), 'journal-'))));
  afterEach(() => rm(folder, { recursive: true }));

  it('gives back what it was given, in any order, also after it was opened again', async () => {
    const file = path.join(folder, 'a.jsonl');
    const journal = await Journal.open<{ text: string }>(file);
    const texts = Array.from({ length: 3000 }, (_, i) => `número ${i} ${'x'.repeat(i % 700)}`);
    const numbers = await Promise.all(texts.map((text) => journal.append({ text })));
    expect(numbers).toEqual(texts.map((_, i) => i));
    await journal.close();

    const seen: string[] = [];
    const again = await Journal.open<{ text: string }>(file, (r) => seen.push(r.text));
    expect(seen).toEqual(texts);
    for (const i of [2999, 0, 1234]) expect(await again.read(i)).toEqual({ text: texts[i] });
    await again.close();
  });

  it('cuts off a half line and goes on after it', async () => {
    const file = path.join(folder, 'b.jsonl');
    const journal = await Journal.open<number>(file);
    await journal.append(1);
    await journal.close();
    await appendFile(file, '{"half');
    const again = await Journal.open<number>(file);
    expect(await again.append(2)).toBe(1);
    expect([await again.read(0), await again.read(1)]).toEqual([1, 2]);
    await expect(again.read(2)).rejects.toThrow('There is no record 2');
    await again.close();
  });
});

describe('pages, newest first', () => {
  it.each([
    [5, 1, 2, [4, 3]],
    [5, 3, 2, [0]],
    [5, 4, 2, []],
    [0, 1, 2, []],
  ])('%i records, page %i of %i', (count, page, pageSize, expected) => {
    expect(pageOfNewest(count, page, pageSize)).toEqual(expected);
  });
  it('holds what the query says within bounds', () => {
    expect(pageFrom({ page: '-3', pageSize: '1e9' })).toEqual({ page: 1, pageSize: 1000 });
    expect(pageFrom({ page: '7', pageSize: '20' })).toEqual({ page: 7, pageSize: 20 });
    expect(pageFrom({ page: 'x' })).toEqual({ page: 1, pageSize: 50 });
  });
});
