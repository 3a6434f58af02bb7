import type { Column } from '../data/table.ts';
import {
  type Chosen,
  cooksDistance,
  covarianceRatio,
  deletedResidual,
  fittedShift,
  standardisedResidual,
} from '../examine/chosen.ts';
import { largest } from '../examine/largest.ts';
import type { WithoutRows } from '../examine/without-row.ts';
import { modelVariables } from '../predict/outside-data.ts';
import type { RecordExamination } from './record.ts';

/** Rows up to which every one is kept for the charts. */
const MOST_POINTS = 2000;
/** Of the most extreme rows by each measure, how many a thinning keeps. */
const MOST_EXTREME = 50;

/** Rows for the charts, the most influential rows, and counts over all rows. */
export function rowSummaries(
  chosen: Chosen,
  without: WithoutRows,
): Pick<RecordExamination, 'influential_rows' | 'choice_omitted' | 'counts' | 'points'> {
  const { sample } = chosen;
  const n = sample.rowCount;
  const standardised = new Float64Array(n);
  const cook = new Float64Array(n);
  for (let i = 0; i < n; i++) {
    standardised[i] = standardisedResidual(chosen, i) ?? Number.NaN;
    cook[i] = cooksDistance(chosen, i) ?? Number.NaN;
  }
  const names = chosen.fit.columns.map((column) => chosen.columns[column]!.name);
  return {
    influential_rows: without.rows.map(({ row: i, coefficients, chosen: instead }) => ({
      row: sample.lines[i]!,
      id: sample.ids?.[i] ?? null,
      fitted: chosen.fitted[i]!,
      observed: chosen.observed[i]!,
      standardised_residual: orNull(standardised[i]!),
      leverage: chosen.leverages[i]!,
      cooks_distance: orNull(cook[i]!),
      deleted_residual: orNull(deletedResidual(chosen, i) ?? Number.NaN),
      dffits: fittedShift(chosen, i),
      covratio: covarianceRatio(chosen, i),
      without: {
        coefficients: coefficients.map(({ estimate, standardError, shift }, j) => ({
          name: names[j]!,
          estimate,
          standard_error: standardError,
          dfbetas: shift,
        })),
        chosen: instead === null || instead === undefined ? null : without.candidates[instead]!,
      },
    })),
    choice_omitted: without.choiceOmitted,
    counts: countsOf(chosen, standardised, cook),
    points: pointsOf(chosen, standardised, cook),
  };
}

function countsOf(
  chosen: Chosen,
  standardised: Float64Array,
  cook: Float64Array,
): RecordExamination['counts'] {
  const n = chosen.sample.rowCount;
  const share = chosen.fit.columns.length / n;
  const counts = {
    rows: n,
    beyond_2: 0,
    beyond_3: 0,
    leverage_beyond_2p_over_n: 0,
    leverage_beyond_3p_over_n: 0,
    cook_beyond_half: 0,
    dffits_beyond_mark: 0,
    covratio_beyond_mark: 0,
  };
  for (let i = 0; i < n; i++) {
    const size = Math.abs(standardised[i]!);
    if (size > 2) counts.beyond_2++;
    if (size > 3) counts.beyond_3++;
    if (chosen.leverages[i]! > 2 * share) counts.leverage_beyond_2p_over_n++;
    if (chosen.leverages[i]! > 3 * share) counts.leverage_beyond_3p_over_n++;
    if (cook[i]! >= 0.5) counts.cook_beyond_half++;
    if (Math.abs(fittedShift(chosen, i) ?? 0) > 2 * Math.sqrt(share)) counts.dffits_beyond_mark++;
    if (Math.abs((covarianceRatio(chosen, i) ?? 1) - 1) > 3 * share) counts.covratio_beyond_mark++;
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
