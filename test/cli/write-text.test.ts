import {
  existsSync,
  lstatSync,
  mkdirSync,
  readdirSync,
  readFileSync,
  statSync,
  symlinkSync,
  writeFileSync,
} from 'node:fs';
import { join } from 'node:path';
import { expect, test } from 'vitest';
import { writeText } from '../../src/cli/write-text.ts';
import type { Problem } from '../../src/problem.ts';
import { inFolder } from './in-folder.ts';

async function write(path: string, content: string | Iterable<string>): Promise<readonly Problem[]> {
  const problems: Problem[] = [];
  const done = await writeText(path, content, (problem) => problems.push(problem));
  expect(done).toBe(problems.length === 0);
  return problems;
}

test('makes folders, replaces what is there, and leaves nothing else', () =>
  inFolder({ 'deep/a.csv': 'earlier' }, async (folder) => {
    expect(await write(join(folder, 'deep/a.csv'), ['x', 'é\n'])).toEqual([]);
    expect(await write(join(folder, 'more/deep/b.csv'), 'y')).toEqual([]);
    expect(readFileSync(join(folder, 'deep/a.csv'), 'utf8')).toBe('xé\n');
    expect(readdirSync(join(folder, 'deep'))).toEqual(['a.csv']);
    expect(readdirSync(join(folder, 'more/deep'))).toEqual(['b.csv']);
  }));

test('a content that fails half-way leaves the earlier file, and nothing of its own', () =>
  inFolder({ 'a.csv': 'earlier' }, async (folder) => {
    function* broken() {
      yield 'half';
      throw new TypeError('a fault of the program');
    }
    await expect(write(join(folder, 'a.csv'), broken())).rejects.toThrow('a fault of the program');
    expect(readFileSync(join(folder, 'a.csv'), 'utf8')).toBe('earlier');
    expect(readdirSync(folder)).toEqual(['a.csv']);
  }));

test('through a link the file that it leads to is written', () =>
  inFolder({ 'real/a.csv': 'earlier' }, async (folder) => {
    symlinkSync(join(folder, 'real/a.csv'), join(folder, 'link.csv'));
    expect(await write(join(folder, 'link.csv'), 'x')).toEqual([]);
    expect(lstatSync(join(folder, 'link.csv')).isSymbolicLink()).toBe(true);
    expect(readFileSync(join(folder, 'real/a.csv'), 'utf8')).toBe('x');
  }));

test.skipIf(!existsSync('/dev/null'))('a device is written to and not replaced by a file', () =>
  inFolder({}, async (folder) => {
    // Through a link in a folder of its own, so that a fault of the program would not reach the device itself.
    symlinkSync('/dev/null', join(folder, 'nothing'));
    expect(await write(join(folder, 'nothing'), 'x')).toEqual([]);
    expect(statSync(join(folder, 'nothing')).isCharacterDevice()).toBe(true);
    expect(readdirSync(folder)).toEqual(['nothing']);
  }),
);

test('a folder where the file belongs is left alone, and said', () =>
  inFolder({}, async (folder) => {
    mkdirSync(join(folder, 'a.csv'));
    writeFileSync(join(folder, 'a.csv/inside'), 'mine');
    const [problem] = await write(join(folder, 'a.csv'), 'x');
    expect(problem?.code).toBe('output_unwritable');
    expect(problem?.message).toMatch(/cannot be written: a folder stands where one of the files belongs\.$/);
    expect(readdirSync(folder)).toEqual(['a.csv']);
  }));
