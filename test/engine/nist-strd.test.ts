/**
 * Source: NIST Statistical Reference Datasets, linear regression (National Institute of Standards and
 * Technology): certified estimates, standard deviations, residual standard deviation, R² and F.
 * Run where the files are present; `published-sets.test.ts` needs no file.
 */
import { describe, expect, test } from 'vitest';
import { factorExtended, factorRows } from '../../src/engine/factor.ts';
import type { Fit } from '../../src/engine/fit.ts';
import { fitCandidate } from '../../src/engine/fit-candidate.ts';
import { refineFit } from '../../src/engine/refine.ts';
import { power, testModel, variable } from './models.ts';
import { correctDigits, readStrd, STRD_PRESENT, STRD_SETS, type StrdSet } from './nist-strd.ts';

function modelOf(set: StrdSet) {
  const data: Record<string, number[]> = { y: set.y };
  set.x.forEach((values, j) => {
    data[`x${j}`] = values;
  });
  const withIntercept = !set.name.startsWith('NoInt');
  const degree = withIntercept ? set.estimates.length - 1 : 1;
  const columns =
    set.x.length > 1
      ? set.x.map((_, j) => variable(`x${j}`))
      : Array.from({ length: degree }, (_, k) => power('x0', k + 1));
  const own = columns.map((_, j) => j + 1);
  return testModel(data, columns, [withIntercept ? [0, ...own] : own]);
}

const standardErrors = (fit: Fit) =>
  Array.from(fit.columns, (_, j) =>
    Math.sqrt((fit.residualSumOfSquares / fit.degreesOfFreedom) * fit.inverse[j * fit.columns.length + j]!),
  );

describe.skipIf(!STRD_PRESENT)('NIST StRD, correct digits', () => {
  test.each(STRD_SETS)('%s from the extended factor', (name) => {
    const set = readStrd(name);
    const { rows, design, facts } = modelOf(set);
    const fit = fitCandidate(factorExtended(rows), design.candidates[0]!, facts);
    expect(fit.dropped).toEqual([]);
    for (const [j, certified] of set.estimates.entries()) {
      expect(correctDigits(fit.estimates[j]!, certified), `B${j}`).toBeGreaterThanOrEqual(13);
    }
    const errors = standardErrors(fit);
    for (const [j, certified] of set.standardErrors.entries()) {
      if (certified === 0) expect(fit.exact).toBe(true);
      else expect(correctDigits(errors[j]!, certified), `standard error of B${j}`).toBeGreaterThanOrEqual(12);
    }
    const rSquared = 1 - fit.residualSumOfSquares / fit.totalSumOfSquares;
    expect(correctDigits(rSquared, set.rSquared)).toBeGreaterThanOrEqual(13);
    if (set.residualSumOfSquares > 0) {
      const p = fit.columns.length;
      const df1 = set.name.startsWith('NoInt') ? p : p - 1;
      const s2 = fit.residualSumOfSquares / fit.degreesOfFreedom;
      expect(correctDigits(Math.sqrt(s2), set.residualStandardError)).toBeGreaterThanOrEqual(12);
      const f = (fit.totalSumOfSquares - fit.residualSumOfSquares) / df1 / s2;
      expect(correctDigits(f, set.overallF)).toBeGreaterThanOrEqual(12);
    }
  });

  test.each(STRD_SETS)('%s from the streamed factor, refined by passes over the rows', (name) => {
    const set = readStrd(name);
    const { rows, design, facts } = modelOf(set);
    const fit = refineFit(fitCandidate(factorRows(rows), design.candidates[0]!, facts), rows, facts);
    expect(fit.arithmetic).toBe('refined');
    for (const [j, certified] of set.estimates.entries()) {
      expect(correctDigits(fit.estimates[j]!, certified), `B${j}`).toBeGreaterThanOrEqual(13);
    }
    if (set.residualSumOfSquares > 0) {
      expect(correctDigits(fit.residualSumOfSquares, set.residualSumOfSquares)).toBeGreaterThanOrEqual(12);
    }
  });
});
