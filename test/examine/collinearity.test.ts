/** Condition indices and what they point at; figures from test/reference/inference/make.py. */
import { readFileSync } from 'node:fs';
import { describe, expect, test } from 'vitest';
import { longley } from '../reference/longley.ts';
import { type Columns, csv, runText, studyOf } from './run-text.ts';

const figures = JSON.parse(
  readFileSync(new URL('../reference/inference/figures.json', import.meta.url), 'utf8'),
).longley;

async function collinearity(columns: Columns, terms?: string) {
  const { record, problems } = await runText(studyOf(columns, '', terms), csv(columns));
  if (record === null) throw new Error(JSON.stringify(problems));
  return record.examination!.collinearity!;
}

describe('Longley', () => {
  test('the largest index is the published one', async () => {
    const { indices } = await collinearity(longley);
    // Belsley, Kuh & Welsch 1980 print 43275 for this design.
    expect(indices.at(-1)).toBeCloseTo(43275.04, 2);
    expect(indices[0]).toBe(1);
    expect([...indices].sort((a, b) => a - b)).toEqual(indices);
  });

  test('the shares of each coefficient add up to one', async () => {
    const { proportions, columns } = await collinearity(longley);
    columns.forEach((_, j) => {
      expect(proportions.reduce((sum, row) => sum + row[j]!, 0)).toBeCloseTo(1, 12);
    });
  });

  test('who carries the dependencies, and what each would be without the other', async () => {
    const { dependencies } = await collinearity(longley);
    // Carriers by the reference's own proportions, from the largest index down.
    const carriers = figures.condition.indices
      .map((index: number, k: number) => ({
        index,
        names: figures.names.filter((_: string, j: number) => figures.condition.proportions[k][j] > 0.5),
      }))
      .filter((each: { index: number; names: string[] }) => each.index > 30 && each.names.length > 1)
      .reverse();
    expect(dependencies.map(({ columns }) => columns.map(({ name }) => name))).toEqual(
      carriers.map((each: { names: string[] }) => each.names),
    );
    expect(carriers[0].names).toEqual(['intercept', 'x2', 'x3', 'x6']);
    expect(dependencies[0]!.by_construction).toBe(false);
    expect(dependencies[0]!.sentence).toMatch(
      /^x2, x3 and x6, and the intercept with them, nearly depend on one another in these rows \(condition index /,
    );
    const all = figures.estimates;
    for (const each of dependencies.flatMap(({ without }) => without)) {
      for (const { name, estimate, standard_error } of each.coefficients) {
        const j = figures.names.indexOf(name);
        expect(Math.abs(estimate / all[j] - 1)).toBeLessThan(1e-9);
        expect(Math.abs(standard_error! / figures.errors.classical[j] - 1)).toBeLessThan(1e-9);
      }
    }
    for (const figure of figures.without) {
      const { coefficients } = dependencies
        .flatMap(({ without }) => without)
        .find((each) => each.left_out === figure.left_out)!;
      for (const { name, estimate_without, standard_error_without } of coefficients) {
        const expected = figure.coefficients.find((each: { name: string }) => each.name === name);
        expect(Math.abs(estimate_without / expected.estimate - 1), name).toBeLessThan(1e-9);
        expect(Math.abs(standard_error_without! / expected.standard_error - 1), name).toBeLessThan(1e-9);
      }
    }
  });
});

describe('sentences', () => {
  const n = 40;
  const noise = (i: number) => (((i * 7919) % 97) - 48) / 48;
  const other = (i: number) => (((i * 104729) % 89) - 44) / 44;
  const y = Array.from({ length: n }, (_, i) => 3 + other(i) + noise(i + 11));

  test('a column that varies little beside its size, and the intercept', async () => {
    const found = await collinearity({
      y,
      year: Array.from({ length: n }, (_, i) => 2000 + i / 10 + noise(i) / 9),
    });
    expect(found.dependencies.length).toBe(1);
    expect(found.dependencies[0]!.sentence).toMatch(
      /^year varies little beside its size, so that it and the intercept can hardly be told apart \(condition index /,
    );
    expect(found.dependencies[0]!.without).toEqual([
      expect.objectContaining({ left_out: 'year', coefficients: [] }),
    ]);
  });

  test('powers of one variable', async () => {
    const x = Array.from({ length: n }, (_, i) => 50 + 10 * other(i));
    const found = await collinearity({ y, x }, '{ polynomial: x, degree: 3 }');
    expect(found.dependencies[0]).toMatchObject({ by_construction: true });
    expect(found.dependencies[0]!.sentence).toMatch(
      /go together by construction .* read them as one curve\.$/,
    );
  });

  test('two columns that move together; without the one the other says what both do', async () => {
    const a = Array.from({ length: n }, (_, i) => noise(i));
    const b = a.map((value, i) => value + other(i) / 1000);
    const { dependencies } = await collinearity({ y, a, b });
    expect(dependencies.length).toBe(1);
    expect(dependencies[0]!.columns.map(({ name }) => name)).toEqual(['a', 'b']);
    const [withoutA, withoutB] = dependencies[0]!.without;
    expect([withoutA!.left_out, withoutB!.left_out]).toEqual(['a', 'b']);
    const [left] = withoutA!.coefficients;
    expect(left!.name).toBe('b');
    expect(left!.standard_error! / left!.standard_error_without!).toBeGreaterThan(400);
  });

  test('nothing to see', async () => {
    const found = await collinearity({ y, a: Array.from({ length: n }, (_, i) => noise(i)) });
    expect(found.dependencies).toEqual([]);
  });

  test('the intercept alone', async () => {
    expect(await collinearity({ y }, '')).toEqual({
      columns: ['intercept'],
      indices: [1],
      proportions: [[1]],
      dependencies: [],
    });
  });
});
