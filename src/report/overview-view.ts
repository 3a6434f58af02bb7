/** What the templates of an overview are given: all in words and formatted numbers. */
export interface OverviewView {
  readonly title: string;
  readonly tool: string;
  /** How many runs, and what came of them. */
  readonly answer: readonly string[];
  /** The runs that are not done, worst first; then what changed since the earlier records and is to be looked at. */
  readonly failures: readonly { readonly name: string; readonly outcome: string; readonly why: string }[];
  /** What changed since the earlier records; null where runs are not compared. */
  readonly changes: {
    /** Worst first, then changed choices, then by the largest move; what is no longer there at the end. */
    readonly rows: readonly {
      readonly name: string;
      /** Address of the comparison; null where there is none. */
      readonly link: string | null;
      readonly outcome: string;
      readonly done: boolean;
      readonly choice: string;
      /** Whether that asks for a look: another choice, nothing to compare with. */
      readonly marked: boolean;
      /** The coefficient that moved most. */
      readonly moved: string;
      readonly errors: string;
      readonly inside: string;
      readonly criteria: string;
    }[];
    readonly note: string;
  } | null;
  /** All of them, in the order in which they were asked for. */
  readonly runs: readonly {
    readonly name: string;
    /** Address of its report; null where there is none. */
    readonly link: string | null;
    readonly outcome: string;
    readonly done: boolean;
    readonly chosen: string;
    readonly rows: string;
    readonly adjusted: string;
    readonly error: string;
    readonly criteria: string;
    readonly concerns: string;
  }[];
  readonly coefficients: readonly {
    readonly quantity: string;
    readonly names: readonly string[];
    readonly runs: readonly {
      readonly name: string;
      readonly cells: readonly { readonly estimate: string; readonly error: string }[];
    }[];
    /** Of those that are not shown; null where all are. */
    readonly more: string | null;
  }[];
}
