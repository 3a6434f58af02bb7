import type { Design } from '../model/design.ts';
import { scaleName } from '../model/response-scale.ts';
import type { AveragedPrediction } from '../predict/average-predictions.ts';
import type { HoldOutTrial } from '../predict/hold-out.ts';
import type { Averaged } from '../select/average.ts';
import type { Folds } from '../select/folds.ts';
import type { ErrorFigures, HonestError } from '../select/honest-error.ts';
import type { ChoiceTrust } from '../select/question-choice.ts';
import type { Stability } from '../select/stability.ts';
import type { Validated } from '../select/validate-candidates.ts';
import type { HoldOutPlan, SelectionPlan, Study } from '../study/study.ts';
import type { RecordCandidate, StudyRecord } from './record.ts';

type Selection = StudyRecord['selection'];

/** What a run found about how far its choice can be trusted; null where the study does not ask. */
export interface SelectionFindings {
  readonly validated: Validated | null;
  readonly trust: ChoiceTrust | null;
  readonly averagedPredictions: readonly AveragedPrediction[];
  /** Null rows: none set aside. */
  readonly holdOut: { readonly rows: number; readonly trial: HoldOutTrial | null } | null;
  readonly split: { readonly choosing: number; readonly estimating: number } | null;
}

interface Named {
  readonly study: Study;
  readonly design: Design;
  readonly candidates: readonly RecordCandidate[];
  /** Whether every response on its own scale is above zero. */
  readonly positive: boolean;
}

/** The keys of `selection` that are there only where the study asks for them. */
export function describeSelection(
  found: SelectionFindings,
  named: Named,
  estimated: RecordCandidate | null,
): Partial<Selection> {
  const { selection, inference, predict } = named.study;
  const { validated, trust, holdOut, split } = found;
  return {
    ...(selection.oneStandardError ? { one_standard_error: true } : {}),
    ...(validated === null ? {} : { validation: validationOf(validated, named) }),
    ...(trust?.honest?.error == null
      ? {}
      : { honest_error: honestOf(trust.honest.folds, trust.honest.error) }),
    ...(trust?.stability == null ? {} : { stability: stabilityOf(trust.stability, selection, named.design) }),
    ...(trust?.averaged == null
      ? {}
      : {
          averaged: {
            ...averagedOf(trust.averaged, named),
            confidence: inference.confidence,
            prediction_interval: predict.interval,
            predictions: found.averagedPredictions.map((one) => ({ ...one })),
          },
        }),
    ...(holdOut === null ? {} : { hold_out: holdOutOf(holdOut, named) }),
    ...(split === null
      ? {}
      : {
          split_sample: {
            share: selection.splitSample!.share,
            seed: selection.splitSample!.seed,
            rows_choosing: split.choosing,
            rows_estimating: split.estimating,
            estimated,
          },
        }),
  };
}

/** What a reader must be warned of: a procedure that is no better than the mean of the response. */
export function choiceWarnings({ honest }: ChoiceTrust): StudyRecord['warnings'] {
  const error = honest?.error ?? null;
  if (error === null) return [];
  const { value, standardError } = error.gain;
  return value <= (standardError ?? 0) ? [{ about: 'the choice', text: error.sentence }] : [];
}

/** Which rows the choice and the estimates are from, where they differ; else nothing. */
export function splitSentence({ split }: SelectionFindings): string[] {
  return split === null
    ? []
    : [
        `The choice was made on ${split.choosing} rows; the chosen model is estimated from the other ${split.estimating}, which had no part in it.`,
      ];
}

/** Of one candidate; absent where candidates are not cross-validated. */
export function validationFigures(
  validated: Validated | null,
  index: number,
  positive: boolean,
): Pick<RecordCandidate, 'validation' | 'validation_omitted'> {
  if (validated === null) return {};
  const { figures, whyNot, meanResponse } = validated.validation;
  const own = figures[index] ?? null;
  const why = whyNot[index] ?? null;
  return {
    validation:
      own === null
        ? null
        : {
            rows: own.rows,
            mean_squared_error: own.meanSquaredError,
            root_mean_squared_error: Math.sqrt(own.meanSquaredError),
            standard_error: own.standardError,
            mean_error: own.meanError,
            ...percentages(own.meanSquaredError, own.meanError, meanResponse, positive),
          },
    validation_omitted: why === null ? null : `It has no cross-validated error, because ${why}.`,
  };
}

/**
 * CV(RMSE) and normalised mean bias error of rows that the model did not see: errors y − ŷ, divided by their number and not by n − p,
 * since they cost no degrees of freedom (ASHRAE Guideline 14 divides errors of the fitted rows by n − p).
 */
function percentages(
  meanSquaredError: number,
  meanError: number,
  meanResponse: number,
  positive: boolean,
): { cv_rmse_percent: number | null; mean_bias_percent: number | null } {
  return positive && meanResponse > 0
    ? {
        cv_rmse_percent: (100 * Math.sqrt(meanSquaredError)) / meanResponse,
        mean_bias_percent: (100 * meanError) / meanResponse,
      }
    : { cv_rmse_percent: null, mean_bias_percent: null };
}

function foldsOf({ plan, sets, count }: Folds) {
  const drawn = plan.by === 'rows' || plan.by === 'group';
  const timed = plan.by === 'time';
  return {
    by: plan.by,
    folds: count,
    repeats: sets.length,
    seed: drawn ? plan.seed : null,
    group: plan.group,
    start: timed ? plan.start : null,
    horizon: timed ? plan.horizon : null,
  };
}

function validationOf(
  { folds, validation }: Validated,
  { design, candidates }: Named,
): NonNullable<Selection['validation']> {
  return {
    ...foldsOf(folds),
    rows_left_out: validation.rowsLeftOut,
    mean_response: validation.meanResponse,
    losses: validation.losses.map((loss) => ({
      coefficient: loss.column === null ? null : design.columns[loss.column]!.name,
      folds: [...loss.folds],
      rows: loss.rows,
      candidates: loss.candidates.map((index) => candidates[index]!.name),
    })),
  };
}

function errorsOf({ meanSquaredError, standardError }: ErrorFigures) {
  return {
    mean_squared_error: meanSquaredError,
    root_mean_squared_error: Math.sqrt(meanSquaredError),
    standard_error: standardError,
  };
}

function honestOf(folds: Folds, error: HonestError): NonNullable<Selection['honest_error']> {
  return {
    ...foldsOf(folds),
    rows: error.rows,
    rows_left_out: error.rowsLeftOut,
    procedure: errorsOf(error.procedure),
    mean: errorsOf(error.mean),
    winner: error.winner === null ? null : errorsOf(error.winner),
    gain: { value: error.gain.value, standard_error: error.gain.standardError },
    choices: error.choices.map((one) => ({ ...one })),
    sentence: error.sentence,
  };
}

function stabilityOf(
  found: Stability,
  { stability: plan }: SelectionPlan,
  design: Design,
): NonNullable<Selection['stability']> {
  const share = (chosen: number) => chosen / found.repetitions;
  return {
    repetitions: found.repetitions,
    seed: plan!.seed,
    by: plan!.by,
    group: plan!.group,
    block_length: found.blockLength,
    units: found.units,
    none_admitted: found.noneAdmitted,
    candidates: found.candidates.map((one) => ({ ...one, share: share(one.chosen) })),
    terms: found.terms.map((one) => ({ ...one, share: share(one.chosen) })),
    coefficients: found.coefficients.map(({ column, responseColumn, chosen, positive, quantiles }) => ({
      name: design.columns[column]!.name,
      scale: scaleName(design.responses[responseColumn]!.scale),
      chosen,
      positive,
      q05: quantiles[0],
      q25: quantiles[1],
      median: quantiles[2],
      q75: quantiles[3],
      q95: quantiles[4],
    })),
  };
}

function averagedOf(found: Averaged, { design, candidates }: Named) {
  return {
    candidates: found.candidates.map(({ candidate, weight }) => ({
      candidate: candidates[candidate]!.name,
      weight,
    })),
    coefficients: found.coefficients.map((one) => ({
      name: design.columns[one.column]!.name,
      weight: one.weight,
      estimate: one.estimate,
      standard_error: one.standardError,
      lower: one.lower,
      upper: one.upper,
      estimate_where_included: one.whereIncluded.estimate,
      standard_error_where_included: one.whereIncluded.standardError,
    })),
  };
}

function holdOutOf(
  { rows, trial }: NonNullable<SelectionFindings['holdOut']>,
  { study, positive }: Named,
): NonNullable<Selection['hold_out']> {
  const tried = trial !== null && trial.meanSquaredError !== null;
  return {
    rule: holdOutRule(study.selection.holdOut!),
    rows,
    rows_not_predicted: trial?.rowsNotPredicted ?? null,
    mean_error: trial?.meanError ?? null,
    mean_squared_error: trial?.meanSquaredError ?? null,
    root_mean_squared_error: tried ? Math.sqrt(trial.meanSquaredError!) : null,
    ...(tried
      ? percentages(trial.meanSquaredError!, trial.meanError!, trial.meanResponse!, positive)
      : { cv_rmse_percent: null, mean_bias_percent: null }),
    interval: study.predict.interval,
    with_interval: trial?.withInterval ?? null,
    inside: trial?.inside ?? null,
    inside_lower: trial === null || trial.withInterval === 0 ? null : trial.insideInterval[0],
    inside_upper: trial === null || trial.withInterval === 0 ? null : trial.insideInterval[1],
  };
}

function holdOutRule(plan: HoldOutPlan): string {
  switch (plan.kind) {
    case 'share':
      return `a share of ${plan.share}, drawn with seed ${plan.seed}`;
    case 'last':
      return `the last ${plan.rows} in time`;
    case 'where':
      return plan.text;
  }
}
