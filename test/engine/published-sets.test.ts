/** Published data sets that need no file: typed, or made by their published rule. */
import { describe, expect, test } from 'vitest';
import { factorExtended } from '../../src/engine/factor.ts';
import { fitCandidate } from '../../src/engine/fit-candidate.ts';
import { anscombe } from '../reference/anscombe.ts';
import { longley } from '../reference/longley.ts';
import { power, testModel, variable } from './models.ts';
import { correctDigits } from './nist-strd.ts';

const leastDigits = (found: Float64Array, certified: readonly number[]) =>
  Math.min(...certified.map((value, j) => correctDigits(found[j]!, value)));

describe('Longley 1967', () => {
  const names = ['x1', 'x2', 'x3', 'x4', 'x5', 'x6'];
  const { rows, design, facts } = testModel(longley, names.map(variable), [[0, 1, 2, 3, 4, 5, 6]]);
  const fit = fitCandidate(factorExtended(rows), design.candidates[0]!, facts);

  test('estimates, certified by NIST StRD (Longley)', () => {
    const certified = [
      -3482258.63459582, 15.0618722713733, -0.035819179292591, -2.02022980381683, -1.03322686717359,
      -0.0511041056535807, 1829.15146461355,
    ];
    expect(leastDigits(fit.estimates, certified)).toBeGreaterThanOrEqual(13);
  });

  test('VIF, condition index and log-likelihood, recomputed in 60-digit arithmetic from the typed data', () => {
    const vif = [135.532, 1788.513, 33.619, 3.589, 399.151, 758.981];
    for (const [j, value] of vif.entries()) expect(fit.vif[j + 1]!).toBeCloseTo(value, 3);
    expect(fit.conditionNumber).toBeCloseTo(43275.04, 1);
    expect(fit.logLikelihood!).toBeCloseTo(-109.617, 3);
  });
});

describe('Wampler 1970: a polynomial of degree 5 in x = 0 … 20, certified by NIST StRD', () => {
  const x = Array.from({ length: 21 }, (_, i) => i);
  const columns = [1, 2, 3, 4, 5].map((to) => power('x', to));
  const fitOf = (y: number[]) => {
    const { rows, design, facts } = testModel({ y, x }, columns, [[0, 1, 2, 3, 4, 5]]);
    return fitCandidate(factorExtended(rows), design.candidates[0]!, facts);
  };
  const errors = [
    759, -2048, 2048, -2048, 2523, -2048, 2048, -2048, 1838, -2048, 2048, -2048, 1838, -2048, 2048, -2048,
    2523, -2048, 2048, -2048, 759,
  ];
  const ones = x.map((v) => 1 + v + v ** 2 + v ** 3 + v ** 4 + v ** 5);

  test('Wampler1: every coefficient is 1 and the fit is exact', () => {
    const fit = fitOf(ones);
    expect(leastDigits(fit.estimates, [1, 1, 1, 1, 1, 1])).toBeGreaterThanOrEqual(14);
    expect(fit.exact).toBe(true);
    expect(fit.logLikelihood).toBeNull();
  });

  test('Wampler2: coefficients 1, 0.1, … 0.00001', () => {
    const y = x.map((v) =>
      Number((1 + v * 0.1 + v ** 2 * 0.01 + v ** 3 * 1e-3 + v ** 4 * 1e-4 + v ** 5 * 1e-5).toFixed(5)),
    );
    expect(leastDigits(fitOf(y).estimates, [1, 0.1, 0.01, 0.001, 0.0001, 0.00001])).toBeGreaterThanOrEqual(
      13,
    );
  });

  test.each([
    [1, 'Wampler3', 2152.3262467817, 236014.502379268],
    [100, 'Wampler4', 215232.62467817, 23601450.2379268],
    [10000, 'Wampler5', 21523262.467817, 2360145023.79268],
  ])('errors × %d (%s): still 1, with certified standard errors', (factor, _name, intercept, residual) => {
    const fit = fitOf(ones.map((value, i) => value + factor * errors[i]!));
    expect(leastDigits(fit.estimates, [1, 1, 1, 1, 1, 1])).toBeGreaterThanOrEqual(14);
    const s = Math.sqrt(fit.residualSumOfSquares / fit.degreesOfFreedom);
    expect(correctDigits(s, residual / 100)).toBeGreaterThanOrEqual(13);
    expect(correctDigits(s * Math.sqrt(fit.inverse[0]!), intercept)).toBeGreaterThanOrEqual(13);
  });
});

describe('Regressions without an intercept, certified by NIST StRD', () => {
  test('NoInt1: x = 60 … 70, y = 130 … 140', () => {
    const x = Array.from({ length: 11 }, (_, i) => 60 + i);
    const { rows, design, facts } = testModel({ y: x.map((v) => v + 70), x }, [variable('x')], [[1]]);
    const fit = fitCandidate(factorExtended(rows), design.candidates[0]!, facts);
    expect(correctDigits(fit.estimates[0]!, 2.07438016528926)).toBeGreaterThanOrEqual(14);
    expect(
      correctDigits(1 - fit.residualSumOfSquares / fit.totalSumOfSquares, 0.999365492298663),
    ).toBeGreaterThanOrEqual(14);
  });
  test('NoInt2: x 4, 5, 6; y 3, 4, 4', () => {
    const { rows, design, facts } = testModel({ y: [3, 4, 4], x: [4, 5, 6] }, [variable('x')], [[1]]);
    const fit = fitCandidate(factorExtended(rows), design.candidates[0]!, facts);
    expect(correctDigits(fit.estimates[0]!, 0.727272727272727)).toBeGreaterThanOrEqual(14);
    expect(correctDigits(fit.residualSumOfSquares, 0.272727272727273)).toBeGreaterThanOrEqual(14);
  });
});

describe('Anscombe 1973', () => {
  test.each(['1', '2', '3', '4'] as const)('set %s gives the published line', (set) => {
    const { rows, design, facts } = testModel(anscombe[set], [variable('x')], [[0, 1]]);
    const fit = fitCandidate(factorExtended(rows), design.candidates[0]!, facts);
    const s2 = fit.residualSumOfSquares / fit.degreesOfFreedom;
    expect(fit.estimates[0]!).toBeCloseTo(3.0, 1);
    expect(fit.estimates[1]!).toBeCloseTo(0.5, 2);
    expect(Math.sqrt(s2)).toBeCloseTo(1.237, 2);
    expect(1 - fit.residualSumOfSquares / fit.totalSumOfSquares).toBeCloseTo(0.6665, 2);
    if (set === '1') {
      expect(fit.estimates[0]!).toBeCloseTo(3.0001, 4);
      expect(fit.estimates[1]!).toBeCloseTo(0.5001, 4);
      expect(Math.sqrt(s2 * fit.inverse[0]!)).toBeCloseTo(1.1247, 4);
      expect(Math.sqrt(s2 * fit.inverse[3]!)).toBeCloseTo(0.1179, 4);
      expect((fit.totalSumOfSquares - fit.residualSumOfSquares) / s2).toBeCloseTo(17.99, 2);
    }
  });
});
