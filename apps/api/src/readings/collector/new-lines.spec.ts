import { appendFileSync, mkdtempSync, renameSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import path from 'node:path';
import { newLines, type FilePosition } from './new-lines';

describe('new lines of a file that a logger writes', () => {
  let folder: string;
  let file: string;
  beforeEach(() => {
    folder = mkdtempSync(path.join(tmpdir(), 'lidwatch-lines-'));
    file = path.join(folder, 'mast.csv');
    writeFileSync(file, 'time,t2\n05:00,-9.5\n');
  });
  afterEach(() => rmSync(folder, { recursive: true }));

  /** Reads on; gives the text, whether it began anew, and how far the file is read now. */
  async function read(known?: FilePosition): Promise<{ text?: string; anew?: boolean; after: FilePosition }> {
    const found = await newLines(file, known);
    return { text: found?.bytes.toString(), anew: found?.anew, after: found?.after ?? known! };
  }

  it('are all of it at first, then what was added, with the header before it', async () => {
    const first = await read();
    expect(first.text).toBe('time,t2\n05:00,-9.5\n');
    appendFileSync(file, '05:10,-9.6\n');
    const second = await newLines(file, first.after);
    expect(second?.bytes.toString()).toBe('time,t2\n05:10,-9.6\n');
    expect(second?.headerRowNo).toBe(2);
    expect((await read(second!.after)).text).toBeUndefined();
  });

  it('leave half a line for the next time', async () => {
    const first = await read();
    appendFileSync(file, '05:10,-9');
    expect((await read(first.after)).text).toBeUndefined();
    appendFileSync(file, '.6\n05:2');
    const second = await newLines(file, first.after);
    expect(second?.bytes.toString()).toBe('time,t2\n05:10,-9.6\n');
    expect(second?.unfinished).toBe(true);
  });

  it('begin anew where the file was cut off', async () => {
    const { after } = await read();
    writeFileSync(file, 'time,t2\n');
    expect(await read(after)).toMatchObject({ text: 'time,t2\n', anew: true });
  });

  it('begin anew where another file took its name, even a longer one', async () => {
    const { after } = await read();
    const other = path.join(folder, 'other');
    writeFileSync(other, 'time,t2,t10\n06:00,-8.5,-7\n06:10,-8.4,-7\n');
    renameSync(other, file);
    expect(await read(after)).toMatchObject({ anew: true, after: { header: 'time,t2,t10\n', rowNo: 3 } });
  });
});
