import golden from '../../../../fixtures/golden/stability-numbers.json';
import {
  bruntVaisalaPerS,
  bruntVaisalaPeriodS,
  bruntVaisalaSquaredPerS2,
  bulkRichardson,
  gradientRichardson,
} from '.';

const near = (value: number | null, expected: number | null, relative: number): void => {
  if (expected === null) expect(value).toBeNull();
  else expect(Math.abs(value! - expected)).toBeLessThanOrEqual(relative * Math.abs(expected));
};

describe('Brunt–Väisälä frequency', () => {
  it.each(golden.bruntVaisala.rows)('θ $theta_K K, +$dtheta_K K over $dz_m m', (row) => {
    const [theta, dTheta, dz] = [row.theta_K, row.dtheta_K, row.dz_m];
    near(bruntVaisalaSquaredPerS2(theta, dTheta, dz), row.N2_s2, golden.bruntVaisala.relativeTolerance);
    near(bruntVaisalaPerS(theta, dTheta, dz), row.N_s1, golden.bruntVaisala.relativeTolerance);
    near(bruntVaisalaPeriodS(theta, dTheta, dz), row.period_s, golden.bruntVaisala.relativeTolerance);
  });
  it('has no value without a layer', () => {
    expect([
      bruntVaisalaSquaredPerS2(290, 1, 0),
      bruntVaisalaPerS(NaN, 1, 1),
      bruntVaisalaPeriodS(290, NaN, 1),
    ]).toEqual([null, null, null]);
  });
});

describe('Richardson numbers', () => {
  /** Derivatives by the three-point stencil MetPy uses: centred in the middle, one-sided of second order at the ends. */
  const derivative = (f: readonly number[], h: number, i: number): number => {
    const [a, b, c] = f as [number, number, number];
    return [(-3 * a + 4 * b - c) / (2 * h), (c - a) / (2 * h), (3 * c - 4 * b + a) / (2 * h)][i]!;
  };
  const { theta_K: theta, u, v, Ri, relativeTolerance } = golden.gradientRichardson;
  it.each([0, 1, 2])('gradient form, MetPy’s published case, level %i', (i) => {
    near(
      gradientRichardson(theta[i]!, derivative(theta, 200, i), derivative(u, 200, i), derivative(v, 200, i)),
      Ri[i]!,
      relativeTolerance,
    );
  });
  it.each(golden.bulkRichardson.rows)('bulk form, %#', (row) => {
    const value = bulkRichardson(row.theta_sfc_K, row.theta_z_K - row.theta_sfc_K, row.z_m, row.u, row.v);
    if (row.Rib === null) expect(value).toBeNull();
    else expect(Math.abs(value! - row.Rib)).toBeLessThanOrEqual(golden.bulkRichardson.absoluteTolerance);
  });
  it('has no value at zero shear', () => {
    expect([gradientRichardson(290, 0.01, 0, 0), bulkRichardson(290, 1, 10, NaN, 0)]).toEqual([null, null]);
  });
});
