import { describe, expect, test } from 'vitest';
import { tTwoSidedQuantile } from '../../src/stats/distributions.ts';
import { csvOf, runText } from '../run/run-text.ts';

/** Invented: y near 3 + 2x, n = 12. */
const x = [1, 2, 3, 4, 5, 6, 7, 8, 9, 10, 11, 12];
const y = [5.4, 6.7, 9.2, 10.6, 13.3, 15.1, 16.6, 19.5, 20.8, 22.7, 25.4, 26.9];

const studyOf = (rows: string, more = '') => `
plumbrule: 1
title: Test
data:
  file: data.csv
  variables:
    y: { type: number }
    x: { type: number }
response: ${more.includes('scale') ? '{ variable: y, scale: log }' : 'y'}
candidates:
  - { name: line, terms: [x] }
predict:
  interval: 0.9
  total: true
  rows:
${rows}
`;

const row = (value: number) => `    - { label: "at ${value}", x: ${value} }`;

async function predictionsAt(values: number[], more = '') {
  const { record, problems } = await runText(studyOf(values.map(row).join('\n'), more), {
    'data.csv': csvOf({ y, x }),
  });
  expect(problems.filter((problem) => problem.severity === 'error')).toEqual([]);
  return record!;
}

describe('predictions', () => {
  test('agree with the textbook formula of a straight line (common practice, no source)', async () => {
    const { predictions, candidates } = await predictionsAt([2.5, 6.5, 12]);
    const s = candidates[0]!.residual_standard_error!;
    const mean = x.reduce((a, b) => a + b) / 12;
    const sxx = x.reduce((sum, v) => sum + (v - mean) ** 2, 0);
    const t = tTwoSidedQuantile(0.1, 10);
    for (const [k, at] of [2.5, 6.5, 12].entries()) {
      const h = 1 / 12 + (at - mean) ** 2 / sxx;
      const one = predictions[k]!;
      expect(one.leverage).toBeCloseTo(h, 12);
      expect(one.upper! - one.lower!).toBeCloseTo(2 * t * s * Math.sqrt(1 + h), 10);
      expect(one.mean_upper! - one.mean_lower!).toBeCloseTo(2 * t * s * Math.sqrt(h), 10);
    }
  });

  test('an interval for a new row is wider than the mean’s, and both are narrowest at the centre (common practice, no source)', async () => {
    const places = [1, 3, 5, 6.5, 8, 10, 12];
    const { predictions } = await predictionsAt(places);
    const widths = predictions.map((one) => one.upper! - one.lower!);
    const means = predictions.map((one) => one.mean_upper! - one.mean_lower!);
    places.forEach((_, k) => {
      expect(widths[k]!).toBeGreaterThan(means[k]!);
    });
    expect(Math.min(...widths)).toBe(widths[3]);
    expect(Math.min(...means)).toBe(means[3]);
  });

  test('a total adds the covariance of its rows', async () => {
    const places = [2, 3, 9];
    const { predictions, prediction_total: total, candidates } = await predictionsAt(places);
    expect(total!.estimate).toBeCloseTo(
      predictions.reduce((sum, one) => sum + one.estimate, 0),
      12,
    );
    const s = candidates[0]!.residual_standard_error!;
    const mean = x.reduce((a, b) => a + b) / 12;
    const sxx = x.reduce((sum, v) => sum + (v - mean) ** 2, 0);
    let variance = 3;
    for (const a of places) for (const b of places) variance += 1 / 12 + ((a - mean) * (b - mean)) / sxx;
    expect(total!.upper! - total!.lower!).toBeCloseTo(
      2 * tTwoSidedQuantile(0.1, 10) * s * Math.sqrt(variance),
      10,
    );
  });

  test('beyond the range is named with value and limit, inside is not', async () => {
    const { predictions } = await predictionsAt([0.5, 6, 12.5]);
    expect(predictions.map((one) => one.outside)).toEqual([
      ['x 0.5 is below 1, the smallest in the data'],
      [],
      ['x 12.5 is above 12, the largest in the data'],
    ]);
  });

  test('beyond the range is said with the digits that tell, six at least', async () => {
    const { predictions } = await predictionsAt([40 + 1 / 24, 12.000000001]);
    expect(predictions.map((one) => one.outside)).toEqual([
      ['x 40.0417 is above 12, the largest in the data'],
      ['x 12.000000001 is above 12, the largest in the data'],
    ]);
  });

  test('on the log scale the ends are taken back, the estimate is the median and the mean is by smearing (Duan 1983)', async () => {
    const { predictions, model, prediction_total: total, warnings } = await predictionsAt([4], 'scale');
    const one = predictions[0]!;
    const [b0, b1] = model!.columns.map((column) => column.estimate);
    const centre = b0! + 4 * b1!;
    expect(one.estimate).toBeCloseTo(Math.exp(centre), 10);
    expect(Math.sqrt(one.lower! * one.upper!)).toBeCloseTo(one.estimate, 10);
    const residuals = x.map((v, i) => Math.log(y[i]!) - b0! - b1! * v);
    const smeared = residuals.reduce((sum, e) => sum + Math.exp(centre + e), 0) / 12;
    expect(one.mean).toBeCloseTo(smeared, 10);
    expect(total).toBeNull();
    expect(warnings.some((warning) => /No total is given/.test(warning.text))).toBe(true);
  });

  test('a combination more remote than any row is outside although each value is inside', async () => {
    const a = [1, 2, 3, 4, 5, 6, 7, 8, 9, 10];
    const b = a.map((value, i) => value + (i % 3) * 0.1);
    const data = csvOf({ y: a.map((value, i) => value + ((i * 7) % 5) / 10), a, b });
    const study = `
plumbrule: 1
title: Test
data: { file: data.csv, variables: { y: { type: number }, a: { type: number }, b: { type: number } } }
response: y
candidates: [{ name: both, terms: [a, b] }]
predict: { rows: [{ label: corner, a: 2, b: 9 }] }
`;
    const { record } = await runText(study, { 'data.csv': data });
    expect(record!.predictions[0]!.outside).toEqual([
      'its combination of values is more remote than any row in the data',
    ]);
  });

  test('a date that the model only derives from is not itself out of range', async () => {
    const study = `
plumbrule: 1
title: Test
data: { file: data.csv, variables: { y: { type: number }, day: { type: date } } }
derive: { season: { expression: "abs(month(day) - 7)" } }
response: y
candidates: [{ name: season, terms: [season] }]
predict: { rows: [{ label: next year, day: 2031-03-01 }, { label: winter, day: 2031-12-01 }] }
`;
    const days = [
      '2026-02-01',
      '2026-03-01',
      '2026-04-01',
      '2026-05-01',
      '2026-06-01',
      '2026-07-01',
      '2026-08-01',
      '2026-09-01',
    ];
    const { record } = await runText(study, {
      'data.csv': csvOf({ y: [5, 4.2, 3.1, 2.3, 1, 0.2, 0.8, 2.1], day: days }),
    });
    expect(record!.predictions[0]!.outside).toEqual([]);
    expect(record!.predictions[1]!.outside).toEqual([]);
  });
});
