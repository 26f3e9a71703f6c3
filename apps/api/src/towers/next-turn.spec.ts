import { waitUntilNextTurnS } from './next-turn';

describe("a source's wait for its next turn", () => {
  it.each([
    [60, 0, {}, 60],
    [60, 1, {}, 120],
    [60, 3, {}, 480],
    [60, 4, {}, 900],
    [60, 400, {}, 900],
    [10, 6, {}, 640],
    [86_400, 0, {}, 86_400],
    [86_400, 1, {}, 900],
    [60, 40, { notThereYet: true }, 60],
    [10, 40, { notThereYet: true }, 10],
    [3600, 1, { notThereYet: true }, 60],
    [60, 1, { retryAfterS: 600 }, 600],
    [60, 1, { retryAfterS: 7200 }, 900],
  ])('of %d s after %d failures, %j, is %d s', (intervalS, failures, how, waitS) => {
    expect(waitUntilNextTurnS(intervalS, failures, how)).toBe(waitS);
  });
});
