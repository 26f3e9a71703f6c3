import { difference, mixingInWords, number, skillInWords } from './words';

const outcome = { lowC: null, highC: null, windMPerS: null, towerName: '', hours: 24 };

describe('forecasts in words', () => {
  it('show numbers with a real minus and differences with their sign', () => {
    expect([number(-14.26), number(null), difference(-14, -15.2), difference(-15, -14)]).toEqual([
      ...['−14.3', '–', '+1.2', '−1'],
    ]);
  });

  it('say that a mixing height is open', () => {
    expect(mixingInWords({ ...outcome, mixingAtLeastM: 60, mixingAtMostM: null })).toBe('at least 60');
    expect(mixingInWords({ ...outcome, mixingAtLeastM: null, mixingAtMostM: null })).toBe('–');
    expect(mixingInWords({ ...outcome, mixingAtLeastM: 30, mixingAtMostM: 30 })).toBe('30');
  });

  it('say how forecasts did, or that there are too few', () => {
    const few = { n: 2, meanError: null, meanAbsoluteError: null };
    const said = skillInWords({
      lowC: { n: 9, meanError: 1.21, meanAbsoluteError: 1.6 },
      highC: few,
      windMPerS: few,
      least: 5,
    });
    expect(said[0]).toBe('Lows: off by 1.6 °C on average, on the whole too high by 1.2 °C (9 days).');
    expect(said[1]).toBe('Highs: 2 of the last 30 days can be compared; 5 are needed to say anything.');
  });
});
