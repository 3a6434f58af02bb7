import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { bestSubsets, type SubsetsFound } from '../../src/engine/best-subsets.ts';
import { factorExtended, factorRows } from '../../src/engine/factor.ts';
import type { SubsetSearch } from '../../src/engine/subset-search.ts';
import { allSubsets, bestResiduals, type PlainGroup, type PlainSubset } from './all-subsets.ts';
import { testModel, variable } from './models.ts';

/** Numbers from a small generator: the same for a seed. Roughly normal. */
function generator(seed: number): () => number {
  let state = Math.imul(seed, 2654435761) >>> 0;
  const uniform = () => {
    state = (Math.imul(state, 1664525) + 1013904223) >>> 0;
    return (state + 0.5) / 2 ** 32;
  };
  return () => uniform() + uniform() + uniform() + uniform() - 2;
}

interface Problem {
  readonly rows: number;
  readonly widths: readonly number[];
  /** For each group, earlier groups that it needs. */
  readonly needs: readonly (readonly number[])[];
  /** How alike the columns are: 0 not at all. */
  readonly likeness: number;
  /** Columns of the first groups that the response is made of. */
  readonly signal: number;
  /** Groups of which the first column is the sum of those of two others. */
  readonly sums: readonly (readonly [number, number, number])[];
  readonly always: number;
  readonly intercept: boolean;
  readonly seed: number;
}

/** The needs of the needs as well. */
function closed(needs: readonly (readonly number[])[]): number[][] {
  const all: number[][] = [];
  for (const own of needs) {
    all.push([...new Set(own.flatMap((need) => [need, ...all[need]!]))].sort((a, b) => a - b));
  }
  return all;
}

function build(problem: Problem) {
  const next = generator(problem.seed);
  const { rows, widths } = problem;
  const shared = Array.from({ length: rows }, next);
  const column = () => shared.map((value) => problem.likeness * value + next());
  const always = Array.from({ length: problem.always }, column);
  const groups = widths.map((width) => Array.from({ length: width }, column));
  for (const [target, a, b] of problem.sums) {
    if (target === a || target === b || a === b || [target, a, b].some((g) => g >= groups.length)) continue;
    groups[target]![0] = groups[a]![0]!.map((value, i) => value + groups[b]![0]![i]!);
  }
  const all = [...always, ...groups.flat()];
  const y = Array.from({ length: rows }, (_, i) =>
    all.slice(0, problem.signal).reduce((sum, x, k) => sum + x[i]! * (1 + (k % 3)), 5 + 2 * next()),
  );
  const data: Record<string, readonly number[]> = { y };
  all.forEach((x, j) => {
    data[`x${j}`] = x;
  });
  const names = all.map((_, j) => variable(`x${j}`));
  const model = testModel(data, names, [all.map((_, j) => j + 1)]);
  const needs = closed(problem.needs);
  let at = problem.always;
  const asked = widths.map((width, g) => {
    const columns = Array.from({ length: width }, (_, c) => at + 1 + c);
    at += width;
    return { columns, needs: needs[g]! };
  });
  const ones = Array.from({ length: rows }, () => 1);
  const search: SubsetSearch = {
    always: [...(problem.intercept ? [0] : []), ...always.map((_, j) => j + 1)],
    groups: asked,
    responseColumn: 0,
    atLeast: 0,
    atMost: widths.length,
    keep: 1,
    mostColumns: rows - 1,
  };
  const plain = allSubsets(
    [...(problem.intercept ? [ones] : []), ...always],
    groups.map((columns, g): PlainGroup => ({ columns, needs: needs[g]! })),
    y,
  );
  const alwaysCount = search.always.length;
  return { model, search, plain, alwaysCount };
}

function expectSame(
  found: SubsetsFound,
  plain: readonly PlainSubset[],
  keep: number,
  alwaysCount: number,
  passes: (subset: PlainSubset) => boolean,
): void {
  const best = bestResiduals(plain, keep, passes);
  const kept = new Map(
    found.sizes
      .filter((size) => size.kept.length > 0)
      .map((size) => [size.columnCount - alwaysCount, size.kept.map((set) => set.residualSumOfSquares)]),
  );
  expect([...kept.keys()].sort((a, b) => a - b)).toEqual([...best.keys()].sort((a, b) => a - b));
  for (const [size, residuals] of best) {
    const own = kept.get(size)!;
    expect(own.length).toBe(residuals.length);
    residuals.forEach((residual, k) => {
      expect(Math.abs(own[k]! - residual)).toBeLessThanOrEqual(1e-7 * residual + 1e-9);
    });
  }
  // Each set is what it says: its RSS is that of its groups.
  const byGroups = new Map(plain.map((subset) => [subset.groups.join(), subset]));
  for (const { kept: sets, columnCount } of found.sizes) {
    for (const set of sets) {
      const same = byGroups.get(set.groups.join())!;
      expect(same.size + alwaysCount).toBe(columnCount);
      expect(Math.abs(same.residual - set.residualSumOfSquares)).toBeLessThanOrEqual(
        1e-7 * same.residual + 1e-9,
      );
    }
  }
}

const seeds = fc.integer({ min: 1, max: 1_000_000 });

/** Groups, some of several columns, some that need earlier ones. */
const problemsOf = (count: number): fc.Arbitrary<Problem> =>
  fc.record({
    rows: fc.integer({ min: 40, max: 60 }),
    widths: fc.array(fc.constantFrom(1, 1, 1, 2, 3), { minLength: count, maxLength: count }),
    needs: fc.tuple(
      ...Array.from({ length: count }, (_, g) =>
        fc
          .array(fc.nat({ max: Math.max(0, g - 1) }), { maxLength: g === 0 ? 0 : 2 })
          .map((own) => (g % 2 === 0 ? [] : own)),
      ),
    ),
    likeness: fc.constantFrom(0, 0.5, 2),
    signal: fc.integer({ min: 0, max: 6 }),
    sums: fc.constant([] as const),
    always: fc.integer({ min: 0, max: 2 }),
    intercept: fc.boolean(),
    seed: seeds,
  });
const problems = fc.integer({ min: 1, max: 12 }).chain(problemsOf);

describe('the best subsets of every size', () => {
  it('are those of trying them all, with groups, needs, limits and what is always in', () => {
    fc.assert(
      fc.property(
        problems,
        fc.integer({ min: 1, max: 4 }),
        fc.nat({ max: 3 }),
        fc.integer({ min: 3, max: 12 }),
        (problem, keep, atLeast, atMost) => {
          const { model, search, plain, alwaysCount } = build(problem);
          const found = bestSubsets(factorRows(model.rows), { ...search, keep, atLeast, atMost });
          expect(found.finished).toBe(true);
          const inLimits = (subset: PlainSubset) =>
            subset.groups.length >= atLeast && subset.groups.length <= atMost;
          expectSame(found, plain, keep, alwaysCount, inLimits);
          expect(found.covered).toBe(plain.filter(inLimits).length);
        },
      ),
      { numRuns: 150 },
    );
  });

  it('are those of trying all of up to sixteen groups', () => {
    const large = fc.integer({ min: 13, max: 16 }).chain(problemsOf);
    fc.assert(
      fc.property(large, fc.integer({ min: 1, max: 3 }), (problem, keep) => {
        const { model, search, plain, alwaysCount } = build(problem);
        const found = bestSubsets(factorRows(model.rows), { ...search, keep });
        expect(found.finished).toBe(true);
        expectSame(found, plain, keep, alwaysCount, () => true);
        expect(found.covered).toBe(plain.length);
      }),
      { numRuns: 3 },
    );
  });

  it('are those of trying them all where columns depend on each other', () => {
    fc.assert(
      fc.property(
        problems,
        fc.array(fc.tuple(fc.nat({ max: 11 }), fc.nat({ max: 11 }), fc.nat({ max: 11 })), {
          minLength: 1,
          maxLength: 3,
        }),
        fc.integer({ min: 1, max: 3 }),
        (problem, sums, keep) => {
          const plainNeeds = problem.needs.map(() => []);
          const { model, search, plain, alwaysCount } = build({ ...problem, needs: plainNeeds, sums });
          const found = bestSubsets(factorExtended(model.rows), { ...search, keep });
          expect(found.finished).toBe(true);
          expectSame(found, plain, keep, alwaysCount, () => true);
        },
      ),
      { numRuns: 100 },
    );
  });

  it('keep to the sets that are admitted, and name the better one that is not', () => {
    fc.assert(
      fc.property(problems, fc.integer({ min: 1, max: 3 }), seeds, (problem, keep, rule) => {
        const { model, search, plain, alwaysCount } = build(problem);
        // A rule without any order to it: about half of the sets pass.
        const passes = ({ groups }: { readonly groups: readonly number[] }) =>
          Math.imul(
            groups.reduce((hash, g) => Math.imul(hash, 31) + g + 1, rule),
            2654435761,
          ) >>>
            31 ===
          0;
        const found = bestSubsets(factorRows(model.rows), {
          ...search,
          keep,
          admits: (groups) => passes({ groups }),
        });
        expectSame(found, plain, keep, alwaysCount, passes);
        const best = bestResiduals(plain, 1, () => true);
        const admitted = bestResiduals(plain, 1, passes);
        for (const [size, [residual]] of best) {
          const entry = found.sizes.find((each) => each.columnCount - alwaysCount === size)!;
          if (admitted.get(size)?.[0] === residual) expect(entry.refused).toBeNull();
          else expect(entry.refused!.residualSumOfSquares).toBeCloseTo(residual!, 6);
        }
      }),
      { numRuns: 100 },
    );
  });
});
