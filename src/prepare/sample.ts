import type { Column } from '../data/table.ts';

/**
 * The rows that every candidate is fitted on. Columns are gathered: row i of every column here is
 * row `rows[i]` of the table.
 */
export interface Sample {
  /** n. */
  readonly rowCount: number;
  /** Index of each sample row in the table. Length n. */
  readonly rows: Int32Array;
  /** Line in the data file of each sample row. Length n. */
  readonly lines: Uint32Array;
  /** Identity of each row where the study declares `row_id`, else null. */
  readonly ids: readonly string[] | null;
  /** Declared and derived variables that the candidates, response, weights, time or predictions use. */
  readonly columns: ReadonlyMap<string, Column>;
  /** Positions 0…n−1 sorted by the time variable (stable), or null where none is declared. */
  readonly timeOrder: Int32Array | null;
  /** Every row read but not used, under exactly one reason, in the order in which reasons were applied. */
  readonly losses: readonly Loss[];
  /** Rows set aside to try the chosen model on, where the study declares it; counted among the losses. */
  readonly heldOut?: Sample;
}

export interface Loss {
  /** For a person: the study's own reason, "bad value", or "missing cargo". */
  readonly because: string;
  readonly kind: 'bad_value' | 'left_out' | 'missing' | 'undefined' | 'held_out';
  readonly rows: number;
  /**
   * For missing values: rows counted under this reason are those whose first missing variable (in order of
   * declaration) is this one; `missingAny` counts all remaining rows in which it is missing.
   */
  readonly variable: string | null;
  readonly missingAny: number | null;
}
