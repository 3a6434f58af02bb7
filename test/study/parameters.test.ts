// biome-ignore-all lint/suspicious/noTemplateCurlyInString: a study uses its parameters in this form.
import { describe, expect, test } from 'vitest';
import { runCommandLine } from '../../src/cli/command-line.ts';
import type { Problem } from '../../src/problem.ts';
import { parseStudy } from '../../src/study/parse-study.ts';
import type { Study } from '../../src/study/study.ts';
import { collecting } from '../cli/collect.ts';

const TEXT = `plumbrule: 1
title: Fuel in \${year}
parameters:
  file: a.csv
  year: 2024
  limit: 0.75
  trials: "true"
  code: 007
data:
  file: \${file}
  missing: ["\${code}"]
  variables:
    y: { type: number, at_least: "\${limit}" }
    x: { type: number }
    day: { type: date }
leave_out:
  - where: day < "\${year}-02-01" and x > \${limit}
    because: Costs $\${file} more
response: y
candidates: [{ name: "Line of \${year}", terms: [x] }]
acceptance: { r_squared: { at_least: "\${limit}" } }
report: { caution: "\${trials}" }
`;

function read(
  text: string,
  given: Record<string, string> = {},
): { study: Study | null; problems: Problem[] } {
  const problems: Problem[] = [];
  const study = parseStudy(
    text,
    's.yaml',
    '/',
    '0'.repeat(64),
    (problem) => problems.push(problem),
    new Map(Object.entries(given)),
  );
  return { study, problems };
}

describe('parameters', () => {
  test('stand in texts as they are spelt, and alone with their type', () => {
    const { study, problems } = read(TEXT);
    expect(problems).toEqual([]);
    expect(study!.title).toBe('Fuel in 2024');
    expect(study!.data.file).toBe('a.csv');
    expect(study!.data.missing).toEqual(['007']);
    expect(study!.data.variables[0]!.atLeast).toBe(0.75);
    expect(study!.leaveOut[0]!.text).toBe('day < "2024-02-01" and x > 0.75');
    expect(study!.leaveOut[0]!.because).toBe('Costs ${file} more');
    expect(study!.candidates[0]!.name).toBe('Line of 2024');
    expect(study!.acceptance[0]).toMatchObject({ atLeast: 0.75 });
    expect(study!.report.caution).toBe('true');
    expect(study!.parameters.map(({ name, value, given }) => [name, value, given])).toEqual([
      ['file', 'a.csv', false],
      ['year', 2024, false],
      ['limit', 0.75, false],
      ['trials', 'true', false],
      ['code', 7, false],
    ]);
  });

  test('take the values that a run is given, of the type of the default', () => {
    const { study, problems } = read(TEXT, { file: 'b=c.csv', limit: '5e-1', code: '09' });
    expect(problems).toEqual([]);
    expect(study!.data.file).toBe('b=c.csv');
    expect(study!.acceptance[0]).toMatchObject({ atLeast: 0.5 });
    expect(study!.data.missing).toEqual(['09']);
    expect(study!.parameters.find(({ name }) => name === 'limit')).toEqual({
      name: 'limit',
      value: 0.5,
      default: 0.75,
      given: true,
    });
  });

  test('a value given is text wherever it came from: it cannot become YAML', () => {
    const { study } = read(TEXT, { file: '{ a: 1 }', trials: '*alias' });
    expect(study!.data.file).toBe('{ a: 1 }');
    expect(study!.report.caution).toBe('*alias');
  });

  test('what is not declared cannot be set or used; the nearest name is said', () => {
    const given = read(TEXT, { fil: 'b.csv' });
    expect(given.study).toBeNull();
    expect(given.problems).toMatchObject([
      { code: 'parameter_unknown', place: { kind: 'command' }, hint: 'Did you mean file?' },
    ]);
    const used = read(TEXT.replace('Line of ${year}', 'Line of ${yaer}'));
    expect(used.problems).toMatchObject([
      {
        code: 'parameter_unknown',
        place: { line: 20, column: 31, length: 7 },
        hint: 'Did you mean year?',
      },
    ]);
    expect(read(TEXT.replace(/parameters:\n(?: {2}.*\n)+/, '')).problems.length).toBeGreaterThan(3);
  });

  test('a value of another type is refused', () => {
    const { study, problems } = read(TEXT, { limit: '0,5' });
    expect(study).toBeNull();
    expect(problems).toMatchObject([{ code: 'parameter_value', hint: 'Write limit=0.5.' }]);
    expect(read(TEXT, { limit: 'Infinity' }).problems).toMatchObject([{ code: 'parameter_value' }]);
  });

  test('faults after a use have the place of the text as it is written', () => {
    const wrong = read(TEXT.replace('x > ${limit}', '${limit} < xx'));
    expect(wrong.problems.filter(({ severity }) => severity === 'error')).toMatchObject([
      { code: 'expression_name', place: { line: 17, column: 49, length: 2 } },
    ]);
    const inside = read(TEXT, { year: '20' });
    expect(inside.problems).toMatchObject([{ code: 'expression_type', place: { line: 17 } }]);
  });

  test('one that nothing uses is a warning; in a key it is an error', () => {
    expect(read(TEXT.replace('caution: "${trials}"', 'caution: none')).problems).toMatchObject([
      { code: 'name_unused', severity: 'warning', place: { line: 7, column: 3 } },
    ]);
    const key = read(TEXT.replace('x: { type: number }', '"x${year}": { type: number }'));
    expect(key.problems.some(({ message }) => /parameter can stand in a value only/.test(message))).toBe(
      true,
    );
  });

  test('a declaration that is no list of plain values is told once', () => {
    const { problems } = read(TEXT.replace('  year: 2024', '  year: [2024]'));
    expect(problems.filter(({ severity }) => severity === 'error')[0]).toMatchObject({
      code: 'value_not_allowed',
      place: { line: 5 },
    });
    expect(problems.some(({ code }) => code === 'parameter_unknown')).toBe(false);
  });
});

describe('--with', () => {
  test.each([
    ['file', 'is not of the form NAME=VALUE'],
    ['=3', 'is not of the form NAME=VALUE'],
  ])('%s is refused', async (text, said) => {
    const { terminal, printed } = collecting();
    expect(await runCommandLine(['fit', 'none.yaml', '--with', text], terminal)).toBe(2);
    expect(printed.err).toContain(said);
  });

  test('a name given twice is refused by check as well', async () => {
    const { terminal, printed } = collecting();
    expect(await runCommandLine(['check', 'none.yaml', '--with', 'a=1', '--with', 'a=2'], terminal)).toBe(2);
    expect(printed.err).toContain('gives a twice');
  });
});
