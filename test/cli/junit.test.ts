import { readdir, readFile } from 'node:fs/promises';
import { join } from 'node:path';
import { expect, test } from 'vitest';
import { inFolder, plumbrule } from './in-folder.ts';

const STUDY = `plumbrule: 1
title: Test
data: { file: a.csv, variables: { x: { type: number }, y: { type: number } } }
response: y
candidates: [{ name: line, terms: [x] }]
acceptance: { r_squared: { at_least: 0.999 } }
`;
/** By hand: R² = 18²/(17.5 · 70/3) = 0.7935. */
const files = { 's.yaml': STUDY, 'a.csv': 'x,y\n1,1\n2,3\n3,2\n4,5\n5,4\n6,7\n' };

test('--junit writes the criteria as tests beside the results, also where the run stops', () =>
  inFolder(files, async (folder) => {
    const [study, junit] = [join(folder, 's.yaml'), join(folder, 'ci/plumbrule.xml')];
    const args = ['--out', join(folder, 'out'), '--quiet', '--junit', junit];
    expect((await plumbrule('fit', study, ...args)).status).toBe(1);
    expect(await readFile(junit, 'utf8')).toContain('<failure message="R² is 0.793');
    expect((await plumbrule('fit', join(folder, 'none.yaml'), ...args)).status).toBe(2);
    expect(await readFile(junit, 'utf8')).toContain('<error message=');
    expect(await readdir(join(folder, 'ci'))).toEqual(['plumbrule.xml']);
  }));

test('a file that cannot be written is said, with status 2', () =>
  inFolder(files, async (folder) => {
    const study = join(folder, 's.yaml');
    const run = await plumbrule('fit', study, '--out', join(folder, 'out'), '--junit', join(study, 'x.xml'));
    expect([run.status, run.err]).toEqual([2, expect.stringContaining('cannot be written')]);
  }));
