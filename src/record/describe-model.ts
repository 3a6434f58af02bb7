import type { Factor } from '../engine/factor.ts';
import type { Chosen } from '../examine/chosen.ts';
import { referenceOf } from '../examine/effects/settings.ts';
import { curveOf, slopesOf, typicalSteps } from '../examine/effects/term-effects.ts';
import { infer } from '../examine/infer.ts';
import type { ModelTerm } from '../model/design.ts';
import type { DesignRows } from '../model/design-rows.ts';
import { scaleName } from '../model/response-scale.ts';
import { termVariables } from '../prepare/needed-variables.ts';
import { generalisedVif, jointF } from '../select/terms.ts';
import { describePrediction } from './describe-prediction.ts';
import type { RecordModel, RecordTerm } from './record.ts';

/** The chosen model, complete enough to predict from without the data. */
export function describeModel(
  chosen: Chosen,
  rows: DesignRows,
  factor: Factor,
  smearing: Float64Array | null,
): RecordModel {
  const { fit, study, columns } = chosen;
  const p = fit.columns.length;
  const plan = fit.candidate.response;
  const declared = [...study.data.variables, ...study.derive].find((each) => each.name === plan.variable)!;
  const termOf = new Map(
    fit.candidate.terms
      .flatMap((term) => term.columns.map((column) => [column, term.name] as const))
      .reverse(),
  );
  const means = columnMeans(chosen, rows);
  const reference = referenceOf(chosen);
  const inference = infer(chosen, factor);
  return {
    candidate: fit.candidate.name,
    response: {
      variable: plan.variable,
      scale: scaleName(plan.scale),
      lambda: plan.scale.kind === 'box_cox' ? plan.scale.lambda : null,
      unit: declared.unit,
      label: declared.label ?? plan.variable,
    },
    intercept: fit.columns[0] === 0,
    rows: fit.rowCount,
    degrees_of_freedom: fit.degreesOfFreedom,
    residual_standard_error: chosen.s,
    response_mean: meanOf(chosen, plan.variable),
    columns: fit.columns.map((column, j) => ({
      name: columns[column]!.name,
      term: termOf.get(column) ?? null,
      unit: columns[column]!.unit,
      pieces: columns[column]!.pieces.map((piece) =>
        'knots' in piece ? { ...piece, knots: [...piece.knots] } : piece,
      ),
      estimate: fit.estimates[j]!,
      mean: means[j]!,
    })),
    inverse: Array.from({ length: p }, (_, j) => Array.from(fit.inverse.subarray(j * p, (j + 1) * p))),
    covariance: inference.covariance,
    standard_errors: inference.standardErrors,
    inference: {
      coefficients: inference.coefficients,
      simultaneous: inference.simultaneous,
      hypotheses: inference.hypotheses,
    },
    smearing: smearing === null ? null : Array.from(smearing),
    largest_leverage: chosen.leverages.reduce((most, h) => Math.max(most, h), 0),
    prediction: describePrediction(chosen, smearing),
    terms: fit.candidate.terms.map((term): RecordTerm => {
      const vif = generalisedVif(fit, term);
      const { slopes, omitted } = slopesOf(chosen, term, reference);
      return {
        name: term.name,
        kind: kindOf(chosen, term),
        variables: [...termVariables(term.plan)],
        columns: term.columns
          .filter((column) => fit.columns.includes(column))
          .map((column) => columns[column]!.name),
        joint_f: jointF(fit, term, chosen.covariance),
        generalised_vif: vif?.value ?? null,
        generalised_vif_per_column: vif?.perColumn ?? null,
        typical_steps: typicalSteps(chosen, term, reference),
        curve: curveOf(chosen, term, reference),
        slopes,
        slopes_omitted: omitted,
        ...inference.ofTerm(term, reference),
      };
    }),
  };
}

function kindOf(chosen: Chosen, term: ModelTerm): RecordTerm['kind'] {
  if (term.plan.kind !== 'variable') return term.plan.kind;
  const column = chosen.sample.columns.get(term.plan.variable);
  return column?.kind === 'category' ? 'category' : column?.kind === 'flag' ? 'flag' : 'number';
}

/** Unweighted means of the chosen model's columns over the rows used. */
function columnMeans(chosen: Chosen, rows: DesignRows): Float64Array {
  const { fit } = chosen;
  const p = fit.columns.length;
  const block = 1024;
  const values = new Float64Array(block * p);
  const sums = new Float64Array(p);
  for (let from = 0; from < rows.rowCount; from += block) {
    const count = Math.min(block, rows.rowCount - from);
    rows.fill(fit.columns, from, from + count, block, values, null);
    for (let j = 0; j < p; j++) {
      let sum = 0;
      for (let i = 0; i < count; i++)
        sum += values[j * block + i]! / (rows.rootWeights === null ? 1 : rows.rootWeights[from + i]!);
      sums[j]! += sum;
    }
  }
  return sums.map((sum, j) => sum / rows.rowCount / rows.scales[fit.columns[j]!]!);
}

function meanOf(chosen: Chosen, variable: string): number {
  const column = chosen.sample.columns.get(variable)!;
  if (column.kind === 'category' || column.kind === 'text') return Number.NaN;
  return column.values.reduce((sum, value) => sum + value, 0) / column.values.length;
}
