/** PROVISIONAL: to be generated from schemas/record.schema.json; names and shapes here are the contract. */

export interface Record_ {
  format: 'plumbrule-record/1';
  tool: { name: 'plumbrule'; version: string };
  study: {
    title: string;
    question: string | null;
    file: string;
    sha256: string;
    /** Every setting with a default, in force for this run. */
    settings: { key: string; value: string; written: boolean }[];
    caution: string | null;
    /** Confidence of coefficient intervals, and of prediction intervals. */
    confidence: number;
    prediction_interval: number;
    /** Formats to render, and the user's templates (relative to the study), by format. */
    report: { formats: ('html' | 'markdown')[]; templates: { html: string | null; markdown: string | null } };
  };
  data: {
    file: string;
    sha256: string;
    delimiter: string;
    encoding: 'utf-8' | 'latin-1';
    rows_read: number;
    rows_used: number;
    left_out: {
      because: string;
      kind: 'bad_value' | 'left_out' | 'missing' | 'undefined';
      rows: number;
      variable: string | null;
      missing_any: number | null;
    }[];
    columns_ignored: string[];
    bad_values: { row: number; variable: string; text: string; because: string }[];
    bad_value_count: number;
    /** ISO dates of the first and last row used, where the study declares a time variable. */
    time: { variable: string; first: string; last: string } | null;
    variables: RecordVariable[];
  };
  response: { variable: string; scale: string; unit: string | null; label: string };
  candidates: RecordCandidate[];
  /** Pairs in which the smaller's column space lies inside the larger's; see `partial_f_omitted`. */
  partial_f: {
    smaller: string;
    larger: string;
    statistic: number | null;
    df1: number;
    df2: number;
    p_value: number | null;
    decided: boolean;
  }[];
  /** A sentence where not every nested pair is listed, else null. */
  partial_f_omitted: string | null;
  selection: {
    rank_by: 'adjusted_r_squared' | 'aic' | 'aicc' | 'bic' | 'mallows_cp' | 'press' | 'partial_f';
    prefer_smaller_within: number;
    significance: number;
    /** The admission rules in force, one sentence each. */
    admission: string[];
    /** Best first; `difference` from the best value, never negative; null where the criterion is undefined. */
    ranking: { rank: number; candidate: string; value: number | null; difference: number | null }[];
    chosen: string | null;
    /** Why that one (or none), as sentences. */
    because: string;
  };
  /** Null where no candidate was admitted. */
  model: RecordModel | null;
  examination: RecordExamination | null;
  predictions: RecordPrediction[];
  prediction_total: {
    rows: number;
    estimate: number;
    lower: number;
    upper: number;
    mean: number | null;
  } | null;
  acceptance: { criterion: string; limit: string; value: number | string | null; passed: boolean }[];
  warnings: { about: string; text: string }[];
}

export interface RecordVariable {
  name: string;
  label: string;
  unit: string | null;
  type: 'number' | 'integer' | 'category' | 'flag' | 'date' | 'text' | 'identifier';
  /** The expression's text where derived, else null. */
  derived_from: string | null;
  /** How the study uses it: "response", "predictor", "weights", "row identity", "time order", "condition", "derivation", "declared only". */
  used_as: string[];
  /** Missing among the rows read. */
  missing: number;
  /** Over the rows used. Dates in days since 1970-01-01. Null where not numeric. */
  smallest: number | null;
  lower_quartile: number | null;
  median: number | null;
  mean: number | null;
  upper_quartile: number | null;
  largest: number | null;
  standard_deviation: number | null;
  /** Rows used per level of a category or flag, baseline first for a category. */
  levels: { level: string; rows: number }[] | null;
}

export interface RecordCoefficient {
  name: string;
  term: string;
  estimate: number;
  /** Null where there are no degrees of freedom or the fit is exact. */
  standard_error: number | null;
  t: number | null;
  p_value: number | null;
  lower: number | null;
  upper: number | null;
  /** Null for the intercept and for a model without one of at least two columns. */
  vif: number | null;
}

export interface RecordCandidate {
  name: string;
  /** Names of its terms, in order. */
  terms: string[];
  scale: string;
  intercept: boolean;
  rows: number;
  coefficient_count: number;
  r_squared: number | null;
  adjusted_r_squared: number | null;
  predicted_r_squared: number | null;
  residual_standard_error: number | null;
  residual_sum_of_squares: number;
  degrees_of_freedom: number;
  log_likelihood: number | null;
  aic: number | null;
  aicc: number | null;
  bic: number | null;
  mallows_cp: number | null;
  press: number | null;
  overall_f: { statistic: number | null; df1: number; df2: number; p_value: number | null } | null;
  largest_vif: number | null;
  condition_number: number | null;
  coefficients: RecordCoefficient[];
  /** Columns left out because they depend exactly on earlier ones: name and sentence. */
  dropped: { column: string; sentence: string }[];
  /** "extended", "refined" or "plain": the arithmetic of the fit. */
  arithmetic: 'extended' | 'refined' | 'plain';
  admitted: boolean;
  refused_because: string[];
}

/** The chosen model, complete enough to predict from without the data. */
export interface RecordModel {
  candidate: string;
  response: { variable: string; scale: string; lambda: number | null; unit: string | null; label: string };
  intercept: boolean;
  rows: number;
  degrees_of_freedom: number;
  residual_standard_error: number | null;
  /** Typical size of the response among the rows used, on its own scale. */
  response_mean: number;
  columns: {
    name: string;
    term: string | null;
    unit: string | null;
    pieces: {
      kind: string;
      variable: string;
      level?: string;
      to?: number;
      at?: number;
      side?: 'above' | 'below';
      knots?: number[];
      index?: number;
    }[];
    estimate: number;
    /** Mean of the column over the rows used. */
    mean: number;
  }[];
  /** (X′WX)⁻¹, symmetric, p × p, in the order of `columns`. */
  inverse: number[][];
  /** The mean of g⁻¹(fitted + e_i) needs the residuals: kept up to a limit as sorted quantiles, null on the natural scale. */
  smearing: number[] | null;
  largest_leverage: number;
  terms: RecordTerm[];
}

/** What one term of the chosen model says, on the response's fitted scale unless stated. */
export interface RecordTerm {
  name: string;
  kind: 'number' | 'flag' | 'category' | 'interaction' | 'polynomial' | 'power' | 'bend' | 'spline';
  variables: string[];
  columns: string[];
  joint_f: { statistic: number | null; df1: number; df2: number; p_value: number | null } | null;
  /** GVIF and GVIF^(1/(2·columns)); null as for `vif`. */
  generalised_vif: number | null;
  generalised_vif_per_column: number | null;
  /** The variable's typical step (lower to upper quartile; baseline to level) and what it goes with; one entry per level of a category. Empty for interactions. */
  typical_steps: {
    from: string;
    to: string;
    from_value: number | null;
    to_value: number | null;
    estimate: number;
    lower: number | null;
    upper: number | null;
  }[];
  /** The fitted relationship of all columns that depend on this term's variable alone, as a curve over the variable's range (≤ 61 points) with its confidence band, relative to the variable's mean/baseline; null for categories, flags and interactions. */
  curve: {
    variable: string;
    x: number[];
    y: number[];
    lower: (number | null)[];
    upper: (number | null)[];
  } | null;
  /** For an interaction: slope (or difference) of the first member at each level / at the quartiles of the other members. */
  slopes: {
    at: string;
    of: string;
    per: string | null;
    estimate: number;
    lower: number | null;
    upper: number | null;
  }[];
}

export interface RecordFinding {
  /** Stable name: "equal_spread", "independence", "influence" … */
  name: string;
  question: string;
  statistic: number | null;
  /** What the statistic is called, e.g. "Koenker's form of the Breusch–Pagan statistic". */
  statistic_name: string;
  df: number[];
  p_value: number | null;
  mark: string | null;
  verdict: string;
  /** 0 nothing to see, 1 worth a look, 2 take care before relying on it. */
  concern: 0 | 1 | 2;
  advice: string | null;
}

export interface RecordExamination {
  findings: RecordFinding[];
  /** The most influential rows, most influential first (at most 10). */
  influential_rows: {
    row: number;
    id: string | null;
    fitted: number;
    observed: number;
    standardised_residual: number | null;
    leverage: number;
    cooks_distance: number | null;
  }[];
  /** Counts over all rows. */
  counts: {
    rows: number;
    beyond_2: number;
    beyond_3: number;
    leverage_beyond_2p_over_n: number;
    leverage_beyond_3p_over_n: number;
  };
  /** Rows for the charts: all rows up to 2,000, else a fixed thinning that keeps the most extreme. Columnar, equal lengths, file order. */
  points: {
    thinned: boolean;
    row: number[];
    id: (string | null)[];
    fitted: number[];
    observed: number[];
    residual: number[];
    standardised_residual: (number | null)[];
    leverage: number[];
    cooks_distance: (number | null)[];
    /** Position in time order (1…n), null where no time is declared. */
    time_position: number[] | null;
    /** Values of the chosen model's variables, by name; a category gives level names. */
    values: { variable: string; numbers: number[] | null; texts: string[] | null }[];
  };
}

export interface RecordPrediction {
  label: string;
  values: { variable: string; value: number | string | boolean }[];
  /** On the response's own scale: the median g⁻¹(x′b) where the scale is not natural. */
  estimate: number;
  lower: number;
  upper: number;
  mean_lower: number;
  mean_upper: number;
  /** The mean on the own scale by smearing where the scale is not natural, else null. */
  mean: number | null;
  leverage: number;
  /** Each way in which the row lies outside the data, as a sentence. */
  outside: string[];
}
