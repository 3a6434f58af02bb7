/** Criteria that only an earlier record can judge: in the record, the comparison, on the command line and as JUnit XML. */
import { mkdtemp, readFile, rm, writeFile } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterAll, beforeAll, describe, expect, test } from 'vitest';
import { plumbrule } from '../cli/in-folder.ts';
import { runText } from '../run/run-text.ts';
import { CARS, carsStudy, compared, csvText, sideOf } from './sides.ts';

const OLD = CARS.slice(0, 200);
const NEW = CARS.slice(0, 260);
/** On one line, without the line of the terminal and spaces that do not break. */
const plain = (text: string) => text.replace(/[\s│]+/g, ' ');
const more = (acceptance: string) => ({ more: `acceptance: { ${acceptance} }` });
const both = async (acceptance: string, rows = NEW) =>
  compared(await sideOf(OLD), await sideOf(rows, more(acceptance)));

describe('in the comparison', () => {
  test('the largest change is that of the two records, in the earlier one’s standard errors', async () => {
    const [earlier, later] = [await sideOf(OLD), await sideOf(NEW)];
    const before = earlier.record.candidates[0]!.coefficients;
    const after = later.record.candidates[0]!.coefficients;
    // By hand from the two records: |after − before| / standard error before.
    const changes = before.map(({ name, estimate, standard_error: error }) => ({
      name,
      change: Math.abs(after.find((each) => each.name === name)!.estimate - estimate) / error!,
    }));
    const largest = Math.max(...changes.map(({ change }) => change));
    const weight = changes.find(({ name }) => name === 'weight')!.change;
    expect(weight).toBeLessThan(largest);
    const between = (weight + largest) / 2;
    const { acceptance } = await both(
      `coefficient_change: { at_most: ${between}, of: { weight: { at_most: ${between} } } }`,
    );
    expect(acceptance.map(({ of, passed }) => [of, passed])).toEqual([
      [undefined, false],
      ['weight', true],
    ]);
    expect(acceptance[0]!.value).toBeCloseTo(largest, 8);
    expect(acceptance[1]!.value).toBeCloseTo(weight, 8);
  });

  test('the share of new rows inside is that of the comparison; a limit on either side can be missed', async () => {
    const { acceptance, new_rows: rows } = await both('new_rows_inside: { at_least: 0.01, at_most: 1 }');
    const share = rows!.inside! / rows!.scored;
    expect(acceptance).toEqual([
      { criterion: 'new_rows_inside', limit: 'at least 0.01 and at most 1', value: share, passed: true },
    ]);
    const missed = await both(`new_rows_inside: { at_least: ${share + 1e-9} }`);
    expect(missed.acceptance[0]).toMatchObject({ value: share, passed: false });
    const above = await both(`new_rows_inside: { at_most: ${share - 1e-9} }`);
    expect(above.acceptance[0]).toMatchObject({ value: share, passed: false });
  });

  test('without a new row there is nothing to judge; the same rows have not moved', async () => {
    const { acceptance } = await both(
      'new_rows_inside: { at_least: 1 }, coefficient_change: { at_most: 0 }',
      OLD,
    );
    expect(acceptance).toMatchObject([
      { value: null, passed: null },
      { value: 0, passed: true },
    ]);
  });

  test('rows that were not kept never make a run pass', async () => {
    const later = await sideOf(
      NEW,
      more('new_rows_inside: { at_least: 0 }, coefficient_change: { at_most: 99 }'),
    );
    const earlier = { ...(await sideOf(OLD)), rows: null };
    expect(compared(earlier, later).acceptance).toMatchObject([
      { value: null, passed: false },
      { value: null, passed: false },
    ]);
  });

  test('a coefficient that the chosen model did not have before misses its limit; a term stands for its coefficient', async () => {
    const candidates = '  - { name: All, terms: [weight, { power: horsepower, to: 2 }, origin] }';
    const criteria = 'coefficient_change: { of: { "origin Japan": { at_most: 99 } } }';
    const american = OLD.filter(({ origin }) => origin !== 'Japan');
    const { acceptance } = compared(
      await sideOf(american, { candidates }),
      await sideOf(NEW, { candidates, ...more(criteria) }),
    );
    expect(acceptance).toMatchObject([{ of: 'origin Japan', value: null, passed: false }]);
    const twoOrigins = (rows: typeof CARS) => rows.filter(({ origin }) => origin !== 'Europe');
    const term = await sideOf(
      twoOrigins(NEW),
      more('coefficient_change: { of: { origin: { at_most: 99 }, "origin Japan": { at_most: 99 } } }'),
    );
    const [byTerm, byName] = compared(await sideOf(twoOrigins(OLD)), term).acceptance;
    expect(byTerm).toMatchObject({ of: 'origin', value: byName!.value, passed: true });
  });
});

describe('in the study and its record', () => {
  test('the record lists the limits and judges nothing, whatever lies beside it', async () => {
    const { record } = await sideOf(
      NEW,
      more('coefficient_change: { at_most: 1 }, rows_used: { at_least: 10 }'),
    );
    expect(record.acceptance.map(({ criterion }) => criterion)).toEqual(['rows_used']);
    expect(record.acceptance_against_earlier).toEqual([
      { criterion: 'coefficient_change', limit: 'at most 1 standard error', at_least: null, at_most: 1 },
    ]);
    expect((await sideOf(NEW)).record.acceptance_against_earlier).toBeUndefined();
  });

  test.each([
    ['new_rows_inside: { at_least: 1.5 }', 'limit_nonsense', 'new_rows_inside is never above 1'],
    ['new_rows_inside: { at_least: 0.9, at_most: 0.8 }', 'limit_nonsense', 'new_rows_inside'],
    ['coefficient_change: { at_most: -1 }', 'limit_nonsense', 'coefficient_change.at_most'],
    ['coefficient_change: { of: { wieght: { at_most: 1 } } }', 'sign_name_unknown', '"wieght"'],
    ['coefficient_change: { of: { origin: { at_most: 1 } } }', 'sign_name_unknown', 'which has no one value'],
  ])('%s is refused', async (acceptance, code, words) => {
    const { record, problems } = await runText(carsStudy(more(acceptance)), { 'cars.csv': csvText(OLD) });
    expect(record).toBeNull();
    const errors = problems.filter(({ severity }) => severity === 'error');
    expect(errors.map((problem) => problem.code)).toEqual([code]);
    expect(errors[0]!.message).toContain(words);
    // A name that is a key is pointed to, and not what stands under it.
    if (code === 'sign_name_unknown') {
      const name = /\{ of: \{ (\w+):/.exec(acceptance)![1]!;
      expect(errors[0]!.place).toMatchObject({ kind: 'source', length: name.length });
    }
  });
});

describe('on the command line', () => {
  let home: string;
  const at = (...names: string[]) => join(home, ...names);
  const criteria = 'coefficient_change: { at_most: 0.0001 }, new_rows_inside: { at_least: 0.01 }';
  const fitted = async (rows: typeof CARS, ...args: string[]) => {
    await writeFile(at('cars.csv'), csvText(rows));
    return plumbrule('fit', at('cars.study.yaml'), '--junit', at('ci.xml'), ...args);
  };
  beforeAll(async () => {
    home = await mkdtemp(join(tmpdir(), 'plumbrule-accept-'));
    await writeFile(at('cars.study.yaml'), carsStudy(more(criteria)));
  });
  afterAll(() => rm(home, { recursive: true }));

  test('alone they are listed and skipped; against an earlier record they decide', async () => {
    const alone = await fitted(OLD, '--out', at('first'));
    expect(alone.status).toBe(0);
    expect(plain(alone.out)).toContain('2 criteria need an earlier record and are not judged here');
    const skipped = await readFile(at('ci.xml'), 'utf8');
    expect(skipped).toContain('failures="0" errors="0" skipped="2"');
    expect(skipped).toContain('<skipped message="It needs an earlier record."/>');
    expect(await readFile(at('first', 'report.md'), 'utf8')).toContain('needs an earlier record');
    expect(await readFile(at('first', 'report.html'), 'utf8')).toContain('needs an earlier record');

    const again = await fitted(NEW, '--out', at('alone'));
    const against = await fitted(NEW, '--out', at('second'), '--against', at('first'));
    expect([again.status, against.status]).toEqual([0, 1]);
    const record = (folder: string) => readFile(at(folder, 'record.json'), 'utf8');
    expect(await record('second')).toBe(await record('alone'));
    expect(plain(against.out)).not.toContain('need an earlier record');
    expect(plain(against.out)).toContain('2 criteria are held against the earlier record below');
    expect(plain(against.out)).toMatch(
      /accepted · missed: Largest change of a coefficient is [\d.]+ standard errors; the study asks for at most 0.0001 standard errors\./,
    );
    const junit = await readFile(at('ci.xml'), 'utf8');
    expect(junit).toContain('failures="1" errors="0" skipped="0"');
    expect(junit).toContain('<failure message="Largest change of a coefficient is ');
    for (const name of ['comparison.md', 'comparison.html']) {
      const text = await readFile(at('second', name), 'utf8');
      expect(text).toContain('Held against the earlier record');
      expect(text).toContain('Share of the new rows inside the earlier prediction intervals is ');
    }
    expect((await plumbrule('compare', at('first'), at('second'))).status).toBe(1);

    const same = await fitted(NEW, '--out', at('third'), '--against', at('second'));
    expect(same.status).toBe(0);
    const nothingNew = await readFile(at('ci.xml'), 'utf8');
    expect(nothingNew).toContain('failures="0" errors="0" skipped="1"');
    expect(nothingNew).toContain('is not judged, since no row is new');
  });
});
