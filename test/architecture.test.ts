import { existsSync, readdirSync, readFileSync } from 'node:fs';
import { dirname, join, normalize, relative } from 'node:path';
import { fileURLToPath } from 'node:url';
import { describe, expect, test } from 'vitest';

/**
 * The house: rooms in the order of the flow. A file may import from its own room and from rooms before
 * it, types included; nothing goes round in a circle. See DEVELOPERS.md.
 */
const ROOMS = [
  'problem.ts',
  'package-file.ts',
  'numerals.ts',
  'stats',
  'expression',
  'study',
  'data',
  'draft',
  'prepare',
  'model',
  'engine',
  'select',
  'examine',
  'predict',
  'record',
  'compare',
  'report',
  'run',
  'verify.ts',
  'predict-record.ts',
  'cli',
  'index.ts',
];

/** Rooms whose files know nothing of the rooms before them but what is listed. */
const NARROW: { readonly [room: string]: readonly string[] } = {
  'problem.ts': [],
  'package-file.ts': [],
  'numerals.ts': [],
  stats: [],
  expression: ['problem.ts'],
  // A report is made from a record or a comparison and nothing else.
  report: ['problem.ts', 'numerals.ts', 'record', 'compare'],
};

/**
 * Files that lie directly in a room are open to later rooms; a folder within a room is its own. These
 * folders are open as well: the terminal says what the report says, and effects are predicted and recorded.
 */
const OPEN_FOLDERS = ['report/words', 'examine/effects'];

const SOURCE = fileURLToPath(new URL('../src/', import.meta.url));

interface Import {
  readonly from: string;
  readonly to: string;
}

const files = readdirSync(SOURCE, { recursive: true, encoding: 'utf8' })
  .map((file) => file.replaceAll('\\', '/'))
  .filter((file) => file.endsWith('.ts') && !file.endsWith('.d.ts'))
  .sort();

/** Every import of a file of ours: static, type-only, re-exporting and at run time. Paths from src/. */
const imports: Import[] = files.flatMap((from) => {
  const text = withoutComments(readFileSync(join(SOURCE, from), 'utf8'));
  const found = text.matchAll(/(?:\bfrom\s*|\bimport\s*\(?\s*)(['"])(\.[^'"]*)\1/g);
  return [...found].map((match) => ({
    from,
    to: normalize(join(dirname(from), match[2] as string)).replaceAll('\\', '/'),
  }));
});

function withoutComments(text: string): string {
  return text.replace(/\/\*[\s\S]*?\*\/|^\s*\/\/.*$/gm, '');
}

function roomOf(file: string): string {
  return file.split('/')[0] as string;
}

describe('the house', () => {
  test('the imports are found at all', () => {
    expect(files.length).toBeGreaterThan(30);
    expect(imports.length).toBeGreaterThan(files.length);
    expect(imports).toContainEqual({ from: 'record/record-text.ts', to: 'record/json.ts' });
    expect(imports).toContainEqual({ from: 'cli/command-line.ts', to: 'cli/fit.ts' });
  });

  test('every file is in a room, and every import leads to a file', () => {
    expect(files.filter((file) => !ROOMS.includes(roomOf(file)))).toEqual([]);
    const lost = imports.filter(({ to }) => !existsSync(join(SOURCE, to)) || to.startsWith('..'));
    expect(lost).toEqual([]);
  });

  test('imports run downwards', () => {
    const upward = imports.filter(({ from, to }) => ROOMS.indexOf(roomOf(to)) > ROOMS.indexOf(roomOf(from)));
    expect(upward.map(({ from, to }) => `${from} imports ${to}`)).toEqual([]);
  });

  test('leaves and the report know only what they are to know', () => {
    const stray = imports.filter(({ from, to }) => {
      const allowed = NARROW[roomOf(from)];
      return allowed !== undefined && roomOf(to) !== roomOf(from) && !allowed.includes(roomOf(to));
    });
    expect(stray.map(({ from, to }) => `${from} imports ${to}`)).toEqual([]);
  });

  test('of the record and the comparison, the report sees the type', () => {
    const types = ['record/record.ts', 'compare/comparison.ts'];
    const stray = imports.filter(
      ({ from, to }) =>
        roomOf(from) === 'report' && ['record', 'compare'].includes(roomOf(to)) && !types.includes(to),
    );
    expect(stray).toEqual([]);
  });

  test('nothing goes round in a circle', () => {
    expect(circle(imports)).toBeNull();
  });

  test('a circle would be found', () => {
    const round = [
      { from: 'a', to: 'b' },
      { from: 'b', to: 'c' },
      { from: 'c', to: 'b' },
    ];
    expect(circle(round)).toEqual(['b', 'c', 'b']);
  });

  test('a folder within a room is the room’s own, but for those that are open', () => {
    const reached = imports.filter(
      ({ from, to }) =>
        dirname(to).includes('/') && roomOf(from) !== roomOf(to) && !OPEN_FOLDERS.includes(dirname(to)),
    );
    expect(reached.map(({ from, to }) => `${from} imports ${to}`)).toEqual([]);
    expect(OPEN_FOLDERS.filter((folder) => !existsSync(join(SOURCE, folder)))).toEqual([]);
  });

  test('no file names this machine or where it was written', () => {
    const root = join(SOURCE, '..');
    const named = files.filter((file) => readFileSync(join(SOURCE, file), 'utf8').includes(root));
    expect(named).toEqual([]);
    expect(relative(root, SOURCE)).toBe('src');
  });
});

/** The first circle of imports, as the files along it, or null. */
function circle(edges: readonly Import[]): string[] | null {
  const targets = new Map<string, string[]>();
  for (const { from, to } of edges) targets.set(from, [...(targets.get(from) ?? []), to]);
  const done = new Set<string>();
  const visit = (file: string, path: readonly string[]): string[] | null => {
    const at = path.indexOf(file);
    if (at >= 0) return [...path.slice(at), file];
    if (done.has(file)) return null;
    for (const target of targets.get(file) ?? []) {
      const found = visit(target, [...path, file]);
      if (found !== null) return found;
    }
    done.add(file);
    return null;
  };
  for (const file of targets.keys()) {
    const found = visit(file, []);
    if (found !== null) return found;
  }
  return null;
}
