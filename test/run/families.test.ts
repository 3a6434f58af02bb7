/** Families of candidates through whole runs. */
import { describe, expect, it } from 'vitest';
import type { StudyRecord } from '../../src/record/record.ts';
import { HALD, SUBSETS } from '../reference/hald-cement/hald-cement.ts';
import { drawn } from '../select/family-of.ts';
import { csvOf, runText } from './run-text.ts';

const CEMENT = { 'hald.csv': csvOf({ ...HALD.columns, y: HALD.y }) };

function cement(candidates: readonly string[], selection: string, more = ''): string {
  return [
    'plumbrule: 1',
    'title: Heat of hardening cement',
    'data:',
    '  file: hald.csv',
    '  variables:',
    ...['x1', 'x2', 'x3', 'x4', 'y'].map((name) => `    ${name}: { type: number }`),
    'response: y',
    'candidates:',
    ...candidates.map((candidate) => `  - ${candidate}`),
    `selection: { ${selection} }`,
    more,
  ].join('\n');
}

async function recordOf(study: string, files: Readonly<Record<string, string>>): Promise<StudyRecord> {
  const { record, problems } = await runText(study, files);
  expect(problems.filter(({ severity }) => severity === 'error')).toEqual([]);
  return record!;
}

const ALL = '{ name: All, subsets_of: [x1, x2, x3, x4], at_least: 1, keep: 6 }';
const byTerms = (record: StudyRecord) =>
  new Map(record.candidates.map((candidate) => [candidate.terms.join(' '), candidate]));
const chosenTerms = (record: StudyRecord) =>
  record.candidates.find(({ name }) => name === record.selection.chosen)!.terms.join(' ');

describe('all fifteen subsets of the cement data', () => {
  it('are found, with the published figures', async () => {
    const record = await recordOf(cement([ALL], 'rank_by: mallows_cp'), CEMENT);
    expect(record.candidates).toHaveLength(15);
    const found = byTerms(record);
    expect(found.size).toBe(15);
    // shared check values: recomputed from exact arithmetic, see test/reference/hald-cement/README.md.
    for (const { terms, mallowsCp, shortAic, press } of SUBSETS) {
      const candidate = found.get(terms.join(' '))!;
      expect(candidate.mallows_cp).toBeCloseTo(mallowsCp, 4);
      expect(candidate.press).toBeCloseTo(press, 3);
      expect(candidate.aic! - 13 * (1 + Math.log(2 * Math.PI)) - 2).toBeCloseTo(shortAic, 4);
    }
    const [family] = record.families!;
    expect(family).toMatchObject({
      searched: 15,
      searched_exactly: true,
      exact_for: 'every size',
      note: null,
    });
    expect(record.selection.models_looked_at).toBe(15);
    // The best of each size: x4; x1 x2; x1 x2 x4; all four (Draper & Smith, from memory; the sets of two and three as in SUBSETS).
    const best = family!.best_by_size.map(({ candidate }) =>
      record.candidates.find(({ name }) => name === candidate)!.terms.join(' '),
    );
    expect(best).toEqual(['x4', 'x1 x2', 'x1 x2 x4', 'x1 x2 x3 x4']);
    expect(family!.best_by_size[1]!.value).toBeCloseTo(2.67824, 4);
    expect(family!.candidates).toEqual([
      ...['All 2a', 'All 2b', 'All 2c', 'All 2d'],
      ...['All 3a', 'All 3b', 'All 3c', 'All 3d', 'All 3e', 'All 3f'],
      ...['All 4a', 'All 4b', 'All 4c', 'All 4d', 'All 5a'],
    ]);
  });

  it.each([
    ['mallows_cp', 'x1 x2'],
    ['aicc', 'x1 x2'],
    ['aic', 'x1 x2 x4'],
    ['press', 'x1 x2 x4'],
  ])('give %s its own winner', async (criterion, winner) => {
    const record = await recordOf(cement([ALL], `rank_by: ${criterion}`), CEMENT);
    expect(chosenTerms(record)).toBe(winner);
    const note = record.families![0]!.note;
    if (criterion === 'press') expect(note).toContain('PRESS is held only against the 6 best');
    else expect(note).toBeNull();
  });

  it.each(['bic', 'adjusted_r_squared', 'partial_f'])(
    'are ranked by %s as if each had been named',
    async (criterion) => {
      const sets = Array.from({ length: 15 }, (_, k) => [1, 2, 3, 4].filter((j) => ((k + 1) >> (j - 1)) & 1));
      const named = sets.map((set, k) => `{ name: S${k}, terms: [${set.map((j) => `x${j}`).join(', ')}] }`);
      const searched = await recordOf(cement([ALL], `rank_by: ${criterion}`), CEMENT);
      const declared = await recordOf(cement(named, `rank_by: ${criterion}`), CEMENT);
      expect(chosenTerms(searched)).toBe(chosenTerms(declared));
      expect(declared.families).toBeUndefined();
    },
  );

  it('keep to the rules of admission in the search', async () => {
    const record = await recordOf(
      cement(
        ['{ name: All, subsets_of: [x1, x2, x3, x4], keep: 1 }'],
        'rank_by: aicc, admit: { vif: { at_most: 2 }, signs: { x4: negative } }',
      ),
      CEMENT,
    );
    const [family] = record.families!;
    const four = family!.best_by_size.find(({ coefficient_count }) => coefficient_count === 4)!;
    // Every set of three with a good fit has a pair of opposites in it; the best is shown, and why it was not chosen.
    expect(four.admitted).toBe(false);
    expect(record.candidates.find(({ name }) => name === four.candidate)!.refused_because.join()).toContain(
      'VIF of',
    );
    expect(four.better_refused).toBeNull();
    const three = family!.best_by_size.find(({ coefficient_count }) => coefficient_count === 3)!;
    expect(three.admitted).toBe(true);
    expect(chosenTerms(record)).toBe('x1 x2');
  });

  it('stand beside named candidates, under the name that was there first', async () => {
    const record = await recordOf(
      cement(
        [
          '{ name: Two, terms: [x1, x2] }',
          ALL,
          '{ name: Back, eliminate_from: [x1, x2, x3, x4], leave_at: 0.1 }',
        ],
        'rank_by: aicc',
        'acceptance: { chosen: [Back] }\n',
      ),
      CEMENT,
    );
    expect(record.selection.chosen).toBe('Two');
    expect(record.candidates).toHaveLength(15);
    const [all, back] = record.families!;
    expect(all!.candidates).toContain('Two');
    expect(back!.candidates).toEqual(['Two']);
    expect(record.acceptance).toEqual([{ criterion: 'chosen', limit: 'Back', value: 'Two', passed: true }]);
    // The named one, fifteen subsets, and three models on the way of the elimination.
    expect(record.selection.models_looked_at).toBe(19);
  });
});

describe('elimination and selection on the cement data', () => {
  it('go the way of the textbook', async () => {
    const record = await recordOf(
      cement(
        [
          '{ name: Back, eliminate_from: [x1, x2, x3, x4], leave_at: 0.1 }',
          '{ name: Forth, add_from: [x1, x2, x3, x4], enter_at: 0.15, leave_at: 0.15 }',
        ],
        'rank_by: aicc',
      ),
      CEMENT,
    );
    const path = (index: number) =>
      record.families![index]!.path.map(({ action, term }) => `${term} ${action}`);
    // Draper & Smith, Applied Regression Analysis, backward elimination and stepwise selection of these data (from memory).
    expect(path(0)).toEqual(['x3 leaves', 'x4 leaves']);
    expect(path(1)).toEqual(['x4 enters', 'x1 enters', 'x2 enters', 'x4 leaves']);
    expect(record.families!.map(({ candidates }) => candidates)).toEqual([['Back'], ['Back']]);
    expect(record.families![0]!.path[1]).toMatchObject({ step: 2, df1: 1, df2: 9 });
    expect(record.families![0]!.path[1]!.statistic).toBeCloseTo(1.8633, 3);
    expect(record.families![0]!.ended_because).toContain('No p-value of a term that may leave is above 0.1');
  });
});

/** 50 predictors and 100 rows of nothing (Freedman 1983). */
function noise(): Readonly<Record<string, string>> {
  const next = drawn(1983);
  const columns: Record<string, number[]> = {};
  for (let j = 1; j <= 50; j++) columns[`v${j}`] = Array.from({ length: 100 }, next);
  columns.y = Array.from({ length: 100 }, next);
  return { 'noise.csv': csvOf(columns) };
}

describe('a search of noise', () => {
  const names = Array.from({ length: 50 }, (_, j) => `v${j + 1}`);
  const study = (candidate: string, selection: string) =>
    [
      'plumbrule: 1',
      'title: Noise',
      'data:',
      '  file: noise.csv',
      '  variables:',
      ...[...names, 'y'].map((name) => `    ${name}: { type: number }`),
      'response: y',
      'candidates:',
      '  - { name: Mean, terms: [] }',
      `  - ${candidate}`,
      `selection: ${selection}`,
      '',
    ].join('\n');

  it('finds what looks significant, and says among how many models', async () => {
    const record = await recordOf(
      study(`{ name: F, subsets_of: [${names.join(', ')}], at_most: 5, keep: 1 }`, '{ rank_by: aicc }'),
      noise(),
    );
    const chosen = record.candidates.find(({ name }) => name === record.selection.chosen)!;
    expect(chosen.name).toBe('F 6a');
    expect(chosen.overall_f!.p_value!).toBeLessThan(0.01);
    // 50 terms, up to 5 of them: Σ C(50, k), and the mean.
    expect(record.selection.models_looked_at).toBe(1 + 1 + 50 + 1225 + 19_600 + 230_300 + 2_118_760);
    const warning = record.warnings.find(({ about }) => about === 'selection')!;
    expect(warning.text).toMatch(/2.369.937 models/);
    expect(warning.text).toContain('flatter');
  });

  it('is no better than the mean on rows that had no part in the choice', async () => {
    const record = await recordOf(
      study(
        `{ name: F, subsets_of: [${names.slice(0, 25).join(', ')}], at_most: 3, keep: 1 }`,
        '{ rank_by: bic, honest_error: { folds: 5, seed: 3 } }',
      ),
      noise(),
    );
    expect(record.selection.honest_error).toBeDefined();
    expect(JSON.stringify(record.selection.honest_error)).toContain('no better than the mean');
  });
});

describe('a searched choice on one part of the rows', () => {
  it('is estimated from the other without the caution', async () => {
    const names = ['v1', 'v2', 'v3', 'v4', 'v5', 'v6'];
    const study = [
      'plumbrule: 1',
      'title: Noise',
      'data:',
      '  file: noise.csv',
      '  variables:',
      ...[...names, 'y'].map((name) => `    ${name}: { type: number }`),
      'response: y',
      'candidates:',
      `  - { name: F, subsets_of: [${names.join(', ')}], at_least: 2 }`,
      'selection: { rank_by: aicc, split_sample: { share: 0.5, seed: 4 } }',
      '',
    ].join('\n');
    const record = await recordOf(study, noise());
    expect(record.families![0]!.searched).toBe(2 ** 6 - 1 - 6);
    expect(record.selection.split_sample).toMatchObject({ rows_choosing: 50, rows_estimating: 50 });
    expect(record.warnings.filter(({ about }) => about === 'selection')).toEqual([]);
  });
});

describe('a family of which nothing can be fitted', () => {
  it('stops the run where it is all there is', async () => {
    const { record, problems } = await runText(
      cement(['{ name: Back, eliminate_from: [x1, x2, x3, x4], leave_at: 0.1 }'], 'rank_by: aicc'),
      { 'hald.csv': `${CEMENT['hald.csv']!.split('\n').slice(0, 6).join('\n')}\n` },
    );
    expect(record).toBeNull();
    expect(problems.map(({ code, message }) => [code, message])).toEqual([
      [
        'search_empty',
        'Back has no model: it begins with 5 coefficients for 5 rows, so that nothing can be tested.',
      ],
    ]);
  });
});
