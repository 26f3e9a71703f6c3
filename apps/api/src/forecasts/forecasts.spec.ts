import { DistrictFindingsService } from '../rules/findings/district-findings.service';
import { signInAs, type SignedInAgent } from '../testing/people';
import { createTestApp, testNow, type TestApp } from '../testing/test-app';
import { BLOCK_S, inversion, makeValley, type Valley } from '../testing/valley';
import type { ForecastDto, ForecastSkillDto, ForecastTableResultDto } from './dto/forecast.dto';
import { ForecastsService } from './forecasts.service';
import { OutcomesService } from './outcomes.service';

/** 15 January 2026, 18:00 in the district: the night of the 15th, the day of the 16th. */
const DAY = '2026-01-15';

describe("a day's forecast", () => {
  let test: TestApp;
  let analyst: SignedInAgent;
  let valley: Valley;

  beforeEach(async () => {
    test = await createTestApp();
    analyst = await signInAs(test, 'analyst');
    valley = await makeValley(test);
  });
  afterEach(() => test.close());

  const enter = (says: object, status = 201) =>
    analyst.http
      .post('/api/forecasts')
      .send({ districtId: valley.districtId, day: DAY, ...says })
      .expect(status);
  const list = async (): Promise<ForecastDto[]> =>
    (
      await analyst.http
        .get(`/api/forecasts?districtId=${valley.districtId}&from=2026-01-01&to=2026-01-31`)
        .expect(200)
    ).body as ForecastDto[];
  async function block(strengthC = 3): Promise<Record<string, unknown>> {
    const t = test.clock.now();
    await valley.give(0, t, inversion(strengthC, t));
    await valley.settle();
    const { values } = (await test.app.get(DistrictFindingsService).latest(valley.districtId))!;
    return values as Record<string, unknown>;
  }

  it('reaches the rules from when it was entered on, and not before', async () => {
    const before = await block();
    expect(before['forecastLowC']).toMatchObject({ reason: 'no forecast has been entered' });
    await enter({ lowC: -14, windMPerS: 1.5, highC: 2, mixingHeightM: 400 });
    test.clock.advance(BLOCK_S);
    const after = await block();
    expect(after).toMatchObject({
      forecastLowC: { lo: -14, hi: -14 },
      forecastWindMPerS: { lo: 1.5, hi: 1.5 },
      forecastHighC: { lo: 2, hi: 2 },
      forecastMixingHeightM: { lo: 400, hi: 400 },
      // At 2 °C the parcel is warmer than the whole mast: its mixing height is at least the tower's top.
      mixingHeightM: { lo: 60, hi: Infinity },
      ventilationIndexM2PerS: { lo: 90, hi: Infinity },
    });
    const rows = await test.sql.all<{ measures: string }>(
      'SELECT measures FROM district_block WHERE district_id = $1 ORDER BY t_end',
      [valley.districtId],
    );
    expect(rows.map(({ measures }) => 'forecastLowC' in (JSON.parse(measures) as object))).toEqual([
      false,
      true,
    ]);
  });

  it('is not known once its night and its day are over', async () => {
    await enter({ lowC: -14, highC: 2 });
    test.clock.advance(18 * 3600);
    const noon = await block();
    expect(noon['forecastLowC']).toMatchObject({ reason: 'no forecast has been entered' });
    expect(noon['forecastHighC']).toEqual({ lo: 2, hi: 2 });
    test.clock.advance(6 * 3600);
    expect((await block())['forecastHighC']).toMatchObject({ reason: 'no forecast has been entered' });
  });

  it('is replaced by a newer entry, which may say less, and the former is kept', async () => {
    await enter({ lowC: -14, windMPerS: 2 });
    test.clock.advance(BLOCK_S);
    await enter({ lowC: -11, note: 'cloud later' });
    expect((await list())[0]).toMatchObject({
      day: DAY,
      lowC: -11,
      windMPerS: null,
      entries: 2,
      by: analyst.name,
    });
    expect(await block()).toMatchObject({
      forecastLowC: { lo: -11, hi: -11 },
      forecastWindMPerS: { reason: 'the forecast does not say' },
    });
  });

  it.each([
    [{}, 'lowC', /at least one/],
    [{ day: '2026-02-30', lowC: 1 }, 'day', /is no day/],
    [{ day: '2027-01-15', lowC: 1 }, 'day', /more than 10 days ahead/],
    [{ lowC: 30, highC: -5 }, 'lowC', /exchanged/],
    [{ cloudPercent: 120 }, 'cloudPercent', /100/],
  ])('is refused with the cure: %j', async (says, field, words) => {
    const { body } = await enter(says, 422);
    const [error] = (body as { errors: { field: string; text: string }[] }).errors;
    expect(error).toMatchObject({ field, text: expect.stringMatching(words) });
  });

  it('comes from tables, too: bad rows are refused one by one, and the same table again enters nothing', async () => {
    const text = [
      'district,day,low_c,high_c,wind_m_per_s,cloud_percent,mixing_height_m,note',
      'Mill Flats,2026-01-15,-14,2,1.5,10,400,"calm, clear"',
      'Mill Flats,2026-01-16,minus 3,,,,,',
      'Elsewhere,2026-01-16,-3,,,,,',
      '',
      'mill flats,16/01/2026,-3,,,,,',
      'Mill Flats,2026-01-16,-9.5,,,,,',
    ].join('\n');
    const send = async (): Promise<ForecastTableResultDto> =>
      (await analyst.http.post('/api/forecasts/table').send({ text }).expect(200))
        .body as ForecastTableResultDto;
    const first = await send();
    expect(first).toMatchObject({ taken: 2, repeated: 0 });
    expect(first.refused.map(({ row, text: why }) => [row, why.replace(/;.*/, '')])).toEqual([
      [3, 'Row 3, column "low_c": "minus 3" is no number from -80 to 60'],
      [4, 'Row 4, column "district": there is no district "Elsewhere"'],
      [6, 'Row 6, column "day": "16/01/2026" is no day'],
    ]);
    expect(await send()).toMatchObject({ taken: 0, repeated: 2 });
    const wrong = await analyst.http
      .post('/api/forecasts/table')
      .send({ text: 'day,low\n2026-01-15,-3' })
      .expect(422);
    expect((wrong.body as { errors: { text: string }[] }).errors[0]!.text).toMatch(/lacks district/);
  });

  it('is held beside what the night and the day turned out to be, and how such forecasts did is said', async () => {
    await enter({ lowC: -14, windMPerS: 2, highC: 3 });
    const from = testNow - 6 * 3600;
    for (let t = from + BLOCK_S; t <= from + 36 * 3600; t += BLOCK_S) {
      const hour = (t - from) / 3600;
      const ground = hour < 24 ? -5 - 10 * Math.sin((Math.PI * hour) / 24) : 4 - Math.abs(hour - 27) / 3;
      await valley.give(
        0,
        t,
        [0, 1, 2, 3].map((step) => ground + step),
      );
    }
    test.clock.advance(40 * 3600);
    analyst = await signInAs(test, 'analyst');
    await valley.settle();
    expect(await test.app.get(OutcomesService).keepAll()).toBe('1 days');
    const [forecast] = await list();
    expect(forecast!.outcome).toMatchObject({ windMPerS: null, hours: 24 });
    expect(forecast!.outcome!.lowC).toBeCloseTo(-15, 1);
    expect(forecast!.outcome!.highC).toBeCloseTo(4, 1);
    expect(forecast!.outcome!.mixingAtLeastM).toBe(60);
    expect(forecast!.outcome!.mixingAtMostM).toBeNull();
    const { body } = await analyst.http
      .get(`/api/forecasts/skill?districtId=${valley.districtId}`)
      .expect(200);
    expect(body as ForecastSkillDto).toMatchObject({
      lowC: { n: 1, meanError: null },
      windMPerS: { n: 0 },
      least: 5,
    });
  });

  it('is entered by analysts alone', async () => {
    const officer = await signInAs(test, 'officer', { districts: [valley.districtId] });
    await officer.http
      .post('/api/forecasts')
      .send({ districtId: valley.districtId, day: DAY, lowC: 1 })
      .expect(403);
    await test.app
      .get(ForecastsService)
      .enter({ districtId: valley.districtId, day: DAY, lowC: -3 }, null, 'demo');
    expect((await list())[0]).toMatchObject({ origin: 'demo', by: null });
  });
});
