import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { checkExpression } from '../../src/expression/check-expression.ts';
import type { ValueType } from '../../src/expression/expression.ts';
import { evaluateExpression } from '../../src/prepare/evaluate-expression.ts';
import { writeExpression } from '../expression/write-expression.ts';
import { anyTypedExpression } from './any-typed-expression.ts';
import { byName, category, expressionOf, flags, numbers, texts } from './columns.ts';
import { interpret, type Value } from './interpret.ts';

const DAY = 86_400_000;

/** NaN as null, and "undefined" where flagged. */
function values(
  text: string,
  columns: Parameters<typeof byName>[0],
  rowCount = 1,
): (number | null | 'undefined')[] {
  const result = evaluateExpression(expressionOf(text), byName(columns), rowCount);
  return Array.from(result.values, (value, row) => {
    if (result.undefinedRows?.flags[row] === 1) {
      expect(value).toBeNaN();
      return 'undefined';
    }
    return Number.isNaN(value) ? null : value;
  });
}

describe('evaluation', () => {
  test.each([
    ['1 + 2 * 3 ^ 2 / 4 - 1', 4.5],
    ['-2 ^ 2', -4],
    ['2 ^ -1', 0.5],
    ['2 ^ 3 ^ 2', 512],
    ['0 ^ 0', 1],
    ['0 * -1', 0],
    ['round(2.5)', 3],
    ['round(-2.5)', -3],
    ['round(0.49999999999999994)', 0],
    ['round(1.005, 2)', 1.01],
    ['round(-1.005, 2)', -1.01],
    ['round(2.675, 2)', 2.68],
    ['round(1234.5, -2)', 1200],
    ['round(1250, -2)', 1300],
    ['round(1e300, 5)', 1e300],
    ['round(5e-324, 15)', 0],
    ['min(3, 1, 2)', 1],
    ['max(3, 1, 2)', 3],
    ['log(exp(1))', 1],
    ['log10(1000)', 3],
    ['abs(-3)', 3],
    ['if(true, 1, 1/0)', 1],
    ['if(1/0 > 1, 1, 2)', 'undefined'],
    ['false and 1/0 > 1', 0],
    ['true or 1/0 > 1', 1],
    ['true and 1/0 > 1', 'undefined'],
    ['log(0)', 'undefined'],
    ['log(-1)', 'undefined'],
    ['sqrt(-1)', 'undefined'],
    ['1/0', 'undefined'],
    ['0/0', 'undefined'],
    ['0 ^ -1', 'undefined'],
    ['(-8) ^ (1/3)', 'undefined'],
    ['exp(1000)', 'undefined'],
    ['1e300 * 1e300', 'undefined'],
    ['1e308 + 1e308', 'undefined'],
    ['1 / (1/0)', 'undefined'],
    ['-(1/0) < 0', 'undefined'],
    ['(1/0) ^ 0', 'undefined'],
    ['1e308 - -1e307 > -1e308', 1],
    ['1e308 > -1e308', 1],
    ['days_between("2024-02-28", "2024-03-01")', 2],
    ['weekday("2024-02-29")', 4],
    ['"a" == "a"', 1],
    ['"a" == "b"', 0],
  ])('%s is %s', (text, expected) => {
    expect(values(text, [])).toEqual([expected]);
  });

  test('three-valued logic', () => {
    const all = [true, false, null];
    const p = flags(
      'p',
      all.flatMap((value) => [value, value, value]),
    );
    const q = flags('q', [...all, ...all, ...all]);
    expect(values('p and q', [p, q], 9)).toEqual([1, 0, null, 0, 0, 0, null, 0, null]);
    expect(values('p or q', [p, q], 9)).toEqual([1, 1, 1, 1, 0, null, 1, null, null]);
    expect(values('not q', [p, q], 9).slice(0, 3)).toEqual([0, 1, null]);
    expect(values('if(q, 1, 2)', [p, q], 9).slice(0, 3)).toEqual([1, 2, null]);
  });

  test('a missing operand makes the result missing, also where the numbers would not care', () => {
    const x = numbers('x', [null, 2]);
    for (const text of [
      'x ^ 0',
      '1 ^ x',
      'x * 0',
      'min(x, 1)',
      'max(1, x)',
      'x == x',
      'x != x',
      '0 / x > 1',
    ]) {
      expect(values(text, [x], 2)[0], text).toBeNull();
      expect(values(text, [x], 2)[1], text).not.toBeNull();
    }
    // Missing goes before undefined: nothing can be said of a sum that lacks a part.
    expect(values('x + 1/0', [x], 2)).toEqual([null, 'undefined']);
  });

  test('categories and texts', () => {
    const vessel = category('vessel', ['Tern', 'Holm', null, 'Tern']);
    const note = texts('note', ['Tern', null, 'x', 'Holm']);
    expect(values('vessel == "Tern"', [vessel], 4)).toEqual([1, 0, null, 1]);
    expect(values('"Tern" != vessel', [vessel], 4)).toEqual([0, 1, null, 0]);
    expect(values('vessel == "none such"', [vessel], 4)).toEqual([0, 0, null, 0]);
    expect(values('note == "x"', [note], 4)).toEqual([0, null, 1, 0]);
    expect(values('vessel == note', [vessel, note], 4)).toEqual([1, null, null, 0]);
    expect(values('is_missing(note)', [note], 4)).toEqual([0, 1, 0, 0]);
    expect(values('is_missing(vessel)', [vessel], 4)).toEqual([0, 0, 1, 0]);
  });

  test('a date with a time of day counts as that moment', () => {
    const departed = numbers('departed', [19_783.5, 19_782, null], 'date');
    expect(values('departed <= "2024-03-01"', [departed], 3)).toEqual([0, 1, null]);
    expect(values('departed == "2024-03-01T12:00"', [departed], 3)).toEqual([1, 0, null]);
    expect(values('day(departed)', [departed], 3)).toEqual([1, 29, null]);
    expect(values('days_between("2024-03-01", departed)', [departed], 3)).toEqual([0.5, -1, null]);
  });

  test('rows that are undefined on the way in stay so', () => {
    const columns = byName([numbers('x', [1, null, null])]);
    const undefinedRows = new Map([['x', { flags: Uint8Array.of(0, 1, 0), count: 1 }]]);
    const sum = evaluateExpression(expressionOf('x + 1'), columns, 3, undefinedRows);
    expect([...sum.values]).toEqual([2, Number.NaN, Number.NaN]);
    expect(sum.undefinedRows).toEqual({ flags: Uint8Array.of(0, 1, 0), count: 1 });
    const asked = evaluateExpression(expressionOf('is_missing(x)'), columns, 3, undefinedRows);
    expect([...asked.values]).toEqual([0, 1, 1]);
  });

  test('no rows, and more rows than a block holds', () => {
    expect(values('x + 1', [numbers('x', [])], 0)).toEqual([]);
    const n = 10_001;
    const x = numbers(
      'x',
      Array.from({ length: n }, (_, row) => (row % 7 === 0 ? null : row - 5_000)),
    );
    const result = evaluateExpression(expressionOf('log(x) + 0 * x'), byName([x]), n);
    let undefinedCount = 0;
    for (let row = 0; row < n; row++) {
      if (row % 7 !== 0 && row > 5_000) expect(result.values[row]).toBe(Math.log(row - 5_000));
      else expect(result.values[row]).toBeNaN();
      const isUndefined = row % 7 !== 0 && row <= 5_000;
      expect(result.undefinedRows!.flags[row]).toBe(isUndefined ? 1 : 0);
      if (isUndefined) undefinedCount++;
    }
    expect(result.undefinedRows!.count).toBe(undefinedCount);
  });

  test('the longest sum and the longest list of arguments', () => {
    const x = [numbers('x', [1, 2])];
    expect(values(`${'x+'.repeat(1999)}x`, x, 2)).toEqual([2000, 4000]);
    expect(values(`min(${'x,'.repeat(1990)}x)`, x, 2)).toEqual([1, 2]);
  });

  test('the columns are not touched', () => {
    const x = numbers('x', [1, 2, 3]);
    evaluateExpression(expressionOf('-(x + 1) * x'), byName([x]), 3);
    evaluateExpression(expressionOf('if(x > 1, x, -x) + (x ^ 2)'), byName([x]), 3);
    expect([...x.values]).toEqual([1, 2, 3]);
  });

  test('what the check would refuse is a fault of the program', () => {
    const c = category('c', ['A']);
    for (const text of ['c + 1', '"a" + 1', 'none + 1', 'log()', 'nothing(1)', '1 < "a"']) {
      expect(() => evaluateExpression(expressionOf(text), byName([c]), 1), text).toThrow();
    }
  });
});

describe('random expressions', () => {
  const anyNumber = fc.oneof(
    fc.constantFrom(0, 1, -1, 2, 0.5),
    fc.double({ min: -100, max: 100, noNaN: true }),
    fc.double({ noNaN: true, noDefaultInfinity: true }),
  );
  const anyRow = fc.record({
    x: fc.option(anyNumber),
    y: fc.option(anyNumber),
    p: fc.option(fc.boolean()),
    q: fc.option(fc.boolean()),
    // Whole quarters of an hour, so that days and milliseconds are both exact.
    d: fc.option(fc.integer({ min: 0, max: 70_000 }).map((quarters) => quarters * 0.25)),
    e: fc.option(fc.integer({ min: 0, max: 25_000 })),
    c: fc.option(fc.constantFrom('A', 'B', 'C')),
    t: fc.option(fc.constantFrom('A', 'Z', '')),
  });
  const types: ReadonlyMap<string, ValueType> = new Map([
    ['x', 'number'],
    ['y', 'number'],
    ['p', 'flag'],
    ['q', 'flag'],
    ['d', 'date'],
    ['e', 'date'],
    ['c', 'category'],
    ['t', 'text'],
  ]);

  test('give row by row what a plain interpreter gives', () => {
    fc.assert(
      fc.property(anyTypedExpression, fc.array(anyRow, { minLength: 1, maxLength: 12 }), (tree, rows) => {
        expect(checkExpression(tree, (name) => types.get(name) ?? null, []).faults).toEqual([]);
        const columns = byName([
          numbers(
            'x',
            rows.map((row) => row.x),
          ),
          numbers(
            'y',
            rows.map((row) => row.y),
          ),
          flags(
            'p',
            rows.map((row) => row.p),
          ),
          flags(
            'q',
            rows.map((row) => row.q),
          ),
          numbers(
            'd',
            rows.map((row) => row.d),
            'date',
          ),
          numbers(
            'e',
            rows.map((row) => row.e),
            'date',
          ),
          category(
            'c',
            rows.map((row) => row.c),
            ['A', 'B', 'C'],
          ),
          texts(
            't',
            rows.map((row) => row.t),
          ),
        ]);
        const result = evaluateExpression(tree, columns, rows.length);
        rows.forEach((row, index) => {
          const word = (text: string | null): Value => (text === null ? null : { word: text });
          const moment = (days: number | null): Value => (days === null ? null : new Date(days * DAY));
          const expected = interpret(
            tree,
            new Map<string, Value>([
              ['x', row.x],
              ['y', row.y],
              ['p', row.p],
              ['q', row.q],
              ['d', moment(row.d)],
              ['e', moment(row.e)],
              ['c', word(row.c)],
              ['t', word(row.t)],
            ]),
          );
          const found = result.values[index]!;
          const isUndefined = result.undefinedRows?.flags[index] === 1;
          const about = `${writeExpression(tree)} at ${JSON.stringify(row)}`;
          expect(isUndefined, about).toBe(expected === 'undefined');
          if (expected === null || expected === 'undefined') expect(found, about).toBeNaN();
          else
            expect(
              found === (expected instanceof Date ? expected.getTime() / DAY : Number(expected)),
              about,
            ).toBe(true);
        });
      }),
      { numRuns: 1500 },
    );
  });
});
