import { describe, expect, test } from 'vitest';
import { randomFrom, xoshiro } from '../../src/stats/random.ts';

describe('xoshiro128**', () => {
  // Worked out from the published recurrence in another language (python integers, masked to 32 bits).
  test('gives the numbers that the published recurrence gives from the state 1, 2, 3, 4', () => {
    const next = xoshiro(1, 2, 3, 4);
    expect(Array.from({ length: 8 }, next)).toEqual([
      11520, 0, 5927040, 70819200, 2031721883, 1637235492, 1287239034, 3734860849,
    ]);
  });
});

describe('randomFrom', () => {
  test('the same seed gives the same numbers, another seed or stream others', () => {
    const draw = (seed: number, stream?: number) => {
      const { next } = randomFrom(seed, stream);
      return Array.from({ length: 4 }, next);
    };
    expect(draw(1)).toEqual(draw(1));
    const firsts = [draw(0), draw(1), draw(2), draw(4294967295), draw(1, 1), draw(1, 2)].map(
      ([first]) => first,
    );
    expect(new Set(firsts).size).toBe(firsts.length);
  });

  test('numbers are in [0, 1), and whole numbers below n come up equally often', () => {
    const random = randomFrom(20250101);
    const n = 12;
    const draws = 60000;
    const counts = new Float64Array(n);
    for (let k = 0; k < draws; k++) {
      const value = random.below(n);
      expect(Number.isInteger(value) && value >= 0 && value < n).toBe(true);
      counts[value]!++;
    }
    const expected = draws / n;
    const chiSquared = counts.reduce((sum, count) => sum + (count - expected) ** 2 / expected, 0);
    // 0.999 quantile of χ² on 11 (published tables): 31.26.
    expect(chiSquared).toBeLessThan(31.26);
  });

  test('neighbouring numbers are not related', () => {
    const { next } = randomFrom(7);
    const values = Array.from({ length: 20000 }, next);
    let products = 0;
    for (let k = 1; k < values.length; k++) products += (values[k]! - 0.5) * (values[k - 1]! - 0.5);
    // Standard error of the correlation is 1/√n.
    expect(Math.abs((12 * products) / values.length)).toBeLessThan(4 / Math.sqrt(values.length));
  });
});
