import { expect, test } from 'vitest';
import type { VariablePlan } from '../../src/study/study.ts';
import { plan, variable } from './plans.ts';
import { marks, type Reading, read, values } from './read-text.ts';

/** One column of cells, quoted, beside a filler that keeps every line from being blank. */
async function readCells(
  cells: readonly string[],
  own: VariablePlan,
  more: Parameters<typeof plan>[1] = {},
): Promise<Reading> {
  const lines = cells.map((cell) => `"${cell.replaceAll('"', '""')}",1`);
  return read(`${own.column},filler\n${lines.join('\n')}\n`, plan([own], more));
}

test('numbers with a decimal point', async () => {
  const cells = ['1', '-2.5', '+3', '1e3', '.5', '5.', ' 7 ', '-0', '1E-2', '12345678901234567890', '1e-400'];
  const { table, problems } = await readCells(cells, variable('x'));
  expect(problems).toEqual([]);
  expect(values(table, 'x')).toEqual([1, -2.5, 3, 1000, 0.5, 5, 7, -0, 0.01, 12345678901234567000, 0]);
});

test('numbers with a decimal comma', async () => {
  const format = { delimiter: ',', decimalMark: ',', encoding: null } as const;
  const good = ['1', '-2,5', ',5', '1,5e3', '0,12345678901234568'];
  const { table, problems } = await readCells(good, variable('x'), { format });
  expect(problems).toEqual([]);
  expect(values(table, 'x')).toEqual([1, -2.5, 0.5, 1500, 0.12345678901234568]);
  const bad = await readCells(['1.5', '1.234,5', '1,2,3', '1.5e3'], variable('x'), { format });
  expect(marks(bad.problems)).toEqual([2, 3, 4, 5].map((row) => `cell_not_number ${row} x`));
  expect(bad.problems[0]?.message).toBe('"1.5" is not a number with decimal mark ",".');
});

test.each([
  ['9,4', '"9,4" is not a number with decimal mark ".".', 'Declare decimal_mark: "," if'],
  ['1,234.5', '"1,234.5" is not a number with decimal mark ".".', 'Write numbers without a separator'],
  ['1 234', '"1 234" is not a number with decimal mark ".".', 'Write numbers without a separator'],
  ['1e400', '"1e400" is beyond the largest number that can be held.', undefined],
  ['NaN', '"NaN" is not a number with decimal mark ".".', 'Add "NaN" to data.missing'],
  ['Infinity', '"Infinity" is not a number with decimal mark ".".', undefined],
  ['0x10', '"0x10" is not a number with decimal mark ".".', undefined],
  ['', '"" is not a number with decimal mark ".".', 'Add "" to data.missing'],
  ['.', '"." is not a number with decimal mark ".".', undefined],
  ['-', '"-" is not a number with decimal mark ".".', 'Add "-" to data.missing'],
  ['1e', '"1e" is not a number with decimal mark ".".', undefined],
  ['1.2.3', '"1.2.3" is not a number with decimal mark ".".', undefined],
  ['--1', '"--1" is not a number with decimal mark ".".', undefined],
  ['٣', '"٣" is not a number with decimal mark ".".', undefined],
  ['1\n2', '"1\\n2" is not a number with decimal mark ".".', undefined],
])('%j is not a number', async (cell, message, hint) => {
  const { table, problems } = await readCells([cell], variable('x'), { missing: [] });
  expect(table).toBeNull();
  expect(problems).toHaveLength(1);
  expect(problems[0]).toMatchObject({ code: 'cell_not_number', severity: 'error', message });
  if (hint !== undefined) expect(problems[0]?.hint).toContain(hint);
});

test('a long cell is cut in the sentence', async () => {
  const { problems } = await readCells(['x'.repeat(5000)], variable('x'));
  expect(problems[0]?.message).toBe(`"${'x'.repeat(60)}…" is not a number with decimal mark ".".`);
});

test('integers', async () => {
  const good = await readCells(['3', '3.0', '-1e3', '9007199254740991'], variable('n', 'integer'));
  expect(values(good.table, 'n')).toEqual([3, 3, -1000, 9007199254740991]);
  const bad = await readCells(['2.5', '9007199254740993', 'three'], variable('n', 'integer'));
  expect(marks(bad.problems)).toEqual([
    'cell_not_integer 2 n',
    'cell_not_integer 3 n',
    'cell_not_number 4 n',
  ]);
  expect(bad.problems[0]?.message).toBe('"2.5" is not a whole number.');
  expect(bad.problems[1]?.message).toContain('too large to be held exactly');
});

test('missing codes are compared on the trimmed text, before the type, quoted or not', async () => {
  const own = variable('x', 'number', { missing: ['-999', ' none '] });
  const text = 'x,filler\n -999,1\n"-999",1\n-999.0,1\n n/a ,1\n"n/a",1\nnone,1\n,1\n4,1\n';
  const { table, problems } = await read(text, plan([own], { missing: ['n/a', ''] }));
  expect(problems).toEqual([]);
  expect(values(table, 'x')).toEqual([null, null, -999, null, null, null, null, 4]);
  expect(table?.summaries[0]).toEqual({
    name: 'x',
    type: 'number',
    missing: 6,
    smallest: -999,
    largest: 4,
    levels: null,
  });
});

test('levels that are found are sorted, whatever the order of rows', async () => {
  const own = variable('v', 'category');
  const one = await readCells(['Tern', ' Holm ', 'Ärger', '', 'Tern', 'holm'], own);
  const other = await readCells(['holm', 'Tern', '', 'Ärger', 'Holm', 'Tern'], own);
  const column = one.table?.columns.get('v');
  expect(column).toMatchObject({
    kind: 'category',
    levels: ['Holm', 'Tern', 'holm', 'Ärger'],
    baseline: 'Holm',
  });
  expect(other.table?.columns.get('v')).toMatchObject({ levels: ['Holm', 'Tern', 'holm', 'Ärger'] });
  expect(values(one.table, 'v')).toEqual(['Tern', 'Holm', 'Ärger', null, 'Tern', 'holm']);
  expect(one.table?.summaries[0]?.levels).toEqual([
    { level: 'Holm', rows: 1 },
    { level: 'Tern', rows: 2 },
    { level: 'holm', rows: 1 },
    { level: 'Ärger', rows: 1 },
  ]);
  expect(one.table?.summaries[0]?.missing).toBe(1);
});

test('declared levels keep their order and admit no other', async () => {
  const own = variable('v', 'category', { levels: ['Skerry', 'Tern', 'Holm'], baseline: 'Tern' });
  const good = await readCells(['Holm', 'Skerry'], own);
  expect(good.table?.columns.get('v')).toMatchObject({
    levels: ['Skerry', 'Tern', 'Holm'],
    baseline: 'Tern',
    codes: Int32Array.of(2, 0),
  });
  const bad = await readCells(['Holm', 'Skery', 'n/a'], own);
  expect(marks(bad.problems)).toEqual(['cell_level_undeclared 3 v', 'cell_level_undeclared 4 v']);
  expect(bad.problems[0]).toMatchObject({
    message: '"Skery" is not a declared level of v.',
    hint: 'Did you mean Skerry?',
  });
  expect(bad.problems[1]?.hint).toContain('Add "n/a" to data.missing');
});

test('an empty cell is no level of its own', async () => {
  const { table, problems } = await readCells(['a', ''], variable('v', 'category'), { missing: [] });
  expect(table).toBeNull();
  expect(problems[0]).toMatchObject({
    code: 'cell_level_undeclared',
    message: 'An empty cell is not a level of v.',
  });
});

test('level names that are names of object members', async () => {
  const names = ['__proto__', 'constructor', 'toString', '__proto__'];
  const { table } = await readCells(names, variable('v', 'category'));
  expect(values(table, 'v')).toEqual(names);
});

test('a baseline that no row has', async () => {
  const { table, problems } = await readCells(
    ['Tern', 'Holm'],
    variable('v', 'category', { baseline: 'Terne' }),
  );
  expect(table).toBeNull();
  expect(problems[0]).toMatchObject({
    code: 'cell_level_undeclared',
    message: 'No row has the baseline "Terne" of v.',
    hint: 'Did you mean Tern?',
  });
});

test('flags', async () => {
  const usual = await readCells(
    ['No', 'yes', 'FALSE', 'True', '0', '1', 'n', 'Y', ''],
    variable('f', 'flag'),
  );
  expect(values(usual.table, 'f')).toEqual([0, 1, 0, 1, 0, 1, 0, 1, null]);
  const one = await readCells(['Yes', 'Yes'], variable('f', 'flag'));
  expect(one.table?.columns.get('f')).toMatchObject({ kind: 'flag', flagTexts: ['No', 'Yes'] });
  expect(one.table?.summaries[0]?.levels).toEqual([
    { level: 'No', rows: 0 },
    { level: 'Yes', rows: 2 },
  ]);
  const declared = variable('f', 'flag', { flagValues: ['off', 'on'] });
  const two = await readCells(['on', 'off', 'on'], declared);
  expect(values(two.table, 'f')).toEqual([1, 0, 1]);
  expect(two.table?.columns.get('f')).toMatchObject({ flagTexts: ['off', 'on'] });
  const bad = await readCells(['maybe', '2'], variable('f', 'flag'));
  expect(marks(bad.problems)).toEqual(['cell_not_flag 2 f', 'cell_not_flag 3 f']);
  expect(bad.problems[0]?.message).toBe('"maybe" is not one of no/yes, false/true, 0/1 or n/y.');
  const other = await readCells(['yes'], declared);
  expect(other.problems[0]?.message).toBe('"yes" is neither "off" nor "on".');
});

test('dates become days since 1970-01-01', async () => {
  const cells = ['1970-01-01', '2026-03-01', '2026-03-01T12:00', '2026-03-01 06:00:00Z', ''];
  const { table } = await readCells(cells, variable('d', 'date'));
  // 2026-03-01 is day 20513: 56 years of 365 days, 14 leap days before 2026, 59 days of 2026.
  expect(values(table, 'd')).toEqual([0, 20513, 20513.5, 20513.25, null]);
  expect(table?.columns.get('d')?.kind).toBe('date');
  expect(table?.summaries[0]).toMatchObject({ smallest: 0, largest: 20513.5, missing: 1 });
  const bad = await readCells(['2026-02-30', '01.03.2026'], variable('d', 'date'));
  expect(marks(bad.problems)).toEqual(['cell_not_date 2 d', 'cell_not_date 3 d']);
  expect(bad.problems[0]?.message).toBe('"2026-02-30" is not a date (YYYY-MM-DD, with or without hh:mm).');
});

test('dates of a declared pattern', async () => {
  const own = variable('d', 'date', { pattern: 'DD.MM.YYYY hh:mm' });
  const good = await readCells(['01.03.2026 18:00', '1.3.2026 00:00'], own);
  expect(values(good.table, 'd')).toEqual([20513.75, 20513]);
  const bad = await readCells(['2026-03-01', '31.02.2026 00:00'], own);
  expect(marks(bad.problems)).toEqual(['cell_not_date 2 d', 'cell_not_date 3 d']);
  expect(bad.problems[0]?.message).toBe('"2026-03-01" is not a date (pattern "DD.MM.YYYY hh:mm").');
  const useless = await readCells(['1'], variable('d', 'date', { pattern: 'DD.MM' }));
  expect(useless.table).toBeNull();
  expect(marks(useless.problems)).toEqual(['cell_not_date d']);
});

test('texts are kept as they are, identifiers trimmed', async () => {
  const cells = [' a b ', 'x\ny', '"q"', ''];
  const texts = await readCells(cells, variable('t', 'text'));
  expect(values(texts.table, 't')).toEqual([' a b ', 'x\ny', '"q"', null]);
  const ids = await readCells(cells, variable('t', 'identifier'));
  expect(values(ids.table, 't')).toEqual(['a b', 'x\ny', '"q"', null]);
});

test('ranges', async () => {
  const own = variable('speed', 'number', { atLeast: 4, atMost: 16, unit: 'kn' });
  const { problems } = await readCells(['4', '16', '3.9', '17'], own);
  expect(marks(problems)).toEqual(['cell_out_of_range 4 speed', 'cell_out_of_range 5 speed']);
  expect(problems[0]?.message).toBe('"3.9" is below 4 kn, the least that speed may be.');
  expect(problems[1]?.message).toBe('"17" is above 16 kn, the most that speed may be.');
  const late = await readCells(['2026-03-02'], variable('d', 'date', { atMost: 20513 }));
  expect(late.problems[0]?.message).toBe('"2026-03-02" is above 2026-03-01, the most that d may be.');
  const within = variable('d', 'date', { atLeast: 20513, atMost: 20514 });
  const early = await readCells(['2026-02-28', '2026-03-02'], within);
  expect(early.problems.map((problem) => problem.message)).toEqual([
    '"2026-02-28" is not between 2026-03-01 and 2026-03-02.',
  ]);
});
