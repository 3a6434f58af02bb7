/** What cannot be judged says so in a sentence: never NaN, never a crash. */
import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import type { Column } from '../../src/data/table.ts';
import type { Finding } from '../../src/examine/diagnostic.ts';
import { DIAGNOSTICS, examine } from '../../src/examine/examine.ts';
import { withoutRows } from '../../src/examine/without-row.ts';
import { category, flags, numbers } from '../prepare/columns.ts';
import { uniform } from '../select/any-problem.ts';
import { chosenFrom, findingNamed, type Wanted } from './chosen-from.ts';

function sound(findings: readonly Finding[]): void {
  for (const { name, statistic, p_value: p, df, verdict, figures = [] } of findings) {
    for (const value of [statistic, ...df, ...figures.map((figure) => figure.value)]) {
      expect(value === null || Number.isFinite(value), `${name}: ${value}`).toBe(true);
    }
    expect(p === null || (p >= 0 && p <= 1), `${name}: p-value ${p}`).toBe(true);
    expect(verdict, name).toMatch(/^\S.*\.$/s);
    expect(verdict, name).not.toMatch(/NaN|undefined|Infinity|null/);
  }
}

const findingsOf = (columns: readonly Column[], wanted: Wanted): Finding[] => {
  const fitted = chosenFrom(columns, wanted);
  return examine(fitted.chosen, withoutRows(fitted.chosen, fitted));
};

const many = (n: number, seed = 7) => {
  const next = uniform(seed);
  return Array.from({ length: n }, () => next());
};
const count = (n: number) => Array.from({ length: n }, (_, i) => i);

describe('every diagnostic', () => {
  test('has a name, a question, a source and a statistic of its own', () => {
    expect(new Set(DIAGNOSTICS.map(({ name }) => name)).size).toBe(DIAGNOSTICS.length);
    for (const { name, question, source, statisticName } of DIAGNOSTICS) {
      expect(name).toMatch(/^[a-z_]+$/);
      expect(question).toMatch(/^[A-Z].*\?$/);
      expect(source.length).toBeGreaterThan(5);
      expect(statisticName.length).toBeGreaterThan(3);
    }
  });

  test('says something sound of any small sample, whatever its rows, times, weights and split', () => {
    fc.assert(
      fc.property(
        fc.integer({ min: 3, max: 12 }),
        fc.array(fc.integer({ min: -3, max: 3 }), { minLength: 48, maxLength: 48 }),
        fc.constantFrom(1, 1e-120, 1e120, 1e-5),
        fc.constantFrom(0, 1e9),
        fc.boolean(),
        fc.integer({ min: -4, max: 4 }),
        (n, values, unit, offset, weighted, split) => {
          const part = (k: number) => values.slice(k * 12, k * 12 + n);
          const a = part(1);
          const columns = [
            numbers(
              'y',
              part(0).map((v, i) => unit * (v + 0.1 * i) + (unit === 1 ? offset : 0)),
            ),
            numbers(
              'a',
              a.map((v, i) => v + (i === 0 ? 0.5 : 0)),
            ),
            flags(
              'f',
              part(2).map((v) => v > 0),
            ),
            numbers('t', part(3)),
            numbers(
              'w',
              part(2).map((v) => Math.abs(v) + 0.5),
            ),
          ];
          let findings: Finding[];
          try {
            findings = findingsOf(columns, {
              terms: ['a'],
              others: [{ terms: ['a', 'f'] }],
              time: 't',
              ...(weighted ? { weights: 'w' } : {}),
              examination: { splitAt: { variable: 't', value: split, text: String(split) } },
            });
          } catch (error) {
            // A sample that cannot be fitted is refused before anything is examined.
            if (error instanceof Error && /same value|No row/.test(error.message)) return;
            throw error;
          }
          sound(findings);
        },
      ),
      { numRuns: 300 },
    );
  });
});

describe('what steps aside', () => {
  test('an exact fit: every diagnostic, with a sentence', () => {
    const a = count(8);
    const findings = findingsOf(
      [
        numbers(
          'y',
          a.map((v) => 2 + 3 * v),
        ),
        numbers('a', a),
        numbers('t', a),
      ],
      {
        terms: ['a'],
        time: 't',
        examination: { splitAt: { variable: 't', value: 4, text: '4' } },
      },
    );
    sound(findings);
    const judged = findings.filter(({ statistic }) => statistic !== null).map(({ name }) => name);
    expect(judged).toEqual(['enough_rows']);
  });

  test('no degrees of freedom', () => {
    sound(
      findingsOf([numbers('y', [1, 3]), numbers('a', [1, 2]), numbers('t', [1, 2])], {
        terms: ['a'],
        time: 't',
      }),
    );
  });

  test('one degree of freedom', () => {
    const findings = findingsOf([numbers('y', [1, 3, 4]), numbers('a', [1, 2, 4]), numbers('t', [1, 2, 3])], {
      terms: ['a'],
      time: 't',
    });
    sound(findings);
    expect(findings.find(({ name }) => name === 'serial_correlation')!.verdict).toBe(
      'Looking 1 row back takes more than the 1 degree of freedom that the model leaves.',
    );
  });

  test('a leverage of 1, and squares that are too many', () => {
    const n = 12;
    const columns = [
      numbers('y', many(n)),
      numbers('a', many(n, 3)),
      numbers('b', many(n, 5)),
      numbers('c', many(n, 9)),
      category(
        'k',
        count(n).map((i) => (i === 4 ? 'only' : i % 2 === 0 ? 'p' : 'q')),
      ),
    ];
    const findings = findingsOf(columns, { terms: ['a', 'b', 'c', 'k'] });
    sound(findings);
    expect(findings.find(({ name }) => name === 'influence')!.verdict).toContain('leverage 1');
    expect(findings.find(({ name }) => name === 'uneven_spread')!.verdict).toMatch(/too many for the test/);
  });

  test('a mean alone: nothing to depend on, and normality still judged', () => {
    const findings = findingsOf([numbers('y', many(20))], { terms: [] });
    sound(findings);
    const of = (name: string) => findings.find((finding) => finding.name === name)!;
    expect(of('uneven_spread').statistic).toBeNull();
    expect(of('shape').verdict).toContain('too few different values');
    expect(of('normality').statistic).toBeGreaterThan(0.8);
  });

  test('questions that do not arise are not put', () => {
    const names = findingsOf([numbers('y', many(20)), numbers('a', many(20, 2))], { terms: ['a'] }).map(
      ({ name }) => name,
    );
    // No time, no split, no repeated rows, one candidate.
    for (const absent of [
      'independence',
      'serial_correlation',
      'drift',
      'same_in_both_parts',
      'lack_of_fit',
      'choice_without_a_row',
    ])
      expect(names).not.toContain(absent);
  });

  test('a response that is not positive, hardly varies or has no intercept has no best power', () => {
    const verdict = (y: number[], intercept = true) =>
      findingNamed(
        chosenFrom([numbers('y', y), numbers('a', many(12, 4))], { terms: ['a'], intercept }).chosen,
        'response_scale',
      ).verdict;
    expect(verdict(many(12).map((v) => v - 0.5))).toContain('not positive in every row');
    expect(verdict(many(12).map((v) => 1e9 + v * 1e-3))).toContain('hardly varies');
    expect(
      verdict(
        many(12).map((v) => 1 + v),
        false,
      ),
    ).toContain('Without an intercept');
  });

  test('more rows than the Shapiro–Wilk test is made for', () => {
    const n = 5001;
    const { chosen } = chosenFrom([numbers('y', many(n)), numbers('a', many(n, 3))], { terms: ['a'] });
    expect(findingNamed(chosen, 'normality').verdict).toContain('at most 5');
    expect(findingNamed(chosen, 'skewness_and_tails').statistic).toBeGreaterThan(0);
  });
});

describe('time', () => {
  const n = 30;
  const y = many(n).map((v, i) => v + i);
  test('repeated times and rows out of order are said, and taken in time order', () => {
    const t = count(n).map((i) => (i === 3 ? 2 : i === 20 ? 25.5 : i));
    const { chosen } = chosenFrom([numbers('y', y), numbers('a', many(n, 2)), numbers('t', t)], {
      terms: ['a', 't'],
      time: 't',
    });
    const { verdict } = findingNamed(chosen, 'independence');
    expect(verdict).toContain('1 row shares its time with the row before; they are taken in file order.');
    expect(verdict).toContain('In the file 1 row stands below a later one; they are taken in time order.');
  });

  test('gaps between times that are otherwise one step apart are said', () => {
    const verdict = (t: number[]) =>
      findingNamed(
        chosenFrom([numbers('y', y), numbers('a', many(n, 2)), numbers('t', t)], { terms: ['a'], time: 't' })
          .chosen,
        'independence',
      ).verdict;
    const said = 'the rows on both sides of a gap are taken as neighbours.';
    // The thirteenth row, below a header.
    expect(verdict(count(n).map((i) => (i < 12 ? i : i + 1)))).toContain(
      `1 row stands behind a gap in time (row 14); ${said}`,
    );
    expect(verdict(count(n).map((i) => i + (i < 12 ? 0 : 1) + (i < 20 ? 0 : 5)))).toContain(
      `2 rows stand behind a gap in time (the first is row 14); ${said}`,
    );
    // A time that comes twice, and a gap further on.
    expect(verdict(count(n).map((i) => i - (i < 8 ? 0 : 1) + (i < 20 ? 0 : 5)))).toContain(
      `1 row shares its time with the row before; they are taken in file order. 1 row stands behind a gap in time (row 22); ${said}`,
    );
    // Two rows, and ten, at each time: what lies between two times is no step from row to row.
    for (const at of [2, 10]) {
      expect(verdict(count(n).map((i) => Math.floor(i / at) + (i < 20 ? 0 : 5)))).not.toContain('gap');
    }
    expect(verdict(count(n).map((i) => (i < 29 ? 0 : 1)))).not.toContain('gap');
    // One step throughout; and no usual step at all, as of working days.
    expect(verdict(count(n))).not.toContain('gap');
    expect(verdict(count(n).map((i) => i + 2 * Math.floor(i / 5)))).not.toContain('gap');
  });

  test('more rows than an exact p-value is quick for: an approximate one', () => {
    const rows = 2001;
    const { chosen } = chosenFrom(
      [numbers('y', many(rows)), numbers('a', many(rows, 2)), numbers('t', count(rows))],
      { terms: ['a'], time: 't' },
    );
    const [first] = findingNamed(chosen, 'independence').figures!;
    expect(first!.name).toMatch(/^approximate/);
  });

  test.each([
    [1, 7],
    [30, 12],
    [91, 4],
    [10, 1],
  ])('dates %d days apart: %d rows back where nothing is declared', (gap, lags) => {
    const rows = 60;
    const { chosen } = chosenFrom(
      [
        numbers('y', many(rows)),
        numbers('a', many(rows, 2)),
        numbers(
          'd',
          count(rows).map((i) => 20000 + gap * i),
          'date',
        ),
      ],
      { terms: ['a'], time: 'd' },
    );
    expect(findingNamed(chosen, 'serial_correlation').df).toEqual([lags]);
  });

  test('fewer rows than a season asks for: 1 row back', () => {
    const { chosen } = chosenFrom(
      [
        numbers('y', many(14)),
        numbers('a', many(14, 2)),
        numbers(
          'd',
          count(14).map((i) => 20000 + 30 * i),
          'date',
        ),
      ],
      { terms: ['a'], time: 'd' },
    );
    expect(findingNamed(chosen, 'serial_correlation').df).toEqual([1]);
  });
});

describe('a declared split', () => {
  const n = 30;
  const columns = [numbers('y', many(n)), numbers('a', many(n, 2)), numbers('t', [...count(n - 1), null])];
  const verdict = (value: number, variable = 'a') =>
    findingNamed(
      chosenFrom(columns, {
        terms: ['a'],
        examination: { splitAt: { variable, value, text: String(value) } },
      }).chosen,
      'same_in_both_parts',
    );

  test('outside the data, or with values missing, says so', () => {
    expect(verdict(5).verdict).toBe('a 5 lies outside the data: all 30 rows are below it.');
    expect(verdict(-5).verdict).toBe('a -5 lies outside the data: all 30 rows are at or above it.');
    expect(verdict(5, 't').verdict).toContain('t is missing in some of the rows');
  });

  test('a part with fewer rows than coefficients is held against what the other leads one to expect', () => {
    const sorted = [...many(n, 2)].sort((a, b) => a - b);
    const found = verdict(sorted[n - 1]!);
    expect(found.df).toEqual([1, 27]);
    expect(found.verdict).toContain('too few rows for coefficients of its own');
    // Chow's second test for one row is the square of its deleted residual, on 1 and n − 1 − p.
    const { chosen } = chosenFrom(columns, { terms: ['a'] });
    const row = columns[1]!.kind === 'number' ? columns[1]!.values.indexOf(sorted[n - 1]!) : -1;
    const h = chosen.leverages[row]!;
    const e = chosen.residuals[row]!;
    const rss = chosen.fit.residualSumOfSquares;
    const deleted = (e * e) / (1 - h) / ((rss - (e * e) / (1 - h)) / 27);
    expect(found.statistic).toBeCloseTo(deleted, 9);
  });
});
