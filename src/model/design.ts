import type { FamilyPlan, ResponsePlan, TermPlan } from '../study/study.ts';

/**
 * One factor of a design column. A design column is the product of its pieces, so it can be written
 * down in a record, formed block by block, and formed again for rows to be predicted.
 */
export type Piece =
  | { readonly kind: 'variable'; readonly variable: string }
  | { readonly kind: 'level'; readonly variable: string; readonly level: string }
  | { readonly kind: 'power'; readonly variable: string; readonly to: number }
  | {
      readonly kind: 'bend';
      readonly variable: string;
      readonly at: number;
      readonly side: 'above' | 'below';
    }
  /** Column `index` ≥ 1 of the natural cubic spline's curved part. */
  | {
      readonly kind: 'spline';
      readonly variable: string;
      readonly knots: readonly number[];
      readonly index: number;
    };

export interface DesignColumn {
  /** Readable and unique among the columns of a study: "intercept", "cargo", "vessel Tern", "cargo × vessel Tern", "speed³". */
  readonly name: string;
  /** Empty for the intercept. */
  readonly pieces: readonly Piece[];
  /** Unit of one step of the column ("t", "kn³", "t·m/s"), null where it has none or it is unknown. */
  readonly unit: string | null;
}

/** A term with the columns it expands to, as indexes into the union of all candidates' columns. */
export interface ModelTerm {
  /** "cargo", "vessel", "cargo × vessel", "headwind, degree 2", "speed³", "temperature above 12", "age, spline". */
  readonly name: string;
  readonly plan: TermPlan;
  readonly columns: readonly number[];
}

export interface CandidateModel {
  readonly name: string;
  /** Where it stands in the study file's list of candidates; one that a search found, where its family does. */
  readonly position?: number;
  readonly response: ResponsePlan;
  readonly intercept: boolean;
  readonly terms: readonly ModelTerm[];
  /** All columns, the intercept (union column 0) first where there is one, then term by term as declared. */
  readonly columns: readonly number[];
  /** Which column of the response block this candidate's response is. */
  readonly responseColumn: number;
}

/** A family of candidates with the columns of its terms: what a search needs to know of it. */
export interface FamilyModel {
  readonly plan: FamilyPlan;
  /** In the order of the plan's terms. */
  readonly terms: readonly ModelTerm[];
  readonly response: ResponsePlan;
  readonly responseColumn: number;
}

/** The union of all candidates' design columns, those of families included, and every response column. */
export interface Design {
  /** P columns; column 0 is the intercept. */
  readonly columns: readonly DesignColumn[];
  /** The distinct responses, q columns. */
  readonly responses: readonly ResponsePlan[];
  /** The named candidates; with those that a search found after them, once it has run. */
  readonly candidates: readonly CandidateModel[];
  readonly families: readonly FamilyModel[];
}
