import type { Column } from '../data/table.ts';
import { type Chosen, cooksDistance, standardisedResidual } from '../examine/chosen.ts';
import { modelVariables } from '../predict/outside-data.ts';
import type { RecordExamination } from './record.ts';

/** Rows up to which every one is kept for the charts. */
const MOST_POINTS = 2000;
/** Of the most extreme rows by each measure, how many a thinning keeps. */
const MOST_EXTREME = 50;
const MOST_INFLUENTIAL = 10;

/** Rows for the charts, the most influential rows, and counts over all rows. */
export function rowSummaries(
  chosen: Chosen,
): Pick<RecordExamination, 'influential_rows' | 'counts' | 'points'> {
  const { sample } = chosen;
  const n = sample.rowCount;
  const standardised = new Float64Array(n);
  const cook = new Float64Array(n);
  for (let i = 0; i < n; i++) {
    standardised[i] = standardisedResidual(chosen, i) ?? Number.NaN;
    cook[i] = cooksDistance(chosen, i) ?? Number.NaN;
  }
  const influential = largest(cook, MOST_INFLUENTIAL);
  return {
    influential_rows: influential.map((i) => ({
      row: sample.lines[i]!,
      id: sample.ids?.[i] ?? null,
      fitted: chosen.fitted[i]!,
      observed: chosen.observed[i]!,
      standardised_residual: orNull(standardised[i]!),
      leverage: chosen.leverages[i]!,
      cooks_distance: orNull(cook[i]!),
    })),
    counts: countsOf(chosen, standardised),
    points: pointsOf(chosen, standardised, cook),
  };
}

function countsOf(chosen: Chosen, standardised: Float64Array): RecordExamination['counts'] {
  const n = chosen.sample.rowCount;
  const share = chosen.fit.columns.length / n;
  const counts = {
    rows: n,
    beyond_2: 0,
    beyond_3: 0,
    leverage_beyond_2p_over_n: 0,
    leverage_beyond_3p_over_n: 0,
  };
  for (let i = 0; i < n; i++) {
    const size = Math.abs(standardised[i]!);
    if (size > 2) counts.beyond_2++;
    if (size > 3) counts.beyond_3++;
    if (chosen.leverages[i]! > 2 * share) counts.leverage_beyond_2p_over_n++;
    if (chosen.leverages[i]! > 3 * share) counts.leverage_beyond_3p_over_n++;
  }
  return counts;
}

function pointsOf(
  chosen: Chosen,
  standardised: Float64Array,
  cook: Float64Array,
): RecordExamination['points'] {
  const { sample } = chosen;
  const rows = keptRows(chosen, standardised, cook);
  const place = timePlaces(sample.timeOrder);
  const pick = (values: Float64Array): number[] => rows.map((i) => values[i]!);
  return {
    thinned: rows.length < sample.rowCount,
    row: rows.map((i) => sample.lines[i]!),
    id: rows.map((i) => sample.ids?.[i] ?? null),
    fitted: pick(chosen.fitted),
    observed: pick(chosen.observed),
    residual: rows.map((i) => chosen.observed[i]! - chosen.fitted[i]!),
    standardised_residual: pick(standardised).map(orNull),
    leverage: pick(chosen.leverages),
    cooks_distance: pick(cook).map(orNull),
    time_position: place === null ? null : rows.map((i) => place[i]!),
    values: modelVariables(chosen).map((variable) => ({
      variable,
      ...valuesAt(sample.columns.get(variable)!, rows),
    })),
  };
}

/** All rows where there are few; else an even thinning that keeps the most extreme, in file order. */
function keptRows(chosen: Chosen, standardised: Float64Array, cook: Float64Array): number[] {
  const n = chosen.sample.rowCount;
  if (n <= MOST_POINTS) return Array.from({ length: n }, (_, i) => i);
  const kept = new Set([
    ...largest(cook, MOST_EXTREME),
    ...largest(chosen.leverages, MOST_EXTREME),
    ...largest(standardised.map(Math.abs), MOST_EXTREME),
  ]);
  const evenly = MOST_POINTS - kept.size;
  for (let k = 0; k < evenly; k++) kept.add(Math.floor(((k + 0.5) * n) / evenly));
  return [...kept].sort((a, b) => a - b);
}

/** Indexes of the largest values, largest first, NaN left out; earlier rows first among equals. */
function largest(values: Float64Array, count: number): number[] {
  const found: number[] = [];
  let least = Number.NEGATIVE_INFINITY;
  for (let i = 0; i < values.length; i++) {
    const value = values[i]!;
    if (Number.isNaN(value) || (found.length === count && value <= least)) continue;
    let at = found.length;
    while (at > 0 && values[found[at - 1]!]! < value) at--;
    found.splice(at, 0, i);
    if (found.length > count) found.pop();
    least = values[found.at(-1)!]!;
  }
  return found;
}

function timePlaces(order: Int32Array | null): Int32Array | null {
  if (order === null) return null;
  const place = new Int32Array(order.length);
  for (let t = 0; t < order.length; t++) place[order[t]!] = t + 1;
  return place;
}

function valuesAt(
  column: Column,
  rows: readonly number[],
): { numbers: number[] | null; texts: string[] | null } {
  if (column.kind === 'category')
    return { numbers: null, texts: rows.map((i) => column.levels[column.codes[i]!]!) };
  if (column.kind === 'text') return { numbers: null, texts: rows.map((i) => column.values[i] ?? '') };
  return { numbers: rows.map((i) => column.values[i]!), texts: null };
}

function orNull(value: number): number | null {
  return Number.isFinite(value) ? value : null;
}
