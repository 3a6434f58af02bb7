import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { fitCandidate } from '../../src/engine/fit-candidate.ts';
import { choose } from '../../src/select/choose.ts';
import type { Folds } from '../../src/select/folds.ts';
import { honestError } from '../../src/select/honest-error.ts';
import { declaredProcedure, type Search } from '../../src/select/procedure.ts';
import { jointF } from '../../src/select/terms.ts';
import { type PieceLists, variable } from '../engine/models.ts';
import { allOf, makeGround, numbers } from './make-ground.ts';
import { studyWith } from './study-with.ts';

const folds = (n: number, k: number): Folds => ({
  plan: { by: 'rows', folds: k, repeats: 1, seed: 1, group: null, start: null, horizon: 1, path: [] },
  sets: [{ kind: 'parts', partOf: Int32Array.from({ length: n }, (_, i) => (i * 7) % k), count: k }],
  nameOf: (fold) => `fold ${fold + 1}`,
  count: k,
});

const pick = (data: Readonly<Record<string, readonly number[]>>, rows: readonly number[]) =>
  Object.fromEntries(Object.entries(data).map(([name, values]) => [name, rows.map((row) => values[row]!)]));

describe('the error of the whole procedure', () => {
  const columns = ['a', 'b', 'c'].map(variable);
  const candidates = [[0], [0, 1], [0, 2], [0, 1, 2], [0, 1, 2, 3]];

  test('equals choosing anew without each fold and predicting it, written out', () => {
    fc.assert(
      fc.property(
        fc.integer({ min: 20, max: 60 }),
        fc.integer({ min: 1, max: 1e6 }),
        fc.constantFrom('aic' as const, 'press' as const, 'partial_f' as const),
        (n, seed, rankBy) => {
          const next = numbers(seed);
          const data: Record<string, number[]> = { y: [], a: [], b: [], c: [] };
          for (let i = 0; i < n; i++) {
            data.a!.push(next());
            data.b!.push(next() * 9);
            data.c!.push(next() + data.a![i]!);
            data.y!.push(2 + data.a![i]! + data.b![i]! * 0.04 + next());
          }
          const k = 5;
          const study = studyWith({ rankBy, admit: { pValue: { atMost: 0.5 } } });
          const { ground, fitted } = makeGround(data, columns, candidates);
          const winner = choose(study, fitted, () => {}).chosen;
          const found = honestError({
            ground,
            folds: folds(n, k),
            procedure: declaredProcedure(study, ground.design, null),
            winner: winner === null ? null : fitted.fits[winner]!,
          })!;
          let squares = 0;
          let ofMean = 0;
          const choices = new Map<string | null, number>();
          for (let fold = 0; fold < k; fold++) {
            const held = [...data.y!.keys()].filter((i) => (i * 7) % k === fold);
            const rest = [...data.y!.keys()].filter((i) => (i * 7) % k !== fold);
            const made = makeGround(pick(data, rest), columns, candidates);
            const { chosen } = choose(study, made.fitted, () => {});
            const mean = rest.reduce((sum, i) => sum + data.y![i]!, 0) / rest.length;
            const name = chosen === null ? null : made.fitted.fits[chosen]!.candidate.name;
            choices.set(name, (choices.get(name) ?? 0) + 1);
            for (const i of held) {
              const fit = chosen === null ? null : made.fitted.fits[chosen]!;
              const x = [1, data.a![i]!, data.b![i]!, data.c![i]!];
              const predicted =
                fit === null
                  ? mean
                  : fit.columns.reduce((sum, column, j) => sum + fit.estimates[j]! * x[column]!, 0);
              squares += (data.y![i]! - predicted) ** 2;
              ofMean += (data.y![i]! - mean) ** 2;
            }
          }
          expect(found.procedure.meanSquaredError / (squares / n)).toBeCloseTo(1, 9);
          expect(found.mean.meanSquaredError / (ofMean / n)).toBeCloseTo(1, 10);
          expect(found.gain.value).toBeCloseTo((ofMean - squares) / n, 10);
          expect(new Map(found.choices.map((one) => [one.candidate, one.folds]))).toEqual(choices);
          expect(found.rows).toBe(n);
        },
      ),
      { numRuns: 25 },
    );
  });

  test('where no candidate is admitted the mean is predicted', () => {
    const next = numbers(3);
    const data = { y: Array.from({ length: 30 }, () => next()), a: Array.from({ length: 30 }, () => next()) };
    const { ground } = makeGround(data, [variable('a')], [[0, 1]]);
    const study = studyWith({ rankBy: 'aic', admit: { rowsPerCoefficient: { atLeast: 1000 } } });
    const found = honestError({
      ground,
      folds: folds(30, 5),
      procedure: declaredProcedure(study, ground.design, null),
      winner: null,
    })!;
    expect(found.procedure).toEqual(found.mean);
    expect(found.winner).toBeNull();
    expect(found.choices).toEqual([{ candidate: null, folds: 5 }]);
    expect(found.sentence).toMatch(/In 5 of 5\sfolds no candidate was admitted\./);
  });

  test('rows that the chosen cannot predict are in none of the figures', () => {
    const next = numbers(5);
    const level = Array.from({ length: 40 }, (_, i) => (i === 4 ? 1 : 0));
    const data = { y: level.map((v) => v * 9 + next()), level };
    const { ground, fitted } = makeGround(data, [variable('level')], [[0, 1]]);
    const found = honestError({
      ground,
      folds: folds(40, 4),
      procedure: declaredProcedure(studyWith({ rankBy: 'aic' }), ground.design, null),
      winner: fitted.fits[0]!,
    })!;
    expect(found.rowsLeftOut).toBe(1);
    expect(found.rows).toBe(39);
    // Without the row both predict the mean of the other rows without level.
    expect(found.procedure.meanSquaredError).toBeCloseTo(found.winner!.meanSquaredError, 12);
  });
});

describe('noise alone (Freedman 1983): 50 predictors, 100 rows, kept where p < 0.25 and fitted again', () => {
  const n = 100;
  const p = 50;
  const names = Array.from({ length: p }, (_, j) => `x${j + 1}`);
  const pieces: PieceLists = names.map((name) => variable(name));

  const madeOf = (seed: number, signal: number) => {
    const next = numbers(seed);
    const data: Record<string, number[]> = { y: [] };
    for (const name of names) data[name] = Array.from({ length: n }, () => next());
    data.y = data.x1!.map((x) => 10 + signal * x + next());
    return makeGround(data, pieces, [[0, ...names.map((_, j) => j + 1)], [0]]);
  };

  /** Freedman's two steps: what is significant at 0.25 among all is fitted alone. */
  const screen =
    (ground: ReturnType<typeof madeOf>['ground']): Search =>
    ({ factor, facts }) => {
      const all = fitCandidate(factor, ground.design.candidates[0]!, facts);
      const terms = all.candidate.terms.filter((term) => jointF(all, term)!.p_value! < 0.25);
      const columns = [0, ...terms.flatMap((term) => term.columns)];
      return [{ ...all.candidate, name: terms.map(({ name }) => name).join(' '), terms, columns }];
    };

  test('the screened model looks good, and the honest error says that it is no better than the mean', () => {
    for (const seed of [11, 12, 13, 14]) {
      const { ground, fitted } = madeOf(seed, 0);
      const procedure = declaredProcedure(
        studyWith({ rankBy: 'adjusted_r_squared' }),
        ground.design,
        screen(ground),
      );
      const [kept] = screen(ground)({ ...allOf(ground), factor: fitted.factor, facts: fitted.facts });
      const fit = fitCandidate(fitted.factor, kept!, fitted.facts);
      // What a reader of the screened model alone would see: Freedman's point.
      const rSquared = 1 - fit.residualSumOfSquares / fit.totalSumOfSquares;
      expect(rSquared).toBeGreaterThan(0.15);
      const found = honestError({ ground, folds: folds(n, 10), procedure, winner: fit })!;
      expect(found.sentence).toMatch(
        /it is no better than the mean|cannot be told to be better than the mean/,
      );
      expect(found.winner!.meanSquaredError).toBeLessThan(found.procedure.meanSquaredError);
    }
  });

  test('with a real effect it does not say so', () => {
    const { ground, fitted } = madeOf(21, 4);
    const procedure = declaredProcedure(
      studyWith({ rankBy: 'adjusted_r_squared' }),
      ground.design,
      screen(ground),
    );
    const found = honestError({ ground, folds: folds(n, 10), procedure, winner: fitted.fits[0]! })!;
    expect(found.sentence).not.toContain('better than the mean');
    expect(found.gain.value).toBeGreaterThan(2 * found.gain.standardError!);
  });
});
