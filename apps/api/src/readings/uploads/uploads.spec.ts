import { createHash } from 'node:crypto';
import path from 'node:path';
import { mkdtemp, readFile, readdir, rm } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import ExcelJS from 'exceljs';
import { signInAs, type SignedInAgent } from '../../testing/people';
import { makeTower } from '../../testing/places';
import { createTestApp, testNow, type TestApp } from '../../testing/test-app';
import { UploadRuns } from './upload-runs.service';
import type { PreviewDto, ProposalDto } from './dto/proposal.dto';
import type { UploadDto } from './dto/upload.dto';

const STEP_S = 600;
const wall = (t: number): string => new Date(t * 1000).toISOString().slice(0, 16).replace('T', ' ');
const lines = (count: number, row: (t: number, i: number) => string): string[] =>
  Array.from({ length: count }, (_, i) => row(testNow - 86_400 + i * STEP_S, i));

describe('files that staff upload', () => {
  let test: TestApp;
  let analyst: SignedInAgent;
  let towerId: number;

  beforeAll(async () => {
    test = await createTestApp();
    analyst = await signInAs(test, 'analyst');
  });
  afterAll(() => test.close());
  beforeEach(async () => {
    ({ towerId } = await makeTower(test, { heightsM: [2, 10] }));
  });

  const send = (body: string | Buffer, name = 'mast.csv') =>
    analyst.http
      .post(`/api/uploads?towerId=${towerId}&name=${name}`)
      .set('Content-Type', 'application/octet-stream')
      .send(body as string);
  const upload = async (body: string | Buffer, name?: string): Promise<UploadDto> =>
    (await send(body, name).expect(201)).body as UploadDto;
  const propose = async (id: number): Promise<ProposalDto> =>
    (await analyst.http.get(`/api/uploads/${id}/proposal`).expect(200)).body as ProposalDto;
  const preview = async (id: number, mapping: object): Promise<PreviewDto> =>
    (await analyst.http.post(`/api/uploads/${id}/preview`).send({ mapping }).expect(200)).body as PreviewDto;
  const commit = async (id: number, mapping: object): Promise<UploadDto> => {
    await analyst.http.post(`/api/uploads/${id}/commit`).send({ mapping }).expect(202);
    await test.app.get(UploadRuns).idle();
    return (await analyst.http.get(`/api/uploads/${id}`).expect(200)).body as UploadDto;
  };
  const counts = (importId: number | null) =>
    test.sql.get(
      'SELECT new_count fresh, repeated_count repeated, refused_count refused, state FROM import WHERE id = $1',
      [importId],
    );

  it('are proposed, previewed and imported; the same file again changes nothing and is known', async () => {
    const text = [
      'Zeit;Temp 2 m (°F);Temp 10 m',
      ...lines(30, (t, i) => `${wall(t)};${i === 4 ? 'kaputt' : '14,0'};-9,5`),
    ].join('\n');
    const sent = await upload(text);
    expect(sent).toMatchObject({
      state: 'waiting',
      kind: 'text',
      sameAs: null,
      bytes: Buffer.byteLength(text),
    });
    const { mapping, from } = await propose(sent.id);
    expect(from).toBe('sample');
    expect(mapping).toMatchObject({ separator: ';', decimal: ',', units: { 'Temp 2 m (°F)': '°F' } });
    const seen = await preview(sent.id, mapping);
    expect(seen).toMatchObject({ read: 59, refused: 1, whole: true, questions: [] });
    expect(seen.rows[0]!.values).toEqual([
      { sensor: 'temperature_2m', value: -10, unit: '°C' },
      { sensor: 'temperature_10m', value: -9.5, unit: '°C' },
    ]);
    expect(seen.refusedRows[0]).toMatchObject({
      row: 6,
      column: 'Temp 2 m (°F)',
      code: 'value-not-a-number',
    });
    const done = await commit(sent.id, mapping);
    expect(done).toMatchObject({ state: 'done', bytesDone: done.bytes, fault: null });
    expect(await counts(done.importId)).toEqual({ fresh: 59, repeated: 0, refused: 1, state: 'done' });
    expect(await readdir(path.join(test.settings.dataDir, 'uploads'))).toEqual([]);

    const again = await upload(text);
    expect(again.sameAs).toMatchObject({ importId: done.importId });
    const kept = await propose(again.id);
    expect(kept).toMatchObject({ from: 'last file', mapping: { separator: ';', decimal: ',' } });
    const repeated = await commit(again.id, kept.mapping);
    expect(await counts(repeated.importId)).toEqual({ fresh: 0, repeated: 59, refused: 1, state: 'done' });
  });

  it('are kept as they came, whatever their size or way of cutting', async () => {
    const body = Buffer.alloc(300_000, 'time,t\n');
    const { id } = await upload(body);
    const kept = await readFile(path.join(test.settings.dataDir, 'uploads', String(id)));
    expect(createHash('sha256').update(kept).digest('hex')).toBe(
      createHash('sha256').update(body).digest('hex'),
    );
    await analyst.http.delete(`/api/uploads/${id}`).expect(204);
    await analyst.http.get(`/api/uploads/${id}`).expect(404);
  });

  it('ask about the hour that happens twice, and take the answer', async () => {
    const rows = ['00:50', '01:00', '01:30', '01:00', '01:30', '02:00'].map((t) => `2025-11-02 ${t},-1,-2`);
    const tower = await makeTower(test, { heightsM: [2, 10], clock: 'America/Denver' });
    towerId = tower.towerId;
    const { id } = await upload(['time,temperature_2m,temperature_10m', ...rows].join('\n'));
    const { mapping } = await propose(id);
    const open = await preview(id, mapping);
    expect(open.questions.map((question) => question.id)).toEqual(['repeated-hour']);
    expect(open.refused).toBe(4);
    const answered = await preview(id, { ...mapping, repeatedHour: 'in-order' });
    expect(answered).toMatchObject({ refused: 0, read: 12, questions: [] });
    expect(answered.rows.map(({ time }) => time.slice(11, 16))).toEqual([
      ...['06:50', '07:00', '07:30', '08:00', '08:30', '09:00'],
    ]);
  });

  it('may be spreadsheets: dates as the clock shows them, formulas by their last result, hidden sheets left alone', async () => {
    const folder = await mkdtemp(path.join(tmpdir(), 'lidwatch-sheet-'));
    const file = path.join(folder, 'a.xlsx');
    const book = new ExcelJS.Workbook();
    book.addWorksheet('secret', { state: 'hidden' }).addRow(['nothing']);
    const sheet = book.addWorksheet('Readings');
    sheet.addRow(['time', 'temperature_2m', 'temperature_10m']);
    lines(20, (t) => String(t)).forEach((t, i) => {
      const cell = i === 3 ? { formula: 'B4-1', result: -6.5 } : i === 5 ? { formula: 'B5*2' } : -5.5;
      sheet.addRow([new Date(Number(t) * 1000), cell, i === 7 ? '"bad, very"' : -2.25]);
    });
    await book.xlsx.writeFile(file);
    const sent = await upload(await readFile(file), 'a.xlsx');
    await rm(folder, { recursive: true });
    expect(sent.kind).toBe('workbook');
    const { mapping, sheets, notes } = await propose(sent.id);
    expect(sheets).toEqual(['secret', 'Readings']);
    expect(mapping).toMatchObject({ sheet: 'Readings', timeColumn: 'time' });
    expect(notes).toContain('2 cells are formulas: the results the spreadsheet last had are read.');
    const seen = await preview(sent.id, mapping);
    expect(seen.refusedRows.map(({ row, code }) => [row, code])).toEqual([
      [7, 'value-not-a-number'],
      [9, 'value-not-a-number'],
    ]);
    expect(seen.rows[3]).toMatchObject({ rowNo: 5, values: [{ value: -6.5 }, { value: -2.25 }] });
    expect(seen.rows[0]!.time).toBe(new Date((testNow - 86_400) * 1000).toISOString().replace('.000Z', 'Z'));
    expect(await commit(sent.id, mapping)).toMatchObject({ state: 'done' });
  });

  it('are read when written in another encoding, and it is said', async () => {
    const text = ['time,temperature_2m °C', ...lines(5, (t) => `${wall(t)},-9.5`)].join('\n');
    const latin = await propose((await upload(Buffer.from(text, 'latin1'))).id);
    expect(latin.columnNames).toEqual(['time', 'temperature_2m °C']);
    expect(latin.notes[0]).toMatch(/WINDOWS-1252/);
    const wide = await propose((await upload(Buffer.from(`\ufeff${text}`, 'utf16le'))).id);
    expect(wide.notes[0]).toMatch(/UTF-16LE/);
  });

  it.each([
    ['an empty file', '', 422, /empty/],
    ['a picture', Buffer.from([0x89, 0x50, 0x4e, 0x47, 0, 1, 2, 3]), 201, /NUL bytes/],
    [
      'a damaged archive',
      Buffer.concat([Buffer.from('PK\u0003\u0004'), Buffer.alloc(500, 7)]),
      201,
      /cut off or damaged/,
    ],
    ['a text without a table', 'Dear colleagues,\nthe mast is down.\nRegards', 201, /no table/],
  ])('are refused with the cure: %s', async (_, body, status, words) => {
    const answer = await send(body).expect(status);
    if (status !== 201) return expect((answer.body as { detail: string }).detail).toMatch(words);
    const { id } = answer.body as UploadDto;
    const refused = await analyst.http.get(`/api/uploads/${id}/proposal`).expect(422);
    expect((refused.body as { detail: string }).detail).toMatch(words);
  });

  it('begin once, however often it is asked for, and say what a mapping lacks', async () => {
    const { id } = await upload(['time,temperature_2m', ...lines(5, (t) => `${wall(t)},-9.5`)].join('\n'));
    const { mapping } = await propose(id);
    const wrong = { ...mapping, columns: { temperature_2m: 'no such' }, units: { temperature_2m: 'mph' } };
    const refused = await analyst.http.post(`/api/uploads/${id}/commit`).send({ mapping: wrong }).expect(422);
    expect((refused.body as { errors: { field: string }[] }).errors[0]!.field).toBe(
      'mapping.columns.temperature_2m',
    );
    const both = await Promise.all(
      [1, 2].map(() => analyst.http.post(`/api/uploads/${id}/commit`).send({ mapping })),
    );
    expect(both.map(({ status }) => status).sort()).toEqual([202, 409]);
    await test.app.get(UploadRuns).idle();
  });
});
