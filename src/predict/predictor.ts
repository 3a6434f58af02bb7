import type { Covariance } from '../engine/covariance.ts';
import type { Chosen } from '../examine/chosen.ts';
import { namesIn } from '../expression/names-in.ts';
import { presentLevels } from '../model/build-design.ts';
import type { DesignColumn } from '../model/design.ts';
import { baseVariables } from '../prepare/derive.ts';
import type { DerivationPlan, ResponsePlan, VariablePlan } from '../study/study.ts';

/** What a row has to give so that a model can predict it, and what it may hold. */
export interface RowNeeds {
  /** Variables of the model's terms, declared and derived, in order of first use. */
  readonly model: readonly string[];
  /** Declared variables that a row must give, in order of declaration. */
  readonly inputs: readonly VariablePlan[];
  /** Declared variables that a row may give besides: what the weights rest on. */
  readonly extras: readonly VariablePlan[];
  /** Derivations that the model and its weights rest on, in order. */
  readonly derive: readonly DerivationPlan[];
  /** By category: the levels that a row may have. Those of the rows fitted; of one that is only derived from, those declared. */
  readonly levels: ReadonlyMap<string, readonly string[]>;
  /** The two texts of each flag among the inputs, as the data spells them. */
  readonly flagTexts: ReadonlyMap<string, readonly [string, string]>;
}

/**
 * Everything that predictions need of a chosen model, and nothing of its data: made from a fit, or read again from a
 * record. p is the number of columns.
 */
export interface Predictor extends RowNeeds {
  readonly response: ResponsePlan;
  /** The model's columns in order. */
  readonly columns: readonly DesignColumn[];
  /** b. */
  readonly estimates: Float64Array;
  /** R⁻¹, p × p upper triangular, column-major: the leverage of a row x is ‖x′R⁻¹‖². */
  readonly rootInverse: Float64Array;
  /** s; null where the fit is exact. */
  readonly s: number | null;
  /** The declared covariance of the estimates; null as for s. */
  readonly covariance: Pick<Covariance, 'root' | 'classicalRoot' | 'variance'> | null;
  /** Of t. */
  readonly degreesOfFreedom: number;
  /** Among the rows fitted. */
  readonly largestLeverage: number;
  /** Residuals for the mean on the response's own scale; null on the natural scale. */
  readonly smearing: Float64Array | null;
  /** Variable of weights, or null. */
  readonly weights: string | null;
  /** By variable of numbers: its range over the rows fitted. */
  readonly ranges: ReadonlyMap<string, Range>;
}

export interface Range {
  readonly smallest: number;
  readonly largest: number;
}

/** The chosen model as predictions need it. */
export function predictorOf(chosen: Chosen, smearing: Float64Array | null): Predictor {
  const { fit, study, sample, spreads } = chosen;
  const needs = rowNeedsOf(chosen);
  const ranges = new Map<string, Range>();
  for (const name of [...needs.inputs.map((plan) => plan.name), ...needs.model]) {
    const spread = spreads.get(name);
    if (spread === undefined || sample.columns.get(name)?.kind !== 'number') continue;
    ranges.set(name, { smallest: spread.smallest, largest: spread.largest });
  }
  return {
    ...needs,
    response: fit.candidate.response,
    columns: fit.columns.map((column) => chosen.columns[column]!),
    estimates: fit.estimates,
    rootInverse: fit.rootInverse,
    s: chosen.s,
    covariance: chosen.covariance,
    degreesOfFreedom: chosen.covariance?.df ?? fit.degreesOfFreedom,
    largestLeverage: chosen.leverages.reduce((most, h) => Math.max(most, h), 0),
    smearing,
    weights: study.weights,
    ranges,
  };
}

/** What rows have to give for the chosen model. */
export function rowNeedsOf(chosen: Chosen): RowNeeds {
  const { study, sample } = chosen;
  const { derive } = study;
  const model = modelVariables(chosen);
  const resting = (names: readonly string[]) =>
    new Set(names.flatMap((name) => [...baseVariables(name, derive)]));
  const needed = resting(model);
  const forWeights = resting(study.weights === null ? [] : [study.weights]);
  const inputs = study.data.variables.filter((plan) => needed.has(plan.name));
  const levels = new Map<string, readonly string[]>();
  const flagTexts = new Map<string, readonly [string, string]>();
  for (const { name, levels: declared } of inputs) {
    const column = sample.columns.get(name);
    if (column?.kind === 'category') {
      const known = model.includes(name) ? presentLevels(column) : declared;
      if (known !== null) levels.set(name, known);
    }
    if (column?.kind === 'flag' && column.flagTexts !== undefined) flagTexts.set(name, column.flagTexts);
  }
  return {
    model,
    inputs,
    extras: study.data.variables.filter((plan) => forWeights.has(plan.name) && !needed.has(plan.name)),
    derive: derivationsUnder(study.weights === null ? model : [...model, study.weights], derive),
    levels,
    flagTexts,
  };
}

/** The variables of the chosen model's terms, each once, in order of first use. */
export function modelVariables(chosen: Chosen): string[] {
  return [
    ...new Set(
      chosen.fit.candidate.columns.flatMap((column) =>
        chosen.columns[column]!.pieces.map((piece) => piece.variable),
      ),
    ),
  ];
}

/** The derivations that names stand for, directly or through others, in order. */
function derivationsUnder(
  names: readonly string[],
  derive: readonly DerivationPlan[],
): readonly DerivationPlan[] {
  const used = new Set(names);
  // A derivation uses earlier ones only.
  for (const plan of [...derive].reverse()) {
    if (used.has(plan.name)) for (const name of namesIn(plan.expression)) used.add(name);
  }
  return derive.filter((plan) => used.has(plan.name));
}
