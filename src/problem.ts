/**
 * The one type of problem. Every room reports what is wrong as values of this type and goes on
 * as far as it can; they are sorted and formatted once, in `cli/`.
 */

/** A stretch of text in the study file (or another source text). Lines and columns count from 1. */
export interface SourcePlace {
  readonly kind: 'source';
  readonly file: string;
  readonly line: number;
  readonly column: number;
  /** Number of characters to underline; 1 where unknown. */
  readonly length: number;
}

/** A cell, a row or a column of a data file. `row` is the line in the file as a person counts it. */
export interface CellPlace {
  readonly kind: 'cell';
  readonly file: string;
  readonly row?: number;
  readonly variable?: string;
}

/** A whole file. */
export interface FilePlace {
  readonly kind: 'file';
  readonly file: string;
}

/** The command line itself. */
export interface CommandPlace {
  readonly kind: 'command';
}

export type Place = SourcePlace | CellPlace | FilePlace | CommandPlace;

export type Severity = 'error' | 'warning';

/** Every code, by the room that reports it. Each one is provoked by a test. */
export const PROBLEM_CODES = [
  // study/
  'study_unreadable',
  'study_not_utf8',
  'yaml_syntax',
  'yaml_duplicate_key',
  'yaml_alias_limit',
  'key_unknown',
  'key_missing',
  'value_not_allowed',
  'name_unknown',
  'name_unused',
  'name_twice',
  'level_undeclared',
  'type_unsuited',
  'derivation_cycle',
  'candidate_twice',
  'hierarchy_impossible',
  'subsets_too_many',
  'term_without_parts',
  'criterion_across_scales',
  'limit_nonsense',
  'rules_contradict',
  'expression_syntax',
  'expression_name',
  'expression_type',
  'parameter_unknown',
  'parameter_value',
  // data/
  'data_unreadable',
  'data_changed',
  'data_empty',
  'data_no_rows',
  'header_twice',
  'column_missing',
  'row_ragged',
  'quote_unclosed',
  'cell_not_number',
  'cell_not_integer',
  'cell_not_date',
  'cell_not_flag',
  'cell_out_of_range',
  'cell_level_undeclared',
  'levels_alike',
  'cell_encoding',
  'row_id_twice',
  'row_id_missing',
  'problems_more',
  // prepare/
  'column_all_missing',
  'nothing_left',
  'hold_out_nothing',
  'split_too_small',
  'repeat_level_missing',
  'repeat_level_unknown',
  'weight_negative',
  // model/ and engine/
  'category_one_level',
  'predictor_constant',
  'columns_dependent',
  'columns_nearly_dependent',
  'response_constant',
  'fit_exact',
  'scale_undefined',
  'rows_too_few',
  'value_not_finite',
  'clusters_too_few',
  'lags_too_many',
  'standard_errors_costly',
  // select/
  'sign_name_unknown',
  'criterion_undefined',
  'folds_too_many',
  'origin_too_late',
  'fold_unpredictable',
  'search_unfinished',
  'search_empty',
  // examine/
  'hypothesis_name_unknown',
  // predict/
  'prediction_value_missing',
  'prediction_level_unknown',
  'prediction_outside',
  // record/, report/ and cli/
  'record_unreadable',
  'sample_unreadable',
  'records_unlike',
  'record_differs',
  'record_other_version',
  'record_cannot_predict',
  'predictions_none',
  'draft_impossible',
  'study_not_found',
  'run_failed',
  'earlier_run_gone',
  'template_unreadable',
  'template_broken',
  'output_unwritable',
  'command_unusable',
] as const;

export type ProblemCode = (typeof PROBLEM_CODES)[number];

export interface Problem {
  readonly code: ProblemCode;
  readonly severity: Severity;
  readonly place: Place;
  /** What is wrong, as one sentence that ends with a full stop. */
  readonly message: string;
  /** What to do about it, as a sentence: "Did you mean headwind?" */
  readonly hint?: string;
}

/** Stages report through this and go on. */
export type Report = (problem: Problem) => void;

/** Whether any of the problems keeps the study, the data or the command line from being used. */
export function hasError(problems: readonly Problem[]): boolean {
  return problems.some(({ severity }) => severity === 'error');
}

/** Thrown only at the public edge, when a stage cannot go on; carries everything found so far. */
export class Unusable extends Error {
  readonly problems: readonly Problem[];
  constructor(problems: readonly Problem[]) {
    super(problems[0]?.message ?? 'The study cannot be used.');
    this.name = 'Unusable';
    this.problems = problems;
  }
}
