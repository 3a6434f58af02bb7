import { spawn } from 'node:child_process';
import { chmod, mkdir, mkdtemp, readdir, readFile, rm, symlink, writeFile } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join, relative } from 'node:path';
import { afterEach, beforeEach, describe, expect, test } from 'vitest';
import type { Problem } from '../../src/problem.ts';
import { RESULT_FILES, type ResultFile, writeResults } from '../../src/record/write-results.ts';

let folder: string;
beforeEach(async () => {
  folder = await mkdtemp(join(tmpdir(), 'plumbrule-results-'));
});
afterEach(() => rm(folder, { recursive: true }));

async function write(out: string, files: readonly ResultFile[], obsolete: readonly string[] = []) {
  const problems: Problem[] = [];
  const done = await writeResults(out, files, (problem) => problems.push(problem), obsolete);
  expect(done).toBe(problems.length === 0);
  return problems;
}

/** Every file below `path` with its text, as relative names. */
async function tree(path: string): Promise<{ [name: string]: string }> {
  const entries = await readdir(path, { recursive: true, withFileTypes: true });
  const files = entries.filter((entry) => !entry.isDirectory());
  const texts = files.map(async (entry) => {
    const file = join(entry.parentPath, entry.name);
    return [relative(path, file), await readFile(file, 'utf8')] as const;
  });
  return Object.fromEntries(await Promise.all(texts));
}

const first: ResultFile[] = [
  { name: 'record.json', content: 'record 1' },
  { name: 'report.md', content: 'report 1' },
  { name: 'tables/candidates.csv', content: 'candidates 1' },
];

describe('writeResults', () => {
  test('makes the folder and its parents, from texts and pieces of texts and bytes', async () => {
    function* pieces() {
      yield 'a';
      yield Buffer.from('é\n');
    }
    const out = join(folder, 'deep/er/results');
    const files = [...first, { name: 'a.csv', content: pieces() }, { name: 'b.csv', content: ['x', 'y'] }];
    expect(await write(out, files)).toEqual([]);
    expect(await tree(folder)).toEqual({
      'deep/er/results/record.json': 'record 1',
      'deep/er/results/report.md': 'report 1',
      'deep/er/results/tables/candidates.csv': 'candidates 1',
      'deep/er/results/a.csv': 'aé\n',
      'deep/er/results/b.csv': 'xy',
    });
  });

  test('replaces its own files, removes those of an earlier run that are obsolete, leaves the rest alone', async () => {
    const out = join(folder, 'results');
    await write(out, first);
    await writeFile(join(out, 'notes.txt'), 'mine');
    await writeFile(join(out, 'tables/notes.txt'), 'mine too');
    expect(await write(out, [{ name: 'record.json', content: 'record 2' }], RESULT_FILES)).toEqual([]);
    expect(await tree(out)).toEqual({
      'record.json': 'record 2',
      'notes.txt': 'mine',
      'tables/notes.txt': 'mine too',
    });
  });

  test('a content that fails half-way leaves everything as it was, and nothing of its own', async () => {
    const out = join(folder, 'results');
    await write(out, first);
    const before = await tree(folder);
    function* broken() {
      yield 'half';
      throw new TypeError('a fault of the program');
    }
    const files = [
      { name: 'record.json', content: 'record 2' },
      { name: 'tables/residuals.csv', content: broken() },
    ];
    await expect(write(out, files)).rejects.toThrow('a fault of the program');
    await expect(write(join(folder, 'new/results'), [{ name: 'a', content: broken() }])).rejects.toThrow();
    expect(await tree(folder)).toEqual(before);
    expect(await readdir(folder)).toEqual(['results']);
  });

  test('a folder where a file belongs: refused, and the files already moved come back', async () => {
    const out = join(folder, 'results');
    await write(out, first);
    await mkdir(join(out, 'zz.csv'));
    await writeFile(join(out, 'zz.csv/inside'), 'mine');
    const before = await tree(folder);
    const next = first.map((file) => ({ ...file, content: 'second' }));
    const problems = await write(out, [...next, { name: 'zz.csv', content: 'second' }], RESULT_FILES);
    expect(problems[0]).toMatchObject({
      code: 'output_unwritable',
      message: `The results cannot be written to "${out}": a folder stands where one of the files belongs. Earlier results are untouched.`,
    });
    expect(await tree(folder)).toEqual(before);
  });

  test('a file where a folder belongs, at the end of the path and within it', async () => {
    await writeFile(join(folder, 'file'), 'mine');
    for (const out of [join(folder, 'file'), join(folder, 'file/results')]) {
      const problems = await write(out, first);
      expect(problems[0]?.message).toContain('a part of this path is a file, not a folder');
    }
    expect(await tree(folder)).toEqual({ file: 'mine' });
  });

  test.skipIf(process.getuid?.() === 0)('a folder that may not be written', async () => {
    await chmod(folder, 0o500);
    const problems = await write(join(folder, 'results'), first);
    expect(problems[0]?.message).toContain('permission is denied');
    await chmod(folder, 0o700);
    expect(await readdir(folder)).toEqual([]);
  });

  test('a place that no one may write', async () => {
    // /proc refuses new folders even to the superuser, but exists on Linux only.
    const out = process.platform === 'linux' ? '/proc/plumbrule-results' : join(folder, 'x'.repeat(300));
    for (const place of [out, join(out, 'deep/er')]) {
      expect((await write(place, first))[0]?.code).toBe('output_unwritable');
    }
    expect((await write(join(folder, 'x'.repeat(300)), first))[0]?.message).toContain('the name is too long');
    expect(await readdir(folder)).toEqual([]);
  });

  test('a folder reached through a link is written where it is', async () => {
    await mkdir(join(folder, 'real'));
    await symlink(join(folder, 'real'), join(folder, 'link'));
    await write(join(folder, 'link'), first);
    expect(Object.keys(await tree(join(folder, 'real')))).toHaveLength(3);
  });

  test('a run that is killed while it writes leaves the earlier results as they were', async () => {
    const out = join(folder, 'results');
    await write(out, first);
    const before = await tree(out);
    const module = new URL('../../src/record/write-results.ts', import.meta.url).href;
    const script = `
      const { writeResults } = await import(${JSON.stringify(module)});
      function* endless() {
        // Slow, so that the file does not fill the disk before it is found.
        for (;;) {
          yield 'x'.repeat(1000);
          Atomics.wait(new Int32Array(new SharedArrayBuffer(4)), 0, 0, 5);
        }
      }
      const files = [{ name: 'report.md', content: 'report 2' }, { name: 'record.json', content: endless() }];
      await writeResults(${JSON.stringify(out)}, files, () => {});
    `;
    const args = ['--import', import.meta.resolve('tsx'), '--input-type=module', '-e', script];
    const child = spawn(process.execPath, args, { stdio: 'ignore' });
    const ended = new Promise((resolve) => child.on('exit', resolve));
    const begun = async () =>
      Object.entries(await tree(out)).some(
        ([name, text]) => name.endsWith('record.json') && text.startsWith('xx'),
      );
    while (child.exitCode === null && !(await begun()))
      await new Promise((resolve) => setTimeout(resolve, 20));
    child.kill('SIGKILL');
    await ended;
    expect(child.signalCode).toBe('SIGKILL');
    const after = Object.entries(await tree(out)).filter(([name]) => !name.startsWith('.plumbrule-'));
    expect(Object.fromEntries(after)).toEqual(before);
    // The next run goes through as if nothing had been.
    expect(await write(out, [{ name: 'record.json', content: 'record 3' }])).toEqual([]);
    expect(await readFile(join(out, 'record.json'), 'utf8')).toBe('record 3');
  });
});
