import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { countNumbers, differences } from '../../src/record/differences.ts';

const keys = (a: unknown, b: unknown, tolerance = 0) => differences(a, b, tolerance).map((each) => each.key);

describe('differences', () => {
  test('nothing differs from itself, whatever it is', () => {
    fc.assert(
      fc.property(fc.jsonValue(), (value) => {
        expect(differences(value, structuredClone(value), 0)).toEqual([]);
      }),
    );
  });

  test('one bit is a difference, and a tolerance passes over it', () => {
    const [a, b] = [{ x: [1, { y: 1 }] }, { x: [1, { y: 1 + 2 ** -52 }] }];
    expect(keys(a, b)).toEqual(['x[1].y']);
    expect(keys(a, b, 1e-15)).toEqual([]);
    expect(keys({ x: 0 }, { x: 1e-30 }, 1e-9)).toEqual(['x']);
  });

  test('in a list of numbers, what is small beside the largest has no digits of its own', () => {
    expect(keys({ x: [1e6, 0] }, { x: [1e6, 1e-8] }, 1e-9)).toEqual([]);
    expect(keys({ x: [1e6, 0] }, { x: [1e6, 1] }, 1e-9)).toEqual(['x[1]']);
  });

  test('keys and items on one side only are named, with what stands there', () => {
    expect(differences({ a: 1, l: [1, 2] }, { b: 'x', l: [1] }, 0)).toEqual([
      { key: 'a', earlier: '1', later: 'absent', relative: null },
      { key: 'l[1]', earlier: '2', later: 'absent', relative: null },
      { key: 'b', earlier: 'absent', later: '"x"', relative: null },
    ]);
    expect(keys({ a: null }, { a: 0 })).toEqual(['a']);
    expect(keys({ a: [1] }, { a: { 0: 1 } })).toEqual(['a']);
  });

  test('with a tolerance, sentences may differ by one step of a number’s last digit', () => {
    const said = (text: string) => ({ verdict: text });
    expect(keys(said('It is 2.31 on −1,204 rows.'), said('It is 2.32 on −1,204 rows.'), 1e-9)).toEqual([]);
    expect(keys(said('It is 2.31.'), said('It is 2.33.'), 1e-9)).toEqual(['verdict']);
    expect(keys(said('It is 2.31.'), said('It was 2.31.'), 1e-9)).toEqual(['verdict']);
    expect(keys(said('It is 2.31.'), said('It is 2.32.'))).toEqual(['verdict']);
  });

  test('hashes and versions are left to the caller', () => {
    expect(keys({ tool: { version: '1' } }, { tool: { version: '2' } })).toEqual([]);
  });

  test('numbers are counted through lists and mappings', () => {
    expect(countNumbers({ a: 1, b: [2, { c: 3 }, 'x', null] })).toBe(3);
  });
});
