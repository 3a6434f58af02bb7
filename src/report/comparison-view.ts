import type { Figure } from './chart/svg.ts';

/** What a template of a comparison is given. */
export interface ComparisonView {
  /** The study's title. */
  readonly title: string;
  /** The study's question; null where it asks none. */
  readonly question: string | null;
  /** Program and version. */
  readonly tool: string;
  /** What became of rows, choice and coefficients, and how the new rows lie: two to five sentences. */
  readonly answer: readonly string[];
  /** What to look at first. */
  readonly attention: readonly string[];
  /** Every acceptance criterion that an earlier record judges, and what came of it. */
  readonly accepted: readonly VerdictView[];
  /** Whether rows of either side have dates. */
  readonly dated: boolean;
  /** The two sides in a line each. */
  readonly sides: readonly SideView[];
  /** Which rows are unchanged, revised, new and gone. */
  readonly rows: RowsView;
  /** Changes of the data under its contract, as sentences. */
  readonly contract: readonly string[];
  /** Whether the study is the same, then its changes. */
  readonly study: string;
  /** Changes of the study, as sentences. */
  readonly declaration: readonly string[];
  /** What became of the choice, as sentences. */
  readonly choice: readonly string[];
  /** The model chosen now, then that chosen before where it is another; empty where none could be fitted to both sets of rows. */
  readonly models: readonly ComparedModelView[];
  /** How the new rows lie to the earlier model, as sentences. */
  readonly newRows: readonly string[];
  /** What these two records cannot tell, and why. */
  readonly cannotTell: readonly string[];
}

export interface VerdictView {
  /** "met", "missed" or "not judged". */
  readonly word: string;
  /** The figure and its limit. */
  readonly sentence: string;
}

export interface SideView {
  /** "before" or "now". */
  readonly when: string;
  /** The study file with the beginning of its hash. */
  readonly study: string;
  /** The data file with the beginning of its hash. */
  readonly data: string;
  /** "230 of 240": rows used of those read. */
  readonly rows: string;
  /** From the first to the last row used; a dash where they have no dates. */
  readonly dates: string;
  /** The candidate chosen; "none" where none was. */
  readonly chosen: string;
}

export interface RowsView {
  /** How many are unchanged, revised, gone and new. */
  readonly sentences: readonly string[];
  /** Which variables were revised, and in how many rows; null where none was. */
  readonly revised: string | null;
  /** The first revised cells. */
  readonly revisions: readonly {
    /** The row's identity. */
    readonly row: string;
    /** The variable. */
    readonly variable: string;
    /** Its value before, with its unit. */
    readonly earlier: string;
    /** Its value now. */
    readonly later: string;
  }[];
  /** How many revised cells are not among those; null where all are. */
  readonly revisionsMore: string | null;
  /** Which rows are new; null where none is. */
  readonly addedList: string | null;
  /** Which rows are gone; null where none is. */
  readonly removedList: string | null;
}

export interface ComparedModelView {
  /** The candidate, and when it was chosen. */
  readonly heading: string;
  /** What moved most; null where that cannot be told. */
  readonly finding: string | null;
  /** What keeps its differences from being taken apart; null where nothing does. */
  readonly note: string | null;
  /** Quantity and unit of the coefficients: "fuel burned in L". */
  readonly quantity: string;
  /** The residual standard error before and now; null where one is not defined. */
  readonly scatter: string | null;
  /** What moved each coefficient; null where there is nothing to draw. */
  readonly chart: Figure | null;
  /** Each coefficient, before and now. */
  readonly coefficients: readonly CoefficientChangeView[];
}

export interface CoefficientChangeView {
  /** The coefficient. */
  readonly name: string;
  /** "per kg"; empty without a unit. */
  readonly unit: string;
  /** The estimate before. */
  readonly before: string;
  /** The estimate now. */
  readonly after: string;
  /** Now less before. */
  readonly difference: string;
  /** The part of the difference by rows gone. */
  readonly removed: string;
  /** The part by revised values. */
  readonly revised: string;
  /** The part by new rows. */
  readonly added: string;
  /** The part by the changed declaration. */
  readonly declaration: string;
  /** The difference in earlier standard errors. */
  readonly inErrors: string;
}
