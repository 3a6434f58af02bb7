import type { Figure } from './chart/svg.ts';

/** What the templates of a comparison are given: all in words and formatted numbers, as `ReportView` for a record. */
export interface ComparisonView {
  readonly title: string;
  readonly question: string | null;
  readonly tool: string;
  /** What became of rows, choice and coefficients, and how the new rows lie: two to five sentences. */
  readonly answer: readonly string[];
  /** What to look at first. */
  readonly attention: readonly string[];
  /** Every acceptance criterion that an earlier record judges, and what came of it. */
  readonly accepted: readonly { readonly word: string; readonly sentence: string }[];
  /** The two sides in a line each. */
  readonly sides: readonly SideView[];
  readonly rows: RowsView;
  /** Changes of the data under its contract, as sentences. */
  readonly contract: readonly string[];
  /** Whether the study is the same, then its changes. */
  readonly study: string;
  readonly declaration: readonly string[];
  readonly choice: readonly string[];
  readonly models: readonly ComparedModelView[];
  readonly newRows: readonly string[];
  readonly cannotTell: readonly string[];
}

export interface SideView {
  /** "before" or "now". */
  readonly when: string;
  readonly study: string;
  readonly data: string;
  readonly rows: string;
  readonly dates: string;
  readonly chosen: string;
}

export interface RowsView {
  readonly sentences: readonly string[];
  readonly revised: string | null;
  readonly revisions: readonly {
    readonly row: string;
    readonly variable: string;
    readonly earlier: string;
    readonly later: string;
  }[];
  readonly revisionsMore: string | null;
  readonly addedList: string | null;
  readonly removedList: string | null;
}

export interface ComparedModelView {
  readonly heading: string;
  /** What moved most. */
  readonly finding: string | null;
  readonly note: string | null;
  /** Quantity and unit of the coefficients: "fuel burned in L". */
  readonly quantity: string;
  readonly scatter: string | null;
  readonly chart: Figure | null;
  readonly coefficients: readonly CoefficientChangeView[];
}

export interface CoefficientChangeView {
  readonly name: string;
  readonly unit: string;
  readonly before: string;
  readonly after: string;
  readonly difference: string;
  readonly removed: string;
  readonly revised: string;
  readonly added: string;
  readonly declaration: string;
  readonly inErrors: string;
}
