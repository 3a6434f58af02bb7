// biome-ignore-all lint/suspicious/noTemplateCurlyInString: headers that look like parameters are among the cases.
import { mkdir, readFile, writeFile } from 'node:fs/promises';
import { join } from 'node:path';
import fc from 'fast-check';
import papaparse from 'papaparse';
import { describe, expect, test } from 'vitest';
import { describeColumn, findDecimalMark } from '../../src/draft/describe-column.ts';
import { draftStudy } from '../../src/draft/draft-study.ts';
import { proposeCandidates } from '../../src/draft/propose-candidates.ts';
import { checkStudy } from '../../src/run/check-study.ts';
import { runStudy } from '../../src/run/run-study.ts';
import { inFolder, plumbrule } from '../cli/in-folder.ts';

const errorsOf = (problems: readonly { severity: string; message: string }[]) =>
  problems.filter(({ severity }) => severity === 'error').map(({ message }) => message);

/** Invented. */
const ROWS = Array.from({ length: 48 }, (_, i) => {
  const load = 10 + ((i * 7) % 23);
  return `r${i};${load},5;${['yes', 'no'][i % 2]};${['b "x"', 'a: #1', 'b "x"'][i % 3]};${1 + (i % 28)}.${1 + (i % 12)}.2025;${i === 4 ? '-' : `${2 * load + (i % 3)},25`}`;
});
const EUROPEAN = `Kennung;Gewicht (kg);on;Art, grob;Tag;\${y}\n${ROWS.join('\n')}\n`;

describe('a draft', () => {
  test('tells of dates that tell every row apart, and how they become its identity', () =>
    inFolder(
      {
        'd.csv': `day,a,b\n${ROWS.slice(0, 28)
          .map((_, i) => `2025-03-${String(i + 1).padStart(2, '0')},${i * i},${i}.5`)
          .join('\n')}\n`,
      },
      async (folder) => {
        const out = join(folder, 'd.study.yaml');
        const { text } = await draftStudy(join(folder, 'd.csv'), { response: 'b', out });
        expect(text).toContain('# row_id: TODO The dates in day tell every row apart.');
        const study = text!
          .replace(/^ {2}# row_id: .*$/m, '  row_id: id')
          .replace('  variables:\n', '  variables:\n    id: { column: day, type: identifier }\n');
        await writeFile(out, study);
        expect(errorsOf((await checkStudy(out)).problems)).toEqual([]);
      },
    ));

  test('says how the file is written, and runs', () =>
    inFolder({ 'd.csv': EUROPEAN }, async (folder) => {
      await mkdir(join(folder, 'studies'));
      const out = join(folder, 'studies/d.study.yaml');
      const { text, problems } = await draftStudy(join(folder, 'd.csv'), { response: '${y}', out });
      expect(problems).toEqual([]);
      for (const part of [
        'file: "../d.csv"',
        'delimiter: ";", decimal_mark: ","',
        'row_id: Kennung',
        'time: Tag',
        'Kennung: { type: identifier }',
        '"Gewicht (kg)": { type: number }',
        '"on": { type: flag }',
        '"Art, grob": { type: category, levels: ["b \\"x\\"", "a: #1"] }',
        'pattern: "DD.MM.YYYY"',
        'missing: ["-"]',
      ])
        expect(text).toContain(part);
      await writeFile(out, text!);
      const run = await runStudy(out);
      expect(errorsOf(run.problems)).toEqual([]);
      expect(run.record!.data).toMatchObject({ rows_used: 47, bad_value_count: 0 });
    }));

  test('of a file that is not UTF-8 declares Latin-1', () =>
    inFolder({}, async (folder) => {
      const data = join(folder, 'd.csv');
      await writeFile(data, Buffer.from(EUROPEAN.replaceAll('Kennung', 'Schlüssel'), 'latin1'));
      const { text } = await draftStudy(data, { response: '${y}' });
      expect(text).toContain('encoding: latin-1');
      expect(text).toContain('"Schlüssel"');
    }));

  test('leaves out columns that cannot be told apart, and says so', () =>
    inFolder({ 'd.csv': `a,a,,b,y\n${'1,2,3,4,5\n2,2,3,5,7\n3,2,3,7,8\n'.repeat(8)}` }, async (folder) => {
      const out = join(folder, 's.yaml');
      const { text } = await draftStudy(join(folder, 'd.csv'), { response: 'y', out });
      expect(text).toContain('# Not declared: a, which stands twice.');
      expect(text).toContain('# Not declared: column 3, which has no header.');
      await writeFile(out, text!);
      expect(errorsOf((await runStudy(out)).problems)).toEqual([]);
    }));

  test.each([
    ['spede', 'x,speed\n1,2\n2,3\n3,5\n', 'Did you mean speed?'],
    ['x', 'x,y\na,1\nb,2\nc,3\n', 'does not hold numbers'],
    ['x', 'x,y\n1,1\n1,2\n1,3\n', 'the same value in every row'],
    ['x', 'x,y\n1,1\n,2\n2,3\n', 'fewer than three numbers'],
    ['x', '', 'is empty'],
    ['x', 'x,y\n', 'no rows'],
    ['x', 'x,y\n1,2\n1,2,3\n', 'has 3 cells where the header has 2'],
    ['x', 'x,y\n"1,2\n', 'is not closed'],
  ])('for %s is refused with a sentence: %j', (response, text, said) =>
    inFolder({ 'd.csv': text }, async (folder) => {
      const run = await plumbrule('draft', join(folder, 'd.csv'), '--response', response);
      expect([run.status, run.out]).toEqual([2, '']);
      expect(run.err).toContain(said);
    }),
  );

  test('does not take the place of a study', () =>
    inFolder({ 'd.csv': EUROPEAN, 's.yaml': 'kept' }, async (folder) => {
      const args = ['draft', join(folder, 'd.csv'), '--response', '${y}', '--out'];
      const refused = await plumbrule(...args, join(folder, 's.yaml'));
      expect([refused.status, await readFile(join(folder, 's.yaml'), 'utf8')]).toEqual([2, 'kept']);
      expect(await plumbrule(...args, join(folder, 'new.yaml'))).toEqual({ status: 0, out: '', err: '' });
      expect((await plumbrule(...args.slice(0, -1))).out).toMatch(/^# yaml-language-server: \$schema=/);
    }));

  test('of any table, whatever its headers and cells are, is a sound study or a sentence', async () => {
    const odd = fc.oneof(
      fc.string({ maxLength: 12, unit: 'grapheme' }),
      fc.constantFrom(
        '',
        'NA',
        '-',
        'null',
        '1,5',
        '007',
        'yes',
        '2025-01-01',
        '=1+1',
        '__proto__',
        '${x}',
        '# no',
      ),
    );
    const table = fc.record({
      header: fc.array(odd, { minLength: 1, maxLength: 4 }),
      rows: fc.array(fc.array(odd, { minLength: 4, maxLength: 4 }), { minLength: 3, maxLength: 12 }),
    });
    await fc.assert(
      fc.asyncProperty(table, ({ header, rows }) =>
        inFolder({}, async (folder) => {
          const all = [
            [...header, 'y'],
            ...rows.map((row, i) => [...row.slice(0, header.length), String(i * i)]),
          ];
          const data = join(folder, 'd.csv');
          await writeFile(data, papaparse.unparse(all, { newline: '\n' }));
          const out = join(folder, 's.yaml');
          const { text, problems } = await draftStudy(data, { response: 'y', out });
          if (text === null) {
            expect(errorsOf(problems).length).toBeGreaterThan(0);
            return;
          }
          await writeFile(out, text);
          expect(errorsOf((await checkStudy(out)).problems)).toEqual([]);
        }),
      ),
      { numRuns: 150 },
    );
  });
});

describe('what a column seems to hold', () => {
  const seen = (cells: string[], mark: '.' | ',' = '.') => describeColumn(cells, mark);

  test.each([
    [['1', '2', '', '3'], 'integer'],
    [['1.5', '2', 'NaN'], 'number'],
    [['no', 'Yes', 'no'], 'flag'],
    [['0', '1', '0'], 'flag'],
    [['2025-01-01', '2025-02-01T10:00'], 'date'],
    [['2025-01', '2025-02'], 'date'],
    [['a', 'b', 'a', 'a', 'b', 'b'], 'category'],
    [['a', 'a', 'a', 'a'], 'text'],
    [['k1', 'k2', 'k3'], 'identifier'],
    [['', 'NA'], 'text'],
  ] as [string[], string][])('%j: %s', (cells, type) => {
    expect(seen(cells).type).toBe(type);
  });

  test('levels come most frequent first, in the order of the file where equal', () => {
    const { levels } = seen([...'dcabbabcabdd']);
    expect(levels.map(({ text }) => text)).toEqual(['b', 'd', 'a', 'c']);
  });

  test('a date that can be read two ways says the other', () => {
    expect(seen(['01/02/2025', '03/04/2025'])).toMatchObject({
      pattern: 'DD/MM/YYYY',
      otherPatterns: ['MM/DD/YYYY'],
    });
    expect(seen(['01/22/2025', '03/04/2025'])).toMatchObject({ pattern: 'MM/DD/YYYY', otherPatterns: [] });
  });

  test('a comma is the decimal mark where more columns are numbers that way', () => {
    expect(
      findDecimalMark(
        [
          ['1,5', '2'],
          ['x', 'y'],
        ],
        ';',
      ),
    ).toBe(',');
    expect(
      findDecimalMark(
        [
          ['1.5', '2'],
          ['1', '2'],
        ],
        ';',
      ),
    ).toBe('.');
    expect(findDecimalMark([['1', '2']], ';')).toBe('.');
  });
});

describe('candidates proposed', () => {
  const numbers = (name: string, at: (i: number) => number, n = 40) => ({
    name,
    seen: describeColumn(
      Array.from({ length: n }, (_, i) => String(at(i))),
      '.',
    ),
  });
  const y = Float64Array.from({ length: 40 }, (_, i) => 3 * i + ((i * 7) % 5));

  test('begin with what goes with the response most, and keep ten rows for each coefficient', () => {
    const weak = numbers('weak', (i) => (i * 17) % 11);
    const strong = numbers('strong', (i) => i * 2 + 0.5);
    const others = [5, 6, 7].map((k) => numbers(`k${k}`, (i) => (i * k) % 13));
    const { candidates, rows } = proposeCandidates(y, [weak, strong, ...others]);
    expect(rows).toBe(40);
    expect(candidates[0]!.terms[0]).toBe('strong');
    for (const { terms } of candidates) expect(40 / (terms.length + 1)).toBeGreaterThanOrEqual(10);
  });

  test('without any, the mean alone', () => {
    expect(proposeCandidates(y, [numbers('same', () => 4)]).candidates).toEqual([
      { name: 'The mean alone', terms: [] },
    ]);
  });
});
