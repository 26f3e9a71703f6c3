import fc from 'fast-check';
import * as units from '.';

const pairs: [string, (x: number) => number, (x: number) => number][] = [
  ['kelvin', units.kelvinFromCelsius, units.celsiusFromKelvin],
  ['Fahrenheit', units.fahrenheitFromCelsius, units.celsiusFromFahrenheit],
  ['Fahrenheit differences', units.fahrenheitDifferenceFromCelsius, units.celsiusDifferenceFromFahrenheit],
  ['gradient', units.gradientCPer100MFromLapseRate, units.lapseRateKPerKmFromGradient],
  ['pascal', units.paFromHPa, units.hPaFromPa],
  ['feet', units.feetFromMetres, units.metresFromFeet],
  ['knots', units.knotsFromMetresPerSecond, units.metresPerSecondFromKnots],
  ['miles an hour', units.milesPerHourFromMetresPerSecond, units.metresPerSecondFromMilesPerHour],
  ['megajoule', units.mjPerM2FromJPerM2, units.jPerM2FromMjPerM2],
];

describe('units', () => {
  it.each(pairs)('%s round trip', (_, there, back) => {
    fc.assert(
      fc.property(fc.double({ min: -1e6, max: 1e6, noNaN: true }), (x) => {
        expect(Math.abs(back(there(x)) - x)).toBeLessThanOrEqual(1e-9 * Math.max(1000, Math.abs(x)));
      }),
    );
    expect(there(NaN)).toBeNaN();
  });

  /** NIST SP 811 appendix B, and by definition. */
  it.each([
    ['−40 is the same in both', units.celsiusFromFahrenheit(-40), -40],
    ['a rise of 10 °C is 18 °F', units.fahrenheitDifferenceFromCelsius(10), 18],
    ['10 K/km is −1 °C/100 m', units.gradientCPer100MFromLapseRate(10), -1],
    ['29.92 inHg is 1013.2 hPa', units.hPaFromInchesOfMercury(29.92), 1013.2076],
    ['1 kt', units.metresPerSecondFromKnots(1), 0.514444],
    ['36 km/h', units.metresPerSecondFromKilometresPerHour(36), 10],
    ['1 m²/s is 6.3774 kt·ft', units.knotFeetFromM2PerS(1), 6.3774],
    ['2400 m²/s are 15,306 kt·ft', units.knotFeetFromM2PerS(2400), 15305.79],
  ])('%s', (_, value, expected) => {
    expect(Math.abs(value / expected - 1)).toBeLessThan(1e-5);
  });
});
