import { expect, test } from 'vitest';
import { plan, variable } from './plans.ts';
import { marks, read, values } from './read-text.ts';

const fuel = plan([
  variable('id', 'identifier'),
  variable('fuel', 'number', { atLeast: 0, atMost: 100, unit: 'L' }),
  variable('vessel', 'category', { levels: ['Tern', 'Holm'] }),
]);
const faulty = 'id,vessel,fuel\nK1,Tern,10\nK2,Tirn,x\nK3,Holm,101\nK4,Holm,y\nK5,,-1\nK6,Holm,20\n';

test('stop: every bad value is an error, in file order, and there is no table', async () => {
  const { table, problems } = await read(faulty, fuel);
  expect(table).toBeNull();
  expect(problems.every((problem) => problem.severity === 'error')).toBe(true);
  expect(marks(problems)).toEqual([
    'cell_level_undeclared 3 vessel',
    'cell_not_number 3 fuel',
    'cell_out_of_range 4 fuel',
    'cell_not_number 5 fuel',
    'cell_out_of_range 6 fuel',
  ]);
});

test('an undeclared level is told once, with how many more cells have it', async () => {
  const texts = ['Tirn', 'Tern', 'Skerry', 'Tirn', 'Tirn', 'Skerry', 'Auk', 'Auk'];
  const text = `id,vessel,fuel\n${texts.map((level, i) => `K${i},${level},1\n`).join('')}`;
  const { problems } = await read(text, fuel, { limit: 2 });
  expect(problems.map(({ message }) => message)).toEqual([
    '"Tirn" is not a declared level of vessel; 2 more cells have it.',
    '"Skerry" is not a declared level of vessel; 1 more cell has it.',
    '2 more rows or cells are faulty and are not listed.',
  ]);
  expect(marks(problems).slice(0, 2)).toEqual([
    'cell_level_undeclared 2 vessel',
    'cell_level_undeclared 4 vessel',
  ]);
});

test('beyond the limit the rest is counted, wherever the chunks are cut', async () => {
  const rows = Array.from({ length: 30 }, (_, i) => `K${i},Tern,${i % 2 === 0 ? 'x' : 1}`);
  rows[7] = 'K7,Tern';
  const text = `id,vessel,fuel\n${rows.join('\n')}\n`;
  for (const chunkSize of [1, 100, 65_536]) {
    const { problems } = await read(text, fuel, { limit: 5, chunkSize, headSize: 1 });
    expect(marks(problems)).toEqual([
      'cell_not_number 2 fuel',
      'cell_not_number 4 fuel',
      'cell_not_number 6 fuel',
      'cell_not_number 8 fuel',
      'row_ragged 9',
      'problems_more',
    ]);
    expect(problems.at(-1)).toMatchObject({
      severity: 'error',
      message: '11 more rows or cells are faulty and are not listed.',
    });
  }
  const usual = await read(text.replaceAll(',1\n', ',x\n'), fuel);
  expect(usual.problems).toHaveLength(21);
  expect(usual.problems.at(-1)?.message).toBe('10 more rows or cells are faulty and are not listed.');
  const oneMore = await read(faulty, fuel, { limit: 4 });
  expect(oneMore.problems.at(-1)?.message).toBe('One more row or cell is faulty and is not listed.');
});

test('set_missing: the values are missing, listed and counted, with one warning a kind', async () => {
  const { table, problems } = await read(faulty, { ...fuel, onBadValue: 'set_missing' });
  expect(values(table, 'fuel')).toEqual([10, null, null, null, null, 20]);
  expect(values(table, 'vessel')).toEqual(['Tern', null, 'Holm', 'Holm', null, 'Holm']);
  expect(table?.badRows).toBeNull();
  expect(table?.badValueCount).toBe(5);
  expect(table?.badValues[0]).toEqual({
    row: 3,
    variable: 'vessel',
    text: 'Tirn',
    because: '"Tirn" is not a declared level of vessel.',
  });
  expect(table?.badValues.map((bad) => `${bad.row} ${bad.variable} ${bad.text}`)).toEqual([
    '3 vessel Tirn',
    '3 fuel x',
    '4 fuel 101',
    '5 fuel y',
    '6 fuel -1',
  ]);
  expect(problems.map(({ severity, message }) => `${severity}: ${message}`)).toEqual([
    'warning: One cell of vessel is not a declared level ("Tirn" in line 3) and was set to missing.',
    'warning: 2 cells of fuel are not numbers (the first is "x" in line 3) and were set to missing.',
    'warning: 2 cells of fuel are out of range (the first is "101" in line 4) and were set to missing.',
  ]);
  expect(marks(problems)[1]).toBe('cell_not_number 3 fuel');
  expect(table?.summaries.map((summary) => summary.missing)).toEqual([0, 4, 2]);
});

test('leave_out_row: the rows are marked; the cells are not counted as missing', async () => {
  const { table, problems } = await read(faulty, { ...fuel, onBadValue: 'leave_out_row' }, { limit: 2 });
  expect([...(table?.badRows ?? [])]).toEqual([0, 1, 1, 1, 1, 0]);
  expect(table?.rowCount).toBe(6);
  expect(table?.badValueCount).toBe(5);
  expect(table?.badValues).toHaveLength(2);
  expect(problems.map((problem) => problem.severity)).toEqual(['warning', 'warning', 'warning']);
  expect(problems[1]?.message).toBe(
    '2 cells of fuel are not numbers (the first is "x" in line 3) and their rows are left out.',
  );
  expect(table?.summaries.map((summary) => summary.missing)).toEqual([0, 0, 1]);
});

test('a table without a bad value', async () => {
  for (const onBadValue of ['stop', 'set_missing', 'leave_out_row'] as const) {
    const { table, problems } = await read('id,vessel,fuel\nK1,Tern,10\n', { ...fuel, onBadValue });
    expect(problems).toEqual([]);
    expect(table).toMatchObject({ badRows: null, badValues: [], badValueCount: 0 });
  }
});

const ids = { ...fuel, rowId: 'id' };
const repeated = 'id,vessel,fuel\nK1,Tern,1\n,Tern,2\n K1 ,Tern,3\nK2,Tern,4\nK1,Tern,5\n';

test.each(['stop', 'set_missing'] as const)('%s: identities are unique and present', async (onBadValue) => {
  const { table, problems } = await read(repeated, { ...ids, onBadValue });
  expect(table).toBeNull();
  expect(marks(problems)).toEqual(['row_id_missing 3 id', 'row_id_twice 4 id', 'row_id_twice 6 id']);
  expect(problems.every((problem) => problem.severity === 'error')).toBe(true);
  expect(problems[0]?.message).toBe('The row has no identity.');
  expect(problems[1]?.message).toBe('"K1" already identifies the row in line 2.');
});

test('leave_out_row: the later row of one identity is left out', async () => {
  const { table, problems } = await read(repeated, { ...ids, onBadValue: 'leave_out_row' });
  expect([...(table?.badRows ?? [])]).toEqual([0, 1, 1, 0, 1]);
  expect(marks(problems)).toEqual(['row_id_missing 3 id', 'row_id_twice 4 id']);
  expect(table?.summaries[0]?.missing).toBe(1);
});

test('a row that is left out does not take an identity', async () => {
  const text = 'id,vessel,fuel\nK1,Tern,x\nK1,Tern,3\n';
  const { table } = await read(text, { ...ids, onBadValue: 'leave_out_row' });
  expect([...(table?.badRows ?? [])]).toEqual([1, 0]);
});

test('identities of other types', async () => {
  const numbers = plan([variable('id', 'integer'), variable('b')], { rowId: 'id' });
  const twice = await read('id,b\n1,1\n2,1\n01,1\nx,1\n', numbers);
  expect(marks(twice.problems)).toEqual(['row_id_twice 4 id', 'cell_not_number 5 id']);
  const categories = plan([variable('id', 'category'), variable('b')], { rowId: 'id' });
  const again = await read('id,b\nb,1\na,1\nb,1\n', categories);
  expect(again.problems[0]?.message).toBe('"b" already identifies the row in line 2.');
});

test('only the required columns are read, and the identity where it is there', async () => {
  const text = 'fuel,vessel,other\n,Tern,1\nx,Holm,2\n';
  const { table, problems } = await read(text, ids, { require: new Set(['vessel']) });
  expect(problems).toEqual([]);
  expect([...(table?.columns.keys() ?? [])]).toEqual(['vessel']);
  expect(table?.ignored).toEqual(['other']);
  expect(table?.summaries.map((summary) => summary.name)).toEqual(['vessel']);
  const named = await read('id,vessel\nK1,Tern\nK1,Holm\n', ids, { require: new Set(['vessel']) });
  expect(values(named.table, 'id')).toEqual(['K1', 'K1']);
  const missing = await read('id,fuel\nK1,1\n', ids, { require: new Set(['vessel']) });
  expect(marks(missing.problems)).toEqual(['column_missing 1 vessel']);
});

test('a baseline need not be among the rows of a file that need not hold all', async () => {
  const own = plan([variable('v', 'category', { baseline: 'Holm' }), variable('b')]);
  const { table } = await read('v,b\nTern,1\n', own, { require: new Set(['v']) });
  expect(table?.columns.get('v')).toMatchObject({ levels: ['Tern'], baseline: 'Holm' });
});
