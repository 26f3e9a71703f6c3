import { dryAdiabat, moistAdiabat } from './adiabats';

describe('adiabats', () => {
  it('cool by about 9.8 °C per km when dry (AMS Glossary: approximately 9.8 °C/km)', () => {
    expect(dryAdiabat(0, 1000).at(-1)?.temperatureC).toBeCloseTo(-9.8, 1);
  });

  it('cool less when moist, and nearly as much when very cold (Γm 6.5 at 0 °C, 9.2 K/km at −30 °C, 1000 hPa)', () => {
    expect(moistAdiabat(0, 1000, 100).at(-1)?.temperatureC).toBeCloseTo(-0.65, 1);
    expect(moistAdiabat(-30, 1000, 100).at(-1)?.temperatureC).toBeCloseTo(-30.92, 1);
  });
});
