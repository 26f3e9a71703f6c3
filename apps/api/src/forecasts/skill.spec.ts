import { skillOf, type Pair } from './skill';

describe('how forecasts did', () => {
  it('is the mean error and the mean absolute error', () => {
    const pairs: Pair[] = [
      [-10, -12],
      [-8, -7],
      [-5, -5],
      [-3, -6],
      [0, -2],
    ];
    expect(skillOf(pairs)).toEqual({ n: 5, meanError: 1.2, meanAbsoluteError: 1.6 });
  });

  it('is not said for too few', () => {
    expect(skillOf([[1, 0]])).toEqual({ n: 1, meanError: null, meanAbsoluteError: null });
  });
});
