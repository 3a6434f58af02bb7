import { createHash } from 'node:crypto';
import { appendFileSync, mkdirSync, renameSync, utimesSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { gzipSync } from 'node:zlib';
import { expect, test } from 'vitest';
import { numbersPlan, plan, variable } from './plans.ts';
import { inFolder, marks, read, readIn, values } from './read-text.ts';

const ab = numbersPlan('rows.csv', ['a', 'b']);

/** A gzip file whose check sum (its eighth to fifth byte from the end, RFC 1952) is wrong. */
function damaged(): Buffer {
  const bytes = gzipSync('a,b\n1,2\n');
  return bytes.fill(0, bytes.length - 8, bytes.length - 4);
}

test.each([
  ['nothing', ''],
  ['a byte-order mark', '\ufeff'],
  ['blank lines', '\n  \r\n\n'],
])('a file of %s is empty', async (_, text) => {
  const { table, problems } = await read(text, ab);
  expect(table).toBeNull();
  expect(problems).toEqual([
    {
      code: 'data_empty',
      severity: 'error',
      place: { kind: 'file', file: 'rows.csv' },
      message: 'The data file rows.csv is empty.',
    },
  ]);
});

test.each(['a,b', 'a,b\n', 'a,b\r\n\r\n'])('%j has no rows', async (text) => {
  const { table, problems } = await read(text, ab);
  expect(table).toBeNull();
  expect(marks(problems)).toEqual(['data_no_rows']);
});

test('a file that is not there', async () => {
  const { table, problems } = await read(null, ab);
  expect(table).toBeNull();
  expect(problems).toEqual([
    {
      code: 'data_unreadable',
      severity: 'error',
      place: { kind: 'file', file: 'rows.csv' },
      message: 'There is no data file rows.csv.',
    },
  ]);
});

test('a file with a name near the one that is there', async () => {
  await inFolder(async (folder) => {
    writeFileSync(join(folder, 'row.csv'), 'a,b\n1,2\n');
    const { problems } = await readIn(folder, ab);
    expect(problems[0]?.hint).toBe('Did you mean row.csv?');
  });
});

test('a folder in place of the file, and a file in place of its folder', async () => {
  await inFolder(async (folder) => {
    mkdirSync(join(folder, 'rows.csv'));
    const { table, problems } = await readIn(folder, ab);
    expect(table).toBeNull();
    expect(problems[0]).toMatchObject({
      code: 'data_unreadable',
      message: 'The data file rows.csv is a folder.',
    });
    writeFileSync(join(folder, 'file'), 'x');
    const under = await readIn(join(folder, 'file'), ab);
    expect(under.problems[0]).toMatchObject({
      code: 'data_unreadable',
      message: 'The data file rows.csv cannot be opened (ENOTDIR).',
    });
  });
});

test('gzip by the ending of the name; the hash is of the file as stored', async () => {
  const packed = gzipSync('a,b\n1,2\n3,4\n');
  const { table } = await read(packed, { ...ab, file: 'rows.csv.gz' });
  expect(values(table, 'b')).toEqual([2, 4]);
  expect(table?.sha256).toBe(createHash('sha256').update(packed).digest('hex'));
});

test('gzip in several members, and in one with bytes after its end', async () => {
  const members = Buffer.concat([gzipSync('a,b\n1,2\n'), gzipSync('3,4\n')]);
  const one = await read(members, { ...ab, file: 'rows.csv.gz' });
  expect(values(one.table, 'b')).toEqual([2, 4]);
  const followed = Buffer.concat([gzipSync('a,b\n1,2\n'), Buffer.alloc(100_000)]);
  const { table } = await read(followed, { ...ab, file: 'rows.csv.gz' }, { chunkSize: 1000 });
  expect(values(table, 'b')).toEqual([2]);
  expect(table?.sha256).toBe(createHash('sha256').update(followed).digest('hex'));
});

test.each([
  ['a text', Buffer.from('a,b\n1,2\n')],
  ['half of its bytes', gzipSync('a,b\n1,2\n3,4\n').subarray(0, 20)],
  ['a damaged check sum', damaged()],
])('a .gz that is %s', async (_, bytes) => {
  const { table, problems } = await read(bytes, { ...ab, file: 'rows.csv.gz' });
  expect(table).toBeNull();
  expect(marks(problems)).toEqual(['data_unreadable']);
  expect(problems[0]?.message).toContain('cannot be unpacked (Z_');
});

test('the hash is of the bytes read', async () => {
  const text = '\ufeffa,b\r\n1,2\r\n';
  const { table } = await read(text, ab);
  expect(table?.sha256).toBe(createHash('sha256').update(text).digest('hex'));
});

test.each<[string, (path: string) => void]>([
  ['appended to', (path) => appendFileSync(path, '1,2\n')],
  ['touched', (path) => utimesSync(path, new Date(0), new Date(0))],
  [
    'replaced',
    (path) => {
      writeFileSync(`${path}.new`, 'a,b\n1,2\n3,4\n');
      renameSync(`${path}.new`, path);
    },
  ],
  ['taken away', (path) => renameSync(path, `${path}.old`)],
])('a file that is %s while it is read', async (_, change) => {
  await inFolder(async (folder) => {
    const path = join(folder, 'rows.csv');
    writeFileSync(path, 'a,b\n1,2\n3,4\n');
    let changed = false;
    const { table, problems } = await readIn(folder, ab, {
      onProgress: () => {
        if (!changed) change(path);
        changed = true;
      },
    });
    expect(changed).toBe(true);
    expect(table).toBeNull();
    expect(marks(problems)).toContain('data_changed');
  });
});

test('ragged rows are errors whatever the contract says of bad values', async () => {
  for (const onBadValue of ['stop', 'set_missing', 'leave_out_row'] as const) {
    const { table, problems } = await read('a,b\n1,2\n3\n\n4,5,6\n7,8\n', { ...ab, onBadValue });
    expect(table).toBeNull();
    expect(marks(problems)).toEqual(['row_ragged 3', 'row_ragged 5']);
    expect(problems[0]?.message).toBe('The row has 1 cell where the header has 2.');
    expect(problems[1]?.message).toBe('The row has 3 cells where the header has 2.');
  }
});

test('a quote that is never closed is named by its own line', async () => {
  const { table, problems } = await read(
    'a,b,c\n1,"x\ny","z\n2,3,4\n5,6,7\n',
    numbersPlan('rows.csv', ['a']),
  );
  expect(table).toBeNull();
  expect(marks(problems)).toEqual(['quote_unclosed 3']);
  expect(problems[0]?.message).toBe(
    'The quote that opens in line 3 is not closed before the end of the file.',
  );
});

test('a quote that is closed only by the quote of a later cell', async () => {
  const text = 'a,b\n1,2\n3,"4\n5,"6"\n7,8\n';
  for (const chunkSize of [1, 5, 1000]) {
    const { table, problems } = await read(text, ab, { chunkSize, headSize: 10 });
    expect(table).toBeNull();
    expect(marks(problems)).toEqual(['quote_unclosed 3']);
  }
});

test('text after a closing quote', async () => {
  const { problems } = await read('a,b\n1,"2"x\n3,4\n', ab);
  expect(marks(problems)).toEqual(['quote_unclosed 2']);
});

test('a quote inside an unquoted cell is part of it', async () => {
  const { table } = await read(
    'size,b\n5" pipe,1\n6" pipe,2\n',
    plan([variable('size', 'text'), variable('b')]),
  );
  expect(values(table, 'size')).toEqual(['5" pipe', '6" pipe']);
});

test('a quote left open at the top of a large file stops it with its line', async () => {
  const text = `a,b\n1,"2\n${'3,4\n'.repeat(4_500_000)}`;
  const { table, problems } = await read(text, ab, { chunkSize: 1 << 20 });
  expect(table).toBeNull();
  expect(marks(problems)).toEqual(['quote_unclosed 2']);
});

test('a line without an end', async () => {
  const { table, problems } = await read(`a,b\n1,2\n${'x'.repeat(17 << 20)}`, ab);
  expect(table).toBeNull();
  expect(marks(problems)).toEqual(['data_unreadable 3']);
  const first = await read('x'.repeat(34 << 20), ab);
  expect(first.table).toBeNull();
  expect(marks(first.problems)).toEqual(['data_unreadable 1']);
});

test('a large cell is a cell', async () => {
  const large = 'x\n'.repeat(1 << 20);
  const { table } = await read(`a,t\n1,"${large}"\n2,y\n`, plan([variable('a'), variable('t', 'text')]));
  expect(values(table, 't')).toEqual([large, 'y']);
  expect([...(table?.lines ?? [])]).toEqual([2, 2 + (1 << 20) + 1]);
});

test('characters of code 0', async () => {
  for (const chunkSize of [1, 65_536]) {
    const { table, problems } = await read('a,b\n1,"2\n"\n3,\0\n', ab, { chunkSize, headSize: 10 });
    expect(table).toBeNull();
    expect(marks(problems)).toEqual(['cell_encoding 4']);
  }
});

test.each([
  ['utf16le', Buffer.from('\ufeffa,b\n1,2\n', 'utf16le')],
  ['utf16be', Buffer.from('\ufeffa,b\n1,2\n', 'utf16le').swap16()],
])('the byte-order mark of %s', async (_, bytes) => {
  const { table, problems } = await read(bytes, ab);
  expect(table).toBeNull();
  expect(problems).toMatchObject([
    {
      code: 'cell_encoding',
      message: 'The data file rows.csv begins with the byte-order mark of UTF-16.',
      hint: 'Save it as UTF-8.',
    },
  ]);
});

test('bytes that are not UTF-8, and the same as Latin-1', async () => {
  const latin = Buffer.from('port,b\nMålmö,1\nOslo,2\nGöteborg,3\n', 'latin1');
  const own = plan([variable('port', 'category'), variable('b')]);
  for (const chunkSize of [1, 10, 65_536]) {
    const { table, problems } = await read(latin, own, { chunkSize, headSize: 10 });
    expect(table).toBeNull();
    expect(marks(problems)).toEqual(['cell_encoding 2 port']);
    expect(problems[0]?.message).toBe('2 rows hold bytes that are not UTF-8, line 2 first.');
    expect(problems[0]?.hint).toContain('latin-1');
  }
  const { table } = await read(latin, {
    ...own,
    format: { delimiter: null, decimalMark: '.', encoding: 'latin-1' },
  });
  expect(values(table, 'port')).toEqual(['Målmö', 'Oslo', 'Göteborg']);
  expect(table?.format).toEqual({ delimiter: ',', encoding: 'latin-1' });
});

test('bytes that are not UTF-8 in a column that is not read, or in the header', async () => {
  const column = await read(Buffer.from('a,b,note\n1,2,x\n1,2,é\n', 'latin1'), ab);
  expect(marks(column.problems)).toEqual(['cell_encoding 3 note']);
  const header = await read(Buffer.from('a,b,é\n1,2,x\n', 'latin1'), ab);
  expect(header.table).toBeNull();
  expect(marks(header.problems)).toEqual(['cell_encoding 1 \ufffd']);
});

test('a cell with bytes that are not UTF-8 is not faulty in any other way', async () => {
  const latin = Buffer.from('port,b\nMålmö,x\nOslo,2\n', 'latin1');
  const own = plan([variable('port', 'category', { levels: ['Malmö', 'Oslo'] }), variable('b')]);
  const { problems } = await read(latin, own);
  expect(marks(problems)).toEqual(['cell_encoding 2 port']);
  const all = await read(Buffer.from('port,b\né,1\n', 'latin1'), own);
  expect(marks(all.problems)).toEqual(['cell_encoding 2 port']);
});

test.each(['"', '\n', '\r', '\ufeff', ''])('the delimiter %j', async (delimiter) => {
  const { table, problems } = await read('a,b\n1,2\n', {
    ...ab,
    format: { delimiter, decimalMark: '.', encoding: null },
  });
  expect(table).toBeNull();
  expect(marks(problems)).toEqual(['data_unreadable']);
});

test('Latin-1 files that were written as windows-1252', async () => {
  const own = plan([variable('t', 'text'), variable('b')], {
    format: { delimiter: ',', decimalMark: '.', encoding: 'latin-1' },
  });
  const { table } = await read(
    Buffer.from([...Buffer.from('t,b\n'), 0x80, 0x85, 0xff, ...Buffer.from(',1\n')]),
    own,
  );
  expect(values(table, 't')).toEqual(['€…ÿ']);
});

test('a character U+FFFD that the file itself holds is no fault', async () => {
  const { table } = await read('t,b\n\ufffd,1\n', plan([variable('t', 'text'), variable('b')]));
  expect(values(table, 't')).toEqual(['\ufffd']);
});

test('header names twice', async () => {
  const needed = await read('a, b,b \n1,2,3\n', ab);
  expect(needed.table).toBeNull();
  expect(needed.problems).toMatchObject([
    {
      code: 'header_twice',
      severity: 'error',
      message: 'The header names "b" twice, in columns 2 and 3.',
    },
  ]);
  const ignored = await read('a,b,z,z,,z,\n1,2,3,4,5,6,7\n', ab);
  expect(ignored.problems).toMatchObject([
    {
      code: 'header_twice',
      severity: 'warning',
      message: 'The header names "z" 3 times, in columns 3, 4 and 6.',
    },
  ]);
  expect(ignored.table?.ignored).toEqual(['z', 'z', '(column 5)', 'z', '(column 7)']);
});

test('a declared column that is missing', async () => {
  const own = plan([
    variable('headwind'),
    variable('speed', 'number', { column: 'Speed (kn)' }),
    variable('a'),
  ]);
  const { table, problems } = await read('headwnd,Speed (kt),a\n1,2,oops\n', own);
  expect(table).toBeNull();
  expect(problems).toMatchObject([
    {
      code: 'column_missing',
      place: { row: 1, variable: 'headwind' },
      message: 'The header has no column "headwind".',
      hint: 'Did you mean headwnd?',
    },
    {
      code: 'column_missing',
      message: 'The header has no column "Speed (kn)" of the variable speed.',
      hint: 'Did you mean Speed (kt)?',
    },
    { code: 'cell_not_number', place: { row: 2, variable: 'a' } },
  ]);
});

test('a header that is one column for want of the right delimiter', async () => {
  const { table, problems } = await read('a:b\n1:2\n', ab);
  expect(table).toBeNull();
  // Told once: of such a header every column is missing.
  expect(marks(problems)).toEqual(['column_missing 1 a']);
  expect(problems[0]?.hint).toBe('The header was read as a single column; declare data.format.delimiter.');
  const declared = { ...ab, format: { ...ab.format, delimiter: ';' } };
  expect((await read('a,b\n1,2\n', declared)).problems).toMatchObject([
    { hint: 'The header was read as a single column; data.format.delimiter is ";".' },
  ]);
});

test('columns named as members of objects', async () => {
  const own = numbersPlan('rows.csv', ['__proto__', 'constructor', 'hasOwnProperty']);
  const { table, problems } = await read('constructor,__proto__,hasOwnProperty\n1,2,3\n', own);
  expect(problems).toEqual([]);
  expect(values(table, '__proto__')).toEqual([2]);
  expect([...(table?.columns.keys() ?? [])]).toEqual(['__proto__', 'constructor', 'hasOwnProperty']);
  const missing = await read('a\n1\n', numbersPlan('rows.csv', ['__proto__']));
  expect(marks(missing.problems)).toEqual(['column_missing 1 __proto__']);
});
