/**
 * x rounded to `digits` places after the point (before it where negative), halves away from zero. The half is
 * judged on the number as it is written: 1.005 to two digits is 1.01, although the double nearest to 1.005 lies
 * below it. NaN where `digits` is not a whole number from −15 to 15.
 */
export function roundTo(x: number, digits: number): number {
  if (!Number.isInteger(digits) || Math.abs(digits) > 15) return Number.NaN;
  const size = Math.abs(x);
  if (digits === 0) return Math.sign(x) * Math.round(size);
  const power = 10 ** Math.abs(digits);
  const shifted = digits > 0 ? size * power : size / power;
  // From 2^52 on a double has no fraction to round, and shifting back could only disturb it.
  if (shifted >= 4_503_599_627_370_496) return x;
  const near = Math.abs(shifted - Math.floor(shifted) - 0.5);
  const whole = near < 1e-6 * Math.max(1, shifted * 1e-9) ? roundWritten(size, digits) : Math.round(shifted);
  return Math.sign(x) * (digits > 0 ? whole / power : whole * power);
}

/** Shifts the point in the number's shortest decimal form, where no digit is lost. */
function roundWritten(size: number, digits: number): number {
  const [mantissa, exponent] = size.toExponential().split('e');
  return Math.round(Number(`${mantissa}e${Number(exponent) + digits}`));
}
