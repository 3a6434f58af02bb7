/** `compare` and `fit --against` on the command line, with records good and bad. */
import { cp, mkdtemp, readdir, readFile, rm, writeFile } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterAll, beforeAll, describe, expect, test } from 'vitest';
import { runCommandLine } from '../../src/cli/command-line.ts';
import { collecting } from '../cli/collect.ts';
import { CARS, carsStudy, csvText } from './sides.ts';

let home: string;
const at = (...names: string[]) => join(home, ...names);
const OLD = CARS.slice(0, 200);
const NEW = CARS.slice(2, 230).map((row, i) => (i === 5 ? { ...row, weight: '2222' } : row));

async function plumbrule(...args: string[]) {
  const { terminal, printed } = collecting();
  const status = await runCommandLine(args, terminal);
  return { status, ...printed };
}

beforeAll(async () => {
  home = await mkdtemp(join(tmpdir(), 'plumbrule-compare-'));
  await writeFile(at('cars.study.yaml'), carsStudy());
  await writeFile(at('cars.csv'), csvText(OLD));
  await plumbrule('fit', at('cars.study.yaml'), '--out', at('earlier'));
  await writeFile(at('cars.csv'), csvText(NEW));
  await plumbrule('fit', at('cars.study.yaml'), '--out', at('later'));
});
afterAll(() => rm(home, { recursive: true }));

/** A copy of the earlier results, changed. */
async function damaged(name: string, change: (folder: string) => Promise<unknown>): Promise<string> {
  await cp(at('earlier'), at(name), { recursive: true });
  await change(at(name));
  return at(name);
}

const edit = (file: string, change: (text: string) => string) => async (folder: string) => {
  const text = await readFile(join(folder, file), 'utf8');
  const changed = change(text);
  expect(changed).not.toBe(text);
  await writeFile(join(folder, file), changed);
};

describe('compare', () => {
  test('takes folders and records, and prints what changed', async () => {
    const { status, out, err } = await plumbrule('compare', at('earlier'), at('later', 'record.json'));
    expect([status, err]).toEqual([0, '']);
    expect(out).toMatch(/ compared │ Fuel economy of cars\n/);
    expect(out).toContain('are unchanged, 1 revised and 2 gone.');
    expect(out).toContain('Revised: weight in 1\u00a0row.');
    expect(out).toContain('All is chosen again.');
    expect(out).not.toMatch(/NaN|undefined|null/);
    expect(await plumbrule('compare', at('earlier'), at('later'), '--quiet')).toEqual({
      status: 0,
      out: '',
      err: '',
    });
  });

  test('writes all three files or the one asked for, and prints one without a folder', async () => {
    const all = await plumbrule('compare', at('earlier'), at('later'), '--out', at('all'));
    expect(all.status).toBe(0);
    expect((await readdir(at('all'))).sort()).toEqual([
      'comparison.html',
      'comparison.json',
      'comparison.md',
    ]);
    expect(all.out).toContain(at('all', 'comparison.html'));
    await plumbrule('compare', at('earlier'), at('later'), '--out', at('one'), '--format', 'markdown');
    expect(await readdir(at('one'))).toEqual(['comparison.md']);
    const printed = await plumbrule('compare', at('earlier'), at('later'), '--format', 'json');
    expect(printed.out).toBe(await readFile(at('all', 'comparison.json'), 'utf8'));
    expect(JSON.parse(printed.out).rows).toMatchObject({ revised: 1, removed: 2 });
  });

  test('the page stands by itself and escapes what names contain', async () => {
    await writeFile(
      at('cars.csv'),
      csvText(OLD.map((row) => ({ ...row, origin: `<b>${row.origin}|*</b>` }))),
    );
    const data = `  row_id: car
  variables:
    car: { type: identifier }
    first_sold: { type: date }
    economy: { type: number, unit: mi/gal }
    weight: { type: number, unit: lb }
    horsepower: { type: number, unit: hp }
    origin: { type: category, baseline: "<b>USA|*</b>" }`;
    await writeFile(at('odd.study.yaml'), carsStudy({ data }));
    const { status } = await plumbrule(
      'fit',
      at('odd.study.yaml'),
      '--out',
      at('odd'),
      '--against',
      at('earlier'),
    );
    expect(status).toBe(0);
    const html = await readFile(at('odd', 'comparison.html'), 'utf8');
    expect(html).toContain('&lt;b&gt;USA|*&lt;/b&gt;');
    expect(html).not.toContain('<b>USA');
    expect(html).not.toMatch(/(?:src|href)="(?!#)|<script|NaN|undefined/);
    const markdown = await readFile(at('odd', 'comparison.md'), 'utf8');
    expect(markdown).toContain('&lt;b&gt;USA\\|\\*&lt;/b&gt;');
    const cells = (line: string) => line.replaceAll('\\|', '').split('|').length;
    const table = markdown.split('\n').filter((line) => line.startsWith('| origin'));
    expect(new Set(table.map(cells))).toEqual(new Set([11]));
  });

  test.each<[string, () => Promise<string>, RegExp]>([
    ['nothing there', async () => at('nowhere'), /there is no such file/],
    [
      'another version',
      () =>
        damaged(
          'version',
          edit('record.json', (text) => text.replace('plumbrule-record/1', 'plumbrule-record/9')),
        ),
      /has format "plumbrule-record\/9"; this version reads/,
    ],
    [
      'a truncated record',
      () =>
        damaged(
          'cut',
          edit('record.json', (text) => text.slice(0, 4000)),
        ),
      /The record is not JSON/,
    ],
    [
      'a record edited against its schema',
      () =>
        damaged(
          'edited',
          edit('record.json', (text) => text.replace('"rows_used": ', '"rows_used": "many", "was": ')),
        ),
      /data\.rows_used must be integer/,
    ],
    [
      'an estimate edited by hand',
      () =>
        damaged(
          'estimate',
          edit('record.json', (text) => {
            const record = JSON.parse(text);
            record.model.columns[1].estimate *= 1.5;
            return JSON.stringify(record);
          }),
        ),
      /do not give its chosen model again: one of the two was edited/,
    ],
    [
      'rows cut short',
      () =>
        damaged('rows', async (folder) =>
          writeFile(
            join(folder, 'sample.csv.gz'),
            (await readFile(join(folder, 'sample.csv.gz'))).subarray(0, 500),
          ),
        ),
      /The rows kept with this record cannot be read: the file is damaged/,
    ],
  ])('%s: said, and nothing compared', async (_, make, message) => {
    const { status, out, err } = await plumbrule('compare', await make(), at('later'), '--out', at('none'));
    expect([status, out]).toEqual([2, '']);
    expect(err.replace(/\s+/g, ' ')).toMatch(message);
    expect(await readdir(home)).not.toContain('none');
  });

  test('another response is exit status 2', async () => {
    const candidates = '  - { name: All, terms: [horsepower] }';
    await writeFile(at('cars.csv'), csvText(OLD));
    await writeFile(at('other.study.yaml'), carsStudy({ response: 'response: weight', candidates }));
    await plumbrule('fit', at('other.study.yaml'), '--out', at('other'));
    const { status, err } = await plumbrule('compare', at('earlier'), at('other'));
    expect(status).toBe(2);
    expect(err).toContain('The later record explains weight, the earlier one economy');
    const json = await plumbrule('compare', at('earlier'), at('other'), '--problems', 'json');
    expect(JSON.parse(json.out).problems[0]).toMatchObject({ code: 'records_unlike', severity: 'error' });
  });

  test('rows that have gone are a warning, and the rest is compared', async () => {
    const folder = await damaged('without', (copy) => rm(join(copy, 'sample.csv.gz')));
    const { status, out, err } = await plumbrule('compare', folder, at('later'));
    expect(status).toBe(0);
    expect(err).toContain('The rows kept with this record are not there');
    expect(out).toContain('cannot be told');
  });
});

describe('fit --against', () => {
  test('the folder that is written to is read first, and gets the comparison with the rest', async () => {
    await writeFile(at('cars.csv'), csvText(OLD));
    await plumbrule('fit', at('cars.study.yaml'), '--out', at('same'));
    await writeFile(at('cars.csv'), csvText(NEW));
    const { status, out } = await plumbrule(
      'fit',
      at('cars.study.yaml'),
      '--out',
      at('same'),
      '--against',
      at('same'),
    );
    expect(status).toBe(0);
    expect(out).toContain('unchanged, 1 revised and 2 gone.');
    expect(await readFile(at('same', 'record.json'), 'utf8')).toBe(
      await readFile(at('later', 'record.json'), 'utf8'),
    );
    const { out: printed } = await plumbrule('compare', at('earlier'), at('later'), '--format', 'json');
    expect(await readFile(at('same', 'comparison.json'), 'utf8')).toBe(printed);
    // A run without an earlier record takes the comparison away: it is of another run.
    await plumbrule('fit', at('cars.study.yaml'), '--out', at('same'));
    expect((await readdir(at('same'))).filter((name) => name.startsWith('comparison'))).toEqual([]);
  });

  test('an earlier record that cannot be used stops it before anything is written', async () => {
    const { status, err } = await plumbrule(
      'fit',
      at('cars.study.yaml'),
      '--out',
      at('unwritten'),
      '--against',
      at('nowhere'),
    );
    expect(status).toBe(2);
    expect(err).toContain('there is no such file');
    expect(await readdir(home)).not.toContain('unwritten');
  });
});
