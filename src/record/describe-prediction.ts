import type { Chosen } from '../examine/chosen.ts';
import { predictorOf } from '../predict/predictor.ts';
import type { VariablePlan } from '../study/study.ts';
import type { RecordModel } from './record.ts';

type RecordPredictionNeeds = NonNullable<RecordModel['prediction']>;

/** What the record keeps of the chosen model so that further rows can be predicted without study and data. */
export function describePrediction(chosen: Chosen, smearing: Float64Array | null): RecordPredictionNeeds {
  const { study, covariance } = chosen;
  const predictor = predictorOf(chosen, smearing);
  const p = predictor.estimates.length;
  const variable = (plan: VariablePlan, needed: boolean) => ({
    name: plan.name,
    type: plan.type,
    column: plan.column,
    needed,
    at_least: plan.atLeast,
    at_most: plan.atMost,
    levels: listOf(predictor.levels.get(plan.name)),
    values: listOf(plan.flagValues),
    pattern: plan.pattern,
    missing: [...plan.missing],
  });
  const names = [...predictor.inputs, ...predictor.extras].map(({ name }) => name);
  return {
    root: rowsOf(predictor.rootInverse, p),
    error_variance: covariance?.variance ?? null,
    covariance_root:
      covariance === null || covariance.root === predictor.rootInverse ? null : rowsOf(covariance.root, p),
    df: predictor.degreesOfFreedom,
    weights: study.weights,
    row_id: study.data.variables.find(({ name }) => name === study.data.rowId)?.column ?? null,
    decimal_mark: study.data.format.decimalMark,
    missing: [...study.data.missing],
    variables: study.data.variables
      .filter(({ name }) => names.includes(name))
      .map((plan) => variable(plan, predictor.inputs.includes(plan))),
    derived: predictor.derive.map(({ name, text, type }) => ({ name, expression: text, type })),
    ranges: [...predictor.ranges].map(([name, range]) => ({ variable: name, ...range })),
  };
}

function listOf(texts: readonly string[] | null | undefined): string[] | null {
  return texts === null || texts === undefined ? null : [...texts];
}

/** A p × p column-major matrix row by row. */
function rowsOf(matrix: Float64Array, p: number): number[][] {
  return Array.from({ length: p }, (_, i) => Array.from({ length: p }, (_, j) => matrix[j * p + i]!));
}
