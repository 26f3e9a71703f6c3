import { appendFileSync, mkdtempSync, renameSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import path from 'node:path';
import { newLines, type NewLines } from './new-lines';

describe('new lines of a file that a logger writes', () => {
  let folder: string;
  let file: string;
  beforeEach(() => {
    folder = mkdtempSync(path.join(tmpdir(), 'lidwatch-lines-'));
    file = path.join(folder, 'mast.csv');
    writeFileSync(file, 'time,t2\n05:00,-9.5\n');
  });
  afterEach(() => rmSync(folder, { recursive: true }));

  const told = ({ header, lines, firstRowNo, unfinished }: NewLines): unknown[] => [
    header,
    lines.toString(),
    firstRowNo,
    unfinished,
  ];

  it('are all of it at first, then what was added, with the header beside it', async () => {
    const first = await newLines(file, undefined);
    expect(told(first)).toEqual(['', 'time,t2\n05:00,-9.5\n', 1, false]);
    appendFileSync(file, '05:10,-9.6\n');
    const second = await newLines(file, first.after);
    expect(told(second)).toEqual(['time,t2\n', '05:10,-9.6\n', 3, false]);
    expect(told(await newLines(file, second.after))).toEqual(['time,t2\n', '', 4, false]);
  });

  it('leave half a line for the next time', async () => {
    const { after } = await newLines(file, undefined);
    appendFileSync(file, '05:10,-9');
    expect(told(await newLines(file, after))).toEqual(['time,t2\n', '', 3, true]);
    appendFileSync(file, '.6\n05:2');
    expect(told(await newLines(file, after))).toEqual(['time,t2\n', '05:10,-9.6\n', 3, true]);
  });

  it('may include a last line without its end; what grows on it later is read anew', async () => {
    appendFileSync(file, '05:10,-9');
    const first = await newLines(file, undefined, { takeUnfinished: true });
    expect(told(first)).toEqual(['', 'time,t2\n05:00,-9.5\n05:10,-9', 1, false]);
    appendFileSync(file, '\n05:20,-8\n');
    expect(told(await newLines(file, first.after))).toEqual(['time,t2\n', '\n05:20,-8\n', 3, false]);
    writeFileSync(file, 'time,t2\n05:00,-9.5\n05:10,-9.6\n');
    expect(told(await newLines(file, first.after))[2]).toBe(1);
  });

  it('begin anew where the file was cut off', async () => {
    const { after } = await newLines(file, undefined);
    writeFileSync(file, 'time,t2\n');
    expect(told(await newLines(file, after))).toEqual(['', 'time,t2\n', 1, false]);
  });

  it('begin anew where another file took its name, even a longer one', async () => {
    const { after } = await newLines(file, undefined);
    const other = path.join(folder, 'other');
    writeFileSync(other, 'time,t2,t10\n06:00,-8.5,-7\n06:10,-8.4,-7\n');
    renameSync(other, file);
    const anew = await newLines(file, after);
    expect(anew).toMatchObject({ firstRowNo: 1, after: { header: 'time,t2,t10\n', rowNo: 3 } });
  });

  it.each([false, true])(
    'begin anew where a window moved on under the same long header (whole: %p)',
    async (whole) => {
      const header = `time,${'t'.repeat(5000)}\n`;
      const window = (from: number) => header + [0, 1, 2].map((i) => `0${from + i}:00,-9.5\n`).join('');
      writeFileSync(file, window(1));
      const { after } = await newLines(file, undefined, { whole, inode: 0 });
      writeFileSync(file, `${window(2)}06:00,-9\n`);
      expect((await newLines(file, after, { whole, inode: 0 })).firstRowNo).toBe(1);
    },
  );

  it('are seen as other ones by a change in the middle, when all of it is compared', async () => {
    const text = `time,t2\n${'05:00,-9.5\n'.repeat(2000)}`;
    writeFileSync(file, text);
    const { after } = await newLines(file, undefined, { whole: true });
    writeFileSync(file, `${text.slice(0, 10_000)}7${text.slice(10_001)}06:00,1\n`);
    expect((await newLines(file, after, { whole: true })).firstRowNo).toBe(1);
  });

  it('come after as many header lines as the layout has', async () => {
    writeFileSync(file, 'Mast 3\nserial 17\ntime,t2\n05:00,-9\n');
    const { after } = await newLines(file, undefined, { headerRow: 3 });
    expect(after.header).toBe('Mast 3\nserial 17\ntime,t2\n');
    expect((await newLines(file, undefined, { headerRow: 0 })).after.header).toBe('');
    await expect(newLines(file, undefined, { headerRow: 9 })).rejects.toThrow(
      'It ends after 4 lines; its header is looked for in row 9.',
    );
    writeFileSync(file, '\n\r\ntime,t2\n05:00,-9\n');
    expect((await newLines(file, undefined)).after.header).toBe('\n\r\ntime,t2\n');
  });

  it('are not looked for in a line of many megabytes', async () => {
    writeFileSync(file, 'x'.repeat(17_000_000));
    await expect(newLines(file, undefined)).rejects.toThrow('A line is longer than 8 MB');
  });
});
