import { signInAs, type SignedInAgent } from '../../testing/people';
import { makeTower } from '../../testing/places';
import { createTestApp, testNow, type TestApp } from '../../testing/test-app';
import { ReadingsService } from '../readings.service';
import type { PreviewDto } from './dto/proposal.dto';

const STEP_S = 600;
const BEGIN = testNow - 4 * 86_400;
/** Two levels of cold air that differ by 4 °C, with a daily cycle. */
const groundC = (t: number): number => -6 + 4 * Math.sin((t / 86_400) * 2 * Math.PI);

describe('a file beside the readings that its tower has', () => {
  let test: TestApp;
  let analyst: SignedInAgent;
  let mast: { towerId: number; sensorIds: number[] };

  beforeAll(async () => {
    test = await createTestApp();
    analyst = await signInAs(test, 'analyst');
    mast = await makeTower(test, { heightsM: [2, 10] });
    const rows = Array.from({ length: 300 }, (_, i) => BEGIN + i * STEP_S).flatMap((tEnd, i) =>
      mast.sensorIds.map((sensorId, level) => ({
        sensorId,
        tEnd,
        value: groundC(tEnd) + 4 * level,
        rowNo: i + 2,
      })),
    );
    await test.app.get(ReadingsService).ingest(mast.towerId, rows, { origin: 'push', name: 'before' });
  });
  afterAll(() => test.close());

  async function warnings(from: number, row: (t: number) => [number, number]): Promise<string[]> {
    const lines = Array.from({ length: 150 }, (_, i) => from + i * STEP_S).map((t) => {
      const [low, high] = row(t);
      return `${new Date(t * 1000).toISOString()},${low.toFixed(2)},${high.toFixed(2)}`;
    });
    const text = ['time,temperature_2m,temperature_10m', ...lines].join('\n');
    const { body: sent } = await analyst.http
      .post(`/api/uploads?towerId=${mast.towerId}&name=a.csv`)
      .set('Content-Type', 'application/octet-stream')
      .send(text)
      .expect(201);
    const id = (sent as { id: number }).id;
    const { body: proposal } = await analyst.http.get(`/api/uploads/${id}/proposal`).expect(200);
    const { mapping } = proposal as { mapping: object };
    const { body } = await analyst.http.post(`/api/uploads/${id}/preview`).send({ mapping }).expect(200);
    return (body as PreviewDto).warnings;
  }
  const toF = (c: number): number => (c * 9) / 5 + 32;

  it('is not warned of where it says the same, or goes on like it', async () => {
    expect(await warnings(BEGIN, (t) => [groundC(t), groundC(t) + 4])).toEqual([]);
    expect(await warnings(BEGIN + 310 * STEP_S, (t) => [groundC(t) + 2, groundC(t) + 6])).toEqual([]);
  });

  it('is warned of where its columns are exchanged', async () => {
    const found = await warnings(BEGIN, (t) => [groundC(t) + 4, groundC(t)]);
    expect(found).toHaveLength(2);
    expect(found[0]).toMatch(
      /^temperature_2m: .*most differ, by 4 °C on average. Look whether columns are exchanged/,
    );
  });

  it('is warned of where °F are taken for °C, for the same times and for later ones', async () => {
    const row = (t: number): [number, number] => [toF(groundC(t)), toF(groundC(t) + 4)];
    expect((await warnings(BEGIN, row))[0]).toMatch(/the unit is another/);
    expect((await warnings(BEGIN + 310 * STEP_S, row))[0]).toMatch(/As °F it would fit/);
  });
});
