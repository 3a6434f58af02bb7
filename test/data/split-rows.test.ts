/** Rows are told apart as papaparse, a reader of CSV written elsewhere, tells them apart. */
import fc from 'fast-check';
import papaparse from 'papaparse';
import { expect, test } from 'vitest';
import { rowParser, rowTexts } from '../../src/data/split-rows.ts';

const delimiters = fc.constantFrom(',', ';', '\t', '|');
const text = fc
  .array(
    fc.constantFrom(
      'a',
      '12.5',
      '"',
      '""',
      '"x"',
      '"p""q"',
      ',',
      ';',
      '\t',
      '|',
      '\n',
      ' ',
      'é',
      '\u{1f33f}',
      '-3',
    ),
    {
      maxLength: 25,
    },
  )
  // Blanks between a closing quote and the end of the text: papaparse takes them at the end of a line only.
  .map((all) => all.join('').trimEnd());

function parsed(content: string, delimiter: string, newline: '\n' | '\r') {
  const { rows, fault } = rowParser({ delimiter, newline })(content, false, 1);
  return { cells: Array.from({ length: rows.count }, (_, row) => rowTexts(rows, row)), fault };
}

test.each(['\n', '\r'] as const)('any text with lines that end in %j', (newline) => {
  let [whole, broken] = [0, 0];
  fc.assert(
    fc.property(text, delimiters, (written, delimiter) => {
      const content = written.replaceAll('\n', newline);
      const { data, errors } = papaparse.parse<string[]>(content, { delimiter, newline });
      const { cells, fault } = parsed(content, delimiter, newline);
      const quotes = errors.filter(({ type }) => type === 'Quotes');
      const rows = quotes.length === 0 ? data : data.slice(0, quotes[0]!.row!);
      expect(cells).toEqual(rows.filter((row) => row.length > 1 || row[0]!.trim() !== ''));
      expect(fault === null).toBe(quotes.length === 0);
      if (fault !== null) expect(fault.unclosed).toBe(quotes[0]!.code === 'MissingQuotes');
      if (fault === null) whole++;
      else broken++;
    }),
    { numRuns: 3_000 },
  );
  expect(Math.min(whole, broken)).toBeGreaterThan(200);
});

test('a carriage return before a line feed ends the row; within quotes it is kept', () => {
  const { cells } = parsed('a,b\r\n1,"x\r"\r\n"2", y\r\n3,z\r', ',', '\n');
  expect(cells).toEqual([
    ['a', 'b'],
    ['1', 'x\r'],
    ['2', ' y'],
    ['3', 'z'],
  ]);
});

test('blanks after a closing quote, at the end of the text too', () => {
  expect(parsed('a,"b" \n1,"2" ', ',', '\n').cells).toEqual([
    ['a', 'b'],
    ['1', '2'],
  ]);
});

test('a text is parsed by itself, whatever was parsed before', () => {
  const parse = rowParser({ delimiter: ',', newline: '\n' });
  parse(`${'"",x\n'.repeat(3_000)}`, false, 1);
  const { rows, line } = parse('p,"q"', false, 7);
  expect(rowTexts(rows, 0)).toEqual(['p', 'q']);
  expect([rows.count, rows.lines[0], line]).toEqual([1, 7, 8]);
  expect(parse('p,"q"', true, 1).rows.count).toBe(0);
  expect(parse('', false, 1).rows.count).toBe(0);
});
