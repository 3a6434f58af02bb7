/** New rows against the earlier model, held against the predictions and sums of squares of whole runs. */
import { describe, expect, test } from 'vitest';
import { seeded } from '../../pipelines/invented.ts';
import type { NumberColumn } from '../../src/data/table.ts';
import type { KeptRows } from '../../src/record/read-sample.ts';
import type { StudyRecord } from '../../src/record/record.ts';
import { binomialInterval } from '../../src/stats/binomial-interval.ts';
import { fUpper } from '../../src/stats/distributions.ts';
import { runText } from '../run/run-text.ts';
import { CARS, compared, csvText, type StudyParts, sideOf } from './sides.ts';

const SOUND = CARS.filter((row) => row.horsepower !== '' && row.economy !== '');
const OLD = SOUND.slice(0, 250);
const ADDED = SOUND.slice(250, 330);

const rss = ({ candidates }: StudyRecord) => candidates[0]!.residual_sum_of_squares;
const rank = ({ candidates }: StudyRecord) => candidates[0]!.coefficient_count;

describe('the rows added', () => {
  test.each<[string, StudyParts]>([
    ['as they are', {}],
    ['with HC3 errors', { more: 'inference: { standard_errors: hc3 }' }],
    ['with errors along time', { more: 'inference: { standard_errors: { hac_lags: 3 } }' }],
    ['with clusters', { more: 'inference: { standard_errors: { clustered_by: model_year } }' }],
    ['with weights', { more: 'weights: weight' }],
    ['on the log scale', { response: 'response: { variable: economy, scale: log }' }],
    ['on the reciprocal scale', { response: 'response: { variable: economy, scale: reciprocal }' }],
  ])('%s: errors and intervals are those of a run that predicts them', async (name, parts) => {
    const timed = name.includes('time')
      ? {
          ...parts,
          data: `  row_id: car
  time: first_sold
  variables:
    car: { type: identifier }
    first_sold: { type: date }
    economy: { type: number }
    weight: { type: number }
    horsepower: { type: number }
    origin: { type: category, baseline: USA }`,
        }
      : parts;
    const predict = 'predict: { file: added.csv, interval: 0.8 }';
    const study = { ...timed, more: `${timed.more ?? ''}\n${predict}` };
    const before = await sideOf(OLD, study, { 'added.csv': csvText(ADDED) });
    const now = await sideOf([...OLD, ...ADDED], study, { 'added.csv': csvText(ADDED) });
    const scored = compared(before, now).new_rows!;
    const { predictions } = before.record;
    expect(predictions).toHaveLength(ADDED.length);
    const errors = predictions.map((each, i) => Number(ADDED[i]!.economy) - (each.mean ?? each.estimate));
    const inside = predictions.filter(
      ({ lower, upper }, i) => Number(ADDED[i]!.economy) >= lower! && Number(ADDED[i]!.economy) <= upper!,
    ).length;
    const bias = errors.reduce((sum, e) => sum + e, 0) / errors.length;
    expect(scored).toMatchObject({ rows: 80, scored: 80, not_scored: [], interval: 0.8, inside });
    expect(scored.bias).toBeCloseTo(bias, 8);
    expect(scored.root_mean_squared_error).toBeCloseTo(
      Math.sqrt(errors.reduce((sum, e) => sum + e * e, 0) / errors.length),
      8,
    );
    expect(scored.share_inside).toBe(inside / 80);
    expect([scored.share_lower, scored.share_upper]).toEqual([...binomialInterval(inside, 80, 0.95)]);
  });

  test('Chow’s tests from the sums of squares of three runs (Chow 1960)', async () => {
    const before = await sideOf(OLD);
    const both = await sideOf([...OLD, ...ADDED]);
    const alone = await sideOf(ADDED);
    const [r, r1, r2] = [rss(both.record), rss(before.record), rss(alone.record)];
    const [p, n1, n2] = [rank(before.record), 250, 80];
    const { same_surface: first, predictive: second } = compared(before, both).new_rows!;
    expect(first).toMatchObject({ df1: p, df2: n1 + n2 - 2 * p });
    const f1 = (r - r1 - r2) / p / ((r1 + r2) / (n1 + n2 - 2 * p));
    expect(first!.statistic / f1).toBeCloseTo(1, 9);
    expect(first!.p_value / fUpper(f1, p, n1 + n2 - 2 * p)).toBeCloseTo(1, 7);
    expect(second).toMatchObject({ df1: n2, df2: n1 - p });
    expect(second!.statistic / ((r - r1) / n2 / (r1 / (n1 - p)))).toBeCloseTo(1, 9);
  });

  test('fewer new rows than coefficients: the second test alone', async () => {
    const { new_rows: rows } = compared(await sideOf(OLD), await sideOf([...OLD, ...ADDED.slice(0, 3)]));
    expect(rows!.same_surface).toBeNull();
    expect(rows!.predictive).toMatchObject({ df1: 3 });
  });

  test('new rows of one level only have a lower rank, and count so', async () => {
    const usa = SOUND.slice(250).filter(({ origin }) => origin === 'USA');
    const { new_rows: rows } = compared(await sideOf(OLD), await sideOf([...OLD, ...usa]));
    // Intercept, weight, horsepower, model year: the two levels cannot be told from these rows.
    expect(rows!.same_surface).toMatchObject({ df1: 4, df2: 250 + usa.length - 6 - 4 });
  });

  test('those that the earlier model cannot predict are counted by their reason', async () => {
    const odd = ADDED.map((row, i) => (i < 3 ? { ...row, origin: 'Korea' } : row));
    const derive = '"if(weight > 100, year(first_sold), log(weight - 100))"';
    const { new_rows: rows } = compared(
      await sideOf(OLD, { derive }),
      await sideOf([...OLD, ...odd.map((row, i) => (i === 5 ? { ...row, weight: '90' } : row))]),
    );
    expect(rows).toMatchObject({ rows: 80, scored: 76 });
    expect(rows!.not_scored).toEqual([
      { because: 'no earlier row has origin "Korea"', rows: 3 },
      { because: 'model_year is missing or undefined', rows: 1 },
    ]);
  });

  test('all of them: nothing is scored', async () => {
    const korean = ADDED.map((row) => ({ ...row, origin: 'Korea' }));
    const { new_rows: rows } = compared(await sideOf(OLD), await sideOf([...OLD, ...korean]));
    expect(rows).toMatchObject({ scored: 0, bias: null, inside: null, share_inside: null, predictive: null });
  });
});

/** Kept rows with further ones, numbers and identities as they are written. */
function withRows(rows: KeptRows, more: readonly Record<string, string>[]): KeptRows {
  const columns = [...rows.columns.values()].map((column) => ({
    ...column,
    values: Float64Array.from([
      ...(column.kind === 'number' ? column.values : []),
      ...more.map((row) => Number(row[column.name])),
    ]),
  })) as NumberColumn[];
  const rowCount = rows.rowCount + more.length;
  return {
    rowCount,
    lines: Uint32Array.from({ length: rowCount }, (_, i) => i + 2),
    ids: [...rows.ids!, ...more.map((row) => row.id!)],
    columns: new Map(columns.map((column) => [column.name, column])),
  };
}

describe('by simulation', () => {
  /**
   * y = 3 + 2x − z + normal, 30 rows and 10 to be predicted, drawn anew each time from one seed; the outcomes against the
   * study's own 90 % intervals, one by one and in total.
   */
  test('90 % intervals hold 90 % of new rows, and of totals', { timeout: 240_000 }, async () => {
    const random = seeded(20_250);
    const row = (id: number) => {
      const [x, z] = [random.between(0, 10), random.uniform()];
      return { id: `r${id}`, x: String(x), z: String(z), y: String(random.normal(3 + 2 * x - z, 1)) };
    };
    let inside = 0;
    let totals = 0;
    const runs = 400;
    const wanted = 10;
    for (let run = 0; run < runs; run++) {
      const earlier = Array.from({ length: 30 }, (_, id) => row(id));
      const fresh = Array.from({ length: wanted }, (_, id) => row(100 + id));
      const study = `plumbrule: 1
title: Drawn
data:
  file: drawn.csv
  row_id: id
  variables: { id: { type: identifier }, x: { type: number }, z: { type: number }, y: { type: number } }
response: y
candidates: [{ name: Both, terms: [x, z] }]
selection: { rank_by: aicc }
predict: { file: fresh.csv, interval: 0.9, total: true }
`;
      const files = { 'drawn.csv': csvText(earlier), 'fresh.csv': csvText(fresh) };
      const { record, kept } = await runText(study, files);
      const later = { record: record!, rows: withRows(kept!.rows, fresh), file: 'b' };
      const { new_rows: scored } = compared({ record: record!, rows: kept!.rows, file: 'a' }, later);
      inside += scored!.inside!;
      const { lower, upper } = record!.prediction_total!;
      const total = fresh.reduce((sum, { y }) => sum + Number(y), 0);
      if (total >= lower! && total <= upper!) totals++;
    }
    expect(Math.abs(inside / (runs * wanted) - 0.9)).toBeLessThanOrEqual(0.015);
    // Standard error of the share of totals: √(0.9 · 0.1/400) = 0.015; three of them.
    expect(Math.abs(totals / runs - 0.9)).toBeLessThanOrEqual(0.045);
  });
});
