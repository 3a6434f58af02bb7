import { describe, expect, test } from 'vitest';
import { readStrd, STRD_PRESENT } from '../engine/nist-strd.ts';
import { category, numbers } from '../prepare/columns.ts';
import { uniform } from '../select/any-problem.ts';
import { chosenFrom, findingNamed } from './chosen-from.ts';

describe.skipIf(!STRD_PRESENT)('load cell calibration, NIST/SEMATECH e-Handbook 4.6.1.5 (Pontius)', () => {
  const { x, y } = STRD_PRESENT ? readStrd('Pontius') : { x: [[]], y: [] };
  // The set scales the predictor, so that its squares do not swamp the arithmetic of former days.
  const columns = [numbers('y', y), numbers('x', x[0]!)];

  test('a straight line lacks fit: F 214.7464 on 18 and 20', () => {
    const found = findingNamed(chosenFrom(columns, { terms: ['x'] }).chosen, 'lack_of_fit');
    expect(found.df).toEqual([18, 20]);
    // The page is good to about six figures.
    expect(Math.abs(found.statistic! / 214.7464 - 1)).toBeLessThan(1e-5);
    expect(found.concern).toBe(2);
  });

  test('a parabola does not: F 0.81072 on 17 and 20, recomputed in 60-digit arithmetic', () => {
    const { chosen } = chosenFrom(columns, { terms: [{ kind: 'polynomial', variable: 'x', degree: 2 }] });
    const found = findingNamed(chosen, 'lack_of_fit');
    expect(found.df).toEqual([17, 20]);
    expect(found.statistic).toBeCloseTo(0.81072, 5);
    expect(found.concern).toBe(0);
  });
});

describe('pure error', () => {
  const next = uniform(21);
  const n = 30;
  const a = Array.from({ length: n }, (_, i) => i % 5);
  const k = a.map((_, i) => (i % 2 === 0 ? 'p' : 'q'));
  const y = a.map((v, i) => v * v + (k[i] === 'p' ? 1 : 0) + next());
  const w = a.map(() => 0.5 + next());
  const columns = [numbers('y', y), numbers('a', a), category('k', k), numbers('w', w)];

  test('with numbers and categories is the partial F of a mean for each cell against the model, weighted too', () => {
    // A full set of cells by other terms: the same space as one mean for each.
    const cells = [...new Set(a.map((v, i) => `${v}${k[i]}`))];
    for (const weights of [undefined, 'w']) {
      const more = weights === undefined ? {} : { weights };
      const { chosen } = chosenFrom(columns, { terms: ['a', 'k'], ...more });
      const saturated = chosenFrom(
        [
          ...columns,
          category(
            'cell',
            a.map((v, i) => `${v}${k[i]}`),
          ),
        ],
        { terms: ['cell'], ...more },
      ).chosen;
      const found = findingNamed(chosen, 'lack_of_fit');
      const rss = chosen.fit.residualSumOfSquares;
      const pure = saturated.fit.residualSumOfSquares;
      const [d1, d2] = [cells.length - 3, n - cells.length];
      expect(found.df).toEqual([d1, d2]);
      expect(found.statistic).toBeCloseTo((rss - pure) / d1 / (pure / d2), 9);
    }
  });

  test('is none where a model has a coefficient for every cell, or repeated rows have one response', () => {
    const cell = category('cell', a.map(String));
    expect(
      findingNamed(chosenFrom([...columns, cell], { terms: ['cell'] }).chosen, 'lack_of_fit').verdict,
    ).toContain('a coefficient for every different set of values');
    const flat = numbers(
      'y',
      a.map((v) => v * v),
    );
    expect(
      findingNamed(chosenFrom([flat, columns[1]!], { terms: ['a'] }).chosen, 'lack_of_fit').verdict,
    ).toContain('the same response');
  });
});
