import { mkdir, readFile, rename, writeFile } from 'node:fs/promises';
import { join } from 'node:path';
import { describe, expect, test } from 'vitest';
import { verifyRecord } from '../../src/verify.ts';
import { inFolder, plumbrule } from './in-folder.ts';

/** Invented: y near 3 + 2x. */
const DATA = `x,y\n${Array.from({ length: 14 }, (_, i) => `${i},${3 + 2 * i + ((i * 5) % 3) / 10}`).join('\n')}\n`;
const STUDY = `plumbrule: 1
title: A small study
parameters: { scale: natural, most: 100 }
data: { file: small.csv, variables: { x: { type: number }, y: { type: number, at_most: "\${most}" } } }
response: { variable: y, scale: "\${scale}" }
candidates: [{ name: Straight, terms: [x] }]
predict: { rows: [{ label: "at 3", x: 3 }] }
`;
const FILES = { 'small.study.yaml': STUDY, 'small.csv': DATA };

async function fitted(folder: string, ...args: string[]) {
  const out = join(folder, 'results/small');
  const run = await plumbrule('fit', join(folder, 'small.study.yaml'), '--out', out, '--quiet', ...args);
  expect([run.status, run.err]).toEqual([0, '']);
  return join(out, 'record.json');
}

async function edit(path: string, change: (text: string) => string) {
  const text = await readFile(path, 'utf8');
  expect(change(text)).not.toBe(text);
  await writeFile(path, change(text));
}

describe('verify', () => {
  test('finds the study above the record, and every number comes back', () =>
    inFolder(FILES, async (folder) => {
      const run = await plumbrule('verify', await fitted(folder));
      expect([run.status, run.err]).toEqual([0, '']);
      expect(run.out).toMatch(
        /small\.study\.yaml gives all \d\d\d? numbers of the record again, to the last bit\.\n$/,
      );
    }));

  test('runs with the parameters that the record states', () =>
    inFolder(FILES, async (folder) => {
      const record = await fitted(folder, '--with', 'scale=log');
      expect(JSON.parse(await readFile(record, 'utf8')).study.parameters).toEqual([
        { name: 'scale', value: 'log', default: 'natural', given: true },
        { name: 'most', value: 100, default: 100, given: false },
      ]);
      expect(await plumbrule('verify', record)).toMatchObject({ status: 0, err: '' });
    }));

  test('names each key path that differs, and passes over what a tolerance allows', () =>
    inFolder(FILES, async (folder) => {
      const record = await fitted(folder);
      await edit(record, (text) => {
        const value = JSON.parse(text);
        value.candidates[0].residual_sum_of_squares *= 1 + 1e-12;
        value.predictions[0].estimate *= 1 + 1e-13;
        return JSON.stringify(value);
      });
      const exact = await plumbrule('verify', record);
      expect(exact.status).toBe(1);
      expect(exact.err).toMatch(
        /record\.json: candidates\[0\]\.residual_sum_of_squares was .* and is now .*1\.0e-12/,
      );
      expect(exact.err).toContain('predictions[0].estimate was');
      expect(exact.out).toContain('2 entries differ');
      expect(exact.out).toContain('--tolerance 1e-9');
      expect(await plumbrule('verify', record, '--tolerance', '1e-9')).toMatchObject({ status: 0, err: '' });
      expect((await plumbrule('verify', record, '--tolerance', '1e-14')).status).toBe(1);
    }));

  test('changed data is a difference, said as such', () =>
    inFolder(FILES, async (folder) => {
      const record = await fitted(folder);
      await edit(join(folder, 'small.csv'), (text) => text.replace('\n3,', '\n3.5,'));
      const run = await plumbrule('verify', record);
      expect(run.status).toBe(1);
      expect(run.err).toContain('The data file small.csv is not the file that the record was made from');
      expect(run.err).toContain('candidates[0].r_squared was');
    }));

  test('a study that changed is not taken unless it is named', () =>
    inFolder(FILES, async (folder) => {
      const record = await fitted(folder);
      const study = join(folder, 'small.study.yaml');
      await edit(study, (text) => text.replace('A small study', 'A new title'));
      const found = await plumbrule('verify', record);
      expect(found.status).toBe(2);
      expect(found.err).toMatch(
        /was not found: .*small\.study\.yaml is not the file .* Name it with --study/,
      );
      const named = await plumbrule('verify', record, '--study', study);
      expect(named.status).toBe(1);
      expect(named.err).toContain('The study small.study.yaml is not the file');
      expect(named.err).toContain('study.title was "A small study" and is now "A new title".');
    }));

  test('a study that moved is named by file or folder; two of them are not decided between', () =>
    inFolder(FILES, async (folder) => {
      const record = await fitted(folder);
      await mkdir(join(folder, 'moved'));
      for (const name of Object.keys(FILES)) await rename(join(folder, name), join(folder, 'moved', name));
      const lost = await plumbrule('verify', record);
      expect([lost.status, lost.err]).toEqual([2, expect.stringContaining('was not found in')]);
      expect((await plumbrule('verify', record, '--study', join(folder, 'moved'))).status).toBe(0);
      await writeFile(join(folder, 'small.study.yaml'), STUDY);
      await writeFile(join(folder, 'results/small.study.yaml'), STUDY);
      const twice = await plumbrule('verify', record);
      expect([twice.status, twice.err]).toEqual([2, expect.stringContaining('was found more than once')]);
    }));

  test('data that is gone, a record that is none and a senseless tolerance cannot be run', () =>
    inFolder(FILES, async (folder) => {
      const record = await fitted(folder);
      await rename(join(folder, 'small.csv'), join(folder, 'other.csv'));
      expect(await plumbrule('verify', record)).toMatchObject({
        status: 2,
        err: expect.stringContaining('There is no data file small.csv'),
      });
      expect((await plumbrule('verify', join(folder, 'other.csv'))).status).toBe(2);
      for (const text of ['-1', '1', 'NaN', ''])
        expect((await plumbrule('verify', record, `--tolerance=${text}`)).status, text).toBe(2);
    }));

  test('another version of the tool is said, and is no difference by itself', () =>
    inFolder(FILES, async (folder) => {
      const record = await fitted(folder);
      await edit(record, (text) => text.replace(/"version": "[^"]*"/, '"version": "0.0.1"'));
      const run = await plumbrule('verify', record);
      expect(run.status).toBe(0);
      expect(run.err).toContain('made by version 0.0.1 of Plumbrule');
    }));

  test('as a function: what was run and how much was compared', () =>
    inFolder(FILES, async (folder) => {
      const verified = await verifyRecord(await fitted(folder));
      expect(verified).toMatchObject({ ran: true, differences: [], problems: [] });
      expect(verified.study).toBe(join(folder, 'small.study.yaml'));
      expect(verified.compared).toBeGreaterThan(100);
    }));
});
