import { describe, expect, test } from 'vitest';
import { readStudyAndData } from '../../src/run/read-study-and-data.ts';
import { runRead, runStudy } from '../../src/run/run-study.ts';
import { inFolder } from '../cli/in-folder.ts';
import { data, study } from './small-study.ts';

const rows = data((row, i) => {
  row.k = ['north', 'south', 'a/b'][i % 3]!;
  if (i === 6) row.z = '';
}, 60);

/** Lines of a data file whose k is this. */
const only = (text: string, level: string) =>
  text
    .split('\n')
    .filter((line, index) => index === 0 || line.split(',')[3] === level || line === '')
    .join('\n');

describe('a study that repeats for a variable', () => {
  test('finds for each level what it finds in a file of those rows alone', async () => {
    const terms = {
      'terms: [x, z]': 'terms: [x, z, m]',
      'k: { type: category }': 'k: { type: category }\n    m: { type: category }',
    };
    // m has a level that one k lacks: what is not there is no level of that run.
    const wide = (text: string) =>
      text
        .split('\n')
        .map((line, i) => {
          if (line === '') return line;
          const [y, x, z, k, w] = line.split(',');
          const m =
            i === 0
              ? 'm'
              : k === 'south'
                ? ['p', 'q'][(i >> 2) % 2]
                : ['o', 'p', 'q'][(i * i + (i >> 1)) % 3];
          return [y, x, z, k, w, m].join(',');
        })
        .join('\n');
    const all = wide(rows);
    await inFolder(
      {
        'all.study.yaml': study(terms, 'repeat_for: k\n'),
        'data.csv': all,
        'one/one.study.yaml': study(terms),
        'one/data.csv': only(all, 'south'),
      },
      async (folder) => {
        const read = await readStudyAndData(`${folder}/all.study.yaml`);
        expect(read.levels!.map(({ level, rows: own }) => [level, own.length])).toEqual([
          ['a/b', 20],
          ['north', 20],
          ['south', 20],
        ]);
        const part = (await runRead(read, { level: 'south' })).record!;
        const alone = (await runStudy(`${folder}/one/one.study.yaml`)).record!;
        expect(part.candidates).toEqual(alone.candidates);
        expect(part.selection).toEqual(alone.selection);
        expect(part.data.variables).toEqual(alone.data.variables);
        expect(part.data.rows_read).toBe(20);
        expect(part.data.left_out).toEqual(alone.data.left_out);
        expect(part.data.repeat).toEqual({ variable: 'k', level: 'south' });
        expect(alone.data.repeat).toBeUndefined();
        expect(part.examination!.findings.map(({ statistic }) => statistic)).toEqual(
          alone.examination!.findings.map(({ statistic }) => statistic),
        );
      },
    );
  });

  test('counts the bad values of each level', async () => {
    const bad = data((row, i) => {
      row.k = i % 2 === 0 ? 'even' : 'odd';
      if (i % 2 === 0 && i < 50) row.z = 'bad';
    }, 80);
    const text = study(
      { 'file: data.csv': 'file: data.csv\n  on_bad_value: set_missing' },
      'repeat_for: k\n',
    );
    await inFolder({ 's.yaml': text, 'data.csv': bad }, async (folder) => {
      const read = await readStudyAndData(`${folder}/s.yaml`);
      const [even, odd] = await Promise.all(['even', 'odd'].map((level) => runRead(read, { level })));
      expect(even!.record!.data).toMatchObject({ rows_read: 40, bad_value_count: 25, rows_used: 15 });
      expect(even!.record!.data.bad_values).toHaveLength(20);
      expect(odd!.record!.data).toMatchObject({ rows_read: 40, bad_value_count: 0, rows_used: 40 });
    });
  });

  test('says which rows belong to no run, and stops where there is no level', async () => {
    const text = study({ 'k: { type: category }': 'k: { type: integer }' }, 'repeat_for: k\n');
    const some = data((row, i) => {
      row.k = i < 3 ? '' : String(i % 2 === 0 ? 10 : 9);
    }, 40);
    const none = data((row) => {
      row.k = '';
    });
    await inFolder(
      { 's.yaml': text, 'data.csv': some, 'n/s.yaml': text, 'n/data.csv': none },
      async (folder) => {
        const read = await readStudyAndData(`${folder}/s.yaml`);
        expect(read.levels!.map(({ level }) => level)).toEqual(['9', '10']);
        expect(read.problems).toMatchObject([{ code: 'repeat_level_missing', severity: 'warning' }]);
        expect(read.problems[0]!.message).toContain('3 rows have no value of k');
        const empty = await readStudyAndData(`${folder}/n/s.yaml`);
        expect(empty.problems).toMatchObject([{ code: 'repeat_level_missing', severity: 'error' }]);
      },
    );
  });

  test('runs one level or says why not', async () => {
    await inFolder(
      { 's.yaml': study({}, 'repeat_for: k\n'), 'o.yaml': study(), 'data.csv': rows },
      async (folder) => {
        for (const [file, options] of [
          ['s.yaml', {}],
          ['s.yaml', { level: 'west' }],
          ['o.yaml', { level: 'north' }],
        ] as const) {
          const { record, problems } = await runStudy(`${folder}/${file}`, options);
          expect(record).toBeNull();
          expect(problems).toMatchObject([{ code: 'repeat_level_unknown', severity: 'error' }]);
        }
        expect((await runStudy(`${folder}/s.yaml`, { level: 'north' })).record).not.toBeNull();
      },
    );
  });

  test.each([
    ['x', 'rules_contradict', {}],
    ['q', 'name_unknown', {}],
    ['w', 'type_unsuited', {}],
    ['half', 'type_unsuited', { 'response: y': 'derive:\n  half: { expression: w / 2 }\nresponse: y' }],
  ])('for %s is refused: %s', async (variable, code, changes) => {
    const text = study(
      { 'x: { type: number }': 'x: { type: integer }', ...changes },
      `repeat_for: ${variable}\n`,
    );
    await inFolder({ 's.yaml': text, 'data.csv': rows }, async (folder) => {
      const { problems } = await runStudy(`${folder}/s.yaml`);
      expect(problems.filter(({ severity }) => severity === 'error')).toMatchObject([{ code }]);
    });
  });
});
