import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { checkStudyRecord } from '../../src/record/check-study-record.generated.ts';
import { jsonText } from '../../src/record/json.ts';
import { recordSchema } from '../../src/record/record-schema.ts';
import { recordText } from '../../src/record/record-text.ts';
import { valuesOf } from './arbitrary-record.ts';
import { smallRecord } from './small-record.ts';

const schema = {
  properties: { b: { properties: { y: {}, x: {} } }, a: { items: { $ref: '#/$defs/pair' } } },
  $defs: { pair: { properties: { second: {}, first: {} } } },
} as const;

describe('jsonText', () => {
  test('puts keys in the order of the schema, through references, and unknown ones last', () => {
    const value = { z: 1, a: [{ first: 1, second: 2 }], c: 2, b: { x: [1, 2.5, null], y: 'text' } };
    expect(jsonText(value, schema)).toBe(`{
  "b": {
    "y": "text",
    "x": [1, 2.5, null]
  },
  "a": [
    {
      "second": 2,
      "first": 1
    }
  ],
  "c": 2,
  "z": 1
}
`);
  });

  test('empty lists and objects, absent keys, long texts on lines of their own', () => {
    const long = 'A sentence that is longer than what may share a line with others.';
    expect(jsonText({ a: [], b: {}, c: undefined, d: [long, 'short'] }, {})).toBe(
      `{\n  "a": [],\n  "b": {},\n  "d": [\n    "${long}",\n    "short"\n  ]\n}\n`,
    );
    expect(jsonText('x', {})).toBe('"x"\n');
  });

  test.each([Number.NaN, Number.POSITIVE_INFINITY, Number.NEGATIVE_INFINITY])(
    'refuses %s, which has no JSON form, with its path',
    (number) => {
      expect(() => jsonText({ a: [{ first: [0, number] }] }, schema)).toThrow(/^a\.0\.first is -?(NaN|Inf)/);
      expect(() => jsonText({ a: [{ first: undefined }, { first: () => 1 }] }, schema)).toThrow(
        /^a\.1\.first has no JSON form/,
      );
    },
  );

  test('keys that objects inherit are not taken for keys of the schema', () => {
    const value = JSON.parse('{"__proto__": 1, "constructor": 2, "toString": {"a": 3}}') as unknown;
    expect(JSON.parse(jsonText(value, { properties: {} }))).toEqual(value);
  });
});

describe('the record', () => {
  test('its text does not depend on the order in which keys were put in', () => {
    const reversed = (value: unknown): unknown => {
      if (Array.isArray(value)) return value.map(reversed);
      if (typeof value !== 'object' || value === null) return value;
      return Object.fromEntries(
        Object.entries(value)
          .reverse()
          .map(([key, part]) => [key, reversed(part)]),
      );
    };
    const record = smallRecord();
    expect(recordText(reversed(record) as typeof record)).toBe(recordText(record));
  });

  test('every record that the schema allows is valid, and its text gives it back to the last bit', () => {
    const root = recordSchema();
    fc.assert(
      fc.property(valuesOf(root), (record) => {
        expect(checkStudyRecord(record), JSON.stringify(checkStudyRecord.errors)).toBe(true);
        const text = jsonText(record, root);
        // −0 is the one number that JSON texts do not keep.
        expect(JSON.parse(text)).toEqual(JSON.parse(JSON.stringify(record)));
        expect(jsonText(JSON.parse(text), root)).toBe(text);
      }),
      { numRuns: 60 },
    );
  });
});
