// Generated from schemas/study.schema.json by schemas/generate.ts. Change the schema, then: npx tsx schemas/generate.ts

/**
 * The text of a cell. A number or true/false is taken as it is spelt here.
 */
export type CellText = string | number | boolean;
/**
 * A scale of the response: as it is, its natural logarithm, its square root, one over it, or a Box–Cox power.
 */
export type ScaleInFile = ('natural' | 'log' | 'sqrt' | 'reciprocal') | BoxCoxInFile;
/**
 * A variable's name or one of the term forms.
 */
export type TermInFile =
  string | InteractionInFile | PolynomialInFile | PowerInFile | BendInFile | SplineInFile;
/**
 * A member of an interaction: a variable's name or a term form other than an interaction.
 */
export type MemberInFile = string | PolynomialInFile | PowerInFile | BendInFile | SplineInFile;
/**
 * The name of a covariance of the estimates, or one of the forms with a setting of its own.
 */
export type StandardErrorsInFile =
  ('classical' | 'hc0' | 'hc1' | 'hc2' | 'hc3' | 'hc4') | ClusteredInFile | HacInFile;
/**
 * One equality, or several at once, under a name.
 */
export type HypothesisInFile = SingleHypothesisInFile | JointHypothesisInFile;

/**
 * A declared multiple-regression study: the question, the data and its contract, the candidates, the rule that chooses among them, and what is expected of the chosen model.
 */
export interface StudyFile {
  /**
   * Version of the study format. This version of Plumbrule reads 1.
   */
  plumbrule: 1;
  /**
   * Title of the study, as reports show it.
   */
  title: string;
  /**
   * The question that the study answers, in a sentence or two. Reports begin with it.
   */
  question?: string;
  /**
   * Values that a run may be given, by name, with their defaults. ${NAME} in a value of the study stands for the parameter's value; a value that is nothing but ${NAME} takes its type as well. $${ stands for ${ itself. Inside braces or brackets, write it in quotes.
   */
  parameters?: {
    /**
     * The default. Whoever runs the study gives another value of the same type with --with NAME=VALUE.
     */
    [k: string]: string | number | boolean;
  };
  /**
   * The data file and its contract: what each column must hold.
   */
  data: {
    /**
     * The CSV file, relative to the study file. A name that ends in .gz is read as gzip.
     */
    file: string;
    /**
     * How the data file is written.
     */
    format?: {
      /**
       * The one character between cells. Null: found from the data.
       */
      delimiter?: string | null;
      /**
       * The mark between whole and decimal digits.
       */
      decimal_mark?: '.' | ',';
      /**
       * How characters are stored. Null: found from the data.
       */
      encoding?: 'utf-8' | 'latin-1' | null;
    };
    /**
     * Cells that mean a missing value in every column, compared after blanks at both ends are removed. The list replaces the default.
     */
    missing?: CellText[];
    /**
     * The variable that identifies a row: of type identifier, text or integer; unique and never missing. Null: rows have no identity.
     */
    row_id?: string | null;
    /**
     * The variable that orders the rows for everything that needs an order: a date or a number, declared or derived. Null: rows have no order.
     */
    time?: string | null;
    /**
     * The declared variables, by name. Columns of the data file that no variable reads are left alone and named in the record.
     */
    variables: {
      [k: string]: VariableInFile;
    };
    /**
     * What happens when a cell breaks the contract: stop; read the cell as missing; or leave out its row. Such cells are listed in each case.
     */
    on_bad_value?: 'stop' | 'set_missing' | 'leave_out_row';
  };
  /**
   * Variables worked out from others, by name and in order: a later one may use an earlier one.
   */
  derive?: {
    [k: string]: DerivationInFile;
  };
  /**
   * Rows that the study leaves out on purpose, each rule with its reason. A row is counted under the first rule that holds.
   */
  leave_out?: LeaveOutInFile[];
  /**
   * The variable to be explained and predicted: its name, or its name with the scale on which it is fitted.
   */
  response: string | ResponseInFile;
  /**
   * A numeric variable by which rows are weighted, in proportion to one over their variance. A row to be predicted gives it as well, or has weight 1. Null: all rows count alike.
   */
  weights?: string | null;
  /**
   * A declared variable for each of whose levels the study runs once, on the rows of that level alone: a category, a text, an identifier or an integer that no term uses. The data is read once. Left out: the study runs once, on all rows.
   */
  repeat_for?: string;
  /**
   * The models to be tried, each named or found by a search of a family. All are fitted on the same rows.
   *
   * @minItems 1
   */
  candidates: (CandidateInFile | SubsetFamilyInFile | BackwardFamilyInFile | ForwardFamilyInFile)[];
  /**
   * The rule, declared beforehand, by which one candidate is chosen.
   */
  selection?: {
    /**
     * The criterion that ranks the candidates. Where candidates have different response scales, only aic, aicc, bic and cross_validation can rank them.
     */
    rank_by?:
      | 'adjusted_r_squared'
      | 'aic'
      | 'aicc'
      | 'bic'
      | 'mallows_cp'
      | 'press'
      | 'cross_validation'
      | 'partial_f';
    /**
     * Among admitted candidates whose value is this close to the best, the one with the fewest coefficients is chosen. In units of the criterion.
     */
    prefer_smaller_within?: number;
    /**
     * The level at which a partial F-test counts as an improvement when rank_by is partial_f.
     */
    significance?: number;
    /**
     * Among admitted candidates whose cross-validated error is within one standard error of the best, the one with the fewest coefficients is chosen. Only where rank_by is cross_validation, in place of prefer_smaller_within.
     */
    one_standard_error?: boolean;
    /**
     * How every candidate is held against rows that it was not fitted on (cross-validation). Null: not at all, but where rank_by is cross_validation with everything left out.
     */
    validation?: {
      /**
       * What is held out: rows drawn at random; groups of rows that belong together; the rows of the times that follow, predicted from all before them (a rolling origin); or one row at a time. Rows where left out.
       */
      by?: 'rows' | 'group' | 'time' | 'leave_one_out';
      /**
       * How many parts the rows or the groups are drawn into; each part is held out in turn. Where left out: 10, or one for each row or group where there are fewer.
       */
      folds?: number;
      /**
       * How often the parts are drawn anew; the figures are averaged over all. 1 where left out.
       */
      repeats?: number;
      /**
       * Where the random numbers start: the same seed draws the same parts on every machine; 1 where left out.
       */
      seed?: number;
      /**
       * The variable whose values are the groups, where by is group: rows of one group are held out together.
       */
      group?: string;
      /**
       * How many of the earliest times are never held out, where by is time, counted in distinct values of data.time; half of them where left out.
       */
      start?: number;
      /**
       * How many times ahead are predicted from each origin, where by is time, counted in distinct values of data.time; 1 where left out. The next origin lies as many times later.
       */
      horizon?: number;
    } | null;
    /**
     * The error of the whole procedure: the choice is made again without each part of the rows, and what it chooses is held against that part (nested cross-validation). Null: not worked out.
     */
    honest_error?: {
      /**
       * What is held out: rows drawn at random; groups of rows that belong together; or the rows of the times that follow, predicted from all before them. Rows where left out.
       */
      by?: 'rows' | 'group' | 'time';
      /**
       * How many parts the rows or the groups are drawn into; each part is held out in turn. Where left out: 10, or one for each row or group where there are fewer.
       */
      folds?: number;
      /**
       * How often the parts are drawn anew; the figures are averaged over all. 1 where left out.
       */
      repeats?: number;
      /**
       * Where the random numbers start: the same seed draws the same parts on every machine; 1 where left out.
       */
      seed?: number;
      /**
       * The variable whose values are the groups, where by is group: rows of one group are held out together.
       */
      group?: string;
      /**
       * How many of the earliest times are never held out, where by is time, counted in distinct values of data.time; half of them where left out.
       */
      start?: number;
      /**
       * How many times ahead are predicted from each origin, where by is time, counted in distinct values of data.time; 1 where left out. The next origin lies as many times later.
       */
      horizon?: number;
    } | null;
    /**
     * Rows set aside before anything is fitted, on which the chosen model is tried once. One of share, last and where. Null: none.
     */
    hold_out?: {
      /**
       * The share of the rows that is drawn at random and set aside.
       */
      share?: number;
      /**
       * Where the random numbers start: the same seed draws the same rows on every machine; 1 where left out.
       */
      seed?: number;
      /**
       * How many of the latest rows are set aside, in the order of data.time.
       */
      last?: number;
      /**
       * A condition: the rows for which it holds are set aside.
       */
      where?: string;
    } | null;
    /**
     * Choosing on one part of the rows and estimating the chosen model on the other, so that its p-values and intervals owe nothing to the choice. Null: not split.
     */
    split_sample?: {
      /**
       * The share of the rows that the choice is made on; the others are for estimating. 0.5 where left out.
       */
      share?: number;
      /**
       * Where the random numbers start: the same seed draws the same rows on every machine; 1 where left out.
       */
      seed?: number;
    } | null;
    /**
     * How often the same candidate would be chosen from rows drawn anew with replacement (bootstrap). Null: not worked out.
     */
    stability?: {
      /**
       * How often the rows are drawn and the choice is made again; 500 where left out.
       */
      repetitions?: number;
      /**
       * Where the random numbers start: the same seed draws the same rows on every machine; 1 where left out.
       */
      seed?: number;
      /**
       * What is drawn: rows; groups of rows that belong together; or blocks of rows that follow one another in time. Rows where left out.
       */
      by?: 'rows' | 'group' | 'blocks';
      /**
       * The variable whose values are the groups, where by is group.
       */
      group?: string;
      /**
       * Rows in a block, where blocks are drawn; the cube root of the number of rows, rounded up, where left out.
       */
      block_length?: number;
    } | null;
    /**
     * Whether coefficients and predictions are also averaged over all admitted candidates, each by its weight of evidence. Only where rank_by is aic, aicc or bic, on one response scale.
     */
    average?: boolean;
    /**
     * Rules that a candidate must keep to be chosen. One that breaks a rule is shown with the reason. No rule applies unless it is written.
     */
    admit?: {
      /**
       * Limit on the variance inflation factor of every term. Of a term with several columns the generalised factor to the power 1/columns is held against it, which is comparable; that of one column is its VIF.
       */
      vif?: {
        /**
         * The largest value admitted, at least 1.
         */
        at_most: number;
      };
      /**
       * Limit on the p-value of every term, jointly where a term has several columns.
       */
      p_value?: {
        /**
         * The largest value admitted.
         */
        at_most: number;
      };
      /**
       * The sign that a coefficient must have, by the name of a term with one column or of a single coefficient ("vessel Tern").
       */
      signs?: {
        /**
         * The sign.
         */
        [k: string]: 'positive' | 'negative';
      };
      /**
       * Limit on the number of rows for each coefficient, the intercept counted.
       */
      rows_per_coefficient?: {
        /**
         * The smallest value admitted.
         */
        at_least: number;
      };
      /**
       * Limit on adjusted R².
       */
      adjusted_r_squared?: {
        /**
         * The smallest value admitted.
         */
        at_least: number;
      };
    };
  };
  /**
   * How the coefficients are judged.
   */
  inference?: {
    /**
     * Confidence of the intervals for coefficients, between 0 and 1.
     */
    confidence?: number;
    /**
     * What happens when a column of a candidate depends exactly on earlier ones: drop it with a warning, or stop.
     */
    dependent_columns?: 'drop' | 'stop';
    standard_errors?: StandardErrorsInFile;
    /**
     * Statements about the chosen model's coefficients to be tested: a sum of multiples of named coefficients equals a value, or several such equalities hold at once.
     */
    hypotheses?: HypothesisInFile[];
    /**
     * How the levels of a category are compared pair by pair: with p-values adjusted for the number of pairs by Holm's steps, by the studentised range (Tukey–Kramer), or not at all.
     */
    level_comparisons?: 'holm' | 'tukey_kramer' | 'none';
    /**
     * Whether to give, beside each coefficient's own interval, one that holds for all coefficients together, and by which method.
     */
    simultaneous?: 'none' | 'bonferroni' | 'scheffe';
    /**
     * Values of a variable at which the slopes of its curve, and of interactions with it, are given. Left out: its quartiles.
     */
    slopes_at?: {
      /**
       * The values.
       *
       * @minItems 1
       * @maxItems 50
       */
      [k: string]: number[];
    };
  };
  /**
   * How closely the chosen model is examined, beyond what every examination does.
   */
  examination?: {
    /**
     * How many rows back the test for related neighbours in time looks. Null: 12 where the times are months, 4 where quarters, 7 where days, else 1; 1 where there are too few rows for more.
     */
    lags?: number | null;
    /**
     * Where the rows are split in two to see whether one set of coefficients holds for both. Null: not split.
     */
    split_at?: {
      /**
       * The variable that splits the rows: a number, an integer, a date or a flag, declared or derived.
       */
      variable: string;
      /**
       * Rows with this value or a greater one form the second part. Of a flag it is true.
       */
      value: number | string | boolean;
    } | null;
    /**
     * Intervals for coefficients and stated predictions by drawing from the rows themselves, which need no assumption on how the errors are distributed. Null: none.
     */
    bootstrap?: {
      /**
       * How often the rows are drawn and the model fitted again; 999 where left out.
       */
      repetitions?: number;
      /**
       * Where the random numbers start: the same seed gives the same intervals on every machine; 1 where left out.
       */
      seed?: number;
      /**
       * What is drawn: whole rows; residuals, with the rows' predictors as they are; or blocks of rows that follow one another in time. Rows where left out.
       */
      by?: 'rows' | 'residuals' | 'blocks';
      /**
       * Rows in a block, where blocks are drawn; the cube root of the number of rows, rounded up, where left out.
       */
      block_length?: number;
    } | null;
  };
  /**
   * What the chosen model is to predict.
   */
  predict?: {
    /**
     * Rows to predict, written here.
     */
    rows?: PredictRowInFile[];
    /**
     * A CSV file of rows to predict under the same contract as the data, relative to the study file. Null: none.
     */
    file?: string | null;
    /**
     * Confidence of the prediction intervals, between 0 and 1.
     */
    interval?: number;
    /**
     * Whether to predict the total of all rows as well, with its own interval.
     */
    total?: boolean;
  };
  /**
   * What the chosen model must reach for the run to pass. A missed limit makes the exit status 1.
   */
  acceptance?: {
    r_squared?: LimitsInFile;
    adjusted_r_squared?: LimitsInFile;
    predicted_r_squared?: LimitsInFile;
    residual_standard_error?: LimitsInFile;
    largest_vif?: LimitsInFile;
    condition_number?: LimitsInFile;
    rows_used?: LimitsInFile;
    rows_lost_share?: LimitsInFile;
    rows_per_coefficient?: LimitsInFile;
    cv_rmse?: LimitsInFile;
    bias?: LimitsInFile;
    prediction_interval_width?: LimitsInFile;
    relative_interval_width?: LimitsInFile;
    /**
     * Limits on the p-value of a question put to the chosen model, by the name that the record's examination gives it.
     */
    p_value?: {
      [k: string]: LimitsInFile;
    };
    /**
     * Limits on coefficients of the chosen model, by the name of a coefficient or of a term with one column. One that the chosen model does not have misses them.
     */
    coefficients?: {
      [k: string]: LimitsInFile;
    };
    /**
     * The sign expected of a coefficient of the chosen model, by the name of a coefficient or of a term with one column. One that the chosen model does not have misses it.
     */
    signs?: {
      /**
       * The sign.
       */
      [k: string]: 'positive' | 'negative';
    };
    /**
     * Limit on the days from the newest row used, by data.time, to a stated day. The day is best a parameter, so that whoever runs the study gives it and the record states it.
     */
    age_of_newest_row?: {
      /**
       * The day, as 2026-03-31.
       */
      on: string;
      /**
       * Upper limit in days.
       */
      at_most: number;
    };
    /**
     * Limits on how far coefficients of the chosen model lie from an earlier record, in the earlier record's standard errors. Judged by `fit --against` and `compare`; without an earlier record it is listed as needing one, neither met nor missed.
     */
    coefficient_change?: {
      /**
       * Upper limit on the largest change among the coefficients that the chosen model has then and now, in either direction.
       */
      at_most?: number;
      /**
       * Limits on the change of single coefficients, by the name of a coefficient or of a term with one column. One that the chosen model does not have then and now misses its limit.
       */
      of?: {
        /**
         * The limit.
         */
        [k: string]: {
          /**
           * Upper limit on the change in either direction.
           */
          at_most: number;
        };
      };
    };
    new_rows_inside?: LimitsInFile;
    /**
     * Names of the candidates of which one must be chosen.
     *
     * @minItems 1
     */
    chosen?: string[];
  };
  /**
   * The reports to write.
   */
  report?: {
    /**
     * Formats to write.
     */
    formats?: ('html' | 'markdown')[];
    /**
     * Templates of your own in place of the shipped ones, by format.
     */
    templates?: {
      /**
       * A Handlebars template for the HTML report, relative to the study file. Null: the shipped one.
       */
      html?: string | null;
      /**
       * A Handlebars template for the Markdown report, relative to the study file. Null: the shipped one.
       */
      markdown?: string | null;
      /**
       * Templates of your own for what is different from an earlier record, by format.
       */
      comparison?: {
        /**
         * A Handlebars template for comparison.html, relative to the study file. Null: the shipped one.
         */
        html?: string | null;
        /**
         * A Handlebars template for comparison.md, relative to the study file. Null: the shipped one.
         */
        markdown?: string | null;
      };
    };
    /**
     * Whether the rows used are kept beside the record (sample.csv.gz), so that a later run can be compared with this one row by row.
     */
    keep_sample?: boolean;
    /**
     * A sentence of your own among the cautions of the report: the local code, or who must review. Null: none.
     */
    caution?: string | null;
  };
}
/**
 * One declared variable.
 */
export interface VariableInFile {
  /**
   * What the column holds. A flag has two values, coded 0 and 1; a text or an identifier cannot be a term.
   */
  type: 'number' | 'integer' | 'category' | 'flag' | 'date' | 'text' | 'identifier';
  /**
   * The column's header in the data file. Left out: the variable's own name.
   */
  column?: string;
  /**
   * Unit of a number or an integer, for labels and sentences.
   */
  unit?: string;
  /**
   * What reports call the variable. Left out: its name.
   */
  label?: string;
  /**
   * Smallest value allowed of a number or an integer.
   */
  at_least?: number;
  /**
   * Largest value allowed of a number or an integer.
   */
  at_most?: number;
  /**
   * Levels of a category, in order. A value in the data outside the list breaks the contract. Left out: the levels in the data, sorted.
   *
   * @minItems 2
   */
  levels?: CellText[];
  baseline?: CellText;
  /**
   * The two values of a flag: the one coded 0, then the one coded 1. Left out: no and yes, false and true, or 0 and 1.
   *
   * @minItems 2
   * @maxItems 2
   */
  values?: CellText[];
  /**
   * How a date is written: YYYY, MM, DD, hh, mm and ss with other characters between them. Left out: ISO 8601.
   */
  pattern?: string;
  /**
   * Cells that mean a missing value in this column, besides those of data.missing.
   */
  missing?: CellText[];
}
/**
 * One derived variable.
 */
export interface DerivationInFile {
  /**
   * Arithmetic over variables with + - * / ^, comparisons, and, or, not, and the functions log, log10, exp, sqrt, abs, min, max, round, if, is_missing, year, month, day, weekday and days_between.
   */
  expression: string;
  /**
   * Unit of the result, for labels and sentences.
   */
  unit?: string;
  /**
   * What reports call the variable. Left out: its name.
   */
  label?: string;
}
/**
 * One rule that leaves rows out.
 */
export interface LeaveOutInFile {
  /**
   * A condition over variables; rows for which it holds are left out.
   */
  where: string;
  /**
   * The reason, under which the rows are counted.
   */
  because: string;
}
/**
 * The response with its scale.
 */
export interface ResponseInFile {
  /**
   * The response's name.
   */
  variable: string;
  scale?: ScaleInFile;
}
/**
 * A Box–Cox power of the response.
 */
export interface BoxCoxInFile {
  /**
   * The power λ of (y^λ − 1)/λ; 0 is the natural logarithm.
   */
  box_cox: number;
}
/**
 * One model to be tried.
 */
export interface CandidateInFile {
  /**
   * A name of its own, by which reports and criteria call it.
   */
  name: string;
  /**
   * The terms of the model, in order. An empty list is the mean alone.
   */
  terms: TermInFile[];
  scale?: ScaleInFile;
  /**
   * Whether the model has an intercept.
   */
  intercept?: boolean;
}
/**
 * The product of its members, column by column.
 */
export interface InteractionInFile {
  /**
   * Two or more members, each of a different variable.
   *
   * @minItems 2
   */
  interaction: MemberInFile[];
}
/**
 * A variable with its powers up to a degree.
 */
export interface PolynomialInFile {
  /**
   * Name of the variable.
   */
  polynomial: string;
  /**
   * The highest power, from 1 to 12.
   */
  degree: number;
}
/**
 * One power of a variable, without the lower ones.
 */
export interface PowerInFile {
  /**
   * Name of the variable.
   */
  power: string;
  /**
   * The power, a whole number from 2 to 12. For other powers derive a variable.
   */
  to: number;
}
/**
 * A change of slope at a value: the distance of the variable from it on one side, zero on the other.
 */
export interface BendInFile {
  /**
   * Name of the variable.
   */
  bend: string;
  /**
   * Where the slope changes.
   */
  at: number;
  /**
   * The side on which the distance is counted.
   */
  side?: 'above' | 'below';
}
/**
 * A natural cubic spline: cubic between knots, straight beyond the first and the last.
 */
export interface SplineInFile {
  /**
   * Name of the variable.
   */
  spline: string;
  /**
   * Three or more increasing values; the first and the last are the boundary knots.
   *
   * @minItems 3
   * @maxItems 50
   */
  knots: number[];
}
/**
 * All subsets of a list of terms. They are searched exactly; the best of each number of coefficients become candidates.
 */
export interface SubsetFamilyInFile {
  /**
   * A name of its own, from which those of the models found are made: "Loads 4a" is the best with 4 coefficients, "Loads 4b" the next.
   */
  name: string;
  /**
   * The terms to choose from. One of several columns is in or out as a whole.
   *
   * @minItems 1
   */
  subsets_of: TermInFile[];
  /**
   * Terms that every model has.
   */
  always?: TermInFile[];
  /**
   * The fewest terms of a model, those under always counted. Null: no limit.
   */
  at_least?: number | null;
  /**
   * The most terms of a model, those under always counted. Null: no limit.
   */
  at_most?: number | null;
  /**
   * How many models become candidates for each number of coefficients.
   */
  keep?: number;
  /**
   * Whether a model has an interaction or a higher power only with all that it contains.
   */
  hierarchy?: boolean;
  scale?: ScaleInFile;
  /**
   * Whether the models have an intercept.
   */
  intercept?: boolean;
}
/**
 * Backward elimination: from all terms, the one with the largest p-value of its partial F leaves, one after the other. What is left becomes a candidate.
 */
export interface BackwardFamilyInFile {
  /**
   * A name of its own, by which reports and criteria call the model found.
   */
  name: string;
  /**
   * The terms to begin with. One of several columns leaves as a whole.
   *
   * @minItems 1
   */
  eliminate_from: TermInFile[];
  /**
   * Terms that every model has.
   */
  always?: TermInFile[];
  /**
   * The p-value above which a term leaves.
   */
  leave_at: number;
  /**
   * The p-value at or below which a term that has left returns; no more than leave_at. Left out: none returns.
   */
  enter_at?: number;
  /**
   * Whether a model has an interaction or a higher power only with all that it contains.
   */
  hierarchy?: boolean;
  scale?: ScaleInFile;
  /**
   * Whether the models have an intercept.
   */
  intercept?: boolean;
}
/**
 * Forward selection: from the terms under always, the one with the smallest p-value of its partial F enters, one after the other. What is reached becomes a candidate.
 */
export interface ForwardFamilyInFile {
  /**
   * A name of its own, by which reports and criteria call the model found.
   */
  name: string;
  /**
   * The terms to choose from. One of several columns enters as a whole.
   *
   * @minItems 1
   */
  add_from: TermInFile[];
  /**
   * Terms that every model has.
   */
  always?: TermInFile[];
  /**
   * The p-value at or below which a term enters.
   */
  enter_at: number;
  /**
   * The p-value above which a term that has entered leaves again; at least enter_at. Left out: none leaves.
   */
  leave_at?: number;
  /**
   * Whether a model has an interaction or a higher power only with all that it contains.
   */
  hierarchy?: boolean;
  scale?: ScaleInFile;
  /**
   * Whether the models have an intercept.
   */
  intercept?: boolean;
}
/**
 * Rows of one cluster may have errors that go together; clusters are independent of each other.
 */
export interface ClusteredInFile {
  /**
   * The variable that names the cluster of a row: a category, an identifier, a text, an integer, a date or a derived number. A row without a value is not used.
   */
  clustered_by: string;
}
/**
 * Consistent under unequal spread and under errors that go together over a number of rows in time order; needs data.time.
 */
export interface HacInFile {
  /**
   * The number of lags, or auto for the whole part of 4 (n/100)^(2/9).
   */
  hac_lags: number | string;
}
/**
 * One equality.
 */
export interface SingleHypothesisInFile {
  /**
   * The statement in words, as reports show it.
   */
  name: string;
  combination: CombinationInFile;
  /**
   * The value that their sum is to have.
   */
  equals?: number;
}
/**
 * Multipliers by the names of coefficients, as the report lists them; the sum of multiplier times coefficient is meant.
 */
export interface CombinationInFile {
  /**
   * The multiplier of the coefficient.
   */
  [k: string]: number;
}
/**
 * Several equalities that hold at once.
 */
export interface JointHypothesisInFile {
  /**
   * The statement in words, as reports show it.
   */
  name: string;
  /**
   * The equalities.
   *
   * @minItems 1
   * @maxItems 100
   */
  all_of: EqualityInFile[];
}
/**
 * One equality of a joint hypothesis.
 */
export interface EqualityInFile {
  combination: CombinationInFile;
  /**
   * The value that their sum is to have.
   */
  equals?: number;
}
/**
 * One row to predict: its label, and a value for every variable that a candidate needs.
 */
export interface PredictRowInFile {
  /**
   * What reports call the row.
   */
  label: string;
  /**
   * The value of the variable with this name.
   */
  [k: string]: number | string | boolean;
}
/**
 * A lower limit, an upper limit, or both.
 */
export interface LimitsInFile {
  /**
   * Lower limit.
   */
  at_least?: number;
  /**
   * Upper limit.
   */
  at_most?: number;
}
