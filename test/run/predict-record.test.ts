import { spawn } from 'node:child_process';
import { once } from 'node:events';
import { readFile, writeFile } from 'node:fs/promises';
import { join } from 'node:path';
import { Readable } from 'node:stream';
import { fileURLToPath } from 'node:url';
import { describe, expect, test } from 'vitest';
import { predictFromRecord } from '../../src/predict-record.ts';
import type { StudyRecord } from '../../src/record/record.ts';
import { inFolder, plumbrule } from '../cli/in-folder.ts';

/** Invented, with no more pattern than is needed for every kind of column to be fitted. */
const n = 60;
const noise = (i: number) => ((i * 37) % 23) / 23 - 0.5;
const cell = (value: number) => String(value).replace('.', ',');
const HEADER = 'id;Menge (t);b;site;on;when;w;y\n';
const line = (i: number) => {
  const a = 1 + ((i * 7) % 19) / 2;
  const b = 10 + ((i * 13) % 31) / 3;
  const site = ['North', 'South', 'East'][i % 3]!;
  const on = i % 4 < 2 ? 'off' : 'on';
  const when = `${String(1 + (i % 28)).padStart(2, '0')}.${String(1 + (i % 12)).padStart(2, '0')}.2025`;
  const y = 20 + 3 * a + 0.2 * b + (i % 3) + (i % 4 < 2 ? 0 : 2) + Math.cos(i % 12) + noise(i);
  return `r${i};${cell(a)};${cell(b)};${site};${on};${when};${cell(1 + (i % 5) / 2)};${cell(y)}\n`;
};
const DATA = HEADER + Array.from({ length: n }, (_, i) => line(i)).join('');
/** The data's own rows in part, and one beyond them. */
const ROWS = `${HEADER}${[3, 14, 25, 7].map(line).join('')}far;11;12,5;East;on;01.02.2025;2;\n`;

const study = (more: string) => `plumbrule: 1
title: Every kind of column
data:
  file: data.csv
  format: { decimal_mark: "," }
  row_id: id
  time: when
  missing: ["", "-"]
  variables:
    id: { type: identifier }
    a: { type: number, column: Menge (t), at_least: 0, missing: [-1] }
    b: { type: number }
    site: { type: category, levels: [North, South, East, West], baseline: South }
    on: { type: flag, values: ["off", "on"] }
    when: { type: date, pattern: DD.MM.YYYY }
    w: { type: number }
    y: { type: number }
derive:
  season: { expression: "month(when) * 2 + if(on, 1, 0)" }
  root: { expression: "sqrt(a) / b" }
  heavy: { expression: "w * 2" }
predict: { file: rows.csv, interval: 0.8, total: true }
${more}
`;
const TERMS = `[{ polynomial: a, degree: 3 }, { spline: b, knots: [10, 13, 17, 20] }, site, on, season, { bend: season, at: 9 },
      root, { interaction: [a, site] }]`;
const candidates = (terms = TERMS) => `candidates: [{ name: All, terms: ${terms} }]`;

const CASES: Readonly<Record<string, string>> = {
  classical: `response: y\n${candidates()}`,
  'unequal spread': `response: y\ninference: { standard_errors: hc3 }\n${candidates()}`,
  clustered: `response: y\ninference: { standard_errors: { clustered_by: season } }\n${candidates('[a, b, on]')}`,
  'log scale': `response: { variable: y, scale: log }\n${candidates()}`,
  reciprocal: `response: { variable: y, scale: reciprocal }\n${candidates('[a, site]')}`,
  'box-cox': `response: { variable: y, scale: { box_cox: 0.5 } }\n${candidates('[a, site]')}`,
  weighted: `response: y\nweights: w\n${candidates()}`,
  'derived weights': `response: y\nweights: heavy\n${candidates('[a, on]')}`,
  'through zero': `response: y\ncandidates: [{ name: Zero, terms: [a, b], intercept: false }]`,
};

async function fitted(folder: string): Promise<{ path: string; record: StudyRecord }> {
  const out = join(folder, 'out');
  const run = await plumbrule('fit', join(folder, 'study.yaml'), '--out', out, '--quiet');
  expect(run.status, run.err).toBe(0);
  const path = join(out, 'record.json');
  return { path, record: JSON.parse(await readFile(path, 'utf8')) };
}

const filesOf = (text: string, rows = ROWS) => ({
  'study.yaml': study(text),
  'data.csv': DATA,
  'rows.csv': rows,
});

describe('a record alone predicts as its study did, to the last bit', () => {
  test.each(Object.entries(CASES))('%s', (_, text) =>
    inFolder(filesOf(text), async (folder) => {
      const { path, record } = await fitted(folder);
      // Neither study nor data are needed.
      for (const name of ['study.yaml', 'data.csv']) await writeFile(join(folder, name), 'gone');
      const { rows, totals, interval, problems } = await predictFromRecord(path, join(folder, 'rows.csv'));
      expect(problems.map(({ severity, message }) => [severity, message])).toEqual([
        ['warning', '1 of the 5 rows predicted lies outside the data that the model was fitted to.'],
      ]);
      expect(interval).toBe(0.8);
      expect(record.predictions).toHaveLength(5);
      expect(rows.map(({ prediction }) => ({ ...prediction, values: [] }))).toEqual(
        record.predictions.map((prediction) => ({ ...prediction, values: [] })),
      );
      expect(rows.map(({ label, line: at }) => [label, at])).toEqual(
        ['r3', 'r14', 'r25', 'r7', 'far'].map((label, k) => [label, k + 2]),
      );
      if (record.prediction_total === null) expect(totals).toEqual([]);
      else expect(totals).toEqual([{ group: null, ...record.prediction_total, rows_not_predicted: 0 }]);
      expect(rows[4]!.prediction!.outside).toEqual(['a 11 is above 10, the largest in the data']);
    }),
  );
});

describe('predict', () => {
  const text = CASES.classical!;

  test('lists the rows that it cannot predict in their places, and predicts the rest', () => {
    const rows = `${HEADER}${line(3)}u;1;12;Sout;on;01.02.2025;1;\nm;-;12;East;on;01.02.2025;1;\nc;-1;12;East;on;01.02.2025;1;\nx;2;12;East;on;31.02.2025;1;\nw;2;12;West;on;01.02.2025;1;\n`;
    return inFolder(filesOf(text), async (folder) => {
      const { path } = await fitted(folder);
      await writeFile(join(folder, 'more.csv'), rows);
      const run = await plumbrule('predict', path, join(folder, 'more.csv'));
      expect(run.status).toBe(0);
      const lines = run.out.trimEnd().split('\n');
      expect(lines[0]).toBe(
        'label,estimate,lower,upper,mean_lower,mean_upper,mean,leverage,outside,not_predicted',
      );
      expect(lines.slice(1).map((each) => [each.split(',')[0], each.split(',').at(-1)])).toEqual([
        ['r3', ''],
        ['u', '"no row fitted has site ""Sout"""'],
        ['m', 'a is missing'],
        ['c', 'a is missing'],
        ['x', '"when ""31.02.2025"" is not a date"'],
        ['w', '"no row fitted has site ""West"""'],
      ]);
      expect(run.err).toContain('Did you mean South?');
      expect(run.err).toContain('31.02.2025');
    });
  });

  test('a value that cannot be read is said to be that, and not to be missing', () =>
    inFolder(filesOf(text), async (folder) => {
      const { path } = await fitted(folder);
      const broken = [
        '2.5;12;East;on;01.02.2025;x;',
        '-3;12;East;on;01.02.2025;1;',
        '2;12;East;perhaps;01.02.2025;1;',
        '2;12;East;on;01.02.2025;x;',
      ];
      const rows = broken.map((row, i) => `b${i};${row}\n`).join('');
      await writeFile(join(folder, 'more.csv'), `${HEADER}${rows}`);
      const { rows: found, problems } = await predictFromRecord(path, join(folder, 'more.csv'));
      expect(found.map(({ because }) => because)).toEqual([
        'a "2.5" is not a number',
        'a "-3" is out of range',
        'on "perhaps" is not a flag',
        // The weight is not asked of a row.
        null,
      ]);
      const of = (code: string) => problems.filter((each) => each.code === code);
      expect(of('prediction_value_missing').map(({ message, hint }) => [message, hint])).toEqual([
        ['The row "b0" cannot be predicted: a "2.5" is not a number.', undefined],
        ['The row "b1" cannot be predicted: a "-3" is out of range.', undefined],
        ['The row "b2" cannot be predicted: on "perhaps" is not a flag.', undefined],
      ]);
      expect(of('cell_not_number')[0]!.hint).toBe(
        'Numbers are read with the decimal mark ",", that of the study.',
      );
    }));

  test.each(['weighted', 'derived weights'])(
    '%s: a row without a weight is said to count as one of weight 1',
    (name) => {
      const weights = name === 'weighted' ? 'w' : 'heavy';
      const what = `no ${weights} above 0, by which the rows fitted are weighted`;
      // The study's own rows lack one weight, those of the record all of them.
      const own = ROWS.replace(line(14), line(14).replace(/^((?:[^;]*;){6})[^;]*/, '$10'));
      return inFolder(filesOf(CASES[name]!, own), async (folder) => {
        const { path, record } = await fitted(folder);
        expect(record.warnings.map(({ text: said }) => said)).toContain(
          `The row "r14" gives ${what}: its interval for a new row is that of weight 1. Give ${weights}, or what it is derived from.`,
        );
        const bare = ROWS.split('\n').map((each) => each.split(';').toSpliced(6, 1).join(';'));
        await writeFile(join(folder, 'bare.csv'), bare.join('\n'));
        const { rows, problems } = await predictFromRecord(path, join(folder, 'bare.csv'));
        expect(problems.map(({ code, message }) => [code, message])).toContainEqual([
          'prediction_value_missing',
          `5 rows give ${what} (the first is "r3"): their intervals for a new row are those of weight 1.`,
        ]);
        // Of weight 1 the row was before as well; what is said of the mean owes nothing to weights.
        expect(rows[1]!.prediction!.upper).toBe(record.predictions[1]!.upper);
        expect(rows[0]!.prediction!.upper).not.toBe(record.predictions[0]!.upper);
        expect(rows[0]!.prediction!.mean_upper).toBe(record.predictions[0]!.mean_upper);
      });
    },
  );

  test('rows outside the data are counted, and where most are, the units are asked about', () =>
    inFolder(filesOf(text), async (folder) => {
      const { path } = await fitted(folder);
      const at = (a: string) => `z;${a};12,5;East;on;01.02.2025;2;\n`;
      const problemsOf = async (...values: string[]) => {
        await writeFile(join(folder, 'more.csv'), HEADER + values.map(at).join(''));
        return (await predictFromRecord(path, join(folder, 'more.csv'))).problems.map(
          ({ code, severity, message, hint }) => `${code} ${severity}: ${message} ${hint}`,
        );
      };
      const kind = 'prediction_outside warning:';
      const where =
        'outside the data that the model was fitted to. Each prediction says how, under "outside".';
      const units = 'Look whether the file is in the units of the study.';
      expect(await problemsOf('5', '6')).toEqual([]);
      expect(await problemsOf('5', '6', '500')).toEqual([`${kind} 1 of the 3 rows predicted lies ${where}`]);
      expect(await problemsOf('5', '600', '500')).toEqual([
        `${kind} 2 of the 3 rows predicted lie ${where} ${units}`,
      ]);
      expect(await problemsOf('500')).toEqual([`${kind} The row predicted lies ${where} ${units}`]);
    }));

  test.each([
    ['empty', '', 'is empty'],
    ['only a header', HEADER, 'has a header and no rows'],
    ['a column too few', HEADER.replace(';Menge (t)', ''), 'no column "Menge (t)" of the variable a'],
    ['a column twice', HEADER.replace(';y', ';b'), 'The header names "b" twice, in columns 3 and 8.'],
    ['another number of cells', `${HEADER}r;1;2\n`, 'The row has 3 cells where the header has 8.'],
    ['a quote left open', `${HEADER}"r;1;2\n`, 'The quote that opens in line 2 is not closed'],
    ['UTF-16', '\ufeffid', 'the byte-order mark of UTF-16'],
  ])('a file of rows that is %s is refused in a sentence', (what, content, sentence) =>
    inFolder(filesOf(text), async (folder) => {
      const { path } = await fitted(folder);
      const file = join(folder, 'more.csv');
      await writeFile(file, content, what === 'UTF-16' ? 'utf16le' : 'utf8');
      const run = await plumbrule('predict', path, file);
      expect([run.status, run.out]).toEqual([2, '']);
      expect(run.err).toContain(sentence);
    }),
  );

  test('the same rows, however their file is written, give the same predictions', () =>
    inFolder(filesOf(text), async (folder) => {
      const { path } = await fitted(folder);
      const file = join(folder, 'more.csv');
      const predictions = async (content: string) => {
        await writeFile(file, content);
        const run = await plumbrule('predict', path, file);
        expect(run.status, run.err).toBe(0);
        return run.out;
      };
      const plain = await predictions(ROWS);
      const quoted = ROWS.replaceAll(/[^;\n]+/g, '"$&"');
      for (const content of [
        `\ufeff${ROWS}`,
        ROWS.replaceAll('\n', '\r\n'),
        ROWS.replaceAll('\n', '\r'),
        quoted,
        quoted.replaceAll(';', ','),
        ROWS.trimEnd(),
        ROWS.replaceAll('\n', ' \n'),
      ]) {
        expect(await predictions(content)).toBe(plain);
      }
    }));

  test('a reader that has had enough of a long output ends it without a word', () =>
    inFolder(filesOf(text), async (folder) => {
      const { path } = await fitted(folder);
      const file = join(folder, 'more.csv');
      await writeFile(file, HEADER + Array.from({ length: 10_000 }, (_, i) => line(i)).join(''));
      const main = fileURLToPath(new URL('../../src/cli/main.ts', import.meta.url));
      const args = ['--import', import.meta.resolve('tsx'), main, 'predict', path, file];
      const child = spawn(process.execPath, args, { stdio: ['ignore', 'pipe', 'pipe'] });
      let err = '';
      child.stderr.on('data', (bytes) => {
        err += bytes;
      });
      const [head] = (await once(child.stdout, 'data')) as [Buffer];
      child.stdout.destroy();
      const [status] = await once(child, 'close');
      expect(head.toString()).toMatch(/^label,estimate,/);
      expect([status, err]).toEqual([0, '']);
    }));

  test('totals of groups have the full covariance of their rows, and the group may be any column', () =>
    inFolder({ ...filesOf(text), 'rows.csv': ROWS.replace('far;11', 'far;9') }, async (folder) => {
      const { path, record } = await fitted(folder);
      const file = join(folder, 'rows.csv');
      const bySite = await predictFromRecord(path, file, { totalBy: 'site' });
      const s2 = record.model!.residual_standard_error! ** 2;
      // A group of one row has the interval of that row; all rows together have what the record says.
      expect(bySite.totals[0]).toEqual({ group: null, ...record.prediction_total, rows_not_predicted: 0 });
      expect(bySite.totals.map(({ group, rows }) => [group, rows])).toEqual([
        [null, 5],
        ['North', 1],
        ['East', 2],
        ['South', 2],
      ]);
      const [north] = bySite.rows;
      expect(bySite.totals[1]!.lower).toBeCloseTo(north!.prediction!.lower!, 10);
      expect(bySite.totals[1]!.upper).toBeCloseTo(north!.prediction!.upper!, 10);
      // Of two rows a and b: s²(2 + h_a + h_b + 2 x_a′(X′X)⁻¹x_b), the last term from the total of all rows of a file of two.
      const two = bySite.rows.filter((_, k) => [1, 4].includes(k)).map((row) => row.prediction!);
      const width = bySite.totals[2]!.upper! - bySite.totals[2]!.lower!;
      const single = two[0]!.upper! - two[0]!.lower!;
      const t = single / 2 / Math.sqrt(s2 * (1 + two[0]!.leverage));
      const variance = (width / 2 / t) ** 2 / s2;
      const cross = (variance - 2 - two[0]!.leverage - two[1]!.leverage) / 2;
      expect(Math.abs(cross)).toBeLessThanOrEqual(Math.sqrt(two[0]!.leverage * two[1]!.leverage) + 1e-9);
      expect(Math.abs(cross)).toBeGreaterThan(1e-4);

      const byColumn = await plumbrule('predict', path, file, '--total-by', 'w', '--interval', '0.5');
      expect(byColumn.out).toMatch(/^w,rows,estimate,lower,upper,rows_not_predicted\n,5,[^\n]*,0\n/);
      // A row that cannot be predicted is counted where it is missing.
      const [head, first, ...others] = ROWS.trimEnd().split('\n');
      const without = (row: string) =>
        row
          .split(';')
          .map((each, j) => ([1, 2].includes(j) ? '' : each))
          .join(';');
      await writeFile(file, [head, first, without(first!), ...others].join('\n'));
      const some = await predictFromRecord(path, file, { totalBy: 'site' });
      expect(some.totals.map(({ rows_not_predicted: n }) => n)).toEqual([1, 1, 0, 0]);
      const unknown = await plumbrule('predict', path, file, '--total-by', 'sit');
      expect([unknown.status, unknown.err]).toEqual([2, expect.stringContaining('Did you mean site?')]);
    }));

  test('JSON holds the rows, the totals and what they come from; --interval changes the intervals alone', () =>
    inFolder(filesOf(text), async (folder) => {
      const { path, record } = await fitted(folder);
      const args = ['predict', path, join(folder, 'rows.csv'), '--format', 'json', '--total'];
      const wide = JSON.parse((await plumbrule(...args, '--interval', '0.99')).out);
      expect(wide.format).toBe('plumbrule-predictions/1');
      expect(wide.interval).toBe(0.99);
      expect(wide.record).toMatchObject({ candidate: 'All', sha256: record.study.sha256 });
      expect(wide.predictions[0].estimate).toBe(record.predictions[0]!.estimate);
      expect(wide.predictions[0].upper).toBeGreaterThan(record.predictions[0]!.upper!);
      expect(wide.totals).toHaveLength(1);
      const out = join(folder, 'predicted/rows.json');
      const run = await plumbrule(...args, '--out', out);
      expect([run.status, run.out]).toEqual([0, '']);
      expect(JSON.parse(await readFile(out, 'utf8')).interval).toBe(0.8);
    }));

  test('rows may come as a stream of bytes, cut anywhere', () =>
    inFolder(filesOf(text), async (folder) => {
      const { path } = await fitted(folder);
      const file = await predictFromRecord(path, join(folder, 'rows.csv'));
      const bytes = Readable.from(Array.from(Buffer.from(ROWS), (byte) => Buffer.of(byte)));
      expect((await predictFromRecord(path, 'a stream', { bytes })).rows).toEqual(file.rows);
    }));

  test('a label that a spreadsheet would take for a formula is neutralised', () =>
    inFolder(filesOf(text), async (folder) => {
      const { path } = await fitted(folder);
      await writeFile(join(folder, 'rows.csv'), ROWS.replace('r3;', '=1+1;'));
      expect((await plumbrule('predict', path, join(folder, 'rows.csv'))).out).toContain("\n'=1+1,");
    }));

  test('what cannot be used is refused with a sentence and status 2', () =>
    inFolder(filesOf(text), async (folder) => {
      const { path, record } = await fitted(folder);
      const rows = join(folder, 'rows.csv');
      const refused = async (change: (record: StudyRecord) => void) => {
        const edited = structuredClone(record);
        change(edited);
        const file = join(folder, 'edited.json');
        await writeFile(file, JSON.stringify(edited));
        const run = await plumbrule('predict', file, rows);
        expect([run.status, run.out]).toEqual([2, '']);
        return run.err;
      };
      expect(
        await refused((edited) => {
          delete (edited.model as { prediction?: unknown }).prediction;
        }),
      ).toContain('Fit the study again.');
      expect(await refused((edited) => edited.model!.prediction!.root.pop())).toContain('must be');
      const inputs = (edited: StudyRecord) => edited.model!.prediction!;
      expect(
        await refused((edited) => {
          inputs(edited).derived[0]!.expression = 'nothing + 1';
        }),
      ).toContain('the expression of season');
      expect(
        await refused((edited) => {
          inputs(edited).variables = inputs(edited).variables.filter(({ name }) => name !== 'b');
        }),
      ).toContain('does not hang together');
      expect(
        await refused((edited) => {
          edited.model!.response.scale = 'cubed';
        }),
      ).toContain('is not a scale');

      await writeFile(rows, ROWS.replace('Menge (t)', 'Menge'));
      expect((await plumbrule('predict', path, rows)).err).toContain('Menge');
      await writeFile(rows, `${HEADER}a;-;1;East;on;01.01.2025;1;\n`);
      const none = await plumbrule('predict', path, rows);
      expect([none.status, none.err]).toEqual([2, expect.stringContaining('None of the rows')]);
      for (const interval of ['0', '1', 'x'])
        expect((await plumbrule('predict', path, rows, '--interval', interval)).status).toBe(2);
      expect((await plumbrule('predict', path, rows, '--problems', 'json')).status).toBe(2);
    }));

  test('a total on a scale other than the natural one is not given', () =>
    inFolder(filesOf(CASES['log scale']!), async (folder) => {
      const { path } = await fitted(folder);
      const run = await plumbrule('predict', path, join(folder, 'rows.csv'), '--total');
      expect([run.status, run.out]).toEqual([2, '']);
      expect(run.err).toContain('No total is given');
    }));

  test('reasons beyond the twentieth are counted', () =>
    inFolder(filesOf(text), async (folder) => {
      const { path } = await fitted(folder);
      const bad = Array.from({ length: 30 }, (_, i) => `b${i};;1;East;on;01.01.2025;1;\n`).join('');
      await writeFile(join(folder, 'rows.csv'), ROWS + bad);
      const run = await plumbrule('predict', path, join(folder, 'rows.csv'));
      expect(run.status).toBe(0);
      expect(run.err).toContain('10 more reasons');
      expect(run.out.trimEnd().split('\n')).toHaveLength(36);
    }));
});
