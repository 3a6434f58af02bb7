import { describe, expect, test } from 'vitest';
import { csvOf, runText } from '../run/run-text.ts';

/** Residuals that grow with x, over many rows; `shift` moves the response, whose smallest value is then `shift`. */
async function findingsOf(
  shift: number,
  scale = 'natural',
  spoilt = false,
  rows = 1200,
  errors = 'classical',
) {
  const x = Array.from({ length: rows }, (_, i) => i);
  const y = x.map((v) => 3 * v + ((v * v * 7) % 11) * 0.2 * v);
  const smallest = Math.min(...y);
  const csv = csvOf({ x, y: y.map((v, i) => v - smallest + shift + (spoilt && i === 999 ? 1e5 : 0)) });
  const study = `plumbrule: 1
title: Spread
data:
  file: rows.csv
  time: x
  variables: { x: { type: number }, y: { type: number } }
response: { variable: y, scale: ${scale} }
candidates: [{ name: Line, terms: [x] }]
inference: { standard_errors: ${errors} }
`;
  const { record, problems } = await runText(study, { 'rows.csv': csv });
  expect(problems).toEqual([]);
  const { findings } = record!.examination!;
  return (name: string) => findings.find((finding) => finding.name === name)!;
}

describe('a remedy for uneven spread is one that the response allows', () => {
  test.each([
    [5, 'natural', 'Try the response on a log or square-root scale, or declare weights;'],
    [0, 'natural', 'Try the response on a square-root scale (it has zeros'],
    [-5, 'natural', 'Declare weights, or bring what the spread depends on into the model'],
    [5, '{ box_cox: 2 }', 'Try the response on another scale, or declare weights;'],
  ])('smallest value %d on the %s scale', async (shift, scale, advice) => {
    const found = (await findingsOf(shift, scale))('equal_spread');
    expect(found.concern).toBe(2);
    expect(found.advice).toContain(advice);
  });
});

test('intervals are not called wrong for what the declared standard errors allow for', async () => {
  const verdict = async (errors: string, name: string) =>
    (await findingsOf(5, 'natural', false, 200, errors))(name).verdict;
  expect(await verdict('classical', 'equal_spread')).toContain(
    ': standard errors and intervals are too narrow',
  );
  for (const errors of ['hc3', '{ hac_lags: 4 }']) {
    expect(await verdict(errors, 'equal_spread')).toContain('the declared standard errors allow for that');
  }
});

test('a sentence begins with a capital and keeps thousands apart', async () => {
  const of = await findingsOf(5, 'natural', true);
  expect(of('outlying_rows').verdict).toMatch(
    /^Line 1001 lies farther above the model than chance among 1\u202f200 rows/,
  );
  expect(of('outlying_rows').advice).toMatch(/^Look at line 1001 at its source/);
  expect(of('influence').verdict).toMatch(/^(Line 1001 moves|No single row moves .*; line 1001 moves)/);
  expect(of('enough_rows').verdict).toBe('1\u202f200 rows carry 2 coefficients.');
});

test('a category in an interaction is inflated by construction, levels alone are not', async () => {
  const rows = Array.from({ length: 60 }, (_, i) => i);
  const csv = csvOf({
    site: rows.map((i) => `s${i % 6}`),
    year: rows.map((i) => (Math.floor(i / 6) % 2 === 0 ? 'first' : 'second')),
    y: rows.map((i) => 10 + (i % 6) * (Math.floor(i / 6) % 2) + ((i * i) % 7)),
  });
  const verdictOf = async (terms: string) => {
    const study = `plumbrule: 1
title: Sites
data:
  file: rows.csv
  variables: { y: { type: number }, site: { type: category }, year: { type: category } }
response: y
candidates: [{ name: One, terms: ${terms} }]
`;
    const { record } = await runText(study, { 'rows.csv': csv });
    return record!.examination!.findings.find(({ name }) => name === 'collinearity')!;
  };
  const product = await verdictOf('[site, year, { interaction: [year, site] }]');
  expect(product.statistic).toBeGreaterThan(5);
  expect(product).toMatchObject({ concern: 0, verdict: expect.stringContaining('inflated by construction') });
  expect((await verdictOf('[site, year]')).verdict).not.toContain('by construction');
});
