import { expect, test } from 'vitest';
import { csvOf, runText } from '../run/run-text.ts';

/** Sites and sorts, each pair twice, so that every difference can be worked out. */
async function slopesOf(sites: number, sorts: number) {
  const rows = Array.from({ length: sites * sorts * 2 }, (_, i) => ({
    site: `s${i % sites}`,
    sort: `v${Math.floor(i / sites) % sorts}`,
    y: 10 + (i % sites) * (Math.floor(i / sites) % sorts) + ((i * i) % 11) / 10,
  }));
  const file = csvOf({
    site: rows.map(({ site }) => site),
    sort: rows.map(({ sort }) => sort),
    y: rows.map(({ y }) => y),
  });
  const study = `
plumbrule: 1
title: Sorts at sites
data:
  file: rows.csv
  variables: { y: { type: number }, sort: { type: category }, site: { type: category } }
response: y
candidates:
  - { name: Each sort at each site, terms: [sort, site, { interaction: [sort, site] }] }
`;
  const { record, problems } = await runText(study, { 'rows.csv': file });
  expect(problems).toEqual([]);
  return record!.model!.terms.find((term) => term.kind === 'interaction')!;
}

test('an interaction of two categories has a difference for each level at each place', async () => {
  const term = await slopesOf(4, 3);
  expect(term.slopes).toHaveLength(8);
  expect(term.slopes_omitted).toBe(0);
  expect(term.slopes[0]).toMatchObject({ at: 'site s0', of: 'sort v1 rather than v0', per: null });
});

test('beyond forty, how many there are more is kept', async () => {
  const term = await slopesOf(9, 7);
  expect(term.slopes).toHaveLength(40);
  expect(term.slopes_omitted).toBe(6 * 9 - 40);
});
