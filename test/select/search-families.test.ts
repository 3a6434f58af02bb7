import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { fitCandidate } from '../../src/engine/fit-candidate.ts';
import { admit } from '../../src/select/admission.ts';
import { checkFamilies } from '../../src/select/check-families.ts';
import { criterionNamed } from '../../src/select/criteria.ts';
import { familyCandidate, letter } from '../../src/select/family-model.ts';
import { candidatesFrom, searchFamilies } from '../../src/select/search-families.ts';
import type { RankBy } from '../../src/study/study.ts';
import { drawn, familyOf, type PlainTerm } from './family-of.ts';
import { collector, type SelectionChange, studyWith } from './study-with.ts';

interface Made {
  readonly terms: readonly PlainTerm[];
  readonly y: readonly number[];
}

/** Terms alike to each other, so that VIF, signs and p-values have something to refuse. */
function made(
  seed: number,
  widths: readonly number[],
  needs: readonly (readonly number[])[],
  rows = 30,
): Made {
  const next = drawn(seed);
  const shared = Array.from({ length: rows }, next);
  const terms = widths.map((width, k): PlainTerm => {
    const columns = Array.from({ length: width }, () => shared.map((value) => value * (k % 3) + next()));
    return { columns, needs: needs[k] ?? [] };
  });
  const y = Array.from({ length: rows }, (_, i) =>
    terms.slice(0, 3).reduce((sum, { columns }) => sum + columns[0]![i]!, 2 * next()),
  );
  return { terms, y };
}

/** All sets of terms that keep the needs. */
function allSets(terms: readonly PlainTerm[]): number[][] {
  return Array.from({ length: 2 ** terms.length }, (_, bits) =>
    terms.flatMap((_term, k) => ((bits >> k) & 1 ? [k] : [])),
  ).filter((own) => own.every((k) => (terms[k]!.needs ?? []).every((need) => own.includes(need))));
}

const seeds = fc.integer({ min: 1, max: 1_000_000 });
const shapes = fc.array(fc.constantFrom(1, 1, 1, 2), { minLength: 2, maxLength: 7 });

const RULES: readonly NonNullable<SelectionChange['admit']>[] = [
  { vif: { atMost: 2 } },
  { pValue: { atMost: 0.1 } },
  {
    signs: new Map([
      ['x0', 'positive'],
      ['x2', 'negative'],
    ]),
  },
  { rowsPerCoefficient: { atLeast: 6 } },
  { adjustedRSquared: { atLeast: 0.6 } },
  { vif: { atMost: 4 }, pValue: { atMost: 0.2 }, signs: new Map([['x1', 'positive']]) },
];

describe('the search of subsets', () => {
  it('finds the best of each size among those that the rules admit, as trying every set does', () => {
    fc.assert(
      fc.property(
        seeds,
        shapes,
        fc.constantFrom(...RULES),
        fc.integer({ min: 1, max: 3 }),
        (seed, widths, rules, keep) => {
          // The last term needs the first.
          const needs = widths.map((_, k) => (k === widths.length - 1 && k > 0 ? [0] : []));
          const { terms, y } = made(seed, widths, needs);
          const limits = { kind: 'subsets' as const, atLeast: 0, atMost: terms.length, keep };
          const { design, family, factor, facts } = familyOf(terms, y, limits);
          const study = studyWith({ rankBy: 'aic', admit: rules });
          const found = searchFamilies(study, design, { factor, facts }, { everySize: true });
          const [result] = found.families;

          const criterion = criterionNamed('aic');
          const bySize = new Map<number, { rss: number; admitted: boolean; key: string }[]>();
          for (const own of allSets(terms)) {
            const fit = fitCandidate(factor, familyCandidate(family, own, ''), facts);
            const context = {
              fits: [fit],
              press: [null],
              pressOmitted: null,
              fullModelVariance: [],
              columnNames: facts.columnNames,
            };
            const { admitted } = admit(study.selection, criterion, 0, context);
            const list = bySize.get(fit.columns.length) ?? [];
            list.push({ rss: fit.residualSumOfSquares, admitted, key: own.map((k) => `t${k}`).join() });
            bySize.set(fit.columns.length, list);
          }
          const byName = new Map(
            found.candidates.map((one) => [one.name, one.terms.map(({ name }) => name).join()]),
          );
          for (const [size, sets] of bySize) {
            sets.sort((a, b) => a.rss - b.rss);
            const admitted = sets.filter((set) => set.admitted).slice(0, keep);
            const models = result!.models.filter(({ coefficientCount }) => coefficientCount === size);
            const kept = models
              .filter((model) => model.admitted)
              .map(({ candidate }) => byName.get(candidate));
            // Sets beyond the limits of size or adjusted R² are not kept; those refused by a rule set by set are not either.
            expect(kept).toEqual(admitted.map(({ key }) => key));
            const refused = models.find((model) => !model.admitted);
            if (refused !== undefined) expect(byName.get(refused.candidate)).toBe(sets[0]!.key);
          }
          expect(result!.exactFor).toBe('every size');
          expect(result!.covered).toBeLessThanOrEqual(allSets(terms).length);
        },
      ),
      { numRuns: 120 },
    );
  });

  it('finds the choice when nothing but the choice is asked for, for each criterion and tolerance', () => {
    const criteria: readonly RankBy[] = ['adjusted_r_squared', 'aic', 'aicc', 'bic', 'mallows_cp'];
    fc.assert(
      fc.property(
        seeds,
        shapes,
        fc.constantFrom(...criteria),
        fc.constantFrom(0, 0.05, 2),
        fc.constantFrom(undefined, ...RULES),
        (seed, widths, rankBy, preferSmallerWithin, rules) => {
          const { terms, y } = made(seed, widths, []);
          const limits = { kind: 'subsets' as const, atLeast: 0, atMost: terms.length, keep: 2 };
          const { design, family, factor, facts } = familyOf(terms, y, limits);
          const study = studyWith({
            rankBy,
            preferSmallerWithin,
            ...(rules === undefined ? {} : { admit: rules }),
          });
          const criterion = criterionNamed(rankBy);
          const all = allSets(terms).map((own) => familyCandidate(family, own, ''));
          const context = (candidates: typeof all) => {
            const fits = candidates.map((one) => fitCandidate(factor, one, facts));
            const whole = fitCandidate(factor, all.at(-1)!, facts);
            const fullModelVariance = [whole.residualSumOfSquares / whole.degreesOfFreedom];
            return {
              fits,
              press: fits.map(() => null),
              pressOmitted: null,
              fullModelVariance,
              columnNames: facts.columnNames,
            };
          };
          /** The costs of the best admitted one and of the smallest within the tolerance, with its size. */
          const choice = (candidates: typeof all) => {
            const own = context(candidates);
            const rated = own.fits.flatMap((fit, index) => {
              const value = criterion.value(index, own);
              if (value === null || !admit(study.selection, criterion, index, own).admitted) return [];
              return [{ cost: criterion.better === 'lower' ? value : -value, size: fit.columns.length }];
            });
            const best = Math.min(...rated.map(({ cost }) => cost));
            const near = rated.filter(({ cost }) => cost <= best + preferSmallerWithin + 1e-9);
            const size = Math.min(...near.map((one) => one.size));
            const cost = Math.min(...near.filter((one) => one.size === size).map((one) => one.cost));
            return { size, cost };
          };
          const found = candidatesFrom(study, design, { factor, facts });
          const [wanted, got] = [choice(all), choice(found)];
          expect(got.size).toBe(wanted.size);
          if (Number.isFinite(wanted.cost)) expect(got.cost).toBeCloseTo(wanted.cost, 8);
        },
      ),
      { numRuns: 150 },
    );
  });

  it('calls a model by the candidate that has it already', () => {
    const { terms, y } = made(3, [1, 1, 1], []);
    const { design, family, factor, facts } = familyOf(terms, y, {
      kind: 'subsets',
      atLeast: 0,
      atMost: 3,
      keep: 5,
    });
    const named = familyCandidate(family, [0, 2], 'Named');
    const found = searchFamilies(
      studyWith({}),
      { ...design, candidates: [named] },
      { factor, facts },
      { everySize: true },
    );
    expect(found.families[0]!.models.filter(({ candidate }) => candidate === 'Named')).toHaveLength(1);
    expect(found.families[0]!.models).toHaveLength(8);
    expect(found.candidates).toHaveLength(7);
    expect(new Set(found.candidates.map(({ name }) => name)).size).toBe(7);
  });

  it('numbers models by letters', () => {
    expect([0, 1, 25, 26, 51, 52, 701, 702].map(letter)).toEqual([
      'a',
      'b',
      'z',
      'aa',
      'az',
      'ba',
      'zz',
      'aaa',
    ]);
  });

  it('does not propose a model without a column', () => {
    const { terms, y } = made(4, [1, 1], []);
    const limits = { kind: 'subsets' as const, atLeast: 0, atMost: 2, keep: 3 };
    const { design, factor, facts } = familyOf(terms, y, limits, false);
    const found = searchFamilies(studyWith({}), design, { factor, facts }, { everySize: true });
    expect(found.candidates.map(({ columns }) => columns.length).sort()).toEqual([1, 1, 2]);
  });
});

describe('what a search says', () => {
  const { terms, y } = made(5, [1, 1, 1], []);
  const limits = { kind: 'subsets' as const, atLeast: 0, atMost: 3, keep: 1 };

  function said(
    change: SelectionChange,
    alter: (found: ReturnType<typeof searchFamilies>) => ReturnType<typeof searchFamilies>,
  ) {
    const { design, factor, facts } = familyOf(terms, y, limits);
    const study = studyWith(change);
    const found = alter(searchFamilies(study, design, { factor, facts }, { everySize: true }));
    const { problems, report } = collector();
    checkFamilies(study, design, { factor, facts }, found, report);
    return problems;
  }

  it('when it was given up, is an error that tells what would help', () => {
    const [problem] = said({ rankBy: 'press' }, (found) => ({
      ...found,
      families: found.families.map((family) => ({
        ...family,
        exactFor: null,
        covered: 2 ** 50,
        visited: 12_345_678,
      })),
    }));
    expect(problem).toMatchObject({ code: 'search_unfinished', severity: 'error' });
    expect(problem!.message).toContain('The 1.1 × 10¹⁵ subsets of F are too many to search');
    expect(problem!.hint).toContain('Ranked by aicc');
  });

  it('when sizes were left aside, is a warning', () => {
    const problems = said({}, (found) => ({
      ...found,
      families: found.families.map((family) => ({ ...family, exactFor: 'the choice' as const })),
    }));
    expect(problems).toMatchObject([{ code: 'search_unfinished', severity: 'warning' }]);
  });

  it('when it found all, is nothing', () => {
    expect(said({}, (found) => found)).toEqual([]);
  });

  it('when there is no model, depends on whether there is another candidate', () => {
    const few = made(6, [1, 1, 1], [], 3);
    const { design, factor, facts, family } = familyOf(few.terms, few.y, {
      kind: 'backward',
      leaveAt: 0.1,
      enterAt: null,
    });
    const study = studyWith({});
    const named = { ...design, candidates: [familyCandidate(family, [0], 'Named')] };
    const severities = [design, named].map((each) => {
      const { problems, report } = collector();
      const found = searchFamilies(study, each, { factor, facts }, { everySize: true });
      checkFamilies(study, each, { factor, facts }, found, report);
      return problems.map(({ code, severity, message }) => [code, severity, message]);
    });
    const message =
      'F has no model: it begins with 4 coefficients for 3 rows, so that nothing can be tested.';
    expect(severities).toEqual([
      [['search_empty', 'error', message]],
      [['search_empty', 'warning', message]],
    ]);
  });

  it('of terms that depend on each other is which', () => {
    const sum = terms[0]!.columns[0]!.map((value, i) => value + terms[1]!.columns[0]![i]!);
    const { design, factor, facts } = familyOf([...terms, { columns: [sum] }], y, limits);
    const study = studyWith({});
    const { problems, report } = collector();
    const found = searchFamilies(study, design, { factor, facts }, { everySize: true });
    checkFamilies(study, design, { factor, facts }, found, report);
    expect(problems.map(({ code, severity, message }) => [code, severity, message])).toEqual([
      [
        'columns_dependent',
        'warning',
        'x3 equals x0 + x1 in these rows, so no model of F has all of them as columns of their own.',
      ],
    ]);
    expect(found.candidates.every(({ terms: own }) => own.length < 4)).toBe(true);
  });
});
