import golden from '../../../../fixtures/golden/mixing.json';
import { atLeast, between, exactly, isNotKnown, notKnown, type Quantity } from '../bounds';
import { findInversions } from '../inversions';
import { profileOf } from '../testing/profiles';
import {
  breakUpTemperatureC,
  extraterrestrialFluxWPerM2,
  fogNotes,
  heatDeficitJPerM2,
  heatingNeededWPerM2,
  heatingRateWPerM2,
  mixingHeightM,
  sunCanMatter,
  timeToBreakUpHours,
  ventilationBands,
  ventilationIndexM2PerS,
} from '.';

const ends = (q: Quantity) => [q.lo, q.hi];
const worked = profileOf([0, 30, 100], [-20, -17, -16], 0.1, { pressureHPa: 990 });

describe('heat deficit', () => {
  it.each(golden.heatDeficit.rows)('$name', ({ z_m, T_C, p0_hPa, Q_theta_J_m2 }) => {
    const heat = heatDeficitJPerM2(profileOf(z_m, T_C, undefined, { pressureHPa: p0_hPa })).lo;
    const tolerance = Math.max(1, golden.heatDeficit.relativeTolerance * Q_theta_J_m2);
    expect(Math.abs(heat - Q_theta_J_m2)).toBeLessThanOrEqual(tolerance);
  });
  it('of the worked case is at least 0.216 MJ/m², its break-up temperature at least −15.02 °C', () => {
    const heat = heatDeficitJPerM2(worked);
    expect((heat.lo / 1e6).toFixed(3)).toBe('0.216');
    const temperature = breakUpTemperatureC(findInversions(worked).surface);
    expect(temperature.lo.toFixed(2)).toBe('-15.02');
    expect([heat.hi, temperature.hi]).toEqual([Infinity, Infinity]);
  });
  it('is a number when the inversion is closed, and negative when the column is unstable', () => {
    const closed = heatDeficitJPerM2(profileOf([2, 30, 100], [-20, -17, -17.3]));
    expect(closed.lo).toBe(closed.hi);
    expect(heatDeficitJPerM2(profileOf([2, 100], [10, 8])).hi).toBeLessThan(0);
  });
  it('to a height between levels is that of the interpolated level', () => {
    const straight = profileOf([0, 100], [0, 5], undefined, { pressureHPa: 1000 });
    const refined = profileOf([0, 50], [0, 2.5], undefined, { pressureHPa: 1000 });
    expect(heatDeficitJPerM2(straight, 50).lo).toBeCloseTo(heatDeficitJPerM2(refined).lo, 6);
  });
  it.each<[string, (number | null)[], number | undefined, 'at least' | 'not known']>([
    ['lowest missing', [null, 1, 2], undefined, 'not known'],
    ['a level missing', [0, 2, null], undefined, 'at least'],
    ['above the tower', [0, 2, 1], 200, 'at least'],
    ['below the second level', [0, null, 2], 100, 'not known'],
    ['nothing', [null, null, null], undefined, 'not known'],
  ])('%s', (_, temperatures, h, expected) => {
    const heat = heatDeficitJPerM2(profileOf([2, 30, 100], temperatures), h);
    expect([isNotKnown(heat), heat.hi]).toEqual([expected === 'not known', Infinity]);
    expect(heat.reason).toBeTruthy();
  });
  it('of an empty profile is not known', () => {
    expect(isNotKnown(heatDeficitJPerM2(profileOf([], [])))).toBe(true);
  });
});

describe('break-up temperature', () => {
  it('is a number when the inversion is closed', () => {
    const { surface } = findInversions(profileOf([0, 100, 200], [0, 2, 0], 0.1));
    expect(breakUpTemperatureC(surface).lo).toBeCloseTo(2.976, 3);
    expect(breakUpTemperatureC(surface).hi).toBe(breakUpTemperatureC(surface).lo);
  });
  it('is not known without an inversion, or when that is not known', () => {
    expect(breakUpTemperatureC(findInversions(profileOf([0, 100], [2, 0])).surface).reason).toContain(
      'no surface inversion',
    );
    expect(breakUpTemperatureC(findInversions(profileOf([0, 100], [null, 0])).surface).reason).toContain(
      'gave nothing',
    );
  });
});

describe('mixing height', () => {
  const { profile, rows, absoluteToleranceM } = golden.parcelMethod;
  it.each(rows)('for $t_surface_C °C', ({ t_surface_C, mixing_height_m }) => {
    const height = mixingHeightM(profileOf(profile.z_m, profile.T_C), t_surface_C);
    if (mixing_height_m === null) expect(ends(height)).toEqual([1500, Infinity]);
    else
      expect(Math.abs(height.lo - mixing_height_m) + height.hi - height.lo).toBeLessThan(absoluteToleranceM);
  });
  it.each<[string, number[], (number | null)[], number | Quantity, number[]]>([
    ['now, under an inversion', [2, 10, 30], [0, 1, 2], 0, [0, 0]],
    ['neutral air to the top', [0, 100], [10, 10 - 0.9761103], 10, [100, Infinity]],
    ['a level missing on the way', [2, 10, 30], [0, null, 5], 1, [2, 30]],
    ['the lowest missing', [2, 10, 30], [null, 2, 5], 1, [0, 10]],
    ['a missing level may hide a lower crossing', [2, 10, 30, 60], [0, null, -3, 5], 1, [2, 43.5]],
    ['at most so warm', [2, 30], [0, 0], { lo: -Infinity, hi: -1 }, [0, 0]],
  ])('%s', (_, heights, temperatures, surface, [lo, hi]) => {
    const height = mixingHeightM(profileOf(heights, temperatures), surface);
    expect(height.lo).toBeCloseTo(lo!, 0);
    expect(Math.abs(height.hi - hi!) < 0.05 || height.hi === hi).toBe(true);
  });
  it('of a range of temperatures is a range', () => {
    expect(
      ends(mixingHeightM(profileOf([0, 100], [0, 10]), between(1, 2))).map((m) => Math.round(m * 10) / 10),
    ).toEqual([9.1, 18.2]);
  });
  it('is not known without a temperature or a profile', () => {
    expect(mixingHeightM(worked, notKnown('no forecast')).reason).toBe('no forecast');
    expect(isNotKnown(mixingHeightM(profileOf([2], [1]), 5))).toBe(true);
  });
});

describe('ventilation', () => {
  it.each(golden.ventilation.rows)('$mixing_height_m m × $wind_m_s m/s', (row) => {
    expect(ventilationIndexM2PerS(exactly(row.mixing_height_m), exactly(row.wind_m_s))).toEqual(
      exactly(row.ventilation_m2_s),
    );
  });
  it('of a lid above the tower is at least, and in calm air 0', () => {
    expect(ends(ventilationIndexM2PerS(atLeast(60), exactly(2)))).toEqual([120, Infinity]);
    expect(ends(ventilationIndexM2PerS(atLeast(60), exactly(0)))).toEqual([0, 0]);
    expect(ends(ventilationIndexM2PerS(notKnown('silent'), exactly(2)))).toEqual([0, Infinity]);
  });
  it('names every band it may lie in', () => {
    const bands = [
      { name: 'good', fromM2PerS: 6000 },
      { name: 'poor', fromM2PerS: 0 },
      { name: 'fair', fromM2PerS: 2350 },
    ];
    expect(ventilationBands(exactly(2350), bands)).toEqual(['fair']);
    expect(ventilationBands(between(100, 2350), bands)).toEqual(['poor', 'fair']);
    expect(ventilationBands(atLeast(3000), bands)).toEqual(['fair', 'good']);
  });
});

describe('time to break-up', () => {
  it('is heat over heating rate: 281,744 J/m² at 30 W/m² is 2.6 h', () => {
    expect(timeToBreakUpHours(exactly(281744), exactly(30)).lo).toBeCloseTo(2.6, 1);
  });
  it.each<[string, Quantity, Quantity, number[]]>([
    ['a range of rates', exactly(360000), between(50, 100), [1, 2]],
    ['a rate that may cease', exactly(360000), between(-10, 100), [1, Infinity]],
    ['an open deficit', atLeast(360000), exactly(100), [1, Infinity]],
    ['nothing to heat', exactly(-5), exactly(10), [0, 0]],
    ['no heating', exactly(360000), exactly(0), [-Infinity, Infinity]],
    ['deficit not known', notKnown('silent'), exactly(10), [-Infinity, Infinity]],
    ['rate not known', exactly(1), notKnown('night'), [-Infinity, Infinity]],
  ])('%s', (_, heat, rate, expected) => {
    expect(ends(timeToBreakUpHours(heat, rate))).toEqual(expected);
  });
  it('takes the rate from the fall of the deficit, slowest to fastest', () => {
    const at = (tEnd: number, heat: Quantity) => ({ tEnd, heatDeficitJPerM2: heat });
    const seen = [at(7200, exactly(100000)), at(0, atLeast(400000)), at(3600, exactly(300000))];
    expect(ends(heatingRateWPerM2(seen)).map((w) => Math.round(w * 10) / 10)).toEqual([27.8, 55.6]);
    expect(isNotKnown(heatingRateWPerM2([at(0, exactly(1)), at(0, exactly(2))]))).toBe(true);
    expect(isNotKnown(heatingNeededWPerM2(exactly(1), 0))).toBe(true);
    expect(heatingNeededWPerM2(exactly(360000), 2)).toEqual(exactly(50));
  });
});

describe('sun', () => {
  it('at 1.7° gives 41 W/m² at most, and does not matter', () => {
    expect(Math.abs(extraterrestrialFluxWPerM2(1.7) - 41)).toBeLessThan(1);
    expect(extraterrestrialFluxWPerM2(-5)).toBe(0);
    expect([sunCanMatter(1.7), sunCanMatter(20), sunCanMatter(null)]).toEqual(['false', 'true', 'not known']);
  });
});

describe('fog notes', () => {
  it.each([
    [5, 99, false, ['near saturation over water']],
    [-5, 99, false, ['near saturation over water', 'freezing fog or rime possible']],
    [-5, 80, false, []],
    [-35, 71, true, ['ice fog possible']],
    [-35, 71, false, []],
  ])('%f °C, %f %%', (temperatureC, humidity, iceFog, expected) => {
    expect(fogNotes(temperatureC, humidity, 0, { iceFog })).toEqual(expected);
  });
  it('says nothing, not "no fog", without a reading', () => {
    expect([fogNotes(null, 99), fogNotes(-5, null), fogNotes(NaN, 99)]).toEqual([null, null, null]);
  });
});
