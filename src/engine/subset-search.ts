import type { SubsetGoal } from './subset-lists.ts';

/** Columns that come and go together: a term. */
export interface SubsetGroup {
  /** Union columns. */
  readonly columns: readonly number[];
  /** Indexes of the groups that are in whenever this one is: all of them, not only the next. */
  readonly needs: readonly number[];
}

/** Necessary conditions of admission, on groups of one column. They refuse nothing that `admits` would let pass. */
export interface QuickRules {
  /** The smallest t² that a group's column may have, by the columns of the set, what is always in counted. */
  readonly smallestT2: ((columns: number) => number) | null;
  /** By group: the sign that its column must have, or 0. */
  readonly signs: readonly number[];
}

export interface SubsetSearch {
  /** Union columns that every set has, the intercept among them where there is one. */
  readonly always: readonly number[];
  readonly groups: readonly SubsetGroup[];
  readonly responseColumn: number;
  /** Groups of a set beside what is always in. */
  readonly atLeast: number;
  readonly atMost: number;
  /** How many sets to keep for each number of columns. */
  readonly keep: number;
  /** The most columns of a set, what is always in counted. */
  readonly mostColumns: number;
  /** Largest RSS of use, by the number of columns, in the response's own units; none: any. */
  readonly largestResidual?: (columns: number) => number;
  /** Whether a set may be kept; asked only of sets that would enter a list. None: every set may. */
  readonly admits?: (groups: readonly number[]) => boolean;
  /** What `admits` lets pass at the least, told from a place of the search at small cost. */
  readonly quick?: QuickRules;
  /** The largest VIF, or of a group of several columns GVIF^(1/columns), that `admits` lets pass: it only grows with the set. */
  readonly largestInflation?: number | null;
  /** Narrows the search to sets that could still be chosen; values are of RSS in the response's own units. */
  readonly goal?: SubsetGoal | null;
  /** Multiplications after which the search is given up. */
  readonly budget?: number;
  readonly onProgress?: (visited: number) => void;
}
