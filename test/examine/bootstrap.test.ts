import { describe, expect, test } from 'vitest';
import { bootstrap, bootstrapCoefficients, ends } from '../../src/examine/bootstrap.ts';
import { bootstrapPredictions } from '../../src/predict/bootstrap-predictions.ts';
import { predict } from '../../src/predict/predict.ts';
import { normalQuantile } from '../../src/stats/distributions.ts';
import { randomFrom } from '../../src/stats/random.ts';
import type { BootstrapPlan, Scale } from '../../src/study/study.ts';
import { byName, category, numbers } from '../prepare/columns.ts';
import { chosenFrom, type Wanted } from './chosen-from.ts';

const N = 120;
const random = randomFrom(99);
const normal = () => normalQuantile(random.next());
const a = Array.from({ length: N }, (_, i) => (i % 10) + random.next());
const b = Array.from({ length: N }, normal);
const t = Array.from({ length: N }, (_, i) => i);
const y = a.map((v, i) => 3 + 2 * v - b[i]! + normal());
const w = a.map((_, i) => 0.5 + (i % 3));
const columns = [numbers('y', y), numbers('a', a), numbers('b', b), numbers('t', t), numbers('w', w)];

const plan = (change: Partial<BootstrapPlan> = {}): BootstrapPlan => ({
  repetitions: 1999,
  seed: 5,
  by: 'rows',
  blockLength: null,
  ...change,
});
const chosenBy = (more: Partial<Wanted> = {}) =>
  chosenFrom(columns, { terms: ['a', 'b'], time: 't', ...more }).chosen;

describe('the draws', () => {
  test('are the same for the same seed, and others for another', () => {
    const chosen = chosenBy();
    for (const by of ['rows', 'residuals', 'blocks'] as const) {
      const draw = (seed: number) => bootstrap(chosen, plan({ by, seed, repetitions: 99 }))!.estimates;
      expect(draw(1)).toEqual(draw(1));
      expect(draw(1)).not.toEqual(draw(2));
    }
  });

  test('scatter as the classical theory has it where its assumptions hold', () => {
    const chosen = chosenBy();
    for (const by of ['rows', 'residuals', 'blocks'] as const) {
      const draws = bootstrap(chosen, plan({ by }))!;
      expect(draws.used).toBe(1999);
      const found = bootstrapCoefficients(draws, chosen.fit, 0.95)!;
      found.forEach((one, j) => {
        const error = chosen.s! * Math.sqrt(chosen.fit.inverse[j * 3 + j]!);
        // Of 1,999 draws a standard deviation is known to 1.6 %; in 120 rows errors drawn by rows differ by some 10 %,
        // and those of a coefficient drawn by short blocks by more.
        expect(Math.abs(one.standardError / error - 1)).toBeLessThan(by === 'residuals' ? 0.06 : 0.25);
        // Blocks begin anywhere but in the last rows, so rows at either end are drawn less often.
        expect(Math.abs(one.bias)).toBeLessThan((by === 'blocks' ? 0.4 : 0.15) * error);
        expect(one.basicLower).toBeCloseTo(2 * chosen.fit.estimates[j]! - one.upper, 12);
        expect(one.lower).toBeLessThan(chosen.fit.estimates[j]!);
        expect(one.upper).toBeGreaterThan(chosen.fit.estimates[j]!);
      });
    }
  });

  test('by residuals have exactly the covariance of the fit, with weights: (X′WX)⁻¹ times the errors’ variance', () => {
    const chosen = chosenBy({ weights: 'w' });
    const draws = bootstrap(chosen, plan({ by: 'residuals', repetitions: 20000 }))!;
    const variance = draws.errors.reduce((sum, e) => sum + e * e, 0) / draws.errors.length;
    const found = bootstrapCoefficients(draws, chosen.fit, 0.95)!;
    found.forEach(({ standardError }, j) => {
      // Known to 0.5 % from 20,000 draws.
      expect(Math.abs(standardError / Math.sqrt(variance * chosen.fit.inverse[j * 3 + j]!) - 1)).toBeLessThan(
        0.02,
      );
    });
  });

  test('of a mean by rows have the closed-form variance Σ (y − ȳ)²/n²', () => {
    const { chosen } = chosenFrom([columns[0]!], { terms: [] });
    const [one] = bootstrapCoefficients(bootstrap(chosen, plan({ repetitions: 20000 }))!, chosen.fit, 0.9)!;
    const error = Math.sqrt(chosen.fit.totalSumOfSquares) / N;
    expect(Math.abs(one!.standardError / error - 1)).toBeLessThan(0.02);
    expect(one!.lower).toBeCloseTo(chosen.fit.estimates[0]! - 1.645 * error, 1);
  });

  test('by blocks of all rows draw the rows as they are', () => {
    const chosen = chosenBy();
    const { estimates, used, blockLength } = bootstrap(
      chosen,
      plan({ by: 'blocks', blockLength: 500, repetitions: 99 }),
    )!;
    expect(blockLength).toBe(N);
    for (let k = 0; k < used * 3; k++) expect(estimates[k]).toBeCloseTo(chosen.fit.estimates[k % 3]!, 10);
  });

  test('by blocks see that neighbours are related, which rows drawn one by one do not', () => {
    let level = 0;
    const wandering = t.map(() => {
      level = 0.9 * level + normal();
      return level;
    });
    const { chosen } = chosenFrom([numbers('y', wandering), numbers('t', t)], { terms: [], time: 't' });
    const error = (by: 'rows' | 'blocks') =>
      bootstrapCoefficients(
        bootstrap(chosen, plan({ by, blockLength: by === 'blocks' ? 15 : null }))!,
        chosen.fit,
        0.95,
      )![0]!.standardError;
    expect(error('blocks')).toBeGreaterThan(1.8 * error('rows'));
  });

  test('in which a level is lost are left out and counted', () => {
    const kinds = category(
      'k',
      t.map((i) => (i === 7 ? 'once' : i % 2 === 0 ? 'p' : 'q')),
    );
    const { chosen } = chosenFrom([...columns, kinds], { terms: ['a', 'k'] });
    const draws = bootstrap(chosen, plan({ repetitions: 999 }))!;
    // The row is missed with probability (1 − 1/n)ⁿ ≈ 0.37.
    expect(draws.used / 999).toBeGreaterThan(0.55);
    expect(draws.used / 999).toBeLessThan(0.7);
    expect(draws.estimates.every(Number.isFinite)).toBe(true);
    expect(draws.estimates.length).toBe(draws.used * chosen.fit.columns.length);
  });

  test('are none where the model fits exactly, and report their progress', () => {
    const exact = chosenFrom(
      [
        numbers(
          'y',
          a.map((v) => 1 + v),
        ),
        columns[1]!,
      ],
      { terms: ['a'] },
    ).chosen;
    expect(bootstrap(exact, plan())).toBeNull();
    const seen: number[] = [];
    bootstrap(chosenBy(), plan({ repetitions: 99 }), (done, total) => {
      seen.push(done);
      expect(total).toBe(99);
    });
    expect(seen).toEqual(Array.from({ length: 99 }, (_, k) => k + 1));
  });
});

describe('intervals', () => {
  test('end at the order statistics (B + 1)q', () => {
    const sorted = Float64Array.from({ length: 999 }, (_, k) => k + 1);
    expect(ends(sorted, 0.95)).toEqual([25, 975]);
    expect(ends(sorted, 0.9)).toEqual([50, 950]);
    expect(ends(Float64Array.of(1, 2, 3), 0.99)).toEqual([1, 3]);
    expect(ends(Float64Array.of(1, 2, 3), 0.5)).toEqual([1, 3]);
    expect(ends(Float64Array.of(1, 2, 3, 4), 0.5)).toEqual([1.25, 3.75]);
  });
});

describe('predictions', () => {
  const rows = {
    rowCount: 2,
    labelOf: (row: number) => ['near', 'far'][row]!,
    given: [[], []],
    columns: byName([numbers('a', [5, 30]), numbers('b', [0, 0]), numbers('w', [1, 4])]),
    placeOf: () => ({ kind: 'command' }) as const,
    severity: 'error' as const,
  };

  test.each<[string, Scale, boolean]>([
    ['natural', { kind: 'natural' }, false],
    ['weighted', { kind: 'natural' }, true],
    ['log', { kind: 'log' }, false],
    ['reciprocal', { kind: 'reciprocal' }, false],
  ])('%s: near the intervals of the theory where its assumptions hold', (_name, scale, weighted) => {
    const shifted = [
      numbers(
        'y',
        y.map((v) => Math.exp(v / 100 + 1)),
      ),
      ...columns.slice(1),
    ];
    const { chosen } = chosenFrom(shifted, {
      terms: ['a', 'b'],
      scale,
      ...(weighted ? { weights: 'w' } : {}),
    });
    const draws = bootstrap(chosen, plan({ by: 'residuals', repetitions: 4999 }))!;
    const found = bootstrapPredictions(chosen, [rows], draws)!;
    const { predictions } = predict(chosen, [rows], null, () => {});
    found.forEach((one, i) => {
      const theory = predictions[i]!;
      expect(one.label).toBe(theory.label);
      const width = theory.upper! - theory.lower!;
      expect(Math.abs(one.lower! - theory.lower!)).toBeLessThan(0.1 * width);
      expect(Math.abs(one.upper! - theory.upper!)).toBeLessThan(0.1 * width);
      const mean = theory.mean_upper! - theory.mean_lower!;
      expect(Math.abs(one.mean_lower! - theory.mean_lower!)).toBeLessThan(0.15 * mean);
      expect(Math.abs(one.mean_upper! - theory.mean_upper!)).toBeLessThan(0.15 * mean);
    });
  });

  test('are none for too few repetitions', () => {
    const chosen = chosenBy();
    const draws = { ...bootstrap(chosen, plan({ repetitions: 99 }))!, used: 1 };
    expect(bootstrapPredictions(chosen, [rows], draws)).toBeNull();
    expect(bootstrapCoefficients(draws, chosen.fit, 0.95)).toBeNull();
  });
});
