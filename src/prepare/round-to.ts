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
  // No double needs more than 17 digits to write it, so none is left to round.
  if (shifted >= 1e17) return x;
  const fromHalf = Math.abs(shifted - Math.floor(shifted) - 0.5);
  // Shifting may have moved a half by a rounding error of 2e-16 of the number or so.
  if (fromHalf < 1e-6 * Math.max(1, shifted * 1e-9)) return Math.sign(x) * roundWritten(size, digits);
  const whole = Math.round(shifted);
  return Math.sign(x) * (digits > 0 ? whole / power : whole * power);
}

/** The same on the digits of the number's shortest decimal form, in whole numbers of any length. */
function roundWritten(size: number, digits: number): number {
  const [mantissa = '', exponent = ''] = size.toExponential().split('e');
  const [whole, fraction = ''] = mantissa.split('.');
  const written = BigInt(`${whole}${fraction}`);
  // The number is written × 10^−places once it has been shifted by `digits`.
  const places = fraction.length - Number(exponent) - digits;
  if (places <= 0) return size;
  const unit = 10n ** BigInt(places);
  return Number(`${(written + unit / 2n) / unit}e${-digits}`);
}
