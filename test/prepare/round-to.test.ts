import fc from 'fast-check';
import { expect, test } from 'vitest';
import { roundTo } from '../../src/prepare/round-to.ts';
import { roundDecimally } from './interpret.ts';

test('agrees with rounding on the written digits, for every size of number', () => {
  const anyNumber = fc.oneof(
    fc.double({ noNaN: true, noDefaultInfinity: true }),
    fc.double({ min: -1e12, max: 1e12, noNaN: true }),
    fc.double({ min: -10, max: 10, noNaN: true }),
    // Exact halves as written.
    fc.tuple(fc.integer(), fc.integer({ min: 0, max: 12 })).map(([n, places]) => Number(`${n}5e-${places}`)),
  );
  fc.assert(
    fc.property(anyNumber, fc.integer({ min: -15, max: 15 }), (x, digits) => {
      expect(roundTo(x, digits) === roundDecimally(x, digits), `${x} to ${digits}`).toBe(true);
    }),
    { numRuns: 5000 },
  );
});

test('digits that are no whole number from −15 to 15 give nothing', () => {
  for (const digits of [0.5, 16, -16, Number.NaN]) expect(roundTo(1, digits)).toBeNaN();
});
