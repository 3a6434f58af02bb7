import { gzipSync } from 'node:zlib';
import fc from 'fast-check';
import { expect, test, vi } from 'vitest';
import { plan, variable } from './plans.ts';
import { read, values } from './read-text.ts';

/**
 * Random tables written by a CSV writer of its own (RFC 4180: cells quoted where they must be and at random elsewhere),
 * in every dialect, then read with the file cut into chunks of any size.
 */
interface Dialect {
  readonly delimiter: string;
  readonly end: '\n' | '\r\n' | '\r';
  readonly mark: '.' | ',';
  readonly encoding: 'utf-8' | 'latin-1';
  readonly byteOrderMark: boolean;
  readonly lastEnd: boolean;
  readonly packed: boolean;
  readonly chunkSize: number;
  readonly headSize: number;
}

const dialect: fc.Arbitrary<Dialect> = fc.record({
  delimiter: fc.constantFrom(',', ';', '\t', '|'),
  end: fc.constantFrom('\n', '\r\n', '\r'),
  mark: fc.constantFrom('.', ','),
  encoding: fc.constantFrom('utf-8', 'latin-1'),
  byteOrderMark: fc.boolean(),
  lastEnd: fc.boolean(),
  packed: fc.boolean(),
  chunkSize: fc.oneof(fc.integer({ min: 1, max: 40 }), fc.constant(65_536)),
  headSize: fc.integer({ min: 1, max: 100 }),
});

// Latin-1 without the control characters, so that both encodings can hold every text; and what CSV trips over.
const character = fc.oneof(
  {
    weight: 4,
    arbitrary: fc.constantFrom('"', ',', ';', '\t', '|', '\n', '\r', ' ', '""', '\r\n', '="', '.'),
  },
  { weight: 3, arbitrary: fc.constantFrom('a', 'B', '7', 'é', 'ÿ', 'ß', '×') },
);
const text = fc.array(character, { maxLength: 8 }).map((all) => all.join(''));
const word = fc.constantFrom('Tern', 'Holm', 'Ärö', 'a,b', 'a"b', 'x;y', 'p|q', 'two\nlines', "'=1+1");

const row = fc.record({
  id: text.filter((id) => id.trim() !== ''),
  number: fc.option(
    fc.double({ noNaN: true, noDefaultInfinity: true }).map((value) => (value === 0 ? 0 : value)),
    { nil: null },
  ),
  word: fc.option(word, { nil: null }),
  note: text,
  flag: fc.option(fc.constantFrom('yes', 'no'), { nil: null }),
  blankBefore: fc.boolean(),
  quotes: fc.array(fc.boolean(), { minLength: 5, maxLength: 5 }),
});

// Time enough for a busy machine; nothing is timed.
vi.setConfig({ testTimeout: 60_000 });

test('a table comes back as it was written, with the lines on which its rows start', async () => {
  await fc.assert(
    fc.asyncProperty(fc.array(row, { minLength: 1, maxLength: 12 }), dialect, async (rows, how) => {
      let content = writeRow(['id', 'number', 'word', 'note', 'flag'], [], how);
      const lines: number[] = [];
      for (const one of rows) {
        if (one.blankBefore) content += how.end;
        lines.push(1 + countEnds(content, how.end));
        const number = one.number === null ? 'n/a' : String(one.number).replace('.', how.mark);
        const cells = [one.id, number, one.word ?? '', one.note, one.flag ?? 'n/a'];
        content += writeRow(cells, one.quotes, how);
      }
      if (!how.lastEnd) content = content.slice(0, -how.end.length);
      const bytes = Buffer.from(content, how.encoding === 'utf-8' ? 'utf8' : 'latin1');
      const marked = how.byteOrderMark ? Buffer.concat([Buffer.of(0xef, 0xbb, 0xbf), bytes]) : bytes;
      const own = plan(
        [
          variable('id', 'identifier'),
          variable('number'),
          variable('word', 'category'),
          variable('note', 'text', { missing: [] }),
          variable('flag', 'flag'),
        ],
        {
          file: how.packed ? 'rows.csv.gz' : 'rows.csv',
          format: { delimiter: how.delimiter, decimalMark: how.mark, encoding: how.encoding },
          missing: ['', 'n/a'],
        },
      );
      const stored = how.packed ? gzipSync(marked) : marked;
      const { table, problems } = await read(stored, own, {
        chunkSize: how.chunkSize,
        headSize: how.headSize,
      });
      expect(problems).toEqual([]);
      expect([...(table?.lines ?? [])]).toEqual(lines);
      expect(values(table, 'number')).toEqual(rows.map((one) => one.number));
      expect(values(table, 'id')).toEqual(rows.map((one) => one.id.trim()));
      expect(values(table, 'word')).toEqual(rows.map((one) => one.word));
      expect(values(table, 'note')).toEqual(
        rows.map(({ note }) => (note.trim() === '' || note.trim() === 'n/a' ? null : note)),
      );
      expect(values(table, 'flag')).toEqual(
        rows.map(({ flag }) => (flag === null ? null : flag === 'yes' ? 1 : 0)),
      );
    }),
    { numRuns: 400 },
  );
});

test('the table, or the problems, of any bytes do not depend on where the chunks are cut', async () => {
  const piece = fc.constantFrom(
    'a,b',
    '1',
    '2',
    ',',
    '"',
    '\n',
    '\r\n',
    '\r',
    ' ',
    'x',
    '\0',
    'é',
    '\ufffd',
    '1,2\n',
  );
  const bytes = fc.oneof(
    {
      weight: 5,
      arbitrary: fc.array(piece, { maxLength: 30 }).map((all) => Buffer.from(`a,b\n${all.join('')}`)),
    },
    { weight: 1, arbitrary: fc.uint8Array({ maxLength: 60 }).map((all) => Buffer.from(all)) },
  );
  const own = plan([variable('a', 'text'), variable('b')], {
    onBadValue: 'set_missing',
    format: { delimiter: ',', decimalMark: '.', encoding: null },
  });
  await fc.assert(
    fc.asyncProperty(bytes, fc.integer({ min: 1, max: 9 }), async (content, chunkSize) => {
      const whole = await read(content, own, { chunkSize: 65_536 });
      const cut = await read(content, own, { chunkSize, headSize: 1 });
      expect(cut).toEqual(whole);
      expect(whole.table !== null || whole.problems.some(({ severity }) => severity === 'error')).toBe(true);
    }),
    { numRuns: 600 },
  );
});

test('a file larger than the part that is judged first, cut anywhere', async () => {
  const rows = Array.from(
    { length: 6_000 },
    (_, i) => `${i / 8},"${i % 7 === 0 ? `n${i}\nm` : `é${i}`}",${i}`,
  );
  const content = `x,note,k\r\n${rows.join('\r\n')}\r\n`;
  const own = plan([variable('x'), variable('note', 'text'), variable('k', 'integer')]);
  const whole = await read(content, own, { chunkSize: 1 << 24 });
  expect(whole.problems).toEqual([]);
  expect(values(whole.table, 'k')).toEqual(rows.map((_, i) => i));
  expect(values(whole.table, 'note').slice(6, 8)).toEqual(['é6', 'n7\nm']);
  // Rows 0, 7, 14 … take two lines each.
  expect([...(whole.table?.lines ?? [])]).toEqual(rows.map((_, i) => 2 + i + Math.ceil(i / 7)));
  for (const chunkSize of [13, 1_000, 4_096, 65_536]) {
    expect(await read(content, own, { chunkSize })).toEqual(whole);
  }
});

function writeRow(cells: readonly string[], quotes: readonly boolean[], how: Dialect): string {
  const written = cells.map((cell, index) => {
    const must = ['"', how.delimiter, '\n', '\r'].some((special) => cell.includes(special));
    return must || quotes[index] === true ? `"${cell.replaceAll('"', '""')}"` : cell;
  });
  return written.join(how.delimiter) + how.end;
}

/** Line ends of the file's own kind; LF counts in a CRLF file too, since any reader starts a line there. */
function countEnds(content: string, end: Dialect['end']): number {
  return content.split(end === '\r' ? '\r' : '\n').length - 1;
}
