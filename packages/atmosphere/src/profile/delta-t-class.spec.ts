import classes from '../../../../fixtures/golden/stability-classes.json';
import { deltaTClass, deltaTFinding } from '.';

describe('ΔT/Δz class of Regulatory Guide 1.23', () => {
  it.each(classes.regulatoryGuide123.rows)('%f °C/100 m is %s', (gradient, expected) => {
    expect(deltaTClass(Number(gradient))).toBe(expected);
  });
  it('is on the bound whatever the rounding of ΔT/Δz', () => {
    expect(
      deltaTFinding({ heightM: 10, temperatureC: 0 }, { heightM: 60, temperatureC: -0.95 }, null)!.class,
    ).toBe('A');
    expect(
      deltaTFinding({ heightM: 10, temperatureC: 0.3 }, { heightM: 40, temperatureC: 0.75 }, null)!.class,
    ).toBe('E');
  });
  it('says which classes a pair of σ 0.1 °C over 50 m cannot tell apart', () => {
    const found = deltaTFinding({ heightM: 10, temperatureC: 0 }, { heightM: 60, temperatureC: -0.8 }, 0.1);
    expect([found!.class, found!.possible]).toEqual(['C', ['A', 'B', 'C', 'D']]);
  });
  it('has no class without both temperatures or a separation', () => {
    expect(deltaTClass(NaN)).toBeNull();
    expect(
      deltaTFinding({ heightM: 10, temperatureC: null }, { heightM: 60, temperatureC: 1 }, 0.1),
    ).toBeNull();
    expect(deltaTFinding({ heightM: 60, temperatureC: 1 }, { heightM: 60, temperatureC: 1 }, 0.1)).toBeNull();
  });
});
