import { type Quartiles, quartilesOf } from '../stats/quartiles.ts';
import type { Sample } from './sample.ts';

/** How the values of a column of numbers, flags or dates are spread over the rows used, missing ones left out. */
export interface Spread extends Quartiles {
  readonly mean: number;
  /** √(Σ (x − x̄)²/(n − 1)); null for fewer than two values. */
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

/** In two passes, so that a large offset costs no digits. */
function meanAndDeviation(values: Float64Array): Pick<Spread, 'mean' | 'standardDeviation'> {
  let sum = 0;
  for (let i = 0; i < values.length; i++) sum += values[i]!;
  const mean = sum / values.length;
  let squares = 0;
  for (let i = 0; i < values.length; i++) squares += (values[i]! - mean) ** 2;
  return { mean, standardDeviation: values.length < 2 ? null : Math.sqrt(squares / (values.length - 1)) };
}
