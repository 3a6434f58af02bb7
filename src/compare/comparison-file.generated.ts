// Generated from schemas/comparison.schema.json by schemas/generate.ts. Change the schema, then: npx tsx schemas/generate.ts

/**
 * What is different between two records of one study: rows, the contract of the data, the declaration, the choice, every coefficient, and how the rows that are new lie to the earlier model. Numbers carry full precision; null where a figure is not defined or cannot be told.
 */
export interface Comparison {
  /**
   * The form of this file.
   */
  format: 'plumbrule-comparison/1';
  /**
   * The program that compared.
   */
  tool: {
    /**
     * Its name.
     */
    name: string;
    /**
     * Its version.
     */
    version: string;
  };
  earlier: ComparedRecord;
  later: ComparedRecord;
  /**
   * What cannot be told from these two records, and why, as sentences.
   */
  cannot_tell: string[];
  /**
   * The rows used, matched; null where the rows of one record were not kept.
   */
  rows: ComparedRows | null;
  /**
   * What changed in the data as the contract describes it.
   */
  contract: ContractChange[];
  /**
   * What changed in the study.
   */
  declaration: {
    /**
     * Whether the study file has another hash.
     */
    study_changed: boolean;
    /**
     * Every change that the records tell of.
     */
    changes: DeclarationChange[];
  };
  choice: ChoiceChange;
  /**
   * The model chosen later, and where that is another, the one chosen earlier, each fitted to both sets of rows; empty where rows were not kept or nothing was chosen later.
   */
  models: ComparedModel[];
  /**
   * The rows added, held against the model chosen earlier; null where there are none or it cannot be done.
   */
  new_rows: NewRows | null;
  /**
   * The later study's acceptance criteria that only an earlier record can judge, held against this one; empty where it declares none.
   */
  acceptance: ComparedCriterion[];
}
/**
 * One of the two records.
 */
export interface ComparedRecord {
  /**
   * The study's title.
   */
  title: string;
  /**
   * Hash of the record's text, by which a comparison that lies beside a record is known to be its own.
   */
  record_sha256: string;
  /**
   * The study file's base name.
   */
  study_file: string;
  /**
   * Its hash.
   */
  study_sha256: string;
  /**
   * The data file as the study names it.
   */
  data_file: string;
  /**
   * Its hash.
   */
  data_sha256: string;
  /**
   * Rows in the data.
   */
  rows_read: number;
  /**
   * Rows fitted.
   */
  rows_used: number;
  /**
   * Time of the first row used; null without a time variable.
   */
  first: string | null;
  /**
   * Time of the last row used; null with the first.
   */
  last: string | null;
  /**
   * The candidate chosen; null where none was.
   */
  chosen: string | null;
}
/**
 * Which rows used are in both records. A row that is read but no longer used counts as removed.
 */
export interface ComparedRows {
  /**
   * By identity, or, without one in both, by all that is in a row; a row that was revised is then one removed and one added.
   */
  matched_by: 'row_id' | 'content';
  /**
   * Rows in both with the same values.
   */
  kept: number;
  /**
   * Rows in both with a changed value; null where rows are matched by content.
   */
  revised: number | null;
  /**
   * Rows in the later record only.
   */
  added: number;
  /**
   * Rows in the earlier record only.
   */
  removed: number;
  /**
   * Variables with changed values, and in how many rows.
   *
   * Items: One variable.
   */
  revised_cells: {
    /**
     * The variable.
     */
    variable: string;
    /**
     * Rows in which its value changed.
     */
    rows: number;
  }[];
  /**
   * The first changed cells, in the order of the later record's rows.
   */
  revisions: Revision[];
  /**
   * All changed cells.
   */
  revision_count: number;
  /**
   * The first rows added: identities, or lines in the later data file where there are none.
   */
  added_rows: string[];
  /**
   * The first rows removed: identities, or lines in the earlier data file.
   */
  removed_rows: string[];
}
/**
 * One cell.
 */
export interface Revision {
  /**
   * The row's identity.
   */
  id: string;
  /**
   * Its line in the later data file.
   */
  row: number;
  /**
   * The variable.
   */
  variable: string;
  /**
   * Its value before; null where missing. Dates as ISO text.
   */
  earlier: number | string | null;
  /**
   * Its value now.
   */
  later: number | string | null;
}
/**
 * One change in the data.
 */
export interface ContractChange {
  /**
   * level_new, level_gone: a level has rows in one record only. level_undeclared: a text that is no declared level, and was not among those listed before. rescaled: the revised values are the earlier ones in what looks like another unit. range: values beyond those seen before. middle: the median has left the middle half of what was seen before. missing: a larger share of the rows read has no value. bad_values: more cells break the contract. rows_lost: a larger share of the rows read is not used. variable_gone, variable_new: declared in one study only. column_new, column_gone: a column of the file that the study does not use. unit, type: declared otherwise.
   */
  kind:
    | 'level_new'
    | 'level_gone'
    | 'level_undeclared'
    | 'rescaled'
    | 'range'
    | 'middle'
    | 'missing'
    | 'bad_values'
    | 'rows_lost'
    | 'variable_gone'
    | 'variable_new'
    | 'column_new'
    | 'column_gone'
    | 'unit'
    | 'type';
  /**
   * The variable; null where there is none.
   */
  variable: string | null;
  /**
   * The level, text or column; null for the other kinds.
   */
  name: string | null;
  /**
   * What a level, variable or column that is gone is most likely called now; null where nothing is near.
   */
  likely: string | null;
  /**
   * Why that is likely: every row that had it and is still there has the other now (rows), most cells that break the contract of its variable say so (contract), or it is spelt almost so (spelling).
   */
  because: 'rows' | 'contract' | 'spelling' | null;
  /**
   * Before: smallest and largest value, one median, one share, a count of rows, or a text; null where there is nothing to say.
   */
  earlier: number[] | string | null;
  /**
   * Now, likewise; of rescaled the number of revised values that follow later = offset + factor × earlier, the number of all revised values, the offset and the factor.
   */
  later: number[] | string | null;
}
/**
 * One change in the study.
 */
export interface DeclarationChange {
  /**
   * What changed.
   */
  kind:
    | 'candidate_added'
    | 'candidate_removed'
    | 'candidate_changed'
    | 'derivation'
    | 'exclusion'
    | 'response_scale'
    | 'weights'
    | 'admission'
    | 'setting'
    | 'parameter';
  /**
   * The candidate, variable, setting or parameter; null where there is one only.
   */
  name: string | null;
  /**
   * As it was; null where absent.
   */
  earlier: string | null;
  /**
   * As it is; null where absent.
   */
  later: string | null;
}
/**
 * The two choices, held against each other on the later rows and by the later rule.
 */
export interface ChoiceChange {
  /**
   * Whether another candidate was chosen.
   */
  changed: boolean;
  /**
   * The later criterion.
   */
  rank_by: string;
  /**
   * Whether the earlier criterion, preference or admission was another.
   */
  rule_changed: boolean;
  /**
   * The earlier choice on the later rows; null where nothing was chosen earlier.
   */
  earlier: Contender | null;
  /**
   * The later choice; null where nothing was chosen later.
   */
  later: Contender | null;
  /**
   * How much worse the earlier choice is than the later one now, in the criterion (below 0: better); null where one has no value.
   */
  difference: number | null;
  /**
   * Within so much of the best the fewest coefficients win, by the later rule.
   */
  prefer_smaller_within: number;
}
/**
 * One candidate on the later rows.
 */
export interface Contender {
  /**
   * Its name.
   */
  name: string;
  /**
   * Its value of the later criterion.
   */
  value: number | null;
  /**
   * Its coefficients there.
   */
  coefficient_count: number | null;
  /**
   * Whether it stands in the later record as it was declared (record), was fitted again for this comparison (refitted), or could not be (none).
   */
  found: 'record' | 'refitted' | 'none';
  /**
   * Whether the later rules admit it; null where it is no candidate there.
   */
  admitted: boolean | null;
  /**
   * Why not, as sentences.
   */
  refused_because: string[];
  /**
   * Why it has no value; null where it has one.
   */
  reason: string | null;
}
/**
 * One model fitted to the earlier and the later rows, and every difference of a coefficient taken apart: rows removed, then values revised, then rows added, then the declaration changed, each a fit of its own.
 */
export interface ComparedModel {
  /**
   * Its name.
   */
  candidate: string;
  /**
   * Which record chose it.
   */
  chosen: 'both' | 'later' | 'earlier';
  /**
   * Rows of the first fit.
   */
  rows_before: number;
  /**
   * Rows of the last fit; null where there is none.
   */
  rows_after: number | null;
  /**
   * s before and after, on the fitted scale.
   */
  residual_standard_error: {
    /**
     * Before.
     */
    before: number | null;
    /**
     * After.
     */
    after: number | null;
  };
  /**
   * What keeps differences from being taken apart, as a sentence; null where nothing does.
   */
  note: string | null;
  /**
   * Every coefficient of either fit, those of the later one first.
   */
  coefficients: CoefficientChange[];
  /**
   * The coefficient with the largest change in earlier standard errors; null where none is defined.
   */
  largest_change: {
    /**
     * The coefficient.
     */
    name: string;
    /**
     * Its change.
     */
    in_standard_errors: number;
  } | null;
}
/**
 * One coefficient before and after.
 */
export interface CoefficientChange {
  /**
   * The column's name.
   */
  name: string;
  /**
   * Unit of one step of the column.
   */
  unit: string | null;
  /**
   * On the earlier rows; null where it has no estimate there.
   */
  before: number | null;
  /**
   * Its standard error, as the earlier record has it where it has this model, else the classical one.
   */
  before_standard_error: number | null;
  /**
   * On the later rows.
   */
  after: number | null;
  /**
   * Likewise.
   */
  after_standard_error: number | null;
  /**
   * After less before.
   */
  difference: number | null;
  /**
   * The difference taken apart; the parts add up to it. Null where one of the fits in between has no estimate.
   */
  parts: Parts | null;
  /**
   * The difference in earlier standard errors.
   */
  in_standard_errors: number | null;
}
export interface Parts {
  /**
   * By rows removed.
   */
  removed: number;
  /**
   * By values revised.
   */
  revised: number;
  /**
   * By rows added.
   */
  added: number;
  /**
   * By the declaration.
   */
  declaration: number;
}
/**
 * The rows added, predicted by the earlier model as it was, on the response's own scale.
 */
export interface NewRows {
  /**
   * The model.
   */
  candidate: string;
  /**
   * Rows added.
   */
  rows: number;
  /**
   * Those it could predict.
   */
  scored: number;
  /**
   * Why it could not predict the others.
   *
   * Items: One reason.
   */
  not_scored: {
    /**
     * The reason.
     */
    because: string;
    /**
     * Rows.
     */
    rows: number;
  }[];
  /**
   * The response's unit.
   */
  unit: string | null;
  /**
   * Mean of observed less predicted; where the scale is not natural, less the predicted mean by smearing.
   */
  bias: number | null;
  /**
   * Root of the mean square of the same.
   */
  root_mean_squared_error: number | null;
  /**
   * Confidence of the earlier prediction intervals.
   */
  interval: number;
  /**
   * Rows whose response lies inside theirs; null where the model has no intervals.
   */
  inside: number | null;
  /**
   * As a share of the rows scored.
   */
  share_inside: number | null;
  /**
   * Confidence of the interval for that share.
   */
  share_confidence: number;
  /**
   * Lower end of its binomial interval (Clopper & Pearson 1934).
   */
  share_lower: number | null;
  /**
   * Upper end.
   */
  share_upper: number | null;
  /**
   * Chow's first test: one set of coefficients for the earlier and the new rows against one for each (Chow 1960); null where the new rows alone leave no degrees of freedom.
   */
  same_surface: ComparisonTest | null;
  /**
   * Chow's second test: whether the new rows lie as the earlier fit expects them; needs no fit of their own.
   */
  predictive: ComparisonTest | null;
}
/**
 * An F test.
 */
export interface ComparisonTest {
  /**
   * F.
   */
  statistic: number;
  /**
   * Degrees of freedom of the numerator.
   */
  df1: number;
  /**
   * Degrees of freedom of the denominator.
   */
  df2: number;
  /**
   * P(F > statistic).
   */
  p_value: number;
}
/**
 * One criterion.
 */
export interface ComparedCriterion {
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
   * The value found: a change in earlier standard errors without its sign, or a share; null where there is none.
   */
  value: number | null;
  /**
   * Whether the limit is kept; null where there was nothing to judge, since no row is new. A value that cannot be told misses its limit.
   */
  passed: boolean | null;
}
