import { quantileSorted } from 'd3-array';
import fc from 'fast-check';
import { expect, test } from 'vitest';
import { quartilesOf } from '../../src/stats/quartiles.ts';

test('quartiles are those of the sorted values (definition 7; reference: d3-array’s quantileSorted)', () => {
  fc.assert(
    fc.property(
      fc.array(fc.oneof(fc.double({ noNaN: true, min: -1e9, max: 1e9 }), fc.integer({ min: 0, max: 3 })), {
        minLength: 1,
        maxLength: 200,
      }),
      (numbers) => {
        const values = Float64Array.from(numbers);
        const before = values.slice();
        const found = quartilesOf(values);
        expect(values).toEqual(before);
        const sorted = Array.from(values).sort((a, b) => a - b);
        const wanted = [0, 0.25, 0.5, 0.75, 1].map((share) => quantileSorted(sorted, share)!);
        const { smallest, lowerQuartile, median, upperQuartile, largest } = found;
        [smallest, lowerQuartile, median, upperQuartile, largest].forEach((value, k) => {
          expect(Math.abs(value - wanted[k]!)).toBeLessThanOrEqual(1e-12 * Math.max(1, Math.abs(wanted[k]!)));
        });
      },
    ),
    { numRuns: 300 },
  );
});

test('nothing has no quartiles', () => {
  expect(quartilesOf(new Float64Array(0)).median).toBeNaN();
});
