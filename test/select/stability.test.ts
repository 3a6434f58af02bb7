import { describe, expect, test } from 'vitest';
import type { CategoryColumn } from '../../src/data/table.ts';
import { namesOfChosen } from '../../src/select/candidate-name.ts';
import { choose } from '../../src/select/choose.ts';
import { declaredProcedure } from '../../src/select/procedure.ts';
import { quantileOf } from '../../src/select/quantile.ts';
import { stability } from '../../src/select/stability.ts';
import { randomFrom } from '../../src/stats/random.ts';
import { shuffle } from '../../src/stats/shuffle.ts';
import type { StabilityPlan } from '../../src/study/study.ts';
import { variable } from '../engine/models.ts';
import { makeGround, numbers } from './make-ground.ts';
import { studyWith } from './study-with.ts';

const COLUMNS = ['a', 'b'].map(variable);
const CANDIDATES = [[0], [0, 1], [0, 2], [0, 1, 2]];

function tableOf(n: number, seed: number) {
  const next = numbers(seed);
  const a = Array.from({ length: n }, () => next());
  const b = Array.from({ length: n }, () => next());
  return { y: a.map((v, i) => 3 + v + 0.6 * b[i]! + next() * 1.4), a, b };
}

const planOf = (change: Partial<StabilityPlan>): StabilityPlan => ({
  repetitions: 60,
  seed: 4,
  by: 'rows',
  group: null,
  blockLength: null,
  ...change,
});

/** The same draws, each written out row by row, fitted and chosen from anew. */
function writtenOut(
  data: ReturnType<typeof tableOf>,
  units: readonly (readonly number[])[],
  plan: StabilityPlan,
) {
  const random = randomFrom(plan.seed);
  const study = studyWith({ rankBy: 'aicc' });
  const chosen = new Map<string, number>();
  const slopes: number[] = [];
  for (let r = 0; r < plan.repetitions; r++) {
    const rows = Array.from(units, () => units[random.below(units.length)]!).flat();
    const drawn = Object.fromEntries(
      Object.entries(data).map(([name, values]) => [name, rows.map((i) => values[i]!)]),
    );
    const { fitted } = makeGround(drawn, COLUMNS, CANDIDATES);
    const fit = fitted.fits[choose(study, fitted, () => {}).chosen!]!;
    chosen.set(fit.candidate.name, (chosen.get(fit.candidate.name) ?? 0) + 1);
    const at = fit.columns.indexOf(1);
    if (at >= 0) slopes.push(fit.estimates[at]!);
  }
  return { chosen, slopes: Float64Array.from(slopes).sort() };
}

function compare(
  data: ReturnType<typeof tableOf>,
  units: readonly (readonly number[])[],
  plan: StabilityPlan,
  groups?: CategoryColumn,
) {
  const made = makeGround(data, COLUMNS, CANDIDATES, { time: true });
  const columns = new Map(made.ground.sample.columns);
  if (groups !== undefined) columns.set(groups.name, groups);
  const ground = { ...made.ground, sample: { ...made.ground.sample, columns } };
  const procedure = declaredProcedure(studyWith({ rankBy: 'aicc' }), ground.design, null);
  const found = stability({ plan, ground, procedure });
  const wanted = writtenOut(data, units, plan);
  expect(new Map(found.candidates.map((one) => [one.candidate, one.chosen]))).toEqual(wanted.chosen);
  const slope = found.coefficients.find(({ column }) => column === 1)!;
  expect(slope.chosen).toBe(wanted.slopes.length);
  [0.05, 0.25, 0.5, 0.75, 0.95].forEach((p, k) => {
    expect(slope.quantiles[k]).toBeCloseTo(quantileOf(wanted.slopes, p), 9);
  });
  expect(slope.positive).toBe(wanted.slopes.filter((value) => value > 0).length);
  expect(found.units).toBe(units.length);
  return found;
}

describe('the choice from rows drawn anew is that of the draws written out', () => {
  test('by row', () => {
    const found = compare(
      tableOf(40, 2),
      Array.from({ length: 40 }, (_, i) => [i]),
      planOf({}),
    );
    expect(found.candidates.length).toBeGreaterThan(1);
    expect(found.terms.map(({ term }) => term).sort()).toEqual(['a', 'b']);
  });

  test.each([
    ['large, from their factors', 120, 12],
    ['small, by passes', 30, 12],
  ])('by groups: %s', (_, n, groups) => {
    const codes = Int32Array.from({ length: n }, (_, i) => (i < groups ? i : (i * 5) % groups));
    const column: CategoryColumn = {
      kind: 'category',
      name: 'g',
      codes,
      levels: Array.from({ length: groups }, (_, k) => `g${k}`),
      baseline: 'g0',
    };
    const units = Array.from({ length: groups }, (_, k) => [...codes.keys()].filter((i) => codes[i] === k));
    compare(tableOf(n, 3), units, planOf({ by: 'group', group: 'g' }), column);
  });

  test.each([7, 3, null])('by blocks in time, the last one shorter: length %s', (blockLength) => {
    const n = 64;
    const length = blockLength ?? 4;
    const units = Array.from({ length: Math.ceil(n / length) }, (_, k) =>
      Array.from({ length: Math.min(length, n - k * length) }, (_, i) => k * length + i),
    );
    const found = compare(tableOf(n, 5), units, planOf({ by: 'blocks', blockLength }));
    expect(found.blockLength).toBe(length);
  });

  test('none admitted is counted', () => {
    const { ground } = makeGround(tableOf(20, 2), COLUMNS, CANDIDATES);
    const study = studyWith({ rankBy: 'aic', admit: { rowsPerCoefficient: { atLeast: 100 } } });
    const found = stability({
      plan: planOf({}),
      ground,
      procedure: declaredProcedure(study, ground.design, null),
    });
    expect(found).toMatchObject({ noneAdmitted: 60, candidates: [], terms: [], coefficients: [] });
  });
});

test('what a search finds is called by the study’s name for the same columns, else by its terms', () => {
  const { ground } = makeGround(tableOf(10, 2), COLUMNS, CANDIDATES);
  const [mean, a] = ground.design.candidates;
  const nameOf = namesOfChosen({ candidates: [a!] });
  expect(nameOf({ ...a!, name: 'Any 2a' })).toBe(a!.name);
  expect(nameOf({ ...mean!, name: 'Any 1a' })).toBe('the mean alone');
  expect(nameOf({ ...ground.design.candidates[3]!, name: 'Any 3a' })).toBe('a, b');
});

test('quantiles: none, one, two, and between (Hyndman & Fan 1996, definition 7)', () => {
  expect(quantileOf(new Float64Array(0), 0.5)).toBeNaN();
  expect(quantileOf(Float64Array.of(3), 0.95)).toBe(3);
  expect(quantileOf(Float64Array.of(1, 2), 0.25)).toBe(1.25);
  expect(quantileOf(Float64Array.of(0, 10, 20, 30, 40), 0.95)).toBe(38);
});

test('shuffling keeps every value, depends on the seed alone, and favours no order', () => {
  const of = (seed: number) => [...shuffle(Int32Array.of(0, 1, 2), randomFrom(seed))].join('');
  expect(of(7)).toBe(of(7));
  const counts = new Map<string, number>();
  for (let seed = 0; seed < 6000; seed++) counts.set(of(seed), (counts.get(of(seed)) ?? 0) + 1);
  expect(counts.size).toBe(6);
  // χ² on 5 degrees of freedom: 25.7 is passed once in ten thousand.
  const squares = [...counts.values()].reduce((sum, count) => sum + (count - 1000) ** 2 / 1000, 0);
  expect(squares).toBeLessThan(25.7);
  expect([...shuffle(new Int32Array(0), randomFrom(1))]).toEqual([]);
});
