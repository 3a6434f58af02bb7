import { expect, test } from 'vitest';
import { binomialInterval } from '../../src/stats/binomial-interval.ts';

// scipy 1.x, scipy.stats.binomtest(k, n).proportion_ci(confidence, 'exact').
test.each([
  [0, 7, 0.95, 0.0, 0.4096163972250487],
  [7, 7, 0.95, 0.5903836027749514, 1.0],
  [53, 92, 0.95, 0.46862239612358625, 0.6785148310853321],
  [1, 1000, 0.99, 5.0125292607668415e-6, 0.007406286938353162],
  [18, 20, 0.9, 0.7173814751141357, 0.9819347969145735],
  [90000, 100000, 0.95, 0.8981239977829294, 0.9018527655852955],
])('%i of %i at %d', (k, n, confidence, lower, upper) => {
  const [low, high] = binomialInterval(k, n, confidence);
  expect(Math.abs(low - lower)).toBeLessThanOrEqual(1e-12);
  expect(Math.abs(high - upper)).toBeLessThanOrEqual(1e-12);
});

test('of nothing there is no interval', () => {
  for (const [k, n, confidence] of [
    [0, 0, 0.95],
    [3, 2, 0.95],
    [-1, 2, 0.95],
    [1, 2, 1],
    [Number.NaN, 2, 0.95],
  ] as const) {
    expect(binomialInterval(k, n, confidence)).toEqual([Number.NaN, Number.NaN]);
  }
});
