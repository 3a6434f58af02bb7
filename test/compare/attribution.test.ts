/** What moved each coefficient, held against runs of the whole study on the rows of each step. */
import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { CARS, compared, estimatesOf, type Row, type StudyParts, sideOf } from './sides.ts';

const revise = (row: Row, index: number): Row => ({
  ...row,
  weight: index % 13 === 2 ? String(Number(row.weight) + 150) : row.weight!,
  horsepower:
    index % 29 === 5 && row.horsepower !== '' ? String(Number(row.horsepower) * 1.1) : row.horsepower!,
  origin: index % 37 === 4 ? 'Europe' : row.origin!,
});
const OLD = CARS.slice(0, 300);
const KEPT = OLD.filter((_, index) => index % 17 !== 3);
const KEPT_NEW = KEPT.map(revise);
const NEW = [...KEPT_NEW, ...CARS.slice(300)];

const SCALES: readonly (readonly [string, StudyParts, StudyParts])[] = [
  ['a derived variable', {}, { derive: 'year(first_sold) - weight / 1000' }],
  ['weights', {}, { more: 'weights: weight' }],
  ['nothing', {}, {}],
  [
    'nothing, on the log scale with an interaction and a curve',
    {
      response: 'response: { variable: economy, scale: log }',
      candidates:
        '  - { name: All, terms: [{ polynomial: weight, degree: 2 }, origin, { interaction: [horsepower, origin] }, horsepower] }',
    },
    {
      response: 'response: { variable: economy, scale: log }',
      candidates:
        '  - { name: All, terms: [{ polynomial: weight, degree: 2 }, origin, { interaction: [horsepower, origin] }, horsepower] }',
    },
  ],
  [
    'a knot of a spline, without an intercept before',
    {
      candidates:
        '  - { name: All, intercept: false, terms: [{ spline: weight, knots: [1900, 2800, 4600] }, horsepower] }',
    },
    { candidates: '  - { name: All, terms: [{ spline: weight, knots: [1900, 3000, 4600] }, horsepower] }' },
  ],
];

describe('the parts of a difference', () => {
  test.each(SCALES)('are the steps between fits; the declaration changes in %s', async (_, before, now) => {
    const first = await sideOf(OLD, before);
    const last = await sideOf(NEW, now);
    const steps = [
      first,
      await sideOf(KEPT, before),
      await sideOf(KEPT_NEW, before),
      await sideOf(NEW, before),
      last,
    ].map(estimatesOf);
    const [model, ...others] = compared(first, last).models;
    expect(others).toEqual([]);
    expect(model!.note).toBeNull();
    expect(model!.coefficients.length).toBe(Math.max(steps[0]!.size, steps[4]!.size));
    for (const { name, before: a, after: b, difference, parts, ...rest } of model!.coefficients) {
      const at = steps.map((step) => step.get(name));
      if (at.includes(undefined)) {
        expect([a === null || b === null, difference, parts]).toEqual([true, null, null]);
        continue;
      }
      const size = Math.max(...at.map((estimate) => Math.abs(estimate!)));
      const near = (x: number, y: number) => expect(Math.abs(x - y), name).toBeLessThanOrEqual(1e-10 * size);
      near(a!, at[0]!);
      near(b!, at[4]!);
      near(parts!.removed, at[1]! - at[0]!);
      near(parts!.revised, at[2]! - at[1]!);
      near(parts!.added, at[3]! - at[2]!);
      near(parts!.declaration, at[4]! - at[3]!);
      // The whole, but for the rounding of one sum of four doubles.
      const sum = parts!.removed + parts!.revised + parts!.added + parts!.declaration;
      const largest = Math.max(...Object.values(parts!).map(Math.abs), Math.abs(difference!));
      expect(Math.abs(sum - difference!)).toBeLessThanOrEqual(4 * Number.EPSILON * largest);
      const { standard_error: error } = first.record.candidates[0]!.coefficients.find(
        (each) => each.name === name,
      )!;
      expect(rest.before_standard_error).toBe(error);
      expect(rest.in_standard_errors).toBeCloseTo(difference! / error!, 9);
    }
  });

  test('a step that changes nothing contributes exactly nothing', async () => {
    const first = await sideOf(OLD);
    const revised = compared(first, await sideOf(OLD.map(revise))).models[0]!;
    for (const { parts } of revised.coefficients) {
      expect(parts).toMatchObject({ removed: 0, added: 0, declaration: 0 });
      expect(parts!.revised).not.toBe(0);
    }
    const declared = compared(first, await sideOf(OLD, { more: 'weights: weight' })).models[0]!;
    for (const { parts } of declared.coefficients) {
      expect(parts).toMatchObject({ removed: 0, revised: 0, added: 0 });
    }
  });

  test('a record compared with itself: nothing changed', async () => {
    const side = await sideOf(CARS);
    const { rows, contract, declaration, choice, models, new_rows, cannot_tell } = compared(side, side);
    expect(rows).toMatchObject({ kept: side.record.data.rows_used, revised: 0, added: 0, removed: 0 });
    expect([contract, cannot_tell, new_rows]).toEqual([[], [], null]);
    expect(declaration).toEqual({ study_changed: false, changes: [] });
    expect(choice).toMatchObject({ changed: false, rule_changed: false, difference: 0 });
    for (const { difference } of models[0]!.coefficients) expect(difference).toBe(0);
  });

  test('whatever rows go, come and are revised, the parts add up and counts agree', {
    timeout: 60_000,
  }, async () => {
    const sets = fc.record({
      gone: fc.integer({ min: 0, max: 60 }),
      come: fc.integer({ min: 0, max: 60 }),
      every: fc.integer({ min: 3, max: 40 }),
    });
    await fc.assert(
      fc.asyncProperty(sets, async ({ gone, come, every }) => {
        const sound = CARS.filter((row) => row.horsepower !== '' && row.economy !== '');
        const earlier = sound.slice(0, 200);
        const later = sound
          .slice(gone, 200 + come)
          .map((row, index) => (index % every === 0 ? { ...row, weight: `${Number(row.weight) + 7}` } : row));
        const { rows, models } = compared(await sideOf(earlier), await sideOf(later.reverse()));
        expect(rows!.removed).toBe(gone);
        expect(rows!.added).toBe(come);
        expect(rows!.kept + rows!.revised! + rows!.removed).toBe(200);
        for (const { parts, difference, before } of models[0]!.coefficients) {
          const sum = parts!.removed + parts!.revised + parts!.added + parts!.declaration;
          expect(Math.abs(sum - difference!)).toBeLessThanOrEqual(1e-13 * Math.abs(before!) + Number.EPSILON);
        }
      }),
      { numRuns: 12, seed: 5 },
    );
  });

  test('a level without a row in between, and one that is new, have no parts', async () => {
    const japanese = CARS.slice(0, 200).map((row, index) => ({
      ...row,
      origin: row.origin === 'Japan' ? 'Nippon' : index % 50 === 7 ? 'Europe' : row.origin!,
    }));
    const { models } = compared(await sideOf(CARS.slice(0, 200)), await sideOf(japanese));
    const named = new Map(models[0]!.coefficients.map((each) => [each.name, each]));
    expect(named.get('origin Japan')).toMatchObject({ after: null, difference: null, parts: null });
    expect(named.get('origin Nippon')).toMatchObject({ before: null, difference: null, parts: null });
    expect(named.get('weight')!.parts).not.toBeNull();
  });

  test('levels compared with another baseline are not subtracted', async () => {
    const data = `  row_id: car
  variables:
    car: { type: identifier }
    first_sold: { type: date }
    economy: { type: number }
    weight: { type: number }
    horsepower: { type: number }
    origin: { type: category, levels: [USA, Europe, Japan] }`;
    const rows = CARS.slice(0, 250);
    const later = await sideOf(
      rows.filter(({ origin }) => origin !== 'USA'),
      { data },
    );
    const { models } = compared(await sideOf(rows, { data }), later);
    expect(models[0]!.note).toMatch(
      /^Levels of origin are compared with Europe now and were compared with USA before/,
    );
    for (const { difference, parts } of models[0]!.coefficients) {
      expect([difference, parts]).toEqual([null, null]);
    }
  });

  test('beyond the budget of extended arithmetic the parts agree as well', { timeout: 60_000 }, async () => {
    // 90 copies of the cars, each a little heavier, and 17 columns, so that fits are refined and not extended.
    const many = Array.from({ length: 90 }, (_, copy) =>
      CARS.map((row) => ({
        ...row,
        car: `${row.car}-${copy}`,
        weight: String(Number(row.weight) + copy / 8),
        economy: row.economy === '' ? '' : String(Number(row.economy) + ((copy * 7) % 11) / 10),
      })),
    ).flat();
    const [old, kept, now] = [many.slice(0, 30_000), many.slice(500, 30_000), many.slice(500)];
    const study = {
      candidates:
        '  - { name: All, terms: [{ polynomial: weight, degree: 3 }, { polynomial: horsepower, degree: 2 }, model_year, origin, { interaction: [weight, origin] }, { interaction: [horsepower, origin] }, { interaction: [model_year, origin] }] }',
    };
    const first = await sideOf(old, study);
    const last = await sideOf(now, study);
    expect(first.record.candidates[0]!.arithmetic).toBe('refined');
    const steps = [first, await sideOf(kept, study), last].map(estimatesOf);
    for (const { name, parts } of compared(first, last).models[0]!.coefficients) {
      const [a, b, c] = steps.map((step) => step.get(name)!) as [number, number, number];
      const size = Math.max(Math.abs(a), Math.abs(b), Math.abs(c));
      expect(Math.abs(parts!.removed - (b - a))).toBeLessThanOrEqual(1e-10 * size);
      expect(Math.abs(parts!.added - (c - b))).toBeLessThanOrEqual(1e-10 * size);
    }
  });
});
