import fc from 'fast-check';
import { expect, test } from 'vitest';
import { factorExtended, factorRows } from '../../src/engine/factor.ts';
import { fitCandidate } from '../../src/engine/fit-candidate.ts';
import { leanFit } from '../../src/engine/lean-fit.ts';
import { rowsAt } from '../../src/engine/rows-at.ts';
import { solveScratch } from '../../src/engine/solve-columns.ts';
import { choose } from '../../src/select/choose.ts';
import { crossValidate } from '../../src/select/cross-validate.ts';
import type { Folds } from '../../src/select/folds.ts';
import { materialOf } from '../../src/select/material.ts';
import { declaredProcedure } from '../../src/select/procedure.ts';
import type { RankBy } from '../../src/study/study.ts';
import { variable } from '../engine/models.ts';
import { allOf, makeGround, numbers } from './make-ground.ts';
import { type SelectionChange, studyWith } from './study-with.ts';

const CRITERIA: readonly RankBy[] = [
  'adjusted_r_squared',
  'aic',
  'aicc',
  'bic',
  'mallows_cp',
  'press',
  'cross_validation',
  'partial_f',
];
const CANDIDATES = [[0], [0, 1], [0, 2], [0, 1, 2], [0, 1, 2, 3], [0, 3], [1, 3], [0, 2, 3], [0, 1, 2, 3, 4]];
const COLUMNS = ['a', 'b', 'c', 'd'].map(variable);

function tableOf(n: number, seed: number): Record<string, number[]> {
  const next = numbers(seed);
  const data: Record<string, number[]> = { y: [], a: [], b: [], c: [], d: [], w: [] };
  for (let i = 0; i < n; i++) {
    const [a, b, c] = [next(), next(), next()];
    data.a!.push(a);
    data.b!.push(b * 3 + a);
    data.c!.push(c * 50);
    // Depends on the others, so that the largest candidate has a column too many.
    data.d!.push(a + c * 50);
    data.w!.push(0.3 + Math.abs(next()));
    data.y!.push(4 + a * 2 - b * 0.4 + next() * 1.5);
  }
  return data;
}

const folds = (n: number): Folds => ({
  plan: { by: 'rows', folds: 4, repeats: 1, seed: 1, group: null, start: null, horizon: 1, path: [] },
  sets: [{ kind: 'parts', partOf: Int32Array.from({ length: n }, (_, i) => i % 4), count: 4 }],
  nameOf: (fold) => `fold ${fold + 1}`,
  count: 4,
});

test('the procedure chooses what choose() chooses, for every criterion, tolerance and admission rule', () => {
  const change: fc.Arbitrary<SelectionChange> = fc.record({
    rankBy: fc.constantFrom(...CRITERIA),
    preferSmallerWithin: fc.constantFrom(0, 0.01, 2),
    admit: fc.record({
      vif: fc.constantFrom(null, { atMost: 1.05 }),
      pValue: fc.constantFrom(null, { atMost: 0.2 }),
      signs: fc.constantFrom(new Map(), new Map([['b', 'negative' as const]])),
      rowsPerCoefficient: fc.constantFrom(null, { atLeast: 6 }),
    }),
  });
  fc.assert(
    fc.property(
      fc.integer({ min: 12, max: 60 }),
      fc.integer({ min: 1, max: 1e6 }),
      change,
      fc.boolean(),
      fc.boolean(),
      (n, seed, selection, weighted, oneStandardError) => {
        const { ground, fitted } = makeGround(tableOf(n, seed), COLUMNS, CANDIDATES, {
          folds: folds(n),
          ...(weighted ? { weights: 'w' } : {}),
        });
        const ranked = selection.rankBy === 'cross_validation' && oneStandardError;
        const study = studyWith({ ...selection, oneStandardError: ranked });
        const validation = crossValidate({
          rows: ground.rows,
          own: ground.own,
          fits: fitted.fits,
          folds: ground.folds!,
          ranks: true,
        });
        const choice = choose(study, { ...fitted, validation }, () => {});
        const fit = declaredProcedure(study, ground.design, null)(allOf(ground));
        expect(fit?.candidate.name ?? null).toBe(
          choice.chosen === null ? null : fitted.fits[choice.chosen]!.candidate.name,
        );
      },
    ),
    { numRuns: 120 },
  );
});

test('a lean fit has the figures of the full one', () => {
  fc.assert(
    fc.property(fc.integer({ min: 8, max: 80 }), fc.integer({ min: 1, max: 1e6 }), (n, seed) => {
      const { ground } = makeGround(tableOf(n, seed), COLUMNS, CANDIDATES, { weights: 'w' });
      const factor = factorRows(ground.rows);
      const scratch = solveScratch(factor.width);
      for (const candidate of ground.design.candidates) {
        const full = fitCandidate(factor, candidate, ground.facts);
        const lean = leanFit(factor, candidate, ground.facts, scratch);
        expect(lean.columns).toEqual(full.columns);
        expect(lean.exact).toBe(full.exact);
        expect(lean.degreesOfFreedom).toBe(full.degreesOfFreedom);
        for (const key of ['residualSumOfSquares', 'totalSumOfSquares', 'logLikelihood'] as const) {
          if (!full.exact) expect(lean[key]! / full[key]!).toBeCloseTo(1, 11);
        }
      }
    }),
    { numRuns: 60 },
  );
});

test('rows that count several times are the rows written so often', () => {
  fc.assert(
    fc.property(fc.integer({ min: 12, max: 40 }), fc.integer({ min: 1, max: 1e6 }), (n, seed) => {
      const data = tableOf(n, seed);
      const { ground } = makeGround(data, COLUMNS, CANDIDATES, { weights: 'w' });
      const next = numbers(seed + 1);
      const counts = Array.from({ length: n }, () => Math.floor((next() + 0.5) * 4));
      const index = Int32Array.from([...counts.keys()].filter((i) => counts[i]! > 0));
      const own = index.map((i) => counts[i]!);
      const total = own.reduce((sum, count) => sum + count, 0);
      const factor = {
        ...factorExtended(rowsAt(ground.rows, index, Float64Array.from(own, Math.sqrt))),
        rowCount: total,
      };
      const written = Object.fromEntries(
        Object.entries(data).map(([name, values]) => [
          name,
          values.flatMap((value, i) => Array.from({ length: counts[i]! }, () => value)),
        ]),
      );
      const direct = makeGround(written, COLUMNS, CANDIDATES, { weights: 'w' });
      const material = materialOf(ground, factor, index, own);
      expect(material.facts.logWeights).toBeCloseTo(direct.ground.facts.logWeights, 9);
      direct.fitted.fits.forEach((fit, c) => {
        if (fit.degreesOfFreedom < 2) return;
        const drawn = fitCandidate(factor, ground.design.candidates[c]!, material.facts);
        expect(drawn.degreesOfFreedom).toBe(fit.degreesOfFreedom);
        if (!fit.exact) expect(drawn.logLikelihood! / fit.logLikelihood!).toBeCloseTo(1, 9);
      });
      expect(material.sample().rows.rowCount).toBe(total);
    }),
    { numRuns: 30 },
  );
});
