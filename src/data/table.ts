import type { VariableType } from '../study/study.ts';

/** Values of a column, one per row read, in file order. Missing is NaN, code −1, or null. */
export type Column = NumberColumn | CategoryColumn | TextColumn;

/** Numbers, integers, flags (0/1) and dates (days since 1970-01-01 UTC, with a fraction for a time of day). */
export interface NumberColumn {
  readonly kind: 'number' | 'flag' | 'date';
  readonly name: string;
  readonly values: Float64Array;
  /** The two texts of a flag as the study or the data spell them; absent otherwise. */
  readonly flagTexts?: readonly [string, string];
}

export interface CategoryColumn {
  readonly kind: 'category';
  readonly name: string;
  /** Index into `levels`; −1 where missing. */
  readonly codes: Int32Array;
  readonly levels: readonly string[];
  readonly baseline: string;
}

/** Texts and identifiers. */
export interface TextColumn {
  readonly kind: 'text';
  readonly name: string;
  readonly values: readonly (string | null)[];
}

export interface BadValue {
  /** Line in the data file as a person counts it. */
  readonly row: number;
  readonly variable: string;
  readonly text: string;
  readonly because: string;
}

export interface Table {
  /** As the study names it. */
  readonly file: string;
  readonly sha256: string;
  readonly rowCount: number;
  readonly columns: ReadonlyMap<string, Column>;
  /** Line in the file of each row (the header is usually line 1). Length rowCount. */
  readonly lines: Uint32Array;
  /** Headers that the study does not declare, in file order. */
  readonly ignored: readonly string[];
  /** The first faults of the contract (up to a limit), in file order; the counts are complete. */
  readonly badValues: readonly BadValue[];
  readonly badValueCount: number;
  /** Rows to be left out because of a bad value (`on_bad_value: leave_out_row`); 1 where so. Length rowCount. */
  readonly badRows: Uint8Array | null;
  /** By declared variable: what was found, for the report. */
  readonly summaries: readonly VariableSummary[];
  /** The dialect that was used. */
  readonly format: { readonly delimiter: string; readonly encoding: 'utf-8' | 'latin-1' };
}

export interface VariableSummary {
  readonly name: string;
  readonly type: VariableType;
  readonly missing: number;
  /** Smallest and largest finite value of a number, integer or date; null for the rest or where all is missing. */
  readonly smallest: number | null;
  readonly largest: number | null;
  /** Rows per level of a category, or of the two texts of a flag. */
  readonly levels: readonly { readonly level: string; readonly rows: number }[] | null;
}
