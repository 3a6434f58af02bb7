/** The criteria on data whose figures are published: test/reference/hald-cement/. */
import { describe, expect, test } from 'vitest';
import type { Fit } from '../../src/engine/fit.ts';
import { choose } from '../../src/select/choose.ts';
import { coefficientFigures } from '../../src/select/coefficients.ts';
import { CRITERIA, criterionNamed } from '../../src/select/criteria.ts';
import { overallF } from '../../src/select/f-test.ts';
import { adjustedRSquared, residualStandardError, rSquared } from '../../src/select/r-squared.ts';
import { summarise } from '../../src/select/summarise.ts';
import type { RankBy } from '../../src/study/study.ts';
import { FULL_MODEL, HALD, PUBLISHED_SHARES, SUBSETS } from '../reference/hald-cement/hald-cement.ts';
import { fitsOf } from './fit-directly.ts';
import { collector, type SelectionChange, studyWith } from './study-with.ts';

const ALL = ['x1', 'x2', 'x3', 'x4'];
/** All 15 subsets, in binary order. */
const subsets = Array.from({ length: 15 }, (_, k) => ALL.filter((_, j) => ((k + 1) >> j) & 1));
const context = fitsOf({
  columns: HALD.columns,
  y: HALD.y,
  candidates: subsets.map((terms) => ({ name: terms.join(' '), terms })),
});
const indexOf = (terms: readonly string[]) => subsets.findIndex((each) => each.join(' ') === terms.join(' '));
const fitOf = (terms: readonly string[]): Fit => context.fits[indexOf(terms)]!;
const value = (name: RankBy, terms: readonly string[]) => criterionNamed(name).value(indexOf(terms), context);

function chosenBy(change: SelectionChange): { readonly name: string | null; readonly because: string } {
  const { problems, report } = collector();
  const choice = choose(studyWith(change), context, report);
  expect(problems).toEqual([]);
  return {
    name: choice.chosen === null ? null : context.fits[choice.chosen]!.candidate.name,
    because: choice.because,
  };
}

describe('the full model, as published', () => {
  const fit = fitOf(ALL);
  const figures = coefficientFigures(fit, context.columnNames, 0.95);

  test('estimates, standard errors and VIF', () => {
    figures.forEach((each, j) => {
      expect(each.estimate).toBeCloseTo(FULL_MODEL.estimates[j]!, 5);
      expect(each.standard_error).toBeCloseTo(FULL_MODEL.standardErrors[j]!, 5);
      if (j === 0) expect(each.vif).toBeNull();
      else expect(each.vif).toBeCloseTo(FULL_MODEL.vif[j - 1]!, 3);
    });
    expect(figures.map(({ term }) => term)).toEqual(['intercept', ...ALL]);
  });

  test('s, R², F, RSS, largest VIF', () => {
    expect(residualStandardError(fit)).toBeCloseTo(FULL_MODEL.s, 5);
    expect(rSquared(fit)).toBeCloseTo(FULL_MODEL.rSquared, 6);
    expect(overallF(fit)!.statistic).toBeCloseTo(FULL_MODEL.f, 3);
    const summary = summarise(indexOf(ALL), context);
    expect(summary.residual_sum_of_squares).toBeCloseTo(FULL_MODEL.rss, 5);
    expect(summary.largest_vif).toBeCloseTo(FULL_MODEL.vif[3], 3);
    expect(summary).toMatchObject({ rows: 13, coefficient_count: 5, degrees_of_freedom: 8 });
  });
});

describe('R² and adjusted R², as published in per cent', () => {
  test.each(PUBLISHED_SHARES)('$terms', ({ terms, rSquared: share, adjusted }) => {
    expect(100 * rSquared(fitOf(terms))!).toBeCloseTo(share, 1);
    expect(100 * adjustedRSquared(fitOf(terms))!).toBeCloseTo(adjusted, 1);
  });
});

describe('criteria of subsets, recomputed in 60-digit arithmetic', () => {
  test.each(SUBSETS)('$terms', ({ terms, mallowsCp, shortAic, press }) => {
    expect(value('mallows_cp', terms)).toBeCloseTo(mallowsCp, 5);
    expect(value('press', terms)).toBeCloseTo(press, 4);
    expect(value('aic', terms)! - 13 * (1 + Math.log(2 * Math.PI)) - 2).toBeCloseTo(shortAic, 5);
  });

  test('AICc and BIC from AIC by their definitions', () => {
    for (const terms of subsets) {
      const k = terms.length + 2;
      const aic = value('aic', terms)!;
      expect(value('aicc', terms)).toBeCloseTo(aic + (2 * k * (k + 1)) / (13 - k - 1), 10);
      expect(value('bic', terms)).toBeCloseTo(aic - 2 * k + k * Math.log(13), 10);
    }
  });
});

describe('each criterion picks its own winner', () => {
  test.each<[RankBy, string]>([
    ['mallows_cp', 'x1 x2'],
    ['aicc', 'x1 x2'],
    ['aic', 'x1 x2 x4'],
    ['press', 'x1 x2 x4'],
  ])('%s: %s (as published for these data)', (rankBy, winner) => {
    expect(chosenBy({ rankBy }).name).toBe(winner);
  });

  test('the ranking lists all 15, best first, with the distance from the best', () => {
    const choice = choose(studyWith({ rankBy: 'aic' }), context, collector().report);
    expect(choice.ranking.map(({ rank }) => rank)).toEqual(Array.from({ length: 15 }, (_, k) => k + 1));
    expect(choice.ranking[0]).toMatchObject({ candidate: indexOf(['x1', 'x2', 'x4']), difference: 0 });
    // 25.01120 − 24.97388 and 25.41999 − 24.97388 of the reference.
    expect(choice.ranking[1]!.difference).toBeCloseTo(0.03732, 4);
    expect(choice.ranking[2]!.difference).toBeCloseTo(0.44611, 5);
    const weights = choice.ranking.map(({ evidence }) => evidence!);
    expect(weights.reduce((sum, weight) => sum + weight, 0)).toBeCloseTo(1, 12);
    expect(weights[1]! / weights[0]!).toBeCloseTo(Math.exp(-0.03732 / 2), 4);
  });

  test('a smaller candidate within the declared distance is preferred', () => {
    // AIC of x1 x2 is 0.44611 from the best.
    expect(chosenBy({ rankBy: 'aic', preferSmallerWithin: 0.44 }).name).toBe('x1 x2 x4');
    const { name, because } = chosenBy({ rankBy: 'aic', preferSmallerWithin: 0.45 });
    expect(name).toBe('x1 x2');
    expect(because).toBe(
      'x1 x2 x4 has the lowest AIC (63.866) of 15 admitted candidates, but x1 x2, 0.45 behind, has 3 coefficients instead of 4; of the 3 candidates within 0.45 of the best the study prefers the smallest.',
    );
  });

  test('by partial F at 0.05 the pair x1 x2: neither x3 nor x4 nor both improve on it', () => {
    const choice = choose(studyWith({ rankBy: 'partial_f' }), context, collector().report);
    expect(context.fits[choice.chosen!]!.candidate.name).toBe('x1 x2');
    const decided = choice.partialF.filter((row) => row.decided);
    const name = (index: number) => context.fits[index]!.candidate.name;
    expect(decided.map(({ smaller, larger }) => [name(smaller), name(larger)])).toEqual(
      expect.arrayContaining([
        ['x1 x2', 'x1 x2 x3'],
        ['x1 x2', 'x1 x2 x4'],
        ['x1 x2', 'x1 x2 x3 x4'],
      ]),
    );
    // Each single predictor is smaller, and is improved on.
    for (const terms of ['x1', 'x2', 'x3', 'x4']) {
      const row = decided.find(({ smaller }) => name(smaller) === terms)!;
      expect(row.p_value).toBeLessThan(0.05);
    }
    expect(choice.because).toContain('x1 x2 has the fewest coefficients (3)');
    expect(choice.ranking.every(({ value, difference }) => value === null && difference === null)).toBe(true);
    expect(choice.ranking[0]!.candidate).toBe(choice.chosen);
  });
});

test('every criterion says where it was published and what it is', () => {
  expect(CRITERIA.map(({ name }) => name)).toEqual([
    'adjusted_r_squared',
    'aic',
    'aicc',
    'bic',
    'mallows_cp',
    'press',
    'cross_validation',
    'partial_f',
  ]);
  for (const { description, source, title } of CRITERIA) {
    expect(description.length).toBeGreaterThan(40);
    expect(source).not.toBe('');
    expect(title).not.toBe('');
  }
  expect(CRITERIA.filter(({ acrossScales }) => acrossScales).map(({ name }) => name)).toEqual([
    'aic',
    'aicc',
    'bic',
    'cross_validation',
  ]);
});
