import { exactly, notKnown } from '../bounds';
import { isInSector, upperWarmedFirst, warmWindBreakUp, type WarmWindSigns } from '.';

const chinook: WarmWindSigns = {
  warmingCPerHour: exactly(4),
  humidityFallPercentPerHour: exactly(20),
  windMPerS: exactly(9),
  windFromDeg: 200,
  sector: { fromDeg: 160, toDeg: 240 },
  upperWarmedFirst: 'false',
};

describe('warm-wind break-up', () => {
  it.each<[string, Partial<WarmWindSigns>, string]>([
    ['all signs', {}, 'true'],
    ['on the limits', { warmingCPerHour: exactly(1), humidityFallPercentPerHour: exactly(5) }, 'true'],
    ['wind on its limit', { windMPerS: exactly(5) }, 'false'],
    ['calm, but the upper level warmed first', { windMPerS: exactly(1), upperWarmedFirst: 'true' }, 'true'],
    ['from elsewhere', { windFromDeg: 20 }, 'false'],
    ['no declared sector', { sector: null, windFromDeg: null }, 'true'],
    ['direction missing', { windFromDeg: null }, 'not known'],
    ['humidity missing', { humidityFallPercentPerHour: notKnown('silent') }, 'not known'],
    [
      'not warming, humidity missing',
      { warmingCPerHour: exactly(0), humidityFallPercentPerHour: notKnown('silent') },
      'false',
    ],
  ])('%s', (_, changed, expected) => {
    expect(warmWindBreakUp({ ...chinook, ...changed })).toBe(expected);
  });

  it.each([
    [350, 330, 30, true],
    [10, 330, 30, true],
    [180, 330, 30, false],
    [30, 330, 30, true],
    [90, 0, 360, true],
    [-10, 330, 30, true],
    [NaN, 330, 30, false],
  ])('a wind from %f° and the sector %f to %f°', (wind, fromDeg, toDeg, expected) => {
    expect(isInSector(wind, { fromDeg, toDeg })).toBe(expected);
  });
});

describe('upper level first', () => {
  const series = (...temperatures: (number | null)[]) =>
    temperatures.map((temperatureC, i) => ({ tEnd: i * 900, temperatureC }));
  it.each([
    ['upper earlier', series(0, 0, 2), series(0, 2, 4), 'true'],
    ['both at once', series(0, 2, 2), series(0, 2, 4), 'false'],
    ['only the upper', series(0, 0, 0), series(0, 0, 1), 'true'],
    ['neither', series(0, 0, 0), series(0, 0, 0), 'false'],
    ['upper silent', series(0, 1, 2), series(null, null), 'not known'],
  ])('%s', (_, lower, upper, expected) => {
    expect(upperWarmedFirst(lower, upper)).toBe(expected);
    expect(upperWarmedFirst([...lower].reverse(), [...upper].reverse())).toBe(expected);
  });
});
