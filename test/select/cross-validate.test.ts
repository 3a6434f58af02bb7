import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { factorExtended, factorRows } from '../../src/engine/factor.ts';
import type { Fit } from '../../src/engine/fit.ts';
import { fitCandidate } from '../../src/engine/fit-candidate.ts';
import { rowsAt } from '../../src/engine/rows-at.ts';
import { fromScale } from '../../src/model/response-scale.ts';
import { crossValidate } from '../../src/select/cross-validate.ts';
import type { FoldSet, Folds } from '../../src/select/folds.ts';
import { restrictFolds } from '../../src/select/folds.ts';
import type { Validation } from '../../src/select/validation.ts';
import type { FoldPlan, Scale } from '../../src/study/study.ts';
import { type TestModel, testModel, variable } from '../engine/models.ts';

const PLAN: FoldPlan = {
  by: 'rows',
  folds: null,
  repeats: 1,
  seed: 1,
  group: null,
  start: null,
  horizon: 1,
  path: [],
};

const foldsOf = (sets: readonly FoldSet[], count: number): Folds => ({
  plan: PLAN,
  sets,
  nameOf: (fold) => `fold ${fold + 1}`,
  count,
});

const parts = (partOf: readonly number[], count: number) =>
  foldsOf([{ kind: 'parts', partOf: Int32Array.from(partOf), count }], count);

function validate(model: TestModel, folds: Folds, own: readonly number[], fits = fitsOf(model)): Validation {
  return crossValidate({ rows: model.rows, own: Float64Array.from(own), fits, folds, ranks: true });
}

const fitsOf = ({ rows, design, facts }: TestModel): Fit[] => {
  const factor = factorExtended(rows);
  return design.candidates.map((one) => fitCandidate(factor, one, facts));
};

/** Errors of held-out rows by fitting the training rows anew in double-double, row by row from the data. */
function refitErrors(
  model: TestModel,
  candidate: number,
  held: readonly number[],
  training: readonly number[],
): number[] {
  const { rows, design, facts } = model;
  const fit = fitCandidate(
    factorExtended(rowsAt(rows, Int32Array.from(training), null)),
    design.candidates[candidate]!,
    facts,
  );
  return held.map((row) => {
    const values = new Float64Array(fit.columns.length + 1);
    const at = [...fit.columns, rows.predictorCount + fit.candidate.responseColumn];
    rows.fill(at, row, row + 1, 1, values, null);
    const root = rows.rootWeights?.[row] ?? 1;
    return fit.columns.reduce(
      (left, column, j) => left - (fit.estimates[j]! * values[j]!) / rows.scales[column]! / root,
      values[fit.columns.length]! / rows.scales[at.at(-1)!]! / root,
    );
  });
}

/** Rows of y, predictors and weights from a small generator, so that a counterexample can be read. */
const tables = fc
  .record({ n: fc.integer({ min: 20, max: 400 }), seed: fc.integer({ min: 1, max: 1e6 }) })
  .map(({ n, seed }) => {
    let state = seed;
    const next = () => {
      state = (Math.imul(state, 1664525) + 1013904223) >>> 0;
      return state / 2 ** 32 - 0.5;
    };
    const data: Record<string, number[]> = { y: [], a: [], b: [], c: [], w: [] };
    for (let i = 0; i < n; i++) {
      const [a, b, c] = [next(), next(), next()];
      data.a!.push(a * 10 + 30);
      data.b!.push(b + a);
      data.c!.push(c * 1e4);
      data.w!.push(0.5 + Math.abs(next()) * 4);
      data.y!.push(9 + 2 * a - b + 1.5 * c + next());
    }
    return { data, next };
  });

const columns = ['a', 'b', 'c'].map(variable);
const candidates = [[0], [0, 1], [0, 1, 2, 3], [2, 3], [0, 3, 1]];
const close = (found: number, wanted: number, share = 1e-10) =>
  expect(Math.abs(found - wanted)).toBeLessThanOrEqual(share * Math.abs(wanted));

describe('cross-validation', () => {
  test('errors from the factors of folds equal those of actual refits to 1e-10, with and without weights', () => {
    fc.assert(
      fc.property(tables, fc.integer({ min: 2, max: 9 }), fc.boolean(), ({ data, next }, k, weighted) => {
        const model = testModel(data, columns, candidates, weighted ? { weights: 'w' } : {});
        const n = data.y!.length;
        const partOf = Array.from({ length: n }, (_, i) => (i < k ? i : Math.floor((next() + 0.5) * k)));
        const weight = weighted ? data.w! : data.y!.map(() => 1);
        const found = validate(model, parts(partOf, k), data.y!);
        candidates.forEach((_, c) => {
          const folds = Array.from({ length: k }, (_, fold) => {
            const held = [...partOf.keys()].filter((i) => partOf[i] === fold);
            const training = [...partOf.keys()].filter((i) => partOf[i] !== fold);
            const errors = refitErrors(model, c, held, training);
            return {
              w: held.reduce((sum, i) => sum + weight[i]!, 0),
              squares: errors.reduce((sum, e, i) => sum + weight[held[i]!]! * e * e, 0),
              errors: errors.reduce((sum, e, i) => sum + weight[held[i]!]! * e, 0),
            };
          });
          const whole = folds.reduce((sum, { w }) => sum + w, 0);
          const mse = folds.reduce((sum, { squares }) => sum + squares, 0) / whole;
          const figures = found.figures[c]!;
          close(figures.meanSquaredError, mse);
          const bias = folds.reduce((sum, { errors }) => sum + errors, 0) / whole;
          expect(Math.abs(figures.meanError - bias)).toBeLessThan(1e-10 * Math.sqrt(mse));
          const spread = folds.reduce((sum, { squares, w }) => sum + (squares - mse * w) ** 2, 0);
          close(figures.standardError!, Math.sqrt((k / (k - 1)) * spread) / whole, 1e-9);
          expect(figures.rows).toBe(n);
        });
        expect(found.rowsLeftOut).toBe(0);
      }),
      { numRuns: 40 },
    );
  });

  test('the standard error of equal folds is the standard deviation of their errors over √k (Breiman et al. 1984)', () => {
    const n = 60;
    const data = { y: Array.from({ length: n }, (_, i) => Math.sin(i * 7) * 5 + i), a: [...Array(n).keys()] };
    const model = testModel(data, [variable('a')], [[0, 1]]);
    const partOf = Array.from({ length: n }, (_, i) => (i * 7) % 6);
    const errors = Array.from({ length: 6 }, (_, fold) => {
      const held = [...partOf.keys()].filter((i) => partOf[i] === fold);
      const squares = refitErrors(
        model,
        0,
        held,
        [...partOf.keys()].filter((i) => partOf[i] !== fold),
      );
      return squares.reduce((sum, e) => sum + e * e, 0) / held.length;
    });
    const mean = errors.reduce((a, b) => a + b) / 6;
    const deviation = Math.sqrt(errors.reduce((sum, e) => sum + (e - mean) ** 2, 0) / 5);
    close(validate(model, parts(partOf, 6), data.y).figures[0]!.standardError!, deviation / Math.sqrt(6));
  });

  test('a rolling origin predicts each part from all before it', () => {
    fc.assert(
      fc.property(
        tables,
        fc.integer({ min: 1, max: 7 }),
        fc.boolean(),
        ({ data, next }, horizon, shuffled) => {
          const model = testModel(data, columns, candidates);
          const n = data.y!.length;
          const order = [...Array(n).keys()];
          if (shuffled) order.sort(() => next());
          const start = 12;
          const blocks = [order.slice(0, start)];
          for (let at = start; at < n; at += horizon) blocks.push(order.slice(at, at + horizon));
          const sorted = blocks.map((block) => Int32Array.from(block).sort());
          const found = validate(
            model,
            foldsOf([{ kind: 'growing', parts: sorted }], sorted.length - 1),
            data.y!,
          );
          candidates.forEach((_, c) => {
            let squares = 0;
            for (let k = 1; k < blocks.length; k++) {
              const errors = refitErrors(
                model,
                c,
                [...sorted[k]!],
                sorted.slice(0, k).flatMap((block) => [...block]),
              );
              squares += errors.reduce((sum, e) => sum + e * e, 0);
            }
            close(found.figures[c]!.meanSquaredError, squares / (n - start));
          });
        },
      ),
      { numRuns: 12 },
    );
  });

  test('rows held out one at a time give the errors of refits, and PRESS/n', () => {
    fc.assert(
      fc.property(tables, fc.boolean(), ({ data }, weighted) => {
        const short = Object.fromEntries(
          Object.entries(data).map(([name, values]) => [name, values.slice(0, 25)]),
        );
        const model = testModel(short, columns, candidates, weighted ? { weights: 'w' } : {});
        const n = short.y!.length;
        const single = validate(model, foldsOf([{ kind: 'single' }], n), short.y!);
        const each = validate(
          model,
          parts(
            short.y!.map((_, i) => i),
            n,
          ),
          short.y!,
        );
        candidates.forEach((_, c) => {
          const a = single.figures[c]!;
          const b = each.figures[c]!;
          close(a.meanSquaredError, b.meanSquaredError);
          close(a.standardError!, b.standardError!, 1e-9);
          expect(Math.abs(a.meanError - b.meanError)).toBeLessThan(1e-10 * Math.sqrt(a.meanSquaredError));
        });
      }),
      { numRuns: 20 },
    );
  });

  test.each<Scale>([
    { kind: 'log' },
    { kind: 'sqrt' },
    { kind: 'reciprocal' },
    { kind: 'box_cox', lambda: 0.3 },
  ])(
    'on the $kind scale errors are on the own scale, the mean by smearing over the training residuals',
    (scale) => {
      fc.assert(
        fc.property(tables, ({ data, next }) => {
          const model = testModel(data, columns, candidates, { scales: [scale] });
          const n = data.y!.length;
          const k = 4;
          const partOf = Array.from({ length: n }, (_, i) => (i < k ? i : Math.floor((next() + 0.5) * k)));
          const found = validate(model, parts(partOf, k), data.y!);
          candidates.forEach((_, c) => {
            let squares = 0;
            for (let fold = 0; fold < k; fold++) {
              const held = [...partOf.keys()].filter((i) => partOf[i] === fold);
              const training = [...partOf.keys()].filter((i) => partOf[i] !== fold);
              const residuals = refitErrors(model, c, training, training);
              refitErrors(model, c, held, training).forEach((error, i) => {
                const row = held[i]!;
                const z = model.rows.responses[0]![row]! - error;
                const mean =
                  residuals.reduce((sum, e) => sum + fromScale(z + e, scale), 0) / residuals.length;
                squares += (data.y![row]! - mean) ** 2;
              });
            }
            if (Number.isFinite(squares)) close(found.figures[c]!.meanSquaredError, squares / n, 1e-9);
          });
          const single = validate(
            testModel(
              Object.fromEntries(Object.entries(data).map(([name, values]) => [name, values.slice(0, 20)])),
              columns,
              candidates,
              { scales: [scale] },
            ),
            foldsOf([{ kind: 'single' }], 20),
            data.y!.slice(0, 20),
          );
          const short = testModel(
            Object.fromEntries(Object.entries(data).map(([name, values]) => [name, values.slice(0, 20)])),
            columns,
            candidates,
            { scales: [scale] },
          );
          const each = validate(short, parts([...Array(20).keys()], 20), data.y!.slice(0, 20));
          candidates.forEach((_, c) => {
            if (each.figures[c] !== null)
              close(single.figures[c]!.meanSquaredError, each.figures[c]!.meanSquaredError, 1e-8);
          });
        }),
        { numRuns: 8 },
      );
    },
  );

  test('repeats are averaged, and their standard errors are not divided by their number', () => {
    const n = 40;
    const data = { y: Array.from({ length: n }, (_, i) => Math.cos(i * 3) + i / 9), a: [...Array(n).keys()] };
    const model = testModel(data, [variable('a')], [[0, 1]]);
    const sets = [5, 7, 11].map(
      (step): FoldSet => ({
        kind: 'parts',
        partOf: Int32Array.from({ length: n }, (_, i) => Math.floor((i * step) / 3) % 5),
        count: 5,
      }),
    );
    const each = sets.map((set) => validate(model, foldsOf([set], 5), data.y).figures[0]!);
    const all = validate(model, foldsOf(sets, 5), data.y).figures[0]!;
    close(all.meanSquaredError, each.reduce((sum, one) => sum + one.meanSquaredError, 0) / 3, 1e-13);
    close(all.standardError! ** 2, each.reduce((sum, one) => sum + one.standardError! ** 2, 0) / 3, 1e-12);
    expect(all.rows).toBe(3 * n);
  });

  test('a dependent column is passed over as in the fit of all rows', () => {
    const n = 30;
    const a = Array.from({ length: n }, (_, i) => Math.sin(i) * 4);
    const b = Array.from({ length: n }, (_, i) => (i * i) % 7);
    const data = { y: a.map((v, i) => v - b[i]! + Math.sin(i * 5)), a, b, total: a.map((v, i) => v + b[i]!) };
    const model = testModel(data, ['a', 'b', 'total'].map(variable), [
      [0, 1, 2],
      [0, 1, 2, 3],
    ]);
    const found = validate(
      model,
      parts(
        a.map((_, i) => i % 3),
        3,
      ),
      data.y,
    );
    expect(found.figures[1]).toEqual(found.figures[0]);
    expect(found.losses).toEqual([]);
  });
});

describe('rows that cannot be predicted', () => {
  const n = 40;
  const a = Array.from({ length: n }, (_, i) => Math.sin(i * 2) * 3);
  const y = a.map((v, i) => 5 + v + Math.cos(i * 5));
  const partOf = Array.from({ length: n }, (_, i) => i % 4);

  test('of a level that only one fold has: they are left out for every candidate, and said', () => {
    const level = Array.from({ length: n }, (_, i) => (i === 8 || i === 12 ? 1 : 0));
    const model = testModel({ y, a, level }, ['a', 'level'].map(variable), [
      [0, 1],
      [0, 1, 2],
    ]);
    const found = validate(model, parts(partOf, 4), y);
    expect(found.losses).toEqual([{ column: 2, folds: ['fold 1'], rows: 2, candidates: [1] }]);
    expect(found.rowsLeftOut).toBe(2);
    const keep = [...Array(n).keys()].filter((i) => i !== 8 && i !== 12);
    const whole = (c: number, held: number[], training: number[]) =>
      refitErrors(model, c, held, training).reduce((sum, e) => sum + e * e, 0);
    for (const c of [0, 1]) {
      const squares = [0, 1, 2, 3].reduce(
        (sum, fold) =>
          sum +
          whole(
            c,
            keep.filter((i) => partOf[i] === fold),
            [...Array(n).keys()].filter((i) => partOf[i] !== fold),
          ),
        0,
      );
      close(found.figures[c]!.meanSquaredError, squares / keep.length);
      expect(found.figures[c]!.rows).toBe(keep.length);
    }
  });

  test('too many of them: the candidate has no figures, and the others keep all rows', () => {
    const level = Array.from({ length: n }, (_, i) => (i % 4 === 1 ? 1 : 0));
    const model = testModel({ y, a, level }, ['a', 'level'].map(variable), [
      [0, 1],
      [0, 1, 2],
    ]);
    const found = validate(model, parts(partOf, 4), y);
    expect(found.figures[1]).toBeNull();
    expect(found.whyNot[1]).toMatch(
      /^10 of the 40\sheld-out rows cannot be predicted by it without themselves$/,
    );
    expect(found.figures[0]!.rows).toBe(n);
    expect(found.rowsLeftOut).toBe(0);
    expect(found.losses).toHaveLength(1);
  });

  test('a dependency among several columns: only the rows that break it', () => {
    const b = a.map((v, i) => (i === 20 ? v + 3 : 2 * v + 1));
    const model = testModel({ y, a, b }, ['a', 'b'].map(variable), [
      [0, 1],
      [0, 1, 2],
    ]);
    const found = validate(model, parts(partOf, 4), y);
    expect(found.losses).toEqual([{ column: 2, folds: ['fold 1'], rows: 1, candidates: [1] }]);
    close(
      found.figures[0]!.meanSquaredError,
      [0, 1, 2, 3].reduce(
        (sum, fold) =>
          sum +
          refitErrors(
            model,
            0,
            [...Array(n).keys()].filter((i) => partOf[i] === fold && i !== 20),
            [...Array(n).keys()].filter((i) => partOf[i] !== fold),
          ).reduce((s, e) => s + e * e, 0),
        0,
      ) / 39,
    );
  });

  test('one at a time: a row that is fitted by itself alone', () => {
    const level = Array.from({ length: n }, (_, i) => (i === 8 ? 1 : 0));
    const model = testModel({ y, a, level }, ['a', 'level'].map(variable), [
      [0, 1],
      [0, 1, 2],
    ]);
    const found = validate(model, foldsOf([{ kind: 'single' }], n), y);
    expect(found.losses).toEqual([{ column: null, folds: ['fold 9'], rows: 1, candidates: [1] }]);
    expect(found.figures.map((one) => one!.rows)).toEqual([39, 39]);
    // Without the row's own coefficient the two candidates predict the others alike but for its fit.
    const rest = [...Array(n).keys()].filter((i) => i !== 8);
    const squares = rest.reduce(
      (sum, i) =>
        sum +
        refitErrors(
          model,
          1,
          [i],
          [...Array(n).keys()].filter((k) => k !== i),
        )[0]! **
          2,
      0,
    );
    close(found.figures[1]!.meanSquaredError, squares / 39);
  });

  test('fewer training rows than coefficients in a fold', () => {
    const model = testModel(
      { y: y.slice(0, 6), a: a.slice(0, 6), b: y.slice(6, 12), c: y.slice(20, 26) },
      columns,
      [[0], [0, 1, 2, 3]],
    );
    const found = validate(model, parts([0, 0, 0, 1, 1, 1], 2), y.slice(0, 6));
    expect(found.figures[0]).not.toBeNull();
    expect(found.figures[1]).toBeNull();
  });
});

test('restricted folds keep together what was held out together', () => {
  const folds = foldsOf([{ kind: 'parts', partOf: Int32Array.from([0, 1, 2, 0, 1, 2]), count: 3 }], 3);
  expect(restrictFolds(folds, Int32Array.from([1, 3, 4]), 6).sets).toEqual([
    { kind: 'parts', partOf: Int32Array.from([1, 0, 1]), count: 3 },
  ]);
  const growing = foldsOf(
    [{ kind: 'growing', parts: [Int32Array.from([0, 1]), Int32Array.from([2]), Int32Array.from([3, 4])] }],
    2,
  );
  expect(restrictFolds(growing, Int32Array.from([1, 3, 4]), 5).sets).toEqual([
    { kind: 'growing', parts: [Int32Array.from([0]), Int32Array.from([1, 2])] },
  ]);
});

test('rows of a design at positions: with repeats, gaps and multipliers', () => {
  const n = 2000;
  const data = {
    y: [...Array(n).keys()],
    a: Array.from({ length: n }, (_, i) => i * i),
    w: [...Array(n).keys()].map((i) => i + 1),
  };
  const { rows } = testModel(data, [variable('a')], [[0, 1]], { weights: 'w' });
  const index = Int32Array.from([1999, 3, 3, 4, 700, 1800, 12]);
  const multipliers = Float64Array.from([1, 2, 1, 1, 3, 1, 1]);
  const view = rowsAt(rows, index, multipliers);
  const block = new Float64Array(8 * 2);
  view.fill([1, 2], 1, 6, 8, block, null);
  [...index.slice(1, 6)].forEach((row, i) => {
    const root = Math.sqrt(row + 1) * multipliers[i + 1]!;
    expect(block[i]).toBeCloseTo(row * row * root, 6);
    expect(block[8 + i]).toBeCloseTo(row * root, 9);
    expect(view.rootWeights![i + 1]).toBeCloseTo(root, 12);
    expect(view.responses[0]![i + 1]).toBe(row);
  });
  expect(factorRows(rowsAt(rows, new Int32Array(0), null)).rowCount).toBe(0);
});
