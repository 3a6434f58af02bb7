// Generated from schemas/record.schema.json by schemas/generate.ts. Change the schema, then: npx tsx schemas/generate.ts

/**
 * The record of one run of a study (record.json): what was declared, read, tried, chosen, found and predicted. The same study, data and version of the program give the same bytes. Later versions may add keys; a program that reads records should pass over those that it does not know.
 */
export interface StudyRecord {
  /**
   * Name and version of this format.
   */
  format: 'plumbrule-record/1';
  /**
   * The program that wrote the record.
   */
  tool: {
    /**
     * Its name.
     */
    name: 'plumbrule';
    /**
     * Its version.
     */
    version: string;
  };
  /**
   * The study as declared.
   */
  study: {
    /**
     * Its title.
     */
    title: string;
    /**
     * The question that it answers; null where none is written.
     */
    question: string | null;
    /**
     * The study file's base name.
     */
    file: string;
    /**
     * SHA-256 of the study file's bytes.
     */
    sha256: string;
    /**
     * Every setting that has a default, in force for this run.
     *
     * Items: One setting.
     */
    settings: {
      /**
       * Its dotted path in the study file.
       */
      key: string;
      /**
       * The value in force.
       */
      value: string;
      /**
       * Whether the study writes it; otherwise it is the default.
       */
      written: boolean;
    }[];
    /**
     * The study's parameters with the values of this run, in order of declaration; left out where it declares none.
     *
     * Items: One parameter.
     */
    parameters?: {
      /**
       * Its name.
       */
      name: string;
      /**
       * The value in force.
       */
      value: string | number | boolean;
      /**
       * Its default in the study file.
       */
      default: string | number | boolean;
      /**
       * Whether the run was given the value; otherwise it is the default.
       */
      given: boolean;
    }[];
    /**
     * The analyst's own sentence for the cautions.
     */
    caution: string | null;
    /**
     * Confidence of the intervals of coefficients.
     */
    confidence: number;
    /**
     * Confidence of the intervals of predictions.
     */
    prediction_interval: number;
    /**
     * What the study asks to be rendered.
     */
    report: {
      /**
       * Formats of the report.
       */
      formats: ('html' | 'markdown')[];
      /**
       * The user's own templates, relative to the study file; null for the built-in one.
       */
      templates: {
        /**
         * For HTML.
         */
        html: string | null;
        /**
         * For Markdown.
         */
        markdown: string | null;
        /**
         * Those for what is different from an earlier record; left out where the study names none.
         */
        comparison?: {
          /**
           * For HTML.
           */
          html: string | null;
          /**
           * For Markdown.
           */
          markdown: string | null;
        };
      };
    };
  };
  /**
   * The data as read.
   */
  data: {
    /**
     * The data file as the study names it.
     */
    file: string;
    /**
     * SHA-256 of the data file's bytes.
     */
    sha256: string;
    /**
     * The delimiter used between cells.
     */
    delimiter: string;
    /**
     * The encoding of the text.
     */
    encoding: 'utf-8' | 'latin-1';
    /**
     * The level whose rows this run has, where the study repeats for a variable; absent or null otherwise.
     */
    repeat?: {
      /**
       * The variable.
       */
      variable: string;
      /**
       * Its level, as text.
       */
      level: string;
    } | null;
    /**
     * Rows in the file, the header not counted; those of the level where the study repeats.
     */
    rows_read: number;
    /**
     * Rows that every candidate is fitted on.
     */
    rows_used: number;
    /**
     * Every row read but not used, under exactly one reason, in the order in which the reasons were applied.
     *
     * Items: One reason.
     */
    left_out: {
      /**
       * The reason, for people.
       */
      because: string;
      /**
       * Its kind.
       */
      kind: 'bad_value' | 'left_out' | 'missing' | 'undefined' | 'held_out';
      /**
       * Rows counted under it.
       */
      rows: number;
      /**
       * For missing values: the variable that is missing first, in order of declaration.
       */
      variable: string | null;
      /**
       * For missing values: all remaining rows in which that variable is missing.
       */
      missing_any: number | null;
    }[];
    /**
     * Headers that the study does not declare, in file order.
     */
    columns_ignored: string[];
    /**
     * The first cells that break the contract, in file order; where there are more, the first of each text of a variable comes before repetitions.
     *
     * Items: One cell.
     */
    bad_values: {
      /**
       * Line in the data file as a person counts it.
       */
      row: number;
      /**
       * The variable.
       */
      variable: string;
      /**
       * The cell's text.
       */
      text: string;
      /**
       * What is wrong with it.
       */
      because: string;
    }[];
    /**
     * All cells that break the contract.
     */
    bad_value_count: number;
    /**
     * First and last of the rows used, where the study declares a time variable; null otherwise.
     */
    time: {
      /**
       * The time variable.
       */
      variable: string;
      /**
       * ISO date of the first row used.
       */
      first: string;
      /**
       * ISO date of the last row used.
       */
      last: string;
    } | null;
    /**
     * The rows used, kept in a file beside the record: one row a line in file order, with its line in the data file, its identity where the study declares one, and the declared variables that the study fits with; dates as days since 1970-01-01, flags as 0 and 1. Null where the study declines it; records of earlier versions have no such key.
     */
    sample?: {
      /**
       * The file's name.
       */
      file: string;
      /**
       * SHA-256 of its text, uncompressed: compression may differ between machines.
       */
      sha256: string;
    } | null;
    /**
     * Declared and derived variables, in order.
     */
    variables: RecordVariable[];
  };
  /**
   * The response that the study asks about.
   */
  response: {
    /**
     * Its name.
     */
    variable: string;
    /**
     * The study's scale for it; a candidate may have its own.
     */
    scale: string;
    /**
     * Its unit.
     */
    unit: string | null;
    /**
     * Its label for people.
     */
    label: string;
  };
  /**
   * Every candidate, in the order declared.
   */
  candidates: RecordCandidate[];
  /**
   * Partial F tests of pairs of candidates in which the column space of one lies inside the other's.
   *
   * Items: One pair.
   */
  partial_f: {
    /**
     * Name of the smaller candidate.
     */
    smaller: string;
    /**
     * Name of the larger candidate.
     */
    larger: string;
    /**
     * The F statistic; null where it is not defined.
     */
    statistic: number | null;
    /**
     * Degrees of freedom of the numerator.
     */
    df1: number;
    /**
     * Degrees of freedom of the denominator.
     */
    df2: number;
    /**
     * Upper tail probability of the statistic; null with it.
     */
    p_value: number | null;
    /**
     * Whether the choice rests on it.
     */
    decided: boolean;
  }[];
  /**
   * Why not every nested pair is listed, as a sentence; null where all are.
   */
  partial_f_omitted: string | null;
  /**
   * What the searches of candidate families found, in the order declared; there only where the study declares families. The models found are among the candidates.
   */
  families?: RecordFamily[];
  /**
   * The declared rule and what it chose.
   */
  selection: {
    /**
     * The criterion that ranks.
     */
    rank_by:
      | 'adjusted_r_squared'
      | 'aic'
      | 'aicc'
      | 'bic'
      | 'mallows_cp'
      | 'press'
      | 'cross_validation'
      | 'partial_f';
    /**
     * Candidates within this much of the best count as equal; the fewest coefficients win.
     */
    prefer_smaller_within: number;
    /**
     * Significance for partial F.
     */
    significance: number;
    /**
     * The admission rules in force, one sentence each.
     */
    admission: string[];
    /**
     * Candidates, best first.
     *
     * Items: One place.
     */
    ranking: {
      /**
       * Place, from 1.
       */
      rank: number;
      /**
       * The candidate's name.
       */
      candidate: string;
      /**
       * The criterion's value; null where it is not defined.
       */
      value: number | null;
      /**
       * Distance from the best value; null with it.
       */
      difference: number | null;
      /**
       * Weight of evidence among all candidates with a value, under an information criterion; null under others.
       */
      evidence?: number | null;
    }[];
    /**
     * Name of the candidate chosen; null where none was admitted.
     */
    chosen: string | null;
    /**
     * Why that one, or none, in sentences.
     */
    because: string;
    /**
     * How many models the choice was made among, counting every subset that a search covers; there only where the study declares families. P-values and intervals of the chosen model do not allow for them.
     */
    models_looked_at?: number;
    /**
     * Whether the fewest coefficients within one standard error of the best cross-validated error win; absent where not.
     */
    one_standard_error?: boolean;
    /**
     * How candidates were cross-validated; absent where they are not.
     */
    validation?: {
      /**
       * What was held out.
       */
      by: 'rows' | 'group' | 'time' | 'leave_one_out';
      /**
       * Parts held out in turn; rows where they were held out one at a time.
       */
      folds: number;
      /**
       * How often the parts were drawn.
       */
      repeats: number;
      /**
       * Seed of the draw; null where nothing was drawn.
       */
      seed: number | null;
      /**
       * The variable that groups rows; null where none does.
       */
      group: string | null;
      /**
       * Distinct times that were never held out; null where by is not time.
       */
      start: number | null;
      /**
       * Distinct times predicted from each origin; null where by is not time.
       */
      horizon: number | null;
      /**
       * Held-out rows that a candidate could not predict from the others and that count in no candidate's figures, each repeat counted.
       */
      rows_left_out: number;
      /**
       * Mean of the response over the held-out rows.
       */
      mean_response: number;
      /**
       * Coefficients that could not be estimated without a fold.
       *
       * Items: One.
       */
      losses: {
        /**
         * Its name; null where a row is fitted by itself alone.
         */
        coefficient: string | null;
        /**
         * Names of the folds.
         */
        folds: string[];
        /**
         * Held-out rows that could therefore not be predicted.
         */
        rows: number;
        /**
         * Names of the candidates that have it.
         */
        candidates: string[];
      }[];
    };
    /**
     * The error of the whole procedure: the choice made again without each fold, what it chose held against the fold. Absent where not asked for.
     */
    honest_error?: {
      /**
       * What was held out.
       */
      by: 'rows' | 'group' | 'time' | 'leave_one_out';
      /**
       * Parts held out in turn; rows where they were held out one at a time.
       */
      folds: number;
      /**
       * How often the parts were drawn.
       */
      repeats: number;
      /**
       * Seed of the draw; null where nothing was drawn.
       */
      seed: number | null;
      /**
       * The variable that groups rows; null where none does.
       */
      group: string | null;
      /**
       * Distinct times that were never held out; null where by is not time.
       */
      start: number | null;
      /**
       * Distinct times predicted from each origin; null where by is not time.
       */
      horizon: number | null;
      /**
       * Held-out rows predicted, each repeat counted.
       */
      rows: number;
      /**
       * Held-out rows that could not be predicted from the others, and are in none of the figures.
       */
      rows_left_out: number;
      /**
       * Of choosing and fitting.
       */
      procedure: {
        /**
         * Σ w (y − ŷ)²/Σ w over the held-out rows.
         */
        mean_squared_error: number;
        /**
         * Its root, in units of the response.
         */
        root_mean_squared_error: number;
        /**
         * Standard error of the mean squared error over the folds; null with fewer than two.
         */
        standard_error: number | null;
      };
      /**
       * Of predicting the mean of the other rows.
       */
      mean: {
        /**
         * Σ w (y − ŷ)²/Σ w over the held-out rows.
         */
        mean_squared_error: number;
        /**
         * Its root, in units of the response.
         */
        root_mean_squared_error: number;
        /**
         * Standard error of the mean squared error over the folds; null with fewer than two.
         */
        standard_error: number | null;
      };
      /**
       * Of the candidate chosen from all rows, in the same folds: flattered by its choice. Null where none was chosen.
       */
      winner: {
        /**
         * Σ w (y − ŷ)²/Σ w over the held-out rows.
         */
        mean_squared_error: number;
        /**
         * Its root, in units of the response.
         */
        root_mean_squared_error: number;
        /**
         * Standard error of the mean squared error over the folds; null with fewer than two.
         */
        standard_error: number | null;
      } | null;
      /**
       * Mean squared error of the mean less that of the procedure, fold by fold.
       */
      gain: {
        /**
         * The difference.
         */
        value: number;
        /**
         * Its standard error over the folds; null with fewer than two.
         */
        standard_error: number | null;
      };
      /**
       * How often each candidate was chosen, most often first.
       *
       * Items: One.
       */
      choices: {
        /**
         * Its name; null where none was admitted and the mean was predicted.
         */
        candidate: string | null;
        /**
         * Folds without which it was chosen.
         */
        folds: number;
      }[];
      /**
       * What the figures say.
       */
      sentence: string;
    };
    /**
     * How often what was chosen from rows drawn anew with replacement. Absent where not asked for.
     */
    stability?: {
      /**
       * Times that rows were drawn.
       */
      repetitions: number;
      /**
       * Seed of the draws.
       */
      seed: number;
      /**
       * What was drawn.
       */
      by: 'rows' | 'group' | 'blocks';
      /**
       * The variable that groups rows; null where none does.
       */
      group: string | null;
      /**
       * Rows in a block; null where blocks were not drawn.
       */
      block_length: number | null;
      /**
       * Rows, groups or blocks drawn from.
       */
      units: number;
      /**
       * Repetitions in which no candidate was admitted.
       */
      none_admitted: number;
      /**
       * Every candidate that was chosen, most often first.
       *
       * Items: One.
       */
      candidates: {
        /**
         * Its name.
         */
        candidate: string;
        /**
         * Repetitions in which it was chosen.
         */
        chosen: number;
        /**
         * As a share of all repetitions.
         */
        share: number;
      }[];
      /**
       * Every term of a chosen candidate, most often first.
       *
       * Items: One.
       */
      terms: {
        /**
         * Its name.
         */
        term: string;
        /**
         * Repetitions in which the chosen candidate has it.
         */
        chosen: number;
        /**
         * As a share of all repetitions.
         */
        share: number;
      }[];
      /**
       * Spread of each coefficient over the repetitions in which the chosen candidate has it.
       *
       * Items: One.
       */
      coefficients: {
        /**
         * Its name.
         */
        name: string;
        /**
         * The response's scale that it belongs to.
         */
        scale: string;
        /**
         * Repetitions in which the chosen candidate has it.
         */
        chosen: number;
        /**
         * Of these, those in which it is above zero.
         */
        positive: number;
        /**
         * Quantile at 0.05.
         */
        q05: number;
        /**
         * Lower quartile.
         */
        q25: number;
        /**
         * Median.
         */
        median: number;
        /**
         * Upper quartile.
         */
        q75: number;
        /**
         * Quantile at 0.95.
         */
        q95: number;
      }[];
    };
    /**
     * Inference averaged over the admitted candidates by their weights of evidence (Burnham & Anderson 2002). Absent where not asked for or none is admitted.
     */
    averaged?: {
      /**
       * What is averaged, best first.
       *
       * Items: One.
       */
      candidates: {
        /**
         * Its name.
         */
        candidate: string;
        /**
         * Weight of evidence among the admitted ones.
         */
        weight: number;
      }[];
      /**
       * Confidence of the coefficients' intervals.
       */
      confidence: number;
      /**
       * Every coefficient of one of them.
       *
       * Items: One.
       */
      coefficients: {
        /**
         * Its name.
         */
        name: string;
        /**
         * Weight of the candidates that have it.
         */
        weight: number;
        /**
         * Over all candidates, 0 in those without it.
         */
        estimate: number;
        /**
         * Unconditional standard error: Σ w √(variance + (estimate − average)²).
         */
        standard_error: number;
        /**
         * Lower end of its interval.
         */
        lower: number;
        /**
         * Upper end.
         */
        upper: number;
        /**
         * Over the candidates that have it.
         */
        estimate_where_included: number;
        /**
         * Its unconditional standard error.
         */
        standard_error_where_included: number;
      }[];
      /**
       * Confidence of the predictions' intervals.
       */
      prediction_interval: number;
      /**
       * The mean at each row that the study states (the median where the scale is not natural).
       *
       * Items: One.
       */
      predictions: {
        /**
         * The row's label.
         */
        label: string;
        /**
         * On the response's own scale.
         */
        estimate: number;
        /**
         * Lower end of its interval; null where it has none.
         */
        lower: number | null;
        /**
         * Upper end; null where it has none.
         */
        upper: number | null;
      }[];
    };
    /**
     * The chosen model tried once on the rows that were set aside. Absent where none were; null figures where none could be predicted or none was chosen.
     */
    hold_out?: {
      /**
       * How the rows were set aside.
       */
      rule: string;
      /**
       * Rows set aside.
       */
      rows: number;
      /**
       * Of these, rows that the chosen model cannot predict; null where none was chosen.
       */
      rows_not_predicted: number | null;
      /**
       * Σ w (y − ŷ)/Σ w: positive where the model predicts too little.
       */
      mean_error: number | null;
      /**
       * Σ w (y − ŷ)²/Σ w.
       */
      mean_squared_error: number | null;
      /**
       * Its root, in units of the response.
       */
      root_mean_squared_error: number | null;
      /**
       * CV(RMSE): 100 × root mean squared error/mean response, in per cent; null where the response is not positive throughout.
       */
      cv_rmse_percent: number | null;
      /**
       * Normalised mean bias error: 100 × mean error/mean response, in per cent; null likewise.
       */
      mean_bias_percent: number | null;
      /**
       * Confidence of the prediction intervals.
       */
      interval: number;
      /**
       * Rows that have a prediction interval; null where none was chosen.
       */
      with_interval: number | null;
      /**
       * Of these, rows whose response lies inside; null likewise.
       */
      inside: number | null;
      /**
       * 95 % interval for the share inside, lower end (Clopper & Pearson 1934); null likewise.
       */
      inside_lower: number | null;
      /**
       * Upper end.
       */
      inside_upper: number | null;
    };
    /**
     * Where the choice is made on one part of the rows and the chosen model estimated on the other: candidates and ranking are of the first part, model, examination and predictions of the second. Absent where not.
     */
    split_sample?: {
      /**
       * Share of the rows for choosing.
       */
      share: number;
      /**
       * Seed of the draw.
       */
      seed: number;
      /**
       * Rows that the choice was made on.
       */
      rows_choosing: number;
      /**
       * Rows that the chosen model is estimated from.
       */
      rows_estimating: number;
      /**
       * The chosen candidate as estimated on the second part; null where none was chosen.
       */
      estimated: RecordCandidate | null;
    };
  };
  /**
   * The chosen model; null where no candidate was admitted.
   */
  model: RecordModel | null;
  /**
   * What was found on examining it; null where no candidate was admitted.
   */
  examination: RecordExamination | null;
  /**
   * The predictions that the study asks for.
   */
  predictions: RecordPrediction[];
  /**
   * Prediction of the total of all predicted rows, on the response's own scale; null where it is not asked for.
   */
  prediction_total: {
    /**
     * Rows summed.
     */
    rows: number;
    /**
     * The total of their estimates.
     */
    estimate: number;
    /**
     * Lower end of its interval; null where the model fits exactly.
     */
    lower: number | null;
    /**
     * Upper end of its interval; null likewise.
     */
    upper: number | null;
    /**
     * The total of their means where the scale is not natural, else null.
     */
    mean: number | null;
  } | null;
  /**
   * The study's acceptance criteria, held against the chosen model.
   *
   * Items: One criterion.
   */
  acceptance: {
    /**
     * The figure, or "chosen".
     */
    criterion: string;
    /**
     * What it is a figure of: the coefficient, or the question put to the model; left out for figures of the model as a whole.
     */
    of?: string;
    /**
     * The limit, for people.
     */
    limit: string;
    /**
     * The value found; null where there is none.
     */
    value: number | string | null;
    /**
     * Whether the limit is kept.
     */
    passed: boolean;
  }[];
  /**
   * The study's acceptance criteria that only an earlier record can judge; a comparison holds what came of them, since a record does not depend on another. Left out where the study declares none.
   */
  acceptance_against_earlier?: RecordEarlierCriterion[];
  /**
   * What to know before relying on the results, in the order found.
   *
   * Items: One warning.
   */
  warnings: {
    /**
     * What it is about.
     */
    about: string;
    /**
     * The warning, as sentences.
     */
    text: string;
  }[];
}
/**
 * One declared or derived variable: what it is, how the study uses it, and its values over the rows used.
 */
export interface RecordVariable {
  /**
   * Its name in the study.
   */
  name: string;
  /**
   * Its label for people; the name where the study gives none.
   */
  label: string;
  /**
   * Its unit as the study writes it.
   */
  unit: string | null;
  /**
   * Its type.
   */
  type: 'number' | 'integer' | 'category' | 'flag' | 'date' | 'text' | 'identifier';
  /**
   * The expression that it is derived by; null for a variable read from the data.
   */
  derived_from: string | null;
  /**
   * How the study uses it: "response", "predictor", "weights", "row identity", "time order", "condition", "derivation" or "declared only".
   */
  used_as: string[];
  /**
   * Rows in which it is missing, among the rows read.
   */
  missing: number;
  /**
   * Smallest value over the rows used. Dates are days since 1970-01-01. Null where the variable is not numeric; so for the six figures that follow.
   */
  smallest: number | null;
  /**
   * Value below which a quarter of the rows used lie.
   */
  lower_quartile: number | null;
  /**
   * Middle value of the rows used.
   */
  median: number | null;
  /**
   * Mean over the rows used.
   */
  mean: number | null;
  /**
   * Value below which three quarters of the rows used lie.
   */
  upper_quartile: number | null;
  /**
   * Largest value over the rows used.
   */
  largest: number | null;
  /**
   * Standard deviation over the rows used, with divisor n − 1.
   */
  standard_deviation: number | null;
  /**
   * Rows used per level of a category (baseline first) or flag; null for the rest.
   */
  levels:
    | {
        /**
         * The level's text.
         */
        level: string;
        /**
         * Rows used that have it.
         */
        rows: number;
      }[]
    | null;
}
/**
 * One candidate, fitted on the common rows.
 */
export interface RecordCandidate {
  /**
   * Its name in the study.
   */
  name: string;
  /**
   * Names of its terms, in the order declared.
   */
  terms: string[];
  /**
   * Scale on which its response is fitted: "natural", "log", "sqrt", "reciprocal" or "box_cox" with its λ.
   */
  scale: string;
  /**
   * Whether it has an intercept.
   */
  intercept: boolean;
  /**
   * n: the rows fitted.
   */
  rows: number;
  /**
   * p: columns of the design that were kept, the intercept included.
   */
  coefficient_count: number;
  /**
   * R² = 1 − RSS/TSS; TSS about the mean with an intercept, about zero without one. Null where the response does not vary.
   */
  r_squared: number | null;
  /**
   * R² adjusted for the number of coefficients; null where there are no degrees of freedom.
   */
  adjusted_r_squared: number | null;
  /**
   * 1 − PRESS/TSS; null where PRESS is.
   */
  predicted_r_squared: number | null;
  /**
   * s = √(RSS/(n − p)), in units of the response's scale; null where there are no degrees of freedom.
   */
  residual_standard_error: number | null;
  /**
   * RSS, weighted where the study has weights.
   */
  residual_sum_of_squares: number;
  /**
   * n − p.
   */
  degrees_of_freedom: number;
  /**
   * Gaussian log-likelihood with every constant, the weights and the Jacobian of the response's scale; null where RSS is 0.
   */
  log_likelihood: number | null;
  /**
   * Akaike's information criterion, σ² counted as a parameter; null with the log-likelihood.
   */
  aic: number | null;
  /**
   * AIC corrected for small samples; null where it is not defined.
   */
  aicc: number | null;
  /**
   * Bayesian information criterion; null with the log-likelihood.
   */
  bic: number | null;
  /**
   * Mallows' Cp against the union of all candidates' terms; null where that union leaves no degrees of freedom.
   */
  mallows_cp: number | null;
  /**
   * PRESS: the sum of squared errors of each row predicted from all the others; null where it was not worked out or a leverage is 1.
   */
  press: number | null;
  /**
   * Overall F test against the intercept alone (against nothing without an intercept); null where it has no other column.
   */
  overall_f: {
    /**
     * The F statistic; null where it is not defined (an exact fit, no degrees of freedom).
     */
    statistic: number | null;
    /**
     * Degrees of freedom of the numerator.
     */
    df1: number;
    /**
     * Degrees of freedom of the denominator.
     */
    df2: number;
    /**
     * Upper tail probability of the statistic; null with it.
     */
    p_value: number | null;
  } | null;
  /**
   * Largest variance inflation factor of its columns.
   */
  largest_vif: number | null;
  /**
   * Largest condition index: columns scaled to unit length, not centred.
   */
  condition_number: number | null;
  /**
   * Its coefficients in the order of its columns.
   */
  coefficients: RecordCoefficient[];
  /**
   * Columns left out because they depend exactly on earlier ones.
   *
   * Items: One column.
   */
  dropped: {
    /**
     * The column's name.
     */
    column: string;
    /**
     * How it depends on the others, as a sentence.
     */
    sentence: string;
  }[];
  /**
   * How the numbers were computed: the factor in extended precision, in double precision with refined estimates, or in plain double precision.
   */
  arithmetic: 'extended' | 'refined' | 'plain';
  /**
   * Whether it passed every admission rule.
   */
  admitted: boolean;
  /**
   * Each rule that it broke, as a sentence; empty where admitted.
   */
  refused_because: string[];
  /**
   * Errors on rows that were held out, on the response's own scale; absent where candidates are not cross-validated, null where it has none.
   */
  validation?: {
    /**
     * Held-out rows predicted, each repeat counted.
     */
    rows: number;
    /**
     * Σ w (y − ŷ)²/Σ w.
     */
    mean_squared_error: number;
    /**
     * Its root, in units of the response.
     */
    root_mean_squared_error: number;
    /**
     * Standard error of the mean squared error over the folds; null with fewer than two.
     */
    standard_error: number | null;
    /**
     * Σ w (y − ŷ)/Σ w: positive where the candidate predicts too little.
     */
    mean_error: number;
    /**
     * CV(RMSE): 100 × root mean squared error/mean response, in per cent; null where the response is not positive throughout.
     */
    cv_rmse_percent: number | null;
    /**
     * Normalised mean bias error: 100 × mean error/mean response, in per cent; null likewise.
     */
    mean_bias_percent: number | null;
  } | null;
  /**
   * Why it has no cross-validated error, as a sentence; null where it has, absent where candidates are not cross-validated.
   */
  validation_omitted?: string | null;
}
/**
 * One column of a candidate's design with its estimate, on the candidate's response scale.
 */
export interface RecordCoefficient {
  /**
   * The column's name, for example "cargo × vessel Tern"; "intercept" for the constant.
   */
  name: string;
  /**
   * Name of the term that the column belongs to; "intercept" for the constant.
   */
  term: string;
  /**
   * The estimated coefficient.
   */
  estimate: number;
  /**
   * Its standard error, by the declared covariance; null where there are no degrees of freedom, the fit is exact or it was not worked out for a candidate not chosen; so for the four figures that depend on it.
   */
  standard_error: number | null;
  /**
   * Estimate divided by standard error.
   */
  t: number | null;
  /**
   * Two-sided p-value of t, on the degrees of freedom of the declared standard errors.
   */
  p_value: number | null;
  /**
   * Lower end of its interval at the study's confidence.
   */
  lower: number | null;
  /**
   * Upper end of its interval at the study's confidence.
   */
  upper: number | null;
  /**
   * Variance inflation factor; null for the intercept, and in a model with fewer than two other columns.
   */
  vif: number | null;
}
/**
 * One family of candidates and what its search found.
 */
export interface RecordFamily {
  /**
   * Its name.
   */
  name: string;
  /**
   * All subsets, backward elimination or forward selection.
   */
  kind: 'subsets' | 'backward' | 'forward';
  /**
   * Its terms, those that every model has first.
   *
   * Items: One term.
   */
  terms: {
    /**
     * Its name.
     */
    name: string;
    /**
     * Whether every model has it.
     */
    always: boolean;
  }[];
  /**
   * Whether models have an interaction or a higher power only with all that it contains.
   */
  hierarchy: boolean;
  /**
   * Fewest terms of a subset; null for elimination and selection.
   */
  at_least: number | null;
  /**
   * Most terms of a subset; null for elimination and selection.
   */
  at_most: number | null;
  /**
   * Models kept for each number of coefficients; null for elimination and selection.
   */
  keep: number | null;
  /**
   * The p-value above which a term leaves; null where none does.
   */
  leave_at: number | null;
  /**
   * The p-value at or below which a term enters; null where none does.
   */
  enter_at: number | null;
  /**
   * Models that the search covers: every subset within the limits, or those fitted on the way.
   */
  searched: number;
  /**
   * Whether they were counted; otherwise the number is an upper bound.
   */
  searched_exactly: boolean;
  /**
   * Places of the search that were looked at; the rest of what it covers was ruled out by bounds.
   */
  visited: number;
  /**
   * What the search is exact for: the best of every size, or only those that could be chosen; null for elimination and selection, which promise neither.
   */
  exact_for: 'every size' | 'the choice' | null;
  /**
   * Names of the candidates that the search found, by number of coefficients and then by residual sum of squares. One with the columns of an earlier candidate goes by that one's name.
   */
  candidates: string[];
  /**
   * How the best value falls or rises with size: the model with the least residual sum of squares of each number of coefficients, among those that keep the rules of admission where there is one. Empty for elimination and selection.
   *
   * Items: One size.
   */
  best_by_size: {
    /**
     * Number of coefficients, the intercept included.
     */
    coefficient_count: number;
    /**
     * Name of the candidate.
     */
    candidate: string;
    /**
     * Its value of the criterion that ranks; null where it is not defined.
     */
    value: number | null;
    /**
     * Whether it was admitted.
     */
    admitted: boolean;
    /**
     * Whether it is known to be the best of its size; false where the search left the size aside because none of it could be chosen.
     */
    settled: boolean;
    /**
     * Name of the best model of this size that breaks a rule of admission, where it fits better than this one; null where there is none.
     */
    better_refused: string | null;
  }[];
  /**
   * The steps of elimination or selection, in order; empty for subsets.
   *
   * Items: One step.
   */
  path: {
    /**
     * From 1.
     */
    step: number;
    /**
     * Whether the term enters or leaves.
     */
    action: 'enters' | 'leaves';
    /**
     * Name of the term.
     */
    term: string;
    /**
     * Partial F of the term in the model that has it; null where it has no column beside the others.
     */
    statistic: number | null;
    /**
     * Degrees of freedom of the numerator; null with the statistic.
     */
    df1: number | null;
    /**
     * Degrees of freedom of the denominator; null with the statistic.
     */
    df2: number | null;
    /**
     * Upper tail probability of the statistic; null with it.
     */
    p_value: number | null;
  }[];
  /**
   * Why the path ended there, as a sentence; null for subsets.
   */
  ended_because: string | null;
  /**
   * Terms that no model has, because in these rows they say nothing beside the terms that they need.
   */
  idle_terms: string[];
  /**
   * What the search does not do, as a sentence; null where there is nothing to say.
   */
  note: string | null;
}
/**
 * The chosen model, complete enough to predict from without the data.
 */
export interface RecordModel {
  /**
   * Name of the candidate chosen.
   */
  candidate: string;
  /**
   * What it predicts.
   */
  response: {
    /**
     * The response's name.
     */
    variable: string;
    /**
     * Scale on which it is fitted.
     */
    scale: string;
    /**
     * λ of a Box–Cox scale; null for the others.
     */
    lambda: number | null;
    /**
     * The response's unit on its own scale.
     */
    unit: string | null;
    /**
     * The response's label for people.
     */
    label: string;
  };
  /**
   * Whether it has an intercept.
   */
  intercept: boolean;
  /**
   * n: the rows fitted.
   */
  rows: number;
  /**
   * n − p.
   */
  degrees_of_freedom: number;
  /**
   * s, in units of the response's scale; null where there are no degrees of freedom.
   */
  residual_standard_error: number | null;
  /**
   * Mean of the response over the rows used, on its own scale.
   */
  response_mean: number;
  /**
   * Columns of its design in order, the intercept first where there is one.
   *
   * Items: One column: the product of its pieces.
   */
  columns: {
    /**
     * The column's name.
     */
    name: string;
    /**
     * Name of its term; null for the intercept.
     */
    term: string | null;
    /**
     * Unit of one step of the column; null where it has none or it is unknown.
     */
    unit: string | null;
    /**
     * Factors of the product; empty for the intercept.
     *
     * Items: One factor of the column's product.
     */
    pieces: {
      /**
       * What it does to the variable.
       */
      kind: 'variable' | 'level' | 'power' | 'bend' | 'spline';
      /**
       * The variable's name.
       */
      variable: string;
      /**
       * For a level: the level that is coded 1.
       */
      level?: string;
      /**
       * For a power: the exponent.
       */
      to?: number;
      /**
       * For a bend: the value at which the slope changes.
       */
      at?: number;
      /**
       * For a bend: the side on which it acts.
       */
      side?: 'above' | 'below';
      /**
       * For a spline: its knots, the outer two being the boundary.
       */
      knots?: number[];
      /**
       * For a spline: which of its curved columns, from 1.
       */
      index?: number;
    }[];
    /**
     * The estimated coefficient.
     */
    estimate: number;
    /**
     * Mean of the column over the rows used.
     */
    mean: number;
  }[];
  /**
   * (X′WX)⁻¹, p × p and symmetric, row by row in the order of `columns`.
   */
  inverse: number[][];
  /**
   * The covariance of the estimates by the declared standard errors, p × p and symmetric, row by row in the order of `columns`; null where there is none. Absent from records of versions before it.
   */
  covariance?: number[][] | null;
  /**
   * Which standard errors the model's coefficients, tests, intervals and predictions rest on. Absent from records of versions before it.
   */
  standard_errors?: {
    /**
     * Which covariance of the estimates.
     */
    kind: 'classical' | 'hc0' | 'hc1' | 'hc2' | 'hc3' | 'hc4' | 'clustered' | 'hac';
    /**
     * Its name for people, for example "HC3" or "clustered by vessel".
     */
    name: string;
    /**
     * What it allows for, where it was published, and which t it goes with.
     */
    sentence: string;
    /**
     * Degrees of freedom of t and of the denominator of F; null where there are no standard errors.
     */
    df: number | null;
    /**
     * Number of clusters; null for the other kinds.
     */
    clusters: number | null;
    /**
     * Number of lags of a HAC covariance; null for the other kinds.
     */
    lags: number | null;
    /**
     * What to be careful about, as sentences.
     */
    cautions: string[];
  };
  /**
   * What the model says exactly, beside estimates and errors. Absent from records of versions before it.
   */
  inference?: {
    /**
     * One entry for each of `columns`, in their order.
     *
     * Items: Measures of one coefficient.
     */
    coefficients: {
      /**
       * The column's name.
       */
      name: string;
      /**
       * Coefficient times the column's standard deviation over the response's, on the fitted scale; null for the intercept.
       */
      standardised: number | null;
      /**
       * Correlation of the column and the response, both without what the other columns explain; null for the intercept and where nothing can be tested.
       */
      partial_correlation: number | null;
      /**
       * The same with the response as it is: its square is what R² would lose without the column.
       */
      semi_partial_correlation: number | null;
      /**
       * Lower end of an interval that holds for all coefficients together; null where not asked for.
       */
      simultaneous_lower: number | null;
      /**
       * Upper end of it.
       */
      simultaneous_upper: number | null;
    }[];
    /**
     * How the simultaneous intervals are made; null where not asked for.
     */
    simultaneous: {
      /**
       * The method.
       */
      method: 'bonferroni' | 'scheffe';
      /**
       * What each standard error is multiplied by.
       */
      multiplier: number;
      /**
       * What the intervals hold for.
       */
      sentence: string;
    } | null;
    /**
     * Each declared hypothesis, in the order declared.
     *
     * Items: One hypothesis.
     */
    hypotheses: {
      /**
       * The statement as the study words it.
       */
      name: string;
      /**
       * Its equalities.
       *
       * Items: One equality.
       */
      equalities: {
        /**
         * The sum of multiples of coefficients, for people.
         */
        combination: string;
        /**
         * The value that it is to have.
         */
        equals: number;
        /**
         * What the model estimates it at; null where the chosen model lacks one of its coefficients.
         */
        estimate: number | null;
        /**
         * Its standard error.
         */
        standard_error: number | null;
        /**
         * Lower end of its interval at the study's confidence.
         */
        lower: number | null;
        /**
         * Upper end of its interval.
         */
        upper: number | null;
      }[];
      /**
       * Estimate less value over standard error, for a single equality; null for several.
       */
      t: number | null;
      /**
       * F test (Wald) of all its equalities together; null where they cannot be tested.
       */
      test: {
        /**
         * The F statistic; null where it is not defined.
         */
        statistic: number | null;
        /**
         * Degrees of freedom of the numerator.
         */
        df1: number;
        /**
         * Degrees of freedom of the denominator.
         */
        df2: number;
        /**
         * Upper tail probability of the statistic; null with it.
         */
        p_value: number | null;
      } | null;
      /**
       * What the data say of it, as a sentence.
       */
      verdict: string;
    }[];
  };
  /**
   * Residuals (sorted; evenly spaced quantiles of them where there are very many) for the mean on the response's own scale (Duan 1983); null on the natural scale.
   */
  smearing: number[] | null;
  /**
   * Largest leverage among the rows used.
   */
  largest_leverage: number;
  /**
   * What further rows need to be predicted from the record alone. Absent from records of versions before it.
   */
  prediction?: {
    /**
     * R⁻¹, p × p and upper triangular, row by row: the leverage of a row x is the squared length of x′R⁻¹.
     */
    root: number[][];
    /**
     * s²; null where the fit is exact.
     */
    error_variance: number | null;
    /**
     * C, p × p, row by row, where the covariance of the estimates is s²CC′ and is not the classical one; null where it is, C then being `root`.
     */
    covariance_root: number[][] | null;
    /**
     * Degrees of freedom of t.
     */
    df: number;
    /**
     * The variable of weights; null where rows count alike.
     */
    weights: string | null;
    /**
     * Header of the column that names a row; null where the study declares none.
     */
    row_id: string | null;
    /**
     * The mark between whole and decimal digits.
     */
    decimal_mark: '.' | ',';
    /**
     * Cells that mean a missing value in every column.
     */
    missing: string[];
    /**
     * Declared variables that a row gives, in order of declaration, with their contract.
     *
     * Items: One variable.
     */
    variables: {
      /**
       * Its name.
       */
      name: string;
      /**
       * Its type.
       */
      type: 'number' | 'integer' | 'category' | 'flag' | 'date' | 'text' | 'identifier';
      /**
       * Header of its column.
       */
      column: string;
      /**
       * Whether a row must give it; otherwise only the weights rest on it.
       */
      needed: boolean;
      /**
       * Smallest value allowed.
       */
      at_least: number | null;
      /**
       * Largest value allowed.
       */
      at_most: number | null;
      /**
       * Levels that a row may have: those of the rows fitted, for a category of the model; those declared, for one that is only derived from; null for all others.
       */
      levels: string[] | null;
      /**
       * The two texts of a flag, the one coded 0 first, where the study declares them.
       */
      values: string[] | null;
      /**
       * How a date is written; null for ISO 8601.
       */
      pattern: string | null;
      /**
       * Cells that mean a missing value in its column, besides those of every column.
       */
      missing: string[];
    }[];
    /**
     * Derived variables that the model rests on, in order.
     *
     * Items: One derived variable.
     */
    derived: {
      /**
       * Its name.
       */
      name: string;
      /**
       * The expression that gives it.
       */
      expression: string;
      /**
       * What it gives.
       */
      type: 'number' | 'flag' | 'date';
    }[];
    /**
     * Range of each variable of numbers over the rows fitted.
     *
     * Items: One range.
     */
    ranges: {
      /**
       * The variable's name.
       */
      variable: string;
      /**
       * Its smallest value.
       */
      smallest: number;
      /**
       * Its largest value.
       */
      largest: number;
    }[];
  };
  /**
   * What each term says, in the order declared.
   */
  terms: RecordTerm[];
}
/**
 * What one term of the chosen model says, on the response's fitted scale.
 */
export interface RecordTerm {
  /**
   * The term's name.
   */
  name: string;
  /**
   * Its kind.
   */
  kind: 'number' | 'flag' | 'category' | 'interaction' | 'polynomial' | 'power' | 'bend' | 'spline';
  /**
   * Names of the variables in it.
   */
  variables: string[];
  /**
   * Names of its columns.
   */
  columns: string[];
  /**
   * F test of all its columns together; null where nothing can be tested.
   */
  joint_f: {
    /**
     * The F statistic; null where it is not defined (an exact fit, no degrees of freedom).
     */
    statistic: number | null;
    /**
     * Degrees of freedom of the numerator.
     */
    df1: number;
    /**
     * Degrees of freedom of the denominator.
     */
    df2: number;
    /**
     * Upper tail probability of the statistic; null with it.
     */
    p_value: number | null;
  } | null;
  /**
   * Generalised variance inflation factor of its columns (Fox & Monette 1992); null as for `vif`.
   */
  generalised_vif: number | null;
  /**
   * The same to the power 1/(2 · columns), comparable among terms.
   */
  generalised_vif_per_column: number | null;
  /**
   * What a typical step of its variable goes with: from lower to upper quartile, or from baseline to each level. Empty for interactions.
   *
   * Items: One step.
   */
  typical_steps: {
    /**
     * Where the step starts, for people.
     */
    from: string;
    /**
     * Where it ends, for people.
     */
    to: string;
    /**
     * Where it starts as a number; null for a level.
     */
    from_value: number | null;
    /**
     * Where it ends as a number; null for a level.
     */
    to_value: number | null;
    /**
     * Difference in the response, the other terms held.
     */
    estimate: number;
    /**
     * Lower end of its interval at the study's confidence.
     */
    lower: number | null;
    /**
     * Upper end of its interval.
     */
    upper: number | null;
  }[];
  /**
   * The fitted relationship of all columns that depend on this variable alone, over its range, relative to its mean, with its confidence band; null for categories, flags and interactions.
   */
  curve: {
    /**
     * The variable along the curve.
     */
    variable: string;
    /**
     * Its values.
     */
    x: number[];
    /**
     * The fitted relationship at each.
     */
    y: number[];
    /**
     * Lower end of the band at each.
     */
    lower: (number | null)[];
    /**
     * Upper end of the band at each.
     */
    upper: (number | null)[];
  } | null;
  /**
   * For an interaction: slope or difference of the first member at levels or quartiles of the others.
   *
   * Items: One slope.
   */
  slopes: {
    /**
     * Where the other members are held.
     */
    at: string;
    /**
     * What moves.
     */
    of: string;
    /**
     * The same in per cent of the response, where it is fitted as a logarithm; null on other scales, or where it is too large.
     */
    percent?: {
      /**
       * Per cent.
       */
      estimate: number;
      /**
       * Lower end of its interval at the study's confidence; null where there is no standard error.
       */
      lower: number | null;
      /**
       * Upper end of its interval.
       */
      upper: number | null;
    } | null;
    /**
     * Unit of the step; null for a level or where there is none.
     */
    per: string | null;
    /**
     * Slope or difference.
     */
    estimate: number;
    /**
     * Lower end of its interval at the study's confidence.
     */
    lower: number | null;
    /**
     * Upper end of its interval.
     */
    upper: number | null;
  }[];
  /**
   * For a category: what the model expects at each level with everything else at its mean, and how levels differ pair by pair, on the fitted scale; null for other terms. Absent from records of versions before it.
   */
  level_means?: {
    /**
     * The category.
     */
    variable: string;
    /**
     * Where everything else is held, as a sentence.
     */
    held: string;
    /**
     * One entry for each level that rows used have, in the category's order.
     *
     * Items: One level.
     */
    means: {
      /**
       * The level.
       */
      level: string;
      /**
       * Rows used that have it.
       */
      rows: number;
      /**
       * What the model expects.
       */
      estimate: number;
      /**
       * Lower end of its interval at the study's confidence; null where there is no standard error.
       */
      lower: number | null;
      /**
       * Upper end of its interval.
       */
      upper: number | null;
      /**
       * The same taken back to the response's own scale; null on the natural scale.
       */
      own: {
        /**
         * Estimate; null beyond the scale.
         */
        estimate: number | null;
        /**
         * Lower end.
         */
        lower: number | null;
        /**
         * Upper end.
         */
        upper: number | null;
      } | null;
    }[];
    /**
     * Pairs of levels; null where they are not to be compared or nothing can be tested.
     */
    comparisons: {
      /**
       * How p-values are adjusted for the number of pairs.
       */
      method: 'holm' | 'tukey_kramer';
      /**
       * What the p-values and intervals hold for.
       */
      sentence: string;
      /**
       * Every pair.
       *
       * Items: One pair.
       */
      pairs: {
        /**
         * The level.
         */
        level: string;
        /**
         * The level that it is compared with.
         */
        other: string;
        /**
         * Mean of the level less that of the other.
         */
        estimate: number;
        /**
         * Its standard error.
         */
        standard_error: number;
        /**
         * Lower end of its interval at the study's confidence.
         */
        lower: number;
        /**
         * Upper end of its interval.
         */
        upper: number;
        /**
         * Two-sided p-value of this pair alone.
         */
        p_value: number;
        /**
         * p-value adjusted for the number of pairs.
         */
        adjusted_p_value: number;
      }[];
      /**
       * Why pairs are not listed, as a sentence; null where all are.
       */
      omitted: string | null;
    } | null;
  } | null;
  /**
   * For a term that bends (a polynomial, power, bend or spline): how steep the relationship with its variable is at some places; null for other terms. Absent from records of versions before it.
   */
  slopes_along?: {
    /**
     * The variable.
     */
    variable: string;
    /**
     * Whether the study declares the places; else they are the quartiles.
     */
    declared: boolean;
    /**
     * One entry for each place, ascending.
     *
     * Items: One place.
     */
    places: {
      /**
       * Value of the variable.
       */
      at: number;
      /**
       * Slope there, on the fitted scale, the other variables at their reference.
       */
      estimate: number;
      /**
       * Lower end of its interval at the study's confidence; null where there is no standard error.
       */
      lower: number | null;
      /**
       * Upper end of its interval.
       */
      upper: number | null;
      /**
       * The same in per cent of the response, where it is fitted as a logarithm; null on other scales, or where it is too large.
       */
      percent: {
        /**
         * Per cent.
         */
        estimate: number;
        /**
         * Lower end of its interval at the study's confidence; null where there is no standard error.
         */
        lower: number | null;
        /**
         * Upper end of its interval.
         */
        upper: number | null;
      } | null;
    }[];
  } | null;
  /**
   * What the term says of the response on its own scale, where the coefficient does not say it: per cent, an elasticity, a difference per doubling, or the difference that typical steps make; null for the rest. Absent from records of versions before it.
   */
  own_scale?: {
    /**
     * What the figures are.
     */
    kind: 'percent' | 'elasticity' | 'per_doubling' | 'difference';
    /**
     * What they are and where they hold, as a sentence.
     */
    sentence: string;
    /**
     * One entry for each step.
     *
     * Items: One effect.
     */
    effects: {
      /**
       * The step, for people.
       */
      of: string;
      /**
       * The effect.
       */
      estimate: number;
      /**
       * Lower end of its interval at the study's confidence; null where there is no standard error.
       */
      lower: number | null;
      /**
       * Upper end of its interval.
       */
      upper: number | null;
    }[];
  } | null;
  /**
   * How many further slopes there are where an interaction has more than forty; else 0.
   */
  slopes_omitted: number;
}
/**
 * What was found on examining the chosen model.
 */
export interface RecordExamination {
  /**
   * Questions and answers, in the order in which a reader asks.
   */
  findings: RecordFinding[];
  /**
   * What to know before relying on the model, weightiest for the declared question first. Absent from records of versions before it.
   *
   * Items: One thing to know.
   */
  before_you_rely?: {
    /**
     * What was found and what to do about it, as sentences.
     */
    text: string;
    /**
     * What it is about: rows, collinearity, shape, spread, independence, normality, constancy, outliers, influence or outside (predictions outside the data).
     */
    about: string;
    /**
     * Name of the finding that it comes from; null where it comes from the predictions.
     */
    finding: string | null;
    /**
     * 1 worth a look, 2 take care.
     */
    concern: 1 | 2;
    /**
     * How much it matters for the declared question.
     */
    weight: number;
  }[];
  /**
   * Intervals from drawing the rows again; null where the study asks for none. Absent from records of versions before it.
   */
  bootstrap?: RecordBootstrap | null;
  /**
   * The standardised residuals in order against those of normal errors: all ranks where there are few, else both ends and some between. Lists of equal length, ascending; null where the model leaves nothing to examine. Absent from records of versions before it.
   */
  normal_quantiles?: {
    /**
     * Normal quantile of each rank (Blom 1958).
     */
    expected: number[];
    /**
     * The standardised residual of each rank.
     */
    residual: number[];
    /**
     * Lower end of where 95 % of the residuals of that rank lie under normal errors (Atkinson 1985); null where not simulated.
     */
    lower: number[] | null;
    /**
     * Upper end of it.
     */
    upper: number[] | null;
    /**
     * How often errors were drawn; 0 where there are too many rows for it.
     */
    simulations: number;
  } | null;
  /**
   * Why the choice was not made again without each influential row, as a sentence; null where it was. Absent from records of versions before it.
   */
  choice_omitted?: string | null;
  /**
   * The most influential rows, most influential first, at most 10.
   *
   * Items: One row.
   */
  influential_rows: {
    /**
     * Line in the data file as a person counts it.
     */
    row: number;
    /**
     * Its identity; null where the study declares none.
     */
    id: string | null;
    /**
     * Fitted value on the response's fitted scale.
     */
    fitted: number;
    /**
     * Observed value on the response's fitted scale.
     */
    observed: number;
    /**
     * e/(s √(1 − h)); null where the leverage is 1 or nothing can be tested.
     */
    standardised_residual: number | null;
    /**
     * Leverage h.
     */
    leverage: number;
    /**
     * Cook's distance; null with the standardised residual.
     */
    cooks_distance: number | null;
    /**
     * Its distance from the model fitted without it, in standard errors; null where undefined. This and what follows: absent from records of versions before it.
     */
    deleted_residual?: number | null;
    /**
     * How far it moves its own fitted value, in standard errors; null where undefined.
     */
    dffits?: number | null;
    /**
     * The determinant of the coefficients' covariance without it over that with it; null where undefined.
     */
    covratio?: number | null;
    /**
     * What the study would say without it.
     */
    without?: {
      /**
       * The chosen model's coefficients without the row.
       *
       * Items: One coefficient.
       */
      coefficients: {
        /**
         * Name of the coefficient.
         */
        name: string;
        /**
         * Its estimate without the row.
         */
        estimate: number;
        /**
         * Its classical standard error without the row; null where undefined.
         */
        standard_error: number | null;
        /**
         * How far the row moves it, in standard errors; null where undefined.
         */
        dfbetas: number | null;
      }[];
      /**
       * Name of the candidate that the declared rule would choose; null where none would be admitted, or where the choice was not made again (choice_omitted).
       */
      chosen: string | null;
    };
  }[];
  /**
   * How far the columns of the chosen model can be told apart (Belsley, Kuh & Welsch 1980). Absent from records of versions before it.
   */
  collinearity?: {
    /**
     * Names of the columns, in the order of each row of proportions.
     */
    columns: string[];
    /**
     * Condition indices, ascending: columns scaled to unit length, not centred; the largest singular value over each.
     */
    indices: number[];
    /**
     * For each index, the share of each coefficient's variance that goes with it; the shares of a coefficient add up to 1.
     */
    proportions: number[][];
    /**
     * Indices above 30 with two or more proportions above 0.5, most serious first.
     *
     * Items: One near dependency.
     */
    dependencies: {
      /**
       * Its condition index.
       */
      index: number;
      /**
       * The columns that carry it.
       *
       * Items: One column.
       */
      columns: {
        /**
         * Its name.
         */
        name: string;
        /**
         * Its proportion.
         */
        proportion: number;
      }[];
      /**
       * Whether they are made of one variable and so go together.
       */
      by_construction: boolean;
      /**
       * Which columns carry it and what that means.
       */
      sentence: string;
      /**
       * What the other coefficients become when one of the columns is left out of the model.
       *
       * Items: The model without one column.
       */
      without: {
        /**
         * The column left out.
         */
        left_out: string;
        /**
         * Residual standard error without it.
         */
        residual_standard_error: number | null;
        /**
         * The columns that carry the dependency with it.
         *
         * Items: One coefficient.
         */
        coefficients: {
          /**
           * Its column.
           */
          name: string;
          /**
           * Its estimate in the chosen model.
           */
          estimate: number;
          /**
           * Its classical standard error there.
           */
          standard_error: number | null;
          /**
           * Its estimate without the column left out.
           */
          estimate_without: number;
          /**
           * Its classical standard error then.
           */
          standard_error_without: number | null;
        }[];
      }[];
    }[];
  };
  /**
   * Counts over all rows used.
   */
  counts: {
    /**
     * Rows used.
     */
    rows: number;
    /**
     * Rows whose standardised residual is beyond ±2.
     */
    beyond_2: number;
    /**
     * Rows whose standardised residual is beyond ±3.
     */
    beyond_3: number;
    /**
     * Rows whose leverage is above 2p/n.
     */
    leverage_beyond_2p_over_n: number;
    /**
     * Rows whose leverage is above 3p/n.
     */
    leverage_beyond_3p_over_n: number;
    /**
     * Rows whose Cook's distance is at least 0.5. This and what follows: absent from records of versions before it.
     */
    cook_beyond_half?: number;
    /**
     * Rows whose DFFITS is beyond 2√(p/n).
     */
    dffits_beyond_mark?: number;
    /**
     * Rows whose COVRATIO is beyond 1 ± 3p/n.
     */
    covratio_beyond_mark?: number;
  };
  /**
   * Rows for the charts: all rows up to 2,000, beyond that a fixed thinning that keeps the most extreme. Lists of equal length, in file order.
   */
  points: {
    /**
     * Whether some rows are not listed.
     */
    thinned: boolean;
    /**
     * Line in the data file of each.
     */
    row: number[];
    /**
     * Identity of each; null where the study declares none.
     */
    id: (string | null)[];
    /**
     * Fitted value of each, on the response's fitted scale.
     */
    fitted: number[];
    /**
     * Observed value of each, on the response's fitted scale.
     */
    observed: number[];
    /**
     * Observed − fitted of each.
     */
    residual: number[];
    /**
     * Standardised residual of each.
     */
    standardised_residual: (number | null)[];
    /**
     * Leverage of each.
     */
    leverage: number[];
    /**
     * Cook's distance of each.
     */
    cooks_distance: (number | null)[];
    /**
     * Position of each in time order, from 1; null where the study declares no time.
     */
    time_position: number[] | null;
    /**
     * Values of the chosen model's variables.
     *
     * Items: One variable.
     */
    values: {
      /**
       * Its name.
       */
      variable: string;
      /**
       * Its values where numeric, else null.
       */
      numbers: number[] | null;
      /**
       * Its levels where a category, else null.
       */
      texts: string[] | null;
    }[];
  };
}
/**
 * One question put to the chosen model, with what was found.
 */
export interface RecordFinding {
  /**
   * Stable name, for example "equal_spread", "independence", "influence".
   */
  name: string;
  /**
   * The question, as a reader asks it.
   */
  question: string;
  /**
   * The figure that answers it; null where it is not defined.
   */
  statistic: number | null;
  /**
   * What the figure is called.
   */
  statistic_name: string;
  /**
   * Its degrees of freedom, if any.
   */
  df: number[];
  /**
   * Its p-value; null where it has none.
   */
  p_value: number | null;
  /**
   * The customary mark that it is held against, in words; null where there is none.
   */
  mark: string | null;
  /**
   * What was found, as a sentence.
   */
  verdict: string;
  /**
   * 0 nothing to see, 1 worth a look, 2 take care before relying on the model.
   */
  concern: 0 | 1 | 2;
  /**
   * What to do about it, as a sentence; null where nothing is to be done.
   */
  advice: string | null;
  /**
   * Further figures, where the one statistic does not say all. Absent where there are none, and from records of versions before it.
   *
   * Items: One figure.
   */
  figures?: {
    /**
     * What it is, in words.
     */
    name: string;
    /**
     * The figure; null where it is not defined.
     */
    value: number | null;
  }[];
}
/**
 * Intervals from drawing the rows, residuals or blocks of rows again and again.
 */
export interface RecordBootstrap {
  /**
   * What was drawn.
   */
  by: 'rows' | 'residuals' | 'blocks';
  /**
   * Repetitions asked for.
   */
  repetitions: number;
  /**
   * Repetitions in which every coefficient could be estimated.
   */
  used: number;
  /**
   * Where the random numbers started.
   */
  seed: number;
  /**
   * Rows in a block; null where blocks were not drawn.
   */
  block_length: number | null;
  /**
   * Confidence of the intervals for coefficients.
   */
  confidence: number;
  /**
   * What a reader has to know of how it went, as sentences; null where there is nothing.
   */
  note: string | null;
  /**
   * The chosen model's coefficients in order; empty where too few repetitions could be used.
   *
   * Items: One coefficient.
   */
  coefficients: {
    /**
     * Its name.
     */
    name: string;
    /**
     * The estimate from all rows.
     */
    estimate: number;
    /**
     * Mean of the repetitions less the estimate.
     */
    bias: number;
    /**
     * Standard deviation of the repetitions.
     */
    standard_error: number;
    /**
     * Lower quantile of the repetitions.
     */
    lower: number;
    /**
     * Upper quantile of the repetitions.
     */
    upper: number;
    /**
     * Twice the estimate less the upper quantile.
     */
    basic_lower: number;
    /**
     * Twice the estimate less the lower quantile.
     */
    basic_upper: number;
  }[];
  /**
   * Confidence of the prediction intervals.
   */
  prediction_interval: number;
  /**
   * Intervals of the predictions, in order, on the response's own scale; empty where there are none or they are too many.
   *
   * Items: One prediction.
   */
  predictions: {
    /**
     * What the row is called.
     */
    label: string;
    /**
     * Lower end for a new row; null where there is none.
     */
    lower: number | null;
    /**
     * Upper end for a new row; null where there is none.
     */
    upper: number | null;
    /**
     * Lower end for the mean at this place (the median where the scale is not natural); null where there is none.
     */
    mean_lower: number | null;
    /**
     * Upper end for the mean; null where there is none.
     */
    mean_upper: number | null;
  }[];
}
/**
 * One predicted row, on the response's own scale.
 */
export interface RecordPrediction {
  /**
   * The row's label.
   */
  label: string;
  /**
   * Values that it is predicted at.
   *
   * Items: One value.
   */
  values: {
    /**
     * The variable's name.
     */
    variable: string;
    /**
     * Its value.
     */
    value: number | string | boolean;
  }[];
  /**
   * The prediction: x′b, or the median g⁻¹(x′b) where the response is fitted on another scale.
   */
  estimate: number;
  /**
   * Lower end of the interval for a new row at the study's prediction confidence; null where the model fits exactly.
   */
  lower: number | null;
  /**
   * Upper end of the interval for a new row; null where the model fits exactly, or where it has no end.
   */
  upper: number | null;
  /**
   * Lower end of the interval for the mean (the median on another scale); null as for a new row.
   */
  mean_lower: number | null;
  /**
   * Upper end of the interval for the mean (the median on another scale); null as for a new row.
   */
  mean_upper: number | null;
  /**
   * The mean on the own scale by smearing (Duan 1983) where the scale is not natural, else null.
   */
  mean: number | null;
  /**
   * x′(X′WX)⁻¹x.
   */
  leverage: number;
  /**
   * Each way in which the row lies outside the data, as a sentence.
   */
  outside: string[];
}
/**
 * One criterion.
 */
export interface RecordEarlierCriterion {
  /**
   * The figure.
   */
  criterion: 'coefficient_change' | 'new_rows_inside';
  /**
   * The coefficient; left out for the largest change and for the new rows.
   */
  of?: string;
  /**
   * The limit, for people.
   */
  limit: string;
  /**
   * Lower limit; null for none.
   */
  at_least: number | null;
  /**
   * Upper limit; null for none.
   */
  at_most: number | null;
}
