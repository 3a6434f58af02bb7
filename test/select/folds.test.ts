import { describe, expect, test } from 'vitest';
import type { CategoryColumn, Column } from '../../src/data/table.ts';
import type { Sample } from '../../src/prepare/sample.ts';
import type { Problem } from '../../src/problem.ts';
import { drawFolds, type Folds } from '../../src/select/folds.ts';
import type { FoldPlan } from '../../src/study/study.ts';
import { collector, studyWith } from './study-with.ts';

const planOf = (change: Partial<FoldPlan>): FoldPlan => ({
  by: 'rows',
  folds: null,
  repeats: 1,
  seed: 1,
  group: null,
  start: null,
  horizon: 1,
  path: ['selection', 'validation'],
  ...change,
});

function sampleOf(
  n: number,
  columns: readonly Column[] = [],
  timeOrder: readonly number[] | null = null,
): Sample {
  return {
    rowCount: n,
    rows: Int32Array.from({ length: n }, (_, i) => i),
    lines: Uint32Array.from({ length: n }, (_, i) => i + 2),
    ids: null,
    columns: new Map(columns.map((column) => [column.name, column])),
    timeOrder: timeOrder === null ? null : Int32Array.from(timeOrder),
    losses: [],
  };
}

function draw(plan: FoldPlan, sample: Sample, time = 'day'): { folds: Folds | null; problems: Problem[] } {
  const { problems, report } = collector();
  const study = studyWith({});
  const folds = drawFolds(plan, { ...study, data: { ...study.data, time } }, sample, report);
  return { folds, problems };
}

const partsOf = (folds: Folds | null, set = 0): number[] => {
  const one = folds!.sets[set]!;
  return one.kind === 'parts' ? [...one.partOf] : [];
};

const sizes = (parts: readonly number[]) => {
  const counts = new Map<number, number>();
  for (const part of parts) counts.set(part, (counts.get(part) ?? 0) + 1);
  return [...counts.values()].sort((a, b) => a - b);
};

const grouped = (names: readonly string[]): CategoryColumn => {
  const levels = [...new Set(names)];
  return {
    kind: 'category',
    name: 'g',
    codes: Int32Array.from(names, (name) => levels.indexOf(name)),
    levels,
    baseline: levels[0]!,
  };
};

describe('rows', () => {
  test('ten parts of nearly equal size where nothing else is said, the same for a seed', () => {
    const { folds } = draw(planOf({}), sampleOf(103));
    expect(folds!.count).toBe(10);
    expect(sizes(partsOf(folds))).toEqual([10, 10, 10, 10, 10, 10, 10, 11, 11, 11]);
    expect(partsOf(draw(planOf({}), sampleOf(103)).folds)).toEqual(partsOf(folds));
    expect(partsOf(draw(planOf({ seed: 2 }), sampleOf(103)).folds)).not.toEqual(partsOf(folds));
    expect(folds!.nameOf(2)).toBe('fold 3');
  });

  test('each repeat draws anew', () => {
    const { folds } = draw(planOf({ repeats: 3, folds: 4 }), sampleOf(20));
    expect(folds!.sets).toHaveLength(3);
    expect(partsOf(folds, 0)).not.toEqual(partsOf(folds, 1));
  });

  test('fewer rows than ten are held out one by one; fewer than the folds asked for is a fault', () => {
    expect(draw(planOf({}), sampleOf(6)).folds!.count).toBe(6);
    const { folds, problems } = draw(planOf({ folds: 8 }), sampleOf(6));
    expect(folds).toBeNull();
    expect(problems).toMatchObject([
      { code: 'folds_too_many', severity: 'error', place: { line: 3, length: 'folds'.length } },
    ]);
    expect(problems[0]!.message).toMatch(
      /^selection\.validation asks for 8 parts, but there are only 6\srows to draw them from\.$/,
    );
  });

  test.each(['rows', 'leave_one_out'] as const)('a single row cannot be held out (%s)', (by) => {
    expect(draw(planOf({ by }), sampleOf(1)).problems).toMatchObject([{ code: 'folds_too_many' }]);
  });
});

describe('groups', () => {
  const names = [...'aaaaaabbbbccddeeff'];

  test('stay together, the parts as even as the groups allow', () => {
    const { folds } = draw(
      planOf({ by: 'group', group: 'g', folds: 3 }),
      sampleOf(names.length, [grouped(names)]),
    );
    const parts = partsOf(folds);
    for (const name of names) {
      expect(new Set(parts.filter((_, i) => names[i] === name)).size).toBe(1);
    }
    expect(sizes(parts)).toEqual([6, 6, 6]);
  });

  test('one part for each where they are fewer than ten, named after the group and drawn once', () => {
    const { folds } = draw(
      planOf({ by: 'group', group: 'g', repeats: 5 }),
      sampleOf(names.length, [grouped(names)]),
    );
    expect(folds!.count).toBe(6);
    expect(folds!.sets).toHaveLength(1);
    expect(folds!.nameOf(1)).toBe('g b');
  });

  test('fewer groups than folds', () => {
    const sample = sampleOf(4, [grouped(['a', 'a', 'b', 'b'])]);
    expect(draw(planOf({ by: 'group', group: 'g', folds: 3 }), sample).problems[0]!.message).toMatch(
      /asks for 3 parts, but there are only 2\sgroups of g to draw them from/,
    );
    const one = sampleOf(3, [grouped(['a', 'a', 'a'])]);
    expect(draw(planOf({ by: 'group', group: 'g' }), one).problems).toMatchObject([
      {
        code: 'folds_too_many',
        message: expect.stringMatching(/asks for 2 parts, but there is only 1\sgroup of g/),
      },
    ]);
  });
});

describe('times', () => {
  // Two rows on each of five days, not in order in the file.
  const day: Column = {
    kind: 'number',
    name: 'day',
    values: Float64Array.from([3, 1, 2, 5, 4, 1, 2, 3, 4, 5]),
  };
  const order = [1, 5, 2, 6, 0, 7, 4, 8, 3, 9];
  const sample = sampleOf(10, [day], order);
  const growing = (folds: Folds | null) => {
    const set = folds!.sets[0]!;
    return set.kind === 'growing' ? set.parts.map((part) => [...part]) : [];
  };

  test('origins go forward by the horizon; rows of one time stay together', () => {
    const { folds } = draw(planOf({ by: 'time', start: 2 }), sample);
    expect(growing(folds)).toEqual([
      [1, 2, 5, 6],
      [0, 7],
      [4, 8],
      [3, 9],
    ]);
    expect(folds!.count).toBe(3);
    expect(folds!.nameOf(0)).toBe('the rows of 3');
    const two = draw(planOf({ by: 'time', start: 2, horizon: 2 }), sample).folds;
    expect(growing(two)).toEqual([
      [1, 2, 5, 6],
      [0, 4, 7, 8],
      [3, 9],
    ]);
    expect([two!.nameOf(0), two!.nameOf(1)]).toEqual(['the rows of 3 to 4', 'the rows of 5']);
  });

  test('half of the times start where nothing is said', () => {
    expect(growing(draw(planOf({ by: 'time' }), sample).folds)[0]).toEqual([1, 2, 5, 6]);
  });

  test('a start that leaves nothing to predict', () => {
    const { folds, problems } = draw(planOf({ by: 'time', start: 5 }), sample);
    expect(folds).toBeNull();
    expect(problems).toMatchObject([
      { code: 'origin_too_late', severity: 'error', hint: 'Start at 4 or earlier.' },
    ]);
    const same = sampleOf(2, [{ kind: 'number', name: 'day', values: Float64Array.of(4, 4) }], [0, 1]);
    expect(draw(planOf({ by: 'time' }), same).problems[0]!.message).toContain('day has one value only');
  });
});
