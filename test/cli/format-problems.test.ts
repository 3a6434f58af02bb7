import { describe, expect, it } from 'vitest';
import { formatProblems, problemsAsJson, sortProblems } from '../../src/cli/format-problems.ts';
import type { Place, Problem } from '../../src/problem.ts';

function problem(place: Place, message: string, more: Partial<Problem> = {}): Problem {
  return { code: 'name_unknown', severity: 'error', place, message, ...more };
}

function at(line: number, column: number, length: number, file = 'a.yaml'): Place {
  return { kind: 'source', file, line, column, length };
}

describe('formatProblems', () => {
  it('shows place, sentence, hint, line and mark', () => {
    const text = 'title: x\nresponse: fuell\n';
    const found = problem(at(2, 11, 5), 'response names "fuell".', { hint: 'Did you mean fuel?' });
    expect(formatProblems([found], new Map([['a.yaml', text]]))).toBe(
      [
        'a.yaml:2:11  response names "fuell". Did you mean fuel?',
        '    2 | response: fuell',
        '      |           ^^^^^',
        '',
      ].join('\n'),
    );
  });

  it('puts that there are more behind those that are listed', () => {
    const more = problem({ kind: 'file', file: 'a.csv' }, 'More.', { code: 'problems_more' });
    const cell = problem({ kind: 'cell', file: 'a.csv', row: 9 }, 'A cell.');
    const whole = problem({ kind: 'file', file: 'a.csv' }, 'The file.');
    expect(sortProblems([more, cell, whole]).map(({ message }) => message)).toEqual([
      'The file.',
      'A cell.',
      'More.',
    ]);
  });

  it('has nothing to say of no problems', () => {
    expect(formatProblems([], new Map())).toBe('');
  });

  it('leaves the excerpt out where the source is not at hand or the line is blank or beyond the end', () => {
    const shown = formatProblems(
      [problem(at(9, 1, 1), 'A.'), problem(at(2, 1, 1), 'B.')],
      new Map([['a.yaml', 'x\n\n']]),
    );
    expect(shown).toBe('a.yaml:2:1  B.\na.yaml:9:1  A.\n');
    expect(formatProblems([problem(at(1, 1, 1), 'A.')], new Map())).toBe('a.yaml:1:1  A.\n');
  });

  it('names cells, columns, files and the command line', () => {
    const shown = formatProblems(
      [
        problem({ kind: 'cell', file: 'd.csv', row: 118, variable: 'speed' }, '"9,4" is not a number.'),
        problem({ kind: 'cell', file: 'd.csv', variable: 'cargo' }, 'All is missing.', {
          severity: 'warning',
        }),
        problem({ kind: 'file', file: 'd.csv' }, 'There are 2 rows.'),
        problem({ kind: 'command' }, 'Name a study.'),
      ],
      new Map(),
    );
    expect(shown.split('\n')).toEqual([
      'Name a study.',
      'd.csv, column cargo: Warning: All is missing.',
      'd.csv: There are 2 rows.',
      'd.csv, row 118, column speed: "9,4" is not a number.',
      '',
    ]);
  });

  it('puts the mark under the right letters behind tabs, wide and combining letters', () => {
    const lineOf = (line: string, word: string) => {
      const place = at(1, line.indexOf(word) + 1, word.length);
      return formatProblems([problem(place, 'A.')], new Map([['a.yaml', line]]))
        .split('\n')
        .slice(1, 3);
    };
    expect(lineOf('a:\tbad', 'bad')).toEqual(['    1 | a:  bad', '      |     ^^^']);
    expect(lineOf('日本: bad', 'bad')).toEqual(['    1 | 日本: bad', '      |       ^^^']);
    expect(lineOf('e\u0301: bad', 'bad')).toEqual(['    1 | e\u0301: bad', '      |    ^^^']);
    expect(lineOf('🚢: bad', 'bad')).toEqual(['    1 | 🚢: bad', '      |     ^^^']);
  });

  it('cuts a long line around the mark', () => {
    const line = `${'a'.repeat(300)}BAD${'b'.repeat(300)}`;
    const [, text, mark] = formatProblems([problem(at(1, 301, 3), 'A.')], new Map([['a.yaml', line]])).split(
      '\n',
    );
    expect(text!.length).toBe('    1 | '.length + 100);
    expect(text).toMatch(/\| …a+BADb+…$/);
    expect(text!.slice(mark!.indexOf('^'), mark!.lastIndexOf('^') + 1)).toBe('BAD');
    const end = formatProblems([problem(at(1, 604, 1), 'A.')], new Map([['a.yaml', line]])).split('\n');
    expect(end[1]).toMatch(/\| …b+$/);
    expect(end[2]!.indexOf('^')).toBe(end[1]!.length);
    const start = formatProblems([problem(at(1, 1, 603), 'A.')], new Map([['a.yaml', line]])).split('\n');
    expect(start[1]).toMatch(/\| a+…$/);
    expect(start[2]!.length).toBeLessThanOrEqual(start[1]!.length);
  });

  it('lets no character of a file steer the terminal', () => {
    const shown = formatProblems(
      [problem(at(1, 1, 1), 'Bad "\u001b[2J\u202e".')],
      new Map([['a.yaml', 'x\u001b[2J']]),
    );
    expect(shown).not.toContain('\u001b');
    expect(shown).not.toContain('\u202e');
    expect(shown).toContain('Bad "<U+001B>[2J<U+202E>".');
  });

  it('reads sources with a byte-order mark and Windows line ends', () => {
    const shown = formatProblems(
      [problem(at(2, 1, 1), 'A.')],
      new Map([['a.yaml', '\ufeffx: 1\r\ny: 2\r\n']]),
    );
    expect(shown).toContain('    2 | y: 2\n');
    expect(shown).not.toContain('\r');
  });
});

describe('sortProblems', () => {
  it('sorts by file as first named, then by place, and keeps the order of equals', () => {
    const problems = [
      problem(at(3, 1, 1, 'b.yaml'), '1'),
      problem(at(2, 9, 1, 'a.yaml'), '2'),
      problem(at(2, 1, 1, 'b.yaml'), '3'),
      problem(at(2, 9, 1, 'a.yaml'), '4'),
      problem(at(2, 3, 1, 'a.yaml'), '5'),
      problem({ kind: 'command' }, '6'),
    ];
    expect(sortProblems(problems).map(({ message }) => message)).toEqual(['6', '3', '1', '5', '2', '4']);
  });
});

describe('problemsAsJson', () => {
  it('counts and lists problems with every key', () => {
    const problems = [
      problem(at(2, 1, 3), 'A.', { hint: 'B.' }),
      problem({ kind: 'cell', file: 'd.csv' }, 'C.', { severity: 'warning' }),
    ];
    expect(JSON.parse(problemsAsJson(problems))).toEqual({
      errors: 1,
      warnings: 1,
      problems: [
        {
          code: 'name_unknown',
          severity: 'error',
          place: { kind: 'source', file: 'a.yaml', line: 2, column: 1, length: 3 },
          message: 'A.',
          hint: 'B.',
        },
        {
          code: 'name_unknown',
          severity: 'warning',
          place: { kind: 'cell', file: 'd.csv', row: null, variable: null },
          message: 'C.',
          hint: null,
        },
      ],
    });
  });
});
