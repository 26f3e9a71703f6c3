import { checkNames, qualityCodes, qualityName } from './quality-codes';

describe('quality codes', () => {
  it('have names both ways', () => {
    for (const [name, code] of Object.entries(qualityCodes)) expect(qualityName(code)).toBe(name);
    expect(() => qualityName(9)).toThrow('9 is no quality code');
  });

  it('name the checks in a number', () => {
    expect(checkNames(0)).toEqual([]);
    expect(checkNames(1 | 8)).toEqual(['range', 'persistence']);
  });
});
