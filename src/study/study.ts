import type { Expression } from '../expression/expression.ts';
import type { SourcePlace } from '../problem.ts';

/**
 * A study with every name resolved and every default filled in: what the later stages read.
 * What the analyst wrote (the YAML's own shape) is the generated type `StudyFile`.
 */
export interface Study {
  /** The study file's name as reports show it: its base name, never an absolute path. */
  readonly file: string;
  /** The folder that relative file names in the study start from. */
  readonly folder: string;
  /** SHA-256 of the study file's bytes, lower-case hexadecimal. */
  readonly sha256: string;
  readonly title: string;
  readonly question: string | null;
  readonly data: DataPlan;
  readonly derive: readonly DerivationPlan[];
  readonly leaveOut: readonly LeaveOutPlan[];
  readonly response: ResponsePlan;
  /** Name of the variable of weights, or null. */
  readonly weights: string | null;
  /** The variable for each of whose levels the study runs once; null or left out: it runs once, on all rows. */
  readonly repeatFor?: string | null;
  /** The named candidates, in order. */
  readonly candidates: readonly CandidatePlan[];
  /** Families of candidates that a search is to find, in order. */
  readonly families: readonly FamilyPlan[];
  readonly selection: SelectionPlan;
  readonly inference: InferencePlan;
  readonly examination: ExaminationPlan;
  readonly predict: PredictPlan;
  readonly acceptance: readonly AcceptancePlan[];
  readonly report: ReportPlan;
  /** Declared parameters with the values in force, in order of declaration. */
  readonly parameters: readonly ParameterPlan[];
  /** Every setting that has a default, in schema order, with whether the analyst wrote it. */
  readonly settings: readonly Setting[];
  /** The place of a value in the study file, by its path of keys and indexes; the nearest parent if absent. */
  readonly placeOf: (path: readonly (string | number)[]) => SourcePlace;
  /** The place of the key itself, for names that are keys. */
  readonly keyPlaceOf: (path: readonly (string | number)[]) => SourcePlace;
}

export interface Setting {
  /** Dotted path, for example `selection.prefer_smaller_within`. */
  readonly key: string;
  /** The value in force, as text. */
  readonly value: string;
  readonly written: boolean;
}

export interface ParameterPlan {
  readonly name: string;
  /** The value in force. */
  readonly value: string | number | boolean;
  readonly default: string | number | boolean;
  /** Whether the run was given the value; otherwise it is the default. */
  readonly given: boolean;
}

export interface DataPlan {
  /** As written, relative to the study file. */
  readonly file: string;
  readonly format: {
    /** null: find out from the data. */
    readonly delimiter: string | null;
    readonly decimalMark: '.' | ',';
    readonly encoding: 'utf-8' | 'latin-1' | null;
  };
  /** Cell texts read as missing in every column, compared after trimming. */
  readonly missing: readonly string[];
  readonly rowId: string | null;
  readonly time: string | null;
  readonly variables: readonly VariablePlan[];
  readonly onBadValue: 'stop' | 'set_missing' | 'leave_out_row';
}

export type VariableType = 'number' | 'integer' | 'category' | 'flag' | 'date' | 'text' | 'identifier';

export interface VariablePlan {
  readonly name: string;
  readonly type: VariableType;
  /** The column's header in the data file; the name itself unless `column` is written. */
  readonly column: string;
  readonly unit: string | null;
  readonly label: string | null;
  readonly atLeast: number | null;
  readonly atMost: number | null;
  /** Declared levels of a category in order, or null: take those in the data, sorted. */
  readonly levels: readonly string[] | null;
  /** Baseline of a category; null: the first level. */
  readonly baseline: string | null;
  /** The two texts of a flag: [coded 0, coded 1]; null: any of no/yes, false/true, 0/1 (any letter case). */
  readonly flagValues: readonly [string, string] | null;
  /** Pattern of a date made of YYYY MM DD hh mm ss and literal text; null: ISO 8601 date or date and time. */
  readonly pattern: string | null;
  /** Missing codes of this variable in addition to `data.missing`. */
  readonly missing: readonly string[];
}

export interface DerivationPlan {
  readonly name: string;
  readonly expression: Expression;
  readonly text: string;
  readonly unit: string | null;
  readonly label: string | null;
  /** What the expression yields: a number, a flag (a condition) or a date. */
  readonly type: 'number' | 'flag' | 'date';
}

export interface LeaveOutPlan {
  readonly where: Expression;
  readonly text: string;
  readonly because: string;
}

export type Scale =
  | { readonly kind: 'natural' }
  | { readonly kind: 'log' }
  | { readonly kind: 'sqrt' }
  | { readonly kind: 'reciprocal' }
  | { readonly kind: 'box_cox'; readonly lambda: number };

export interface ResponsePlan {
  readonly variable: string;
  readonly scale: Scale;
}

export type TermPlan =
  | { readonly kind: 'variable'; readonly variable: string }
  | { readonly kind: 'interaction'; readonly of: readonly TermPlan[] }
  | { readonly kind: 'polynomial'; readonly variable: string; readonly degree: number }
  | { readonly kind: 'power'; readonly variable: string; readonly to: number }
  /** max(0, x − at) for side above, max(0, at − x) for side below. */
  | {
      readonly kind: 'bend';
      readonly variable: string;
      readonly at: number;
      readonly side: 'above' | 'below';
    }
  /** Natural cubic spline; the first and last knots are the boundary knots: knots − 1 columns, the first is x. */
  | { readonly kind: 'spline'; readonly variable: string; readonly knots: readonly number[] };

export interface CandidatePlan {
  readonly name: string;
  readonly terms: readonly TermPlan[];
  /** The candidate's own response scale where it declares one, else the study's. */
  readonly scale: Scale;
  readonly intercept: boolean;
  /** Where it stands in the study file's list of candidates; left out: where it stands among the named ones. */
  readonly position?: number;
}

export interface FamilyTermPlan {
  readonly term: TermPlan;
  /** Every model of the family has it. */
  readonly always: boolean;
  /**
   * Terms of the family, by index, that a model must have with this one: all that it contains (no interaction or
   * higher power without its parts). Empty where the study does not ask for the hierarchy.
   */
  readonly needs: readonly number[];
  /** Its path in the study file. */
  readonly path: readonly (string | number)[];
}

interface AnyFamilyPlan {
  readonly name: string;
  /** Those that are always in first. No two have a column in common. */
  readonly terms: readonly FamilyTermPlan[];
  readonly hierarchy: boolean;
  readonly scale: Scale;
  readonly intercept: boolean;
  /** Where it stands in the study file's list of candidates. */
  readonly position: number;
}

/** All subsets of the terms, of which the best of each number of coefficients become candidates. */
export interface SubsetFamilyPlan extends AnyFamilyPlan {
  readonly kind: 'subsets';
  /** Terms of a model, those that are always in counted. */
  readonly atLeast: number;
  readonly atMost: number;
  /** How many models become candidates for each number of coefficients. */
  readonly keep: number;
}

/** Elimination from all terms, or selection from those that are always in, by p-values of partial F. */
export interface StepFamilyPlan extends AnyFamilyPlan {
  readonly kind: 'backward' | 'forward';
  /** A term whose p-value is above this leaves; null: none does. */
  readonly leaveAt: number | null;
  /** A term whose p-value is at or below this enters; null: none does. */
  readonly enterAt: number | null;
}

export type FamilyPlan = SubsetFamilyPlan | StepFamilyPlan;

export type RankBy =
  | 'adjusted_r_squared'
  | 'aic'
  | 'aicc'
  | 'bic'
  | 'mallows_cp'
  | 'press'
  | 'cross_validation'
  | 'partial_f';

export interface SelectionPlan {
  readonly rankBy: RankBy;
  readonly preferSmallerWithin: number;
  readonly significance: number;
  /** The fewest coefficients within one standard error of the best cross-validated error. */
  readonly oneStandardError: boolean;
  /** How candidates are cross-validated; null where they are not. Never null where that ranks them. */
  readonly validation: FoldPlan | null;
  /** Parts of the rows without which the whole choice is made again. */
  readonly honestError: FoldPlan | null;
  readonly holdOut: HoldOutPlan | null;
  readonly splitSample: SplitSamplePlan | null;
  readonly stability: StabilityPlan | null;
  /** Whether inference is also averaged over the admitted candidates. */
  readonly average: boolean;
  readonly admit: AdmitPlan;
}

/** Which rows are held out together, and what predicts them. */
export interface FoldPlan {
  readonly by: 'rows' | 'group' | 'time' | 'leave_one_out';
  /** Null: 10, or one for each group where there are fewer. */
  readonly folds: number | null;
  readonly repeats: number;
  readonly seed: number;
  /** The variable that groups rows where `by` is group, else null. */
  readonly group: string | null;
  /** Times that are never held out where `by` is time; null: half of them. */
  readonly start: number | null;
  /** Times predicted from each origin. */
  readonly horizon: number;
  /** Path in the study file, for places of problems. */
  readonly path: readonly (string | number)[];
}

/** Rows set aside before anything is fitted. */
export type HoldOutPlan =
  | { readonly kind: 'share'; readonly share: number; readonly seed: number }
  | { readonly kind: 'last'; readonly rows: number }
  | { readonly kind: 'where'; readonly where: Expression; readonly text: string };

export interface SplitSamplePlan {
  /** Of the rows that the choice is made on. */
  readonly share: number;
  readonly seed: number;
}

export interface StabilityPlan {
  readonly repetitions: number;
  readonly seed: number;
  readonly by: 'rows' | 'group' | 'blocks';
  /** The variable that groups rows where `by` is group, else null. */
  readonly group: string | null;
  /** Rows in a block; null: from the number of rows, or where blocks are not drawn. */
  readonly blockLength: number | null;
}

export interface AdmitPlan {
  readonly vif: { readonly atMost: number } | null;
  readonly pValue: { readonly atMost: number } | null;
  /** By the name of a term with one column, or of a single coefficient ("vessel Tern"). */
  readonly signs: ReadonlyMap<string, 'positive' | 'negative'>;
  readonly rowsPerCoefficient: { readonly atLeast: number } | null;
  readonly adjustedRSquared: { readonly atLeast: number } | null;
}

export interface InferencePlan {
  /** Of intervals for coefficients, between 0 and 1. */
  readonly confidence: number;
  /** What to do with a column that depends exactly on earlier ones: go on without it, or stop. */
  readonly dependentColumns: 'drop' | 'stop';
  readonly standardErrors: StandardErrorsPlan;
  readonly hypotheses: readonly HypothesisPlan[];
  /** How levels of a category are compared pair by pair. */
  readonly levelComparisons: 'holm' | 'tukey_kramer' | 'none';
  /** Intervals that hold for all coefficients together, beside each one's own. */
  readonly simultaneous: 'none' | 'bonferroni' | 'scheffe';
  /** Values at which slopes are given, by variable, ascending, each once; quartiles for the rest. */
  readonly slopesAt: ReadonlyMap<string, readonly number[]>;
}

/** Which covariance of the estimates is meant. */
export type StandardErrorsPlan =
  | { readonly kind: 'classical' | HeteroscedasticKind }
  | { readonly kind: 'clustered'; readonly by: string }
  | { readonly kind: 'hac'; readonly lags: number | 'auto' };

export type HeteroscedasticKind = 'hc0' | 'hc1' | 'hc2' | 'hc3' | 'hc4';

/** Equalities about coefficients of the chosen model that are tested at once. */
export interface HypothesisPlan {
  readonly name: string;
  /** One or more; more than one are tested jointly. */
  readonly equalities: readonly EqualityPlan[];
}

/** Σ multiplier · coefficient = value. */
export interface EqualityPlan {
  /** Multipliers by name of coefficient, in the order written; not all zero. */
  readonly combination: ReadonlyMap<string, number>;
  readonly equals: number;
  /** Path in the study file, for places of problems. */
  readonly path: readonly (string | number)[];
}

export interface ExaminationPlan {
  /** How many rows back in time neighbours are compared; null: found from the times. */
  readonly lags: number | null;
  /** Rows whose value is this or greater form the second part; null: not split. */
  readonly splitAt: SplitPlan | null;
  readonly bootstrap: BootstrapPlan | null;
}

export interface SplitPlan {
  readonly variable: string;
  /** As the column holds it: a number, days of a date, 1 of a flag. */
  readonly value: number;
  /** As it was written. */
  readonly text: string;
}

export interface BootstrapPlan {
  readonly repetitions: number;
  readonly seed: number;
  readonly by: 'rows' | 'residuals' | 'blocks';
  /** Rows in a block; null: from the number of rows, or where blocks are not drawn. */
  readonly blockLength: number | null;
}

export interface PredictPlan {
  readonly rows: readonly PredictRowPlan[];
  /** A CSV file of rows with the same contract as the data, relative to the study file, or null. */
  readonly file: string | null;
  /** Confidence of prediction intervals, between 0 and 1. */
  readonly interval: number;
  /** Whether to predict the total of all rows as well. */
  readonly total: boolean;
}

export interface PredictRowPlan {
  readonly label: string;
  readonly values: ReadonlyMap<string, number | string | boolean>;
  readonly place: SourcePlace;
}

/** A limit on a figure of the chosen model, or (`chosen`) on which candidate wins. */
export type AcceptancePlan =
  | {
      readonly criterion: AcceptanceFigure;
      readonly atLeast: number | null;
      readonly atMost: number | null;
    }
  | {
      /** The p-value of a diagnostic, or a coefficient of the chosen model. */
      readonly criterion: 'p_value' | 'coefficient';
      readonly of: string;
      readonly atLeast: number | null;
      readonly atMost: number | null;
    }
  | { readonly criterion: 'sign'; readonly of: string; readonly sign: 'positive' | 'negative' }
  /** Days from the newest row used to `on`, which is in days since 1970-01-01. */
  | {
      readonly criterion: 'age_of_newest_row';
      readonly on: number;
      readonly onText: string;
      readonly atMost: number;
    }
  | { readonly criterion: 'chosen'; readonly names: readonly string[] }
  | EarlierAcceptancePlan;

/** A limit that only an earlier record can judge. */
export interface EarlierAcceptancePlan {
  readonly criterion: 'coefficient_change' | 'new_rows_inside';
  /** The coefficient; null for the largest change and for the new rows. */
  readonly of: string | null;
  readonly atLeast: number | null;
  readonly atMost: number | null;
}

export type AcceptanceFigure =
  | 'r_squared'
  | 'adjusted_r_squared'
  | 'predicted_r_squared'
  | 'residual_standard_error'
  | 'largest_vif'
  | 'condition_number'
  | 'rows_used'
  | 'rows_lost_share'
  | 'rows_per_coefficient'
  | 'cv_rmse'
  | 'bias'
  | 'prediction_interval_width'
  | 'relative_interval_width';

/** Files of templates, relative to the study file; null for the shipped ones. */
export interface TemplateNames {
  readonly html: string | null;
  readonly markdown: string | null;
}

export interface ReportPlan {
  readonly formats: readonly ('html' | 'markdown')[];
  /** The user's own templates, relative to the study file, by format. */
  readonly templates: TemplateNames & { readonly comparison: TemplateNames };
  /** Whether the rows used are kept beside the record. */
  readonly keepSample: boolean;
  /** A sentence of the analyst's own for the cautions (the local code, who must review), or null. */
  readonly caution: string | null;
}
