import { expect, test } from 'vitest';
import { conditionIndex } from '../../src/engine/condition-number.ts';

/** R⁻¹ of the unit columns (1, 0) and (cos θ, sin θ), column-major. */
function inverseAt(angle: number): Float64Array {
  return Float64Array.from([1, 0, -Math.cos(angle) / Math.sin(angle), 1 / Math.sin(angle)]);
}

test.each([1, 1e-3, 1e-9, 1e-13, 1e-20])(
  'two unit columns at an angle of %s have cot(θ/2) as their condition index (from 2 ± 2 cos θ, the eigenvalues of their cross-products doubled)',
  (angle) => {
    const index = conditionIndex(inverseAt(angle), 2, Float64Array.from([1, 1]));
    expect(index * Math.tan(angle / 2)).toBeCloseTo(1, 12);
  },
);

test('one column has nothing beside it', () => {
  expect(conditionIndex(Float64Array.of(0.1), 1, Float64Array.of(10))).toBe(1);
});
