/**
 * Bad input of every kind that a run must survive with a clear word: what is wrong, where, and with which exit
 * status; earlier results untouched where nothing is found. `wholeRun` holds every run to what must always be so.
 */
import { execFile } from 'node:child_process';
import { appendFileSync, mkdirSync, mkdtempSync, renameSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { fileURLToPath } from 'node:url';
import { promisify } from 'node:util';
import { afterAll, beforeAll, describe, expect, test } from 'vitest';
import { runStudy } from '../../src/run/run-study.ts';
import { data, dataWith, pointed, study } from './small-study.ts';
import { mark, type Outcome, wholeRun } from './whole-run.ts';

/** A run with its faults looked at. */
async function run(studyText: string | Uint8Array | null, dataText: string | Uint8Array | null) {
  const outcome = await wholeRun({ study: studyText, data: dataText });
  expect(outcome.faults).toEqual([]);
  return outcome;
}

function messages(outcome: Outcome): string[] {
  return outcome.problems.map(({ message }) => message);
}

test('the study that is spoilt below is sound', async () => {
  const { status, marks, results } = await run(study(), data());
  expect([status, marks]).toEqual([0, []]);
  expect([...results.keys()]).toContain('tables/residuals.csv');
});

describe('data files that cannot be read', () => {
  test.each<[string, string, string[], string]>([
    ['an empty file', '', ['data_empty data.csv'], 'The data file data.csv is empty.'],
    [
      'a header only',
      'y,x,z,k,w\n',
      ['data_no_rows data.csv'],
      'The data file data.csv has a header and no rows.',
    ],
    [
      'duplicate header names',
      data().replace('y,x,z,k,w', 'y,x,x,k,w'),
      ['header_twice row 1', 'column_missing row 1 z'],
      'The header names "x" twice, in columns 2 and 3.',
    ],
    [
      'ragged rows',
      data().replace('\n', '\n1,2\n').replace(/$/, '1,2,3,a,1,6\n'),
      ['row_ragged row 2', 'row_ragged row 19'],
      'The row has 2 cells where the header has 5.',
    ],
    [
      'an unclosed quote',
      dataWith(3, { k: '"a' }),
      ['quote_unclosed row 5'],
      'The quote that opens in line 5 is not closed before the end of the file.',
    ],
  ])('%s', async (_, text, marks, message) => {
    const outcome = await run(study(), text);
    expect(outcome.marks).toEqual(marks);
    expect(messages(outcome)[0]).toBe(message);
    expect(outcome.status).toBe(2);
  });

  test('no file, and a folder in its place', async () => {
    const none = await run(study(), null);
    expect([none.status, none.marks]).toEqual([2, ['data_unreadable data.csv']]);
    const folder = await run(study({ 'file: data.csv': 'file: out' }), data());
    expect([folder.status, folder.marks]).toEqual([2, ['data_unreadable out']]);
    expect(messages(folder)).toEqual(['The data file out is a folder.']);
  });
});

describe('columns that say nothing', () => {
  test('a column that is all missing', async () => {
    const outcome = await run(
      study(),
      data((row) => {
        row.z = '';
      }),
    );
    expect([outcome.status, outcome.marks]).toEqual([2, ['column_all_missing z']]);
    expect(messages(outcome)).toEqual(['"z" has no value in any of the 16 rows read.']);
  });

  test('a column that is all missing and that no candidate needs', async () => {
    const { status, marks, record } = await run(
      study(),
      data((row) => {
        row.w = '';
      }),
    );
    expect([status, marks]).toEqual([0, []]);
    const w = record!.data.variables.find(({ name }) => name === 'w');
    expect(w).toMatchObject({ missing: 16, mean: null, smallest: null, used_as: ['declared only'] });
  });

  test('a constant predictor is left out of its candidate, and said to be', async () => {
    const { study: text, marks } = pointed(study({ '[x, z]': '[x, «z»]' }), ['(predictor_constant @1)']);
    const outcome = await run(
      text,
      data((row) => {
        row.z = 4;
      }),
    );
    expect([outcome.status, outcome.marks]).toEqual([0, marks]);
    expect(messages(outcome)).toEqual(['z is 4 in every row used, so z is left out of Both.']);
    expect(outcome.record!.candidates[1]).toMatchObject({
      coefficient_count: 2,
      dropped: [{ column: 'z', sentence: 'z is 4 in every row used' }],
    });
    expect(outcome.record!.warnings[0]!.text).toContain('z is 4 in every row used');
  });

  test('a constant predictor stops a study that says so', async () => {
    const { study: text, marks } = pointed(
      study({ '[x, z]': '[x, «z»]' }, 'inference: { dependent_columns: stop }\n'),
      ['predictor_constant @1'],
    );
    const outcome = await run(
      text,
      data((row) => {
        row.z = 4;
      }),
    );
    expect([outcome.status, outcome.marks]).toEqual([2, marks]);
    expect(messages(outcome)).toEqual(['z is 4 in every row used.']);
  });

  test('a category with one level left after exclusions', async () => {
    const { study: text, marks } = pointed(
      study({ '[x, z]': '[x, «k»]' }, 'leave_out: [{ where: k != "b", because: Not b }]\n'),
      ['category_one_level @1'],
    );
    const outcome = await run(text, data());
    expect([outcome.status, outcome.marks]).toEqual([2, marks]);
    expect(messages(outcome)).toEqual([
      'k has only the level "b" in the 10 rows used, so it cannot be a term.',
    ]);
  });

  test('a response that is constant', async () => {
    const { study: text, marks } = pointed(study({ 'response: y': 'response: «y»' }), [
      'response_constant @1',
    ]);
    const outcome = await run(
      text,
      data((row) => {
        row.y = 7;
      }),
    );
    expect([outcome.status, outcome.marks]).toEqual([2, marks]);
    expect(messages(outcome)).toEqual([
      'y has the same value in all 16 rows used, so there is nothing to explain.',
    ]);
  });

  test('two identical predictors, under two names', async () => {
    const { study: text, marks } = pointed(study({ '[x, z]': '[x, «z»]' }), ['(columns_dependent @1)']);
    const outcome = await run(
      text,
      data((row) => {
        row.z = row.x;
      }),
    );
    expect([outcome.status, outcome.marks]).toEqual([0, marks]);
    expect(messages(outcome)).toEqual(['z equals x in these rows, so z is left out of Both.']);
    expect(outcome.record!.selection.chosen).toBe('Straight');
  });

  test('a predictor that is a sum of others', async () => {
    const { study: text, marks } = pointed(study({ '[x, z]': '[x, z, «w»]' }), ['(columns_dependent @1)']);
    const outcome = await run(
      text,
      data((row) => {
        row.w = 2 * Number(row.x) - Number(row.z) + 10;
      }),
    );
    expect([outcome.status, outcome.marks]).toEqual([0, marks]);
    expect(messages(outcome)).toEqual(['w equals 10 + 2 × x − z in these rows, so w is left out of Both.']);
  });
});

describe('levels', () => {
  test('a level in the data that is not declared', async () => {
    const text = study({ 'k: { type: category }': 'k: { type: category, levels: [a, b, c] }' });
    const outcome = await run(text, dataWith(5, { k: 'bb' }));
    expect([outcome.status, outcome.marks]).toEqual([2, ['cell_level_undeclared row 7 k']]);
    expect(messages(outcome)).toEqual(['"bb" is not a declared level of k.']);
  });

  test.each([
    ['leave_out_row', 15],
    ['set_missing', 16],
  ])('a level that is not declared, with on_bad_value %s', async (how, rows) => {
    const text = study({
      'k: { type: category }': 'k: { type: category, levels: [a, b, c] }',
      'response: y': `  on_bad_value: ${how}\nresponse: y`,
    });
    const { status, record } = await run(text, dataWith(5, { k: 'bb' }));
    expect(status).toBe(0);
    expect(record!.data).toMatchObject({
      rows_used: rows,
      bad_value_count: 1,
      bad_values: [{ row: 7, variable: 'k', text: 'bb' }],
    });
  });

  test('a declared level that no row has', async () => {
    const text = study({
      'k: { type: category }': 'k: { type: category, levels: [none, a, b, c] }',
      '[x, z]': '[x, k]',
    });
    const { status, marks, record } = await run(text, data());
    expect([status, marks]).toEqual([0, []]);
    const names = record!.candidates[1]!.coefficients.map(({ name }) => name);
    expect(names.filter((name) => name.startsWith('k '))).toHaveLength(1);
  });
});

describe('rows and coefficients', () => {
  const few = (count: number) =>
    data((row, i) => {
      row.z = (i * i * 3) % 5;
    }, count);
  const both = study({ '- name: Straight\n    terms: [x]\n  ': '', '- name: Both': '- «name: Both»' });

  test('more coefficients than rows in every candidate', async () => {
    const outcome = await run(study(), few(1));
    expect([outcome.status, outcome.marks]).toEqual([2, ['rows_too_few 13:5+14', 'rows_too_few 15:5+10']]);
    expect(messages(outcome)).toEqual([
      'Straight has 2 coefficients for 1 row: there is no one answer, and nothing can be tested.',
      'Both has 3 coefficients for 1 row: there is no one answer, and nothing can be tested.',
    ]);
  });

  test('as many coefficients as rows', async () => {
    const { study: text, marks } = pointed(both, ['rows_too_few @1']);
    const outcome = await run(text, few(3));
    expect([outcome.status, outcome.marks]).toEqual([2, marks]);
    expect(messages(outcome)).toEqual([
      'Both has 3 coefficients for 3 rows: it fits them exactly, whatever they are, and nothing can be tested.',
    ]);
  });

  test('as many coefficients as rows in one candidate: that one is refused', async () => {
    const { study: text, marks } = pointed(
      study({ '- name: Both': '- «name: Both»' }, 'selection: { rank_by: adjusted_r_squared }\n'),
      ['(rows_too_few @1)'],
    );
    const outcome = await run(text, few(3));
    expect([outcome.status, outcome.marks]).toEqual([0, marks]);
    expect(outcome.record!.selection.chosen).toBe('Straight');
    expect(outcome.record!.candidates[1]).toMatchObject({
      admitted: false,
      degrees_of_freedom: 0,
      adjusted_r_squared: null,
      press: null,
    });
  });

  test('one row more than coefficients, where AICc is not defined and adjusted R² is', async () => {
    const outcome = await run(both.replaceAll(/[«»]/g, ''), few(4));
    expect([outcome.status, outcome.marks]).toEqual([2, ['criterion_undefined 1:1+12']]);
    expect(messages(outcome)[0]).toBe(
      'selection.rank_by is aicc, which is not defined for any candidate. For Both: with 3 coefficients it needs more than 5 rows, and there are 4.',
    );
    const other = await run(
      `${both.replaceAll(/[«»]/g, '')}selection: { rank_by: adjusted_r_squared }\npredict: { rows: [{ label: A, x: 1, z: 2 }] }\n`,
      few(4),
    );
    expect([other.status, other.marks]).toEqual([0, []]);
    expect(other.record!.model!.degrees_of_freedom).toBe(1);
  });

  test('a column that depends on another among few rows is named as that', async () => {
    const { study: text, marks } = pointed(
      study({ '[x, z]': '[x, «z»]' }, 'selection: { rank_by: adjusted_r_squared }\n'),
      ['(columns_dependent @1)'],
    );
    const outcome = await run(text, data(undefined, 3));
    expect([outcome.status, outcome.marks]).toEqual([0, marks]);
    expect(messages(outcome)).toEqual(['z equals 2 × x in these rows, so z is left out of Both.']);
  });
});

describe('scales and transformations that are not defined', () => {
  test('the logarithm of zero or less as the response', async () => {
    const text = study({ 'response: y': 'response: { variable: y, scale: log }' });
    const outcome = await run(
      text,
      data((row, i) => {
        if (i === 3) row.y = 0;
        if (i === 8) row.y = -1;
      }),
    );
    expect([outcome.status, outcome.marks]).toEqual([2, ['scale_undefined row 5 y']]);
    expect(messages(outcome)).toEqual([
      'The log scale needs values above 0, and "y" is not so in 2 rows: lines 5 and 10.',
    ]);
  });

  test.each([
    ['{ box_cox: 0.5 }', -1, 'Box–Cox scale needs values above 0'],
    ['reciprocal', 0, 'reciprocal scale needs values above 0'],
    ['sqrt', -4, 'square-root scale needs values of 0 or above'],
  ])('a response on the scale %s that is %s somewhere', async (scale, value, said) => {
    const text = study({ 'response: y': `response: { variable: y, scale: ${scale} }` });
    const outcome = await run(text, dataWith(2, { y: value }));
    expect([outcome.status, outcome.marks]).toEqual([2, ['scale_undefined row 4 y']]);
    expect(messages(outcome)[0]).toContain(said);
  });

  test('the logarithm of zero in a derived variable loses the row, and says which', async () => {
    const outcome = await run(
      study({ '[x, z]': '[lx]' }, 'derive: { lx: { expression: log(x) } }\n'),
      data(),
    );
    expect([outcome.status, outcome.marks]).toEqual([0, ['(value_not_finite row 2 lx)']]);
    expect(outcome.record!.data.left_out).toMatchObject([{ rows: 1, variable: 'lx' }]);
    expect(outcome.record!.data.rows_used).toBe(15);
  });

  test('the logarithm of negative numbers in every row', async () => {
    const outcome = await run(
      study({ '[x, z]': '[lx]' }, 'derive: { lx: { expression: log(-1 - x) } }\n'),
      data(),
    );
    expect([outcome.status, outcome.marks]).toEqual([
      2,
      ['(value_not_finite row 2 lx)', 'column_all_missing lx'],
    ]);
  });
});

describe('cells that are no numbers', () => {
  test.each([
    ['1e400', '"1e400" is beyond the largest number that can be held.'],
    ['-1e400', '"-1e400" is beyond the largest number that can be held.'],
    ['NaN', '"NaN" is not a number with decimal mark ".".'],
    ['Infinity', '"Infinity" is not a number with decimal mark ".".'],
    ['"1,234.5"', '"1,234.5" is not a number with decimal mark ".".'],
    ['0x1F', '"0x1F" is not a number with decimal mark ".".'],
    ['1_000', '"1_000" is not a number with decimal mark ".".'],
    ['１２', '"１２" is not a number with decimal mark ".".'],
    ['"1;2"', '"1;2" is not a number with decimal mark ".".'],
  ])('%s', async (cell, message) => {
    const outcome = await run(study(), dataWith(4, { x: cell }));
    expect([outcome.status, outcome.marks]).toEqual([2, ['cell_not_number row 6 x']]);
    expect(messages(outcome)).toEqual([message]);
    expect(outcome.err).toContain(`data.csv, row 6, column x: ${message}`);
  });

  test('NaN as a missing code is missing', async () => {
    const { status, record } = await run(
      study({ 'file: data.csv': 'file: data.csv\n  missing: ["", NaN]' }),
      dataWith(4, { x: 'NaN' }),
    );
    expect(status).toBe(0);
    expect(record!.data.left_out).toMatchObject([{ kind: 'missing', rows: 1, variable: 'x' }]);
  });

  test('a number too small to be held is 0', async () => {
    const { status, record } = await run(study(), dataWith(4, { z: '1e-400' }));
    expect(status).toBe(0);
    expect(record!.data.rows_used).toBe(16);
  });
});

describe('names that JavaScript gives a meaning', () => {
  const names = ['__proto__', 'constructor', 'toString', 'hasOwnProperty'];

  test.each(names)('%s as a predictor, a candidate and a label', async (name) => {
    const text = study(
      {
        '    x: {': `    ${name}: {`,
        'terms: [x]': `terms: [${name}]`,
        'name: Both\n    terms: [x, z]': `name: ${name}\n    terms: [{ polynomial: ${name}, degree: 2 }, z]`,
      },
      `selection: { admit: { signs: { ${name}: positive } } }\npredict: { rows: [{ label: ${name}, ${name}: 4, z: 1 }] }\n`,
    );
    const { status, marks, record } = await run(text, data().replace('y,x,', `y,${name},`));
    expect([status, marks]).toEqual([0, []]);
    expect(record!.candidates.map((one) => one.name)).toEqual(['Straight', name]);
    expect(record!.candidates[0]!.coefficients[1]!.name).toBe(name);
    expect(record!.predictions[0]).toMatchObject({ label: name, values: [{ variable: name, value: 4 }, {}] });
    expect(record!.predictions[0]!.estimate).toBeCloseTo(11.2, 0);
  });

  test.each(names)('%s as the response, derived from and deriving', async (name) => {
    const text = study(
      {
        '    y: {': `    ${name}: {`,
        'response: y': `response: ${name}`,
        '[x, z]': '[prototype]',
      },
      'derive: { prototype: { expression: x ^ 2 } }\n',
    );
    const { status, marks, record } = await run(text, data().replace('y,x,', `${name},x,`));
    expect([status, marks]).toEqual([0, []]);
    expect(record!.response.variable).toBe(name);
  });

  test.each(names)('%s as a category and as its levels', async (name) => {
    const text = study(
      {
        '    k: { type: category }': `    ${name}: { type: category, levels: [${name}, valueOf, c] }`,
        '[x, z]': `[x, ${name}, { interaction: [x, ${name}] }]`,
      },
      `leave_out: [{ where: '${name} == "c"', because: ${name} }]
selection: { rank_by: adjusted_r_squared, admit: { rows_per_coefficient: { at_least: 1 } } }
predict: { rows: [{ label: one, x: 2, ${name}: ${name} }] }\n`,
    );
    const csv = data((row, i) => {
      row.k = i % 5 === 4 ? 'c' : i % 2 === 0 ? name : 'valueOf';
    }).replace(',k,', `,${name},`);
    const { status, marks, record } = await run(text, csv);
    expect([status, marks]).toEqual([0, []]);
    expect(record!.candidates[1]!.coefficients.map((one) => one.name)).toEqual([
      'intercept',
      'x',
      `${name} valueOf`,
      `x × ${name} valueOf`,
    ]);
    expect(record!.data.left_out).toMatchObject([{ because: name, rows: 3 }]);
  });

  test('as keys where the study knows none', async () => {
    const { study: text, marks } = pointed(study({}, '«__proto__»: { a: 1 }\n«constructor»: 1\n'), [
      'key_unknown @1',
      'key_unknown @2',
    ]);
    const outcome = await run(text, data());
    expect([outcome.status, outcome.marks]).toEqual([2, marks]);
  });
});

describe('markup and formulas in texts', () => {
  const levels = [
    '=HYPERLINK("http://example.test","y")',
    '<script>alert(1)</script>',
    '+1+1',
    '@SUM(A1)',
    '-2+3',
    '{{title}}',
    '{{{title}}}',
    'a | b',
    '`code`',
    '[link](http://example.test)',
    '<!-- -->',
    '&lt;img src=x onerror=alert(1)&gt;',
    '"><blink>',
    '\u202etxt.exe',
  ];
  let outcome: Outcome;

  beforeAll(async () => {
    const text = study(
      {
        'file: data.csv': 'file: data.csv\n  row_id: id',
        '    w: { type: number }': '    w: { type: number }\n    id: { type: identifier }',
        'title: A small study': 'title: <b>A</b> =study',
        'name: Both': 'name: "=Both<i>"',
        '[x, z]': '[x, k, { interaction: [x, k] }]',
      },
      `selection: { rank_by: adjusted_r_squared }\npredict: { rows: [{ label: "=1+1<u>", x: 3, k: ${JSON.stringify(levels[0])} }] }\n`,
    );
    const lines = data((row, i) => {
      row.k = `"${levels[i % levels.length]!.replaceAll('"', '""')}"`;
      row.y = Number(row.y) + 3 * (i % levels.length) ** 2 + ((i * i * 3) % 11) / 10;
    }, levels.length * 5)
      .trim()
      .split('\n');
    const csv = lines.map((line, i) => `${line},${i === 0 ? 'id' : `"=${i}<s>"`}`).join('\n');
    outcome = await run(text, csv);
  });

  test('runs', () => {
    expect([outcome.status, outcome.marks]).toEqual([0, []]);
    expect(outcome.record!.selection.chosen).toBe('=Both<i>');
  });

  test('is escaped in the page, and no template is made of it', () => {
    const html = outcome.results.get('report.html')!;
    const raw = ['<script>alert', '<img src=x', '<b>A</b>', '<i>"', '<u>', '<blink>', '<!-- -->'];
    expect(raw.filter((text) => html.includes(text))).toEqual([]);
    const safe = ['&lt;script&gt;alert(1)&lt;/script&gt;', '{{title}}', '&amp;lt;img src', '&lt;blink&gt;'];
    expect(safe.filter((text) => !html.includes(text))).toEqual([]);
  });

  test('is escaped in Markdown', () => {
    const text = outcome.results.get('report.md')!;
    expect(text).not.toMatch(/(?<!\\)<(?:script|b>|i>|u>|s>)/);
    expect(text).not.toMatch(/(?<!\\)\[link\]\(/);
    for (const line of text.split('\n')) if (line.startsWith('|')) expect(line).not.toMatch(/a \| b/);
  });

  test('is neutralised in exported tables, whose numbers stay numbers', () => {
    const tables = [...outcome.results].filter(([name]) => name.startsWith('tables/'));
    expect(tables).toHaveLength(4);
    for (const [name, text] of tables) {
      const cells = text.match(/(?<=^|,|\n)(?:"(?:[^"]|"")*"|[^",\n]*)/g)!;
      for (const cell of cells) {
        const inside = cell.replace(/^"|"$/g, '');
        const isNumber = Number.isFinite(Number(inside));
        if (!isNumber) expect(inside, name).not.toMatch(/^[=+\-@\t\r]/);
      }
    }
    expect(outcome.results.get('tables/coefficients.csv')).toContain(`'=Both<i>`);
    expect(outcome.results.get('tables/predictions.csv')).toContain(`'=1+1<u>`);
    expect(outcome.results.get('tables/residuals.csv')).toContain(`'=1<s>`);
  });

  test('does not reach a terminal as control characters', async () => {
    const { err } = await run(study(), dataWith(3, { x: '\u001b[31mred\u0007\u202e' }));
    expect(err).toContain('red');
    for (const character of ['\u001b', '\u0007', '\u202e']) expect(err).not.toContain(character);
  });
});

describe('study files', () => {
  test('aliases that explode', async () => {
    const bomb = Array.from(
      { length: 12 },
      (_, i) => `a${i + 1}: &a${i + 1} [${`*a${i}, `.repeat(9)}*a${i}]`,
    );
    const outcome = await run(`a0: &a0 [x]\n${bomb.join('\n')}\n`, data());
    expect(outcome.status).toBe(2);
    expect(outcome.marks).toHaveLength(1);
    expect(outcome.marks[0]).toMatch(/^yaml_alias_limit \d+:\d+\+\d+$/);
    expect(messages(outcome)).toEqual(['Aliases repeat more values than any study needs.']);
  });

  test('duplicate keys', async () => {
    const { study: text, marks } = pointed(study({ 'title: A small study': 'title: A\n«title»: B' }), [
      'yaml_duplicate_key @1',
    ]);
    const outcome = await run(text, data());
    expect([outcome.status, outcome.marks]).toEqual([2, marks]);
    expect(messages(outcome)[0]).toContain('title');
  });

  test('tabs', async () => {
    const outcome = await run(study({ '    y: {': '\ty: {' }), data());
    expect(outcome.status).toBe(2);
    expect(outcome.marks[0]).toBe('yaml_syntax 6:1+1');
    expect(messages(outcome)[0]).toMatch(/[Tt]ab/);
  });

  test('a folder', async () => {
    const outcome = await wholeRun({ study: null, data: data(), folders: ['study.yaml'] });
    expect(outcome.faults).toEqual([]);
    expect([outcome.status, outcome.marks]).toEqual([2, ['study_unreadable study.yaml']]);
    expect(messages(outcome)).toEqual(['The study file is a folder.']);
  });

  test('missing', async () => {
    const outcome = await run(null, data());
    expect([outcome.status, outcome.marks]).toEqual([2, ['study_unreadable study.yaml']]);
    expect(messages(outcome)).toEqual(['There is no such study file.']);
  });

  test('not UTF-8', async () => {
    const outcome = await run(
      Buffer.from(study({ 'title: A small': 'title: A sm\u00e4ll' }), 'latin1'),
      data(),
    );
    expect([outcome.status, outcome.marks]).toEqual([2, ['study_not_utf8 2:12+1']]);
    expect(messages(outcome)).toEqual(['The study file is not written in UTF-8.']);
  });

  test('empty', async () => {
    const outcome = await run('', data());
    expect([outcome.status, outcome.marks]).toEqual([2, ['study_unreadable study.yaml']]);
  });
});

describe('output folders that cannot be written', () => {
  test.each([
    ['a file in its place', 'data.csv', 'a part of this path is a file, not a folder'],
    ['a file above it', 'data.csv/results', 'a part of this path is a file, not a folder'],
    ['a name that is too long', `${'n'.repeat(300)}/results`, 'the name is too long'],
  ])('%s', async (_, out, why) => {
    const outcome = await wholeRun({ study: study(), data: data() }, out);
    expect(outcome.faults).toEqual([]);
    expect(outcome.status).toBe(2);
    expect(outcome.err).toContain(`cannot be written to`);
    expect(outcome.err).toContain(why);
    expect(outcome.err).toContain('Name another folder with --out.');
    expect(outcome.out).toBe('');
  });

  test('a folder where a file of ours belongs', async () => {
    const outcome = await wholeRun({ study: study(), data: data(), folders: ['out/report.md/mine'] });
    expect(outcome.faults).toEqual([]);
    expect(outcome.status).toBe(2);
    expect(outcome.err).toContain('a folder stands where one of the files belongs');
  });
});

describe('a data file that changes while it is read', () => {
  test.each<[string, (path: string) => void]>([
    ['by rows at its end', (path) => appendFileSync(path, '1,2,3,a,1\n')],
    [
      'by another file in its place',
      (path) => {
        writeFileSync(`${path}.new`, data());
        renameSync(`${path}.new`, path);
      },
    ],
    ['by being taken away', (path) => rmSync(path)],
  ])('%s', async (_, change) => {
    const home = mkdtempSync(join(tmpdir(), 'changes-'));
    try {
      writeFileSync(join(home, 'study.yaml'), study());
      writeFileSync(join(home, 'data.csv'), data());
      let changes = 0;
      const { record, problems } = await runStudy(join(home, 'study.yaml'), {
        onProgress: (stage) => {
          if (stage === 'reading rows' && changes++ === 0) change(join(home, 'data.csv'));
        },
      });
      expect(changes).toBeGreaterThan(0);
      expect(record).toBeNull();
      expect(problems.map((problem) => mark(problem, home))).toEqual(['data_changed data.csv']);
      expect(problems[0]!.message).toBe('The data file data.csv changed while it was being read.');
    } finally {
      rmSync(home, { recursive: true });
    }
  });
});

describe('the program itself, as a process', () => {
  const main = fileURLToPath(new URL('../../src/cli/main.ts', import.meta.url));
  const home = mkdtempSync(join(tmpdir(), 'process-'));
  afterAll(() => rmSync(home, { recursive: true }));

  async function plumbrule(...args: string[]): Promise<{ status: number; out: string; err: string }> {
    const command = ['--import', import.meta.resolve('tsx'), main, ...args];
    try {
      const { stdout, stderr } = await promisify(execFile)(process.execPath, command, { cwd: home });
      return { status: 0, out: stdout, err: stderr };
    } catch (fault) {
      const { code, stdout, stderr } = fault as { code: number; stdout: string; stderr: string };
      return { status: code, out: stdout, err: stderr };
    }
  }

  test('ends with status 2, a word on standard error and nothing on standard output', async () => {
    writeFileSync(join(home, 'study.yaml'), study());
    writeFileSync(join(home, 'data.csv'), dataWith(4, { x: '"1,234.5"' }));
    expect(await plumbrule('fit', 'study.yaml', '--out', 'results')).toEqual({
      status: 2,
      out: '',
      err: 'data.csv, row 6, column x: "1,234.5" is not a number with decimal mark ".". Write numbers without a separator of thousands.\n',
    });
    mkdirSync(join(home, 'folder.yaml'));
    const folder = await plumbrule('check', 'folder.yaml');
    expect([folder.status, folder.out]).toEqual([2, '']);
    expect(folder.err).toContain('The study file is a folder.');
  });
});
