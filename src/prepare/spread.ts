import { type Quartiles, quartilesOf } from '../stats/quartiles.ts';
import type { Sample } from './sample.ts';

/** How the values of a column of numbers, flags or dates are spread over the rows used, missing ones left out. */
export interface Spread extends Quartiles {
  readonly mean: number;
  /** √(Σ (x − x̄)²/(n − 1)); null for fewer than two values, and where it is too large to be held. */
  readonly standardDeviation: number | null;
}

/** The spread of every column of numbers, flags or dates in the sample that has a value. */
export function spreadsOf(sample: Sample): ReadonlyMap<string, Spread> {
  const spreads = new Map<string, Spread>();
  for (const [name, column] of sample.columns) {
    if (column.kind === 'category' || column.kind === 'text') continue;
    // A variable that no candidate needs may be missing in rows that are used.
    const values = column.values.some(Number.isNaN)
      ? column.values.filter((value) => !Number.isNaN(value))
      : column.values;
    if (values.length > 0) spreads.set(name, { ...quartilesOf(values), ...meanAndDeviation(values) });
  }
  return spreads;
}

/** In two passes, so that a large offset costs no digits; extreme values in units in which their squares can be held. */
function meanAndDeviation(values: Float64Array): Pick<Spread, 'mean' | 'standardDeviation'> {
  let largest = 0;
  for (let i = 0; i < values.length; i++) largest = Math.max(largest, Math.abs(values[i]!));
  const unit =
    largest === 0 || (largest > 1e-100 && largest < 1e100) ? 1 : 2 ** Math.floor(Math.log2(largest));
  let sum = 0;
  for (let i = 0; i < values.length; i++) sum += values[i]! / unit;
  const mean = sum / values.length;
  let squares = 0;
  for (let i = 0; i < values.length; i++) squares += (values[i]! / unit - mean) ** 2;
  const deviation = values.length < 2 ? Number.NaN : unit * Math.sqrt(squares / (values.length - 1));
  return { mean: unit * mean, standardDeviation: Number.isFinite(deviation) ? deviation : null };
}
