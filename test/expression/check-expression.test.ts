import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { checkExpression } from '../../src/expression/check-expression.ts';
import { comparedTexts } from '../../src/expression/compared-texts.ts';
import type { ValueType } from '../../src/expression/expression.ts';
import { callPattern, FUNCTIONS, functionNamed } from '../../src/expression/functions.ts';
import { namesIn } from '../../src/expression/names-in.ts';
import { parseExpression } from '../../src/expression/parse-expression.ts';
import { anyExpression } from './any-expression.ts';

const TYPES: ReadonlyMap<string, ValueType> = new Map([
  ['speed', 'number'],
  ['cargo', 'number'],
  ['headwind', 'number'],
  ['wet', 'flag'],
  ['dark', 'flag'],
  ['vessel', 'category'],
  ['status', 'category'],
  ['crossing', 'text'],
  ['departed', 'date'],
  ['arrived', 'date'],
]);

function tree(text: string) {
  const result = parseExpression(text);
  if ('fault' in result) throw new Error(`${text}: ${result.fault.message}`);
  return result.expression;
}

function check(text: string) {
  return checkExpression(tree(text), (name) => TYPES.get(name) ?? null, [...TYPES.keys()]);
}

describe('types', () => {
  test.each([
    ['speed ^ 3 - -cargo / 2', 'number'],
    ['speed > 3 and not wet or cargo <= 2', 'flag'],
    ['wet == dark', 'flag'],
    ['wet != true', 'flag'],
    ['status == "trial"', 'flag'],
    ['"trial" != status', 'flag'],
    ['crossing == "A-1"', 'flag'],
    ['vessel == status', 'flag'],
    ['vessel != crossing', 'flag'],
    ['departed >= "2024-02-29"', 'flag'],
    ['"2024-03-01T07:30" < arrived', 'flag'],
    ['departed == arrived', 'flag'],
    ['round(speed)', 'number'],
    ['round(speed, -1)', 'number'],
    ['min(speed, cargo, 3, headwind)', 'number'],
    ['if(wet, 1, 0)', 'number'],
    ['if(wet, dark, false)', 'flag'],
    ['if(wet, departed, arrived)', 'date'],
    ['is_missing(vessel) or is_missing(crossing) or is_missing(departed)', 'flag'],
    ['year(departed) + month(departed) + day(departed) + weekday(departed)', 'number'],
    ['days_between(departed, arrived)', 'number'],
    ['days_between("2024-01-01", departed)', 'number'],
    ['log(log10(exp(sqrt(abs(speed)))))', 'number'],
    ['speed', 'number'],
    ['vessel', 'category'],
    ['"text"', 'text'],
    ['departed', 'date'],
    ['true', 'flag'],
  ])('%s is a %s', (text, type) => {
    expect(check(text)).toMatchObject({ type, faults: [] });
  });

  test('names are given once each, in the order of the text', () => {
    expect(check('speed * cargo + if(wet, speed, headwind)').names).toEqual([
      'speed',
      'cargo',
      'wet',
      'headwind',
    ]);
    expect([...namesIn(tree('-speed + if(not wet, cargo, speed)'))]).toEqual(['speed', 'wet', 'cargo']);
  });
});

describe('faults', () => {
  test.each([
    ['headwnd + 1', 0, 7, 'expression_name', 'neither a variable nor derived', 'Did you mean headwind?'],
    ['zzzzzz', 0, 6, 'expression_name', '"zzzzzz"', undefined],
    ['log + 1', 0, 3, 'expression_name', '"log"', 'log(x)'],
    ['True', 0, 4, 'expression_name', '"True"', 'Write true in small letters.'],
    ['status == trial', 10, 15, 'expression_name', '"trial"', '"trial"'],
    ['ln(speed)', 0, 2, 'expression_name', 'no function "ln"', 'log(x)'],
    ['pow(speed, 2)', 0, 3, 'expression_name', 'no function "pow"', '^'],
    ['sqrtt(speed)', 0, 5, 'expression_name', 'no function "sqrtt"', 'Did you mean sqrt?'],
    ['speed(2)', 0, 5, 'expression_name', 'no function "speed"', 'speed * (…)'],
    ['constructor(2)', 0, 11, 'expression_name', 'no function "constructor"', 'There are log,'],
    ['__proto__', 0, 9, 'expression_name', '"__proto__"', undefined],
    ['wet + 1', 0, 3, 'expression_type', '"+" works on numbers', 'if(wet, 1, 0)'],
    ['1 * (wet and dark)', 4, 18, 'expression_type', 'a flag', 'if(…, 1, 0)'],
    ['-wet', 1, 4, 'expression_type', 'The minus sign', 'if(wet, 1, 0)'],
    ['vessel * 2', 0, 6, 'expression_type', 'a category', undefined],
    ['speed + "3"', 8, 11, 'expression_type', 'a text', 'without quotation marks'],
    ['speed + "x"', 8, 11, 'expression_type', 'a text', undefined],
    ['departed - arrived', 0, 18, 'expression_type', 'dates', 'days_between'],
    ['departed * 2', 0, 8, 'expression_type', 'a date', 'days_between'],
    ['speed == "3"', 0, 12, 'expression_type', 'a number with a text', 'without quotation marks'],
    ['vessel == 3', 0, 11, 'expression_type', 'a category with a number', '"3"'],
    ['vessel == speed', 0, 15, 'expression_type', 'a category with a number', undefined],
    ['wet == 1', 0, 8, 'expression_type', 'a flag with a number', 'wet or not wet'],
    ['wet == "yes"', 0, 12, 'expression_type', 'a flag with a text', 'wet or not wet'],
    ['departed == crossing', 0, 20, 'expression_type', 'a date with a text', undefined],
    ['departed > 3', 0, 12, 'expression_type', 'a date with a number', undefined],
    ['departed > "2023-02-29"', 11, 23, 'expression_type', 'is not a date', '2024-03-01'],
    ['departed > "1 March"', 11, 20, 'expression_type', 'is not a date', '2024-03-01'],
    ['vessel < "Tern"', 0, 15, 'expression_type', 'categories have none', '== and !='],
    ['crossing >= "A"', 0, 15, 'expression_type', 'texts have none', '== and !='],
    ['wet < dark', 0, 10, 'expression_type', 'flags have none', '== and !='],
    ['speed and wet', 0, 5, 'expression_type', '"and" works on conditions', 'speed > 0'],
    ['wet or vessel', 7, 13, 'expression_type', '"or" works on conditions', undefined],
    ['not speed', 4, 9, 'expression_type', '"not" works on conditions', 'speed > 0'],
    ['log()', 0, 5, 'expression_type', 'takes 1 argument, and 0 are given', 'log(x)'],
    ['log(speed, 10)', 0, 14, 'expression_type', 'takes 1 argument, and 2 are given', 'log(x)'],
    ['min(speed)', 0, 10, 'expression_type', '2 or more arguments, and 1 is given', 'min(a, b, …)'],
    ['round(speed, 1, 2)', 0, 18, 'expression_type', '1 or 2 arguments, and 3 are', 'round(x, digits)'],
    ['if(wet, 1)', 0, 10, 'expression_type', '3 arguments', 'if(condition, value, other value)'],
    ['round(speed, 1.5)', 13, 16, 'expression_type', 'whole number', undefined],
    ['round(speed, -16)', 13, 16, 'expression_type', 'whole number', undefined],
    ['log(wet)', 4, 7, 'expression_type', 'log works on numbers', 'if(wet, 1, 0)'],
    ['if(speed, 1, 0)', 3, 8, 'expression_type', 'The condition of if', 'speed > 0'],
    ['if(wet, 1, dark)', 11, 15, 'expression_type', 'a number and a flag', undefined],
    ['if(wet, "a", "a")', 8, 11, 'expression_type', 'a text', undefined],
    ['is_missing(speed + 1)', 11, 20, 'expression_type', 'name of a variable', 'Derive'],
    ['year(speed)', 5, 10, 'expression_type', 'year works on dates', undefined],
    ['year("2024")', 5, 11, 'expression_type', 'is not a date', '2024-03-01'],
  ])('%s', (text, start, end, code, message, hint) => {
    const [fault] = check(text).faults;
    expect(fault).toMatchObject({ start, end, code });
    expect(fault!.message).toContain(message);
    expect(fault!.message).toMatch(/\.$/);
    if (hint === undefined) expect(fault!.hint).toBeUndefined();
    else expect(fault!.hint).toContain(hint);
  });

  test('all are told at once, in the order of the text, and one slip gives one fault', () => {
    const { faults, type, names } = check('log(wet) + headwnd > 2 and (vessel + 1) / cargoo');
    expect(faults.map((fault) => [fault.start, fault.code])).toEqual([
      [4, 'expression_type'],
      [11, 'expression_name'],
      [27, 'expression_type'],
      [28, 'expression_type'],
      [42, 'expression_name'],
    ]);
    expect(type).toBe('flag');
    expect(names).toEqual(['wet', 'vessel']);
    expect(check('headwnd * 2 + log(headwnd)').faults).toHaveLength(2);
  });

  test('a proposed name that is no plain word is given in back-quotes', () => {
    const { faults } = checkExpression(tree('wind_speed + 1'), () => null, ['wind speed']);
    expect(faults[0]!.hint).toBe('Did you mean `wind speed`?');
  });

  test('any tree is checked without a throw, and every fault lies inside', () => {
    fc.assert(
      fc.property(anyExpression, (node) => {
        const checked = checkExpression(node, (name) => TYPES.get(name) ?? null, [...TYPES.keys()]);
        for (const name of checked.names) expect(TYPES.has(name)).toBe(true);
        if (checked.type === null) expect(checked.faults.length).toBeGreaterThan(0);
      }),
    );
  });
});

describe('the list of functions', () => {
  test('has every function once, with a description and a pattern', () => {
    const names = FUNCTIONS.map((known) => known.name);
    expect(names.join(' ')).toBe(
      'log log10 exp sqrt abs min max round if is_missing year month day weekday days_between',
    );
    for (const known of FUNCTIONS) expect(known.description).toMatch(/^[A-Z].*\.$/i);
    expect(callPattern(functionNamed('days_between')!)).toBe('days_between(from, to)');
    expect(functionNamed('toString')).toBeNull();
  });
});

test('texts that are compared with a variable are found wherever they stand', () => {
  expect(comparedTexts(tree('not (status == "trial") or if("Tern" != vessel, speed > 1, wet)'))).toEqual([
    { variable: 'status', text: 'trial', start: 15, end: 22 },
    { variable: 'vessel', text: 'Tern', start: 30, end: 36 },
  ]);
});
