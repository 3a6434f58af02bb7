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
   * A numeric variable by which rows are weighted, in proportion to one over their variance. Null: all rows count alike.
   */
  weights?: string | null;
  /**
   * The models to be tried. All are fitted on the same rows.
   *
   * @minItems 1
   */
  candidates: CandidateInFile[];
  /**
   * The rule, declared beforehand, by which one candidate is chosen.
   */
  selection?: {
    /**
     * The criterion that ranks the candidates. Where candidates have different response scales, only aic, aicc and bic can rank them.
     */
    rank_by?: 'adjusted_r_squared' | 'aic' | 'aicc' | 'bic' | 'mallows_cp' | 'press' | 'partial_f';
    /**
     * Among admitted candidates whose value is this close to the best, the one with the fewest coefficients is chosen. In units of the criterion.
     */
    prefer_smaller_within?: number;
    /**
     * The level at which a partial F-test counts as an improvement when rank_by is partial_f.
     */
    significance?: number;
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
    };
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
