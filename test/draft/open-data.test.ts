import { mkdtemp, readdir, readFile, rm, stat, writeFile } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { fileURLToPath } from 'node:url';
import papaparse from 'papaparse';
import { afterAll, beforeAll, describe, expect, test } from 'vitest';
import { draftStudy } from '../../src/draft/draft-study.ts';
import { runStudy } from '../../src/run/run-study.ts';

/** Open data sets of the package vega-datasets, and the data of the shipped studies. */
const OPEN = fileURLToPath(new URL('../../node_modules/vega-datasets/data/', import.meta.url));
const SHIPPED = fileURLToPath(new URL('../../pipelines/', import.meta.url));
const LARGEST = 400_000;

let folder: string;
beforeAll(async () => {
  folder = await mkdtemp(join(tmpdir(), 'plumbrule-draft-'));
});
afterAll(() => rm(folder, { recursive: true }));

/** A file as a CSV of plain cells; null where it is no table. */
async function asCsv(path: string): Promise<string | null> {
  if ((await stat(path)).size > LARGEST) return null;
  const text = await readFile(path, 'utf8');
  if (/\.[ct]sv$/.test(path)) return text;
  if (!path.endsWith('.json')) return null;
  const value: unknown = JSON.parse(text);
  if (!Array.isArray(value) || value.length < 3) return null;
  const flat = value.every(
    (row) =>
      typeof row === 'object' &&
      row !== null &&
      Object.values(row).every((cell) => typeof cell !== 'object' || cell === null),
  );
  return flat ? papaparse.unparse(value, { columns: [...new Set(value.flatMap(Object.keys))] }) : null;
}

async function tables(): Promise<[string, string][]> {
  const names = (await readdir(OPEN)).filter((name) => /\.(?:csv|tsv|json)$/.test(name));
  const found: [string, string][] = [];
  for (const name of names) {
    const text = await asCsv(join(OPEN, name));
    if (text !== null) found.push([name.replace(/\.json$/, '.csv'), text]);
  }
  for (const pipeline of await readdir(SHIPPED)) {
    const files = await readdir(join(SHIPPED, pipeline)).catch(() => []);
    for (const file of files.filter((name) => name.endsWith('.csv'))) {
      found.push([file, await readFile(join(SHIPPED, pipeline, file), 'utf8')]);
    }
  }
  return found;
}

const all = await tables();

describe('a draft runs unchanged', () => {
  test('on very many tables', () => {
    expect(all.length).toBeGreaterThan(30);
  });

  test.each(all)('%s', { timeout: 60_000 }, async (name, text) => {
    const data = join(folder, name);
    await writeFile(data, text);
    const header = papaparse.parse<string[]>(text, { preview: 1 }).data[0]!.map((each) => each.trim());
    let drafted = 0;
    for (const response of new Set(header)) {
      if (drafted === 2) break;
      const out = join(folder, `${name}.study.yaml`);
      const draft = await draftStudy(data, { response, out });
      // A column that is no response is refused with one sentence; nothing else may go wrong.
      if (draft.text === null) {
        expect(draft.problems.map(({ code }) => code)).toEqual(['draft_impossible']);
        continue;
      }
      drafted++;
      await writeFile(out, draft.text);
      const { record, problems } = await runStudy(out);
      const errors = problems.filter(({ severity }) => severity === 'error');
      expect(errors.map(({ code, message }) => `${response}: ${code}: ${message}`)).toEqual([]);
      expect(record?.selection.chosen ?? null, response).not.toBeNull();
      for (const { rows, coefficient_count: p, name: candidate } of record!.candidates) {
        if (candidate !== 'The mean alone') expect(rows / p, candidate).toBeGreaterThanOrEqual(10);
      }
    }
  });
});
