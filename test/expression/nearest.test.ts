import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { nearest } from '../../src/expression/nearest.ts';

describe('nearest', () => {
  test.each([
    ['at_mots', ['at_least', 'at_most'], 'at_most'],
    ['headwnd', ['headway', 'headwind', 'cargo'], 'headwind'],
    ['SPEED', ['spend', 'speed'], 'speed'],
    ['Speed', ['speed', 'Speed'], 'Speed'],
    ['vf', ['vif', 'aic'], 'vif'],
    ['vessel', ['cargo', 'speed'], null],
    ['y', ['x'], null],
    ['', ['x', 'ab'], null],
    ['teh', ['ten', 'the'], 'ten'],
    ['x', [], null],
    ['precip', ['date', 'precipitation'], 'precipitation'],
    ['Temp', ['temperature_inside', 'temp_max', 'temp_min'], 'temp_max'],
    ['Beak_Length', ['Beak Depth (mm)', 'Beak Length (mm)'], 'Beak Length (mm)'],
    ['pr', ['precipitation'], null],
    ['___', ['precipitation'], null],
    ['rain', ['terrain'], null],
    ['vif', ['adjusted_r_squared', 'largest_vif'], 'largest_vif'],
    ['logarithm', ['natural', 'log', 'sqrt'], 'log'],
    ['speed_total', ['spe', 'speed', 'x'], 'speed'],
  ])('of %s among %j is %s', (word, among, expected) => {
    expect(nearest(word, among)).toBe(expected);
  });

  test('a swap of neighbours counts once', () => {
    expect(nearest('abdc', ['abcd', 'abxy'])).toBe('abcd');
    // Two edits without the swap: beyond a third of four letters.
    expect(nearest('dbca', ['abcd'])).toBeNull();
  });

  test('any word finds itself, and the answer is one of the names', () => {
    fc.assert(
      fc.property(fc.array(fc.string(), { minLength: 1 }), fc.string(), (among, word) => {
        expect(nearest(among[0]!, among)).toBe(among[0]);
        const found = nearest(word, among);
        expect(found === null || among.includes(found)).toBe(true);
      }),
    );
  });

  test('one letter changed in a long word is found, and very long words cost nothing', () => {
    fc.assert(
      fc.property(fc.stringMatching(/^[a-z]{4,20}$/), fc.nat(), (word, at) => {
        const i = at % word.length;
        expect(nearest(`${word.slice(0, i)}#${word.slice(i + 1)}`, [word])).toBe(word);
      }),
    );
    expect(nearest('a'.repeat(100_000), ['a'.repeat(100_001)])).toBeNull();
  });
});
