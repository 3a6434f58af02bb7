import { expect, test } from 'vitest';
import { findDelimiter } from '../../src/data/find-delimiter.ts';
import { numbersPlan, plan, variable } from './plans.ts';
import { read, values } from './read-text.ts';

const ab = numbersPlan('rows.csv', ['a', 'b']);

test.each([
  [',', 'a,b\n1,2\n'],
  [';', 'a;b\n1;2\n'],
  ['\t', 'a\tb\n1\t2\n'],
  ['|', 'a|b\n1|2\n'],
])('the delimiter %j is found', async (delimiter, text) => {
  const { table, problems } = await read(text, ab);
  expect(problems).toEqual([]);
  expect(table?.format).toEqual({ delimiter, encoding: 'utf-8' });
  expect(values(table, 'b')).toEqual([2]);
});

test('names in the header tell more than counts of delimiters', async () => {
  const { table } = await read('a;b;"x, y, z"\n1;2;"p, q, r"\n', ab);
  expect(table?.format.delimiter).toBe(';');
  const comma = await read('a,b;c;d\n1,2;3;4\n', plan([variable('a'), variable('b;c;d', 'text')]));
  expect(comma.table?.format.delimiter).toBe(',');
});

test('decimal commas do not pass for delimiters', async () => {
  const own = { ...ab, format: { delimiter: null, decimalMark: ',', encoding: null } as const };
  const { table } = await read('a;b\n1,5;2,5\n3,5;4\n', own);
  expect(values(table, 'a')).toEqual([1.5, 3.5]);
  const quoted = await read('a,b\n"1,5",2\n', own);
  expect(values(quoted.table, 'a')).toEqual([1.5]);
});

test('rows as long as the header decide where its names do not', () => {
  const none = new Set<string>();
  expect(findDelimiter('p|q,r\n1|2,3\n1|2,3,4\n', '\n', none)).toBe('|');
  expect(findDelimiter('p|q,r\n1|2,3\n1|2|3,4\n', '\n', none)).toBe(',');
  expect(findDelimiter('p;q|r;s\n1;2|3;4\n', '\n', none)).toBe(';');
  expect(findDelimiter('p\n1\n', '\n', none)).toBe(',');
  expect(findDelimiter('', '\n', none)).toBe(',');
});

test('a declared delimiter is kept to', async () => {
  const own = { ...ab, format: { delimiter: ':', decimalMark: '.', encoding: null } as const };
  const { table } = await read('a:b\n1:2\n', own);
  expect(values(table, 'b')).toEqual([2]);
});

test.each([
  ['LF', '\n'],
  ['CRLF', '\r\n'],
  ['CR', '\r'],
])('lines that end in %s, with and without a last one', async (_, end) => {
  const lines = ['a,b,v', '1,2,x', '', '"3",4,"y"', '  ', '5,"6" ,z'];
  for (const text of [lines.join(end), `${lines.join(end)}${end}`, `${lines.join(end)}${end}${end}`]) {
    for (const chunkSize of [1, 2, 3, 7, 65_536]) {
      const own = plan([variable('a'), variable('b'), variable('v', 'text')]);
      const { table, problems } = await read(text, own, { chunkSize, headSize: chunkSize });
      expect(problems).toEqual([]);
      expect(values(table, 'b')).toEqual([2, 4, 6]);
      expect(values(table, 'v')).toEqual(['x', 'y', 'z']);
      expect([...(table?.lines ?? [])]).toEqual([2, 4, 6]);
    }
  }
});

test('line ends that are mixed', async () => {
  const text = 'a,v\r\n1,x\n2,"y"\r\n3,z\n';
  const { table } = await read(text, plan([variable('a'), variable('v', 'text')]));
  expect(values(table, 'v')).toEqual(['x', 'y', 'z']);
});

test('a row is where it starts, after cells that hold line ends and blank lines', async () => {
  const text = '\n"a","b\nin L",v\n1,2,"p\r\nq\n\nr"\n\n3,x,s\n4,5,"t\n"\n6,7,u';
  const own = plan([variable('a'), variable('b', 'text', { column: 'b\nin L' }), variable('v', 'text')]);
  const { table } = await read(text, own);
  expect([...(table?.lines ?? [])]).toEqual([4, 9, 10, 12]);
  expect(values(table, 'v')).toEqual(['p\r\nq\n\nr', 's', 't\n', 'u']);
});

test('a byte-order mark, spaces around header names, quotes around them', async () => {
  const { table } = await read('\ufeff"a" , b \n1,2\n', ab);
  expect(values(table, 'a')).toEqual([1]);
  expect(values(table, 'b')).toEqual([2]);
});

test('columns that are not declared are named in file order', async () => {
  const { table } = await read('z,b,y,a\n0,2,0,1\n', ab);
  expect(table?.ignored).toEqual(['z', 'y']);
  expect([...(table?.columns.keys() ?? [])]).toEqual(['a', 'b']);
});

test('a file of one column', async () => {
  const { table } = await read('a\n1\n\n2\n', numbersPlan('rows.csv', ['a']));
  expect(values(table, 'a')).toEqual([1, 2]);
  expect([...(table?.lines ?? [])]).toEqual([2, 4]);
});

test('progress counts the rows', async () => {
  const seen: number[] = [];
  const text = `a,b\n${'1,2\n'.repeat(50_000)}`;
  await read(text, ab, { onProgress: (rows) => seen.push(rows) });
  expect(seen.length).toBeGreaterThan(1);
  expect(seen.at(-1)).toBe(50_000);
  expect(seen).toEqual([...seen].sort((p, q) => p - q));
});
