import { LineCutter } from './lines';

/** Rows with their numbers and the refused rows, the bytes handed over in pieces of a size. */
function cut(bytes: Buffer, size: number): { rows: [number, string][]; refused: string[] } {
  const cutter = new LineCutter();
  const rows: [number, string][] = [];
  const refused: string[] = [];
  const take = ({ lines, firstRowNo, refused: no }: ReturnType<LineCutter['push']>): void => {
    lines.forEach((line, i) => rows.push([firstRowNo + i, line]));
    refused.push(...no.map(({ code, rowNo }) => `${rowNo} ${code}`));
  };
  for (let at = 0; at < bytes.length; at += size) take(cutter.push(bytes.subarray(at, at + size)));
  take(cutter.end());
  return { rows, refused };
}

const texts: [string, string][] = [
  ['line feeds', 'time,t2\n1,2\n\n3,4\n'],
  ['no last line end', 'time,t2\n1,2'],
  ['carriage returns and line feeds', 'time,t2\r\n1,2\r\n\r\n3,4\r\n'],
  ['carriage returns', 'time,t2\r1,2\r\r3,4\r'],
  ['letters of two to four bytes', 'Zeit,Höhe °C €\n𝛤,ü\n'],
  ['mixed line ends', 'a\r\nb\nc\rd'],
];

describe('lines of a file that comes in pieces', () => {
  it.each(texts)('are the same in pieces of any size: %s', (_, text) => {
    const expected = text.split(/\r\n|\n|\r/);
    if (expected.at(-1) === '') expected.pop();
    for (const size of [1, 2, 3, 5, 7, 1000]) {
      const { rows, refused } = cut(Buffer.from(text), size);
      expect({ size, rows }).toEqual({ size, rows: expected.map((line, i) => [i + 1, line]) });
      expect(refused).toEqual([]);
    }
  });

  it('begin after the byte order mark', () => {
    for (const size of [1, 2, 100]) {
      expect(cut(Buffer.from('\ufefftime\n1\n'), size).rows[0]).toEqual([1, 'time']);
    }
  });

  it('are refused alone where they are no text', () => {
    const bytes = Buffer.concat([
      Buffer.from('time\n1\n'),
      Buffer.of(0xff, 0x0a),
      Buffer.from('3\n4\0\n5\n'),
    ]);
    for (const size of [1, 4, 7]) {
      const { rows, refused } = cut(bytes, size);
      expect(refused).toEqual(['3 line-not-text', '5 line-not-text']);
      expect(rows.filter(([, line]) => line !== '')).toEqual([
        [1, 'time'],
        [2, '1'],
        [4, '3'],
        [6, '5'],
      ]);
    }
  });

  it.each(['\n', '\r', '\r\n'])('are refused without being held where they are too long (%j)', (lineEnd) => {
    const cutter = new LineCutter();
    const before = process.memoryUsage().arrayBuffers;
    const found = [cutter.push(Buffer.from(`time,t2${lineEnd}1,2${lineEnd}`))];
    const piece = Buffer.alloc(65_536, 'x');
    for (let i = 0; i < 1_000; i += 1) found.push(cutter.push(piece));
    expect(process.memoryUsage().arrayBuffers - before).toBeLessThan(30_000_000);
    for (const text of [`y${lineEnd}`, `4,5${lineEnd}`]) found.push(cutter.push(Buffer.from(text)));
    found.push(cutter.end());
    const refused = found.flatMap((each) => each.refused);
    expect(refused.map(({ rowNo, code }) => [rowNo, code])).toEqual([[3, 'line-too-long']]);
    expect(refused[0]!.text).toContain(String(1_000 * 65_536 + 1));
    expect(found.flatMap(({ lines }) => lines)).toEqual(['time,t2', '1,2', '', '4,5']);
  });

  it.each([
    ['UTF-16', Buffer.from('\ufefftime', 'utf16le')],
    ['gzip', Buffer.of(0x1f, 0x8b, 8, 0)],
    ['NUL', Buffer.from('time\0\0')],
  ])('are not looked for in what is no text: %s', (word, bytes) => {
    expect(() => cut(bytes, 100)).toThrow(word);
  });
});
