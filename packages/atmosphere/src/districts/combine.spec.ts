import { atLeast, exactly, type Quantity } from '../bounds';
import { combineTowers, isFresh, type Combination, type TowerAnswer } from '.';

const t = 100000;
const tower = (towerId: string, value: Quantity, ageS: number | null = 0): TowerAnswer => ({
  towerId,
  newestBlockEnd: ageS === null ? null : t - ageS,
  intervalS: 300,
  value,
});

describe('freshness', () => {
  it.each([
    [0, 300, true],
    [2699, 300, true],
    [2700, 300, false],
    [8999, 3600, true],
    [9000, 3600, false],
    [-1, 300, false],
  ])('a block %i s old of a tower at %i s is fresh: %s', (ageS, intervalS, expected) => {
    expect(isFresh(t - ageS, intervalS, t)).toBe(expected);
  });
  it('no block is not fresh', () => expect(isFresh(null, 300, t)).toBe(false));
});

describe('combineTowers', () => {
  const [a, b, silent] = [tower('a', exactly(1)), tower('b', atLeast(3)), tower('c', exactly(9), 5000)];
  it.each<[Combination, TowerAnswer[], number[], string[]]>([
    ['first that is fresh', [silent!, a!, b!], [1, 1], ['a']],
    ['any', [a!, b!], [3, Infinity], ['a', 'b']],
    ['all', [a!, b!], [1, 1], ['a', 'b']],
    ['median', [a!, b!, silent!], [1, Infinity], ['a', 'b']],
    ['all', [a!, silent!], [-Infinity, 1], ['a']],
    ['any', [silent!], [-Infinity, Infinity], []],
    ['first that is fresh', [silent!], [-Infinity, Infinity], []],
  ])('%s of %#', (combination, towers, expected, spoke) => {
    const answer = combineTowers(towers, combination, t);
    expect([answer.value.lo, answer.value.hi]).toEqual(expected);
    expect(answer.spoke).toEqual(spoke);
    expect(answer.silent).toEqual(towers.filter((x) => x === silent).map(() => 'c'));
  });
});
