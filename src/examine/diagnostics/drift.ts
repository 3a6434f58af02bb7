import { wholeNumber } from '../../numerals.ts';
import { normalUpper } from '../../stats/distributions.ts';
import { type Chosen, rowName } from '../chosen.ts';
import { concernOf, type Diagnostic, notPossible } from '../diagnostic.ts';
import { orthonormalRows } from '../orthonormal-design.ts';
import { recursiveResiduals } from '../recursive-residuals.ts';

/** n p² up to which updating row by row is quick. */
const WORK = 1e8;

/** The largest cumulated sum of recursive residuals, in units of the line that widens with time. */
export const drift: Diagnostic = {
  name: 'drift',
  topic: 'constancy',
  question: 'Does the model drift away from the rows as time goes on?',
  statisticName: 'largest cumulated sum of recursive residuals',
  source: 'Brown, Durbin & Evans 1975',
  find(chosen, second) {
    const order = chosen.sample.timeOrder;
    if (order === null) return null;
    if (second === null)
      return notPossible('The model fits these rows exactly, so there is nothing to cumulate.');
    const n = chosen.sample.rowCount;
    const p = chosen.fit.columns.length;
    if (n * p * p > WORK)
      return notPossible(
        `The model is not followed row by row through ${wholeNumber(n)} rows: it would take too long.`,
      );
    const found = largestSum(chosen, order);
    if (found === null) return notPossible('There are too few rows to follow the model through time.');
    const { statistic, position, direction } = found;
    const value = crossing(statistic);
    const concern = concernOf(value);
    const row = rowName(chosen.sample, order[position]!);
    return {
      statistic,
      df: [],
      p_value: value,
      mark: null,
      verdict:
        concern === 0
          ? 'Predicting each row from those before it, the errors do not visibly add up in one direction.'
          : `Predicting each row from those before it, the errors add up ${direction}, most clearly by ${row}: the relation has moved in the course of time.`,
      concern,
      advice:
        concern === 0
          ? null
          : 'Look for what changed about then; bring it into the model, or fit only the time that the question is about.',
      figures: [{ name: 'position in time order at which the sum is largest', value: position + 1 }],
    };
  },
};

interface Largest {
  readonly statistic: number;
  readonly position: number;
  readonly direction: 'upwards' | 'downwards';
}

/**
 * max |Σ w/σ̂|/(√m (1 + 2 r/m)) over r = 1 … m, w the recursive residuals and σ̂ = s. The line a(√m + 2r/√m) is crossed
 * somewhere where this exceeds a.
 */
function largestSum(chosen: Chosen, order: Int32Array): Largest | null {
  const q = orthonormalRows(chosen);
  const e = Float64Array.from(order, (row) => chosen.residuals[row]! / chosen.s!);
  const { values, positions } = recursiveResiduals(q, e, e.length, chosen.fit.columns.length);
  const m = values.length;
  if (m < 2) return null;
  let sum = 0;
  let best: Largest = { statistic: -1, position: 0, direction: 'upwards' };
  for (let r = 1; r <= m; r++) {
    sum += values[r - 1]!;
    const statistic = Math.abs(sum) / (Math.sqrt(m) * (1 + (2 * r) / m));
    if (statistic > best.statistic)
      best = { statistic, position: positions[r - 1]!, direction: sum > 0 ? 'upwards' : 'downwards' };
  }
  return best;
}

/** P that the sum crosses either line: 2 (Q(3a) + exp(−4a²)(1 − Q(a))), their equation for a solved for the probability. */
function crossing(a: number): number {
  return Math.min(1, 2 * (normalUpper(3 * a) + Math.exp(-4 * a * a) * normalUpper(-a)));
}
