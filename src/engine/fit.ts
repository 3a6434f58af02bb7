import type { CandidateModel } from '../model/design.ts';
import type { StandardErrorsPlan } from '../study/study.ts';

/** How the numbers of a fit were computed. See DEVELOPERS.md, "Precision". */
export type Arithmetic = 'extended' | 'refined' | 'plain';

/**
 * One candidate fitted by (weighted) least squares. All numbers are read from the factor: none needed a
 * pass over the rows unless `arithmetic` is "refined". p = `columns.length` is the rank of the design.
 */
export interface Fit {
  readonly candidate: CandidateModel;
  /** n, the rows with positive weight. */
  readonly rowCount: number;
  /** Union columns that were kept, in order; length p. */
  readonly columns: readonly number[];
  /** Columns left out because they depend on earlier ones, with a sentence that says how. */
  readonly dropped: readonly DependentColumn[];
  /** Columns kept although they are nearly dependent on earlier ones. */
  readonly nearlyDependent: readonly DependentColumn[];
  /** b, length p. */
  readonly estimates: Float64Array;
  /** (X′WX)⁻¹, p × p, column-major, symmetric. */
  readonly inverse: Float64Array;
  /** R⁻¹, p × p upper triangular, column-major: leverage of a row x is ‖x′R⁻¹‖². */
  readonly rootInverse: Float64Array;
  /** Σ w (y − Xb)². */
  readonly residualSumOfSquares: number;
  /** Σ w (y − ȳ)² about the weighted mean with an intercept, Σ w y² without one. */
  readonly totalSumOfSquares: number;
  /** n − p; may be 0 or negative (then nothing can be tested). */
  readonly degreesOfFreedom: number;
  /** RSS is no more than rounding of TSS: R² is 1 and nothing can be tested. */
  readonly exact: boolean;
  /** Gaussian log-likelihood with every constant, weights and the response's Jacobian; null where the fit is exact or the Jacobian is not finite. */
  readonly logLikelihood: number | null;
  /**
   * VIF of each kept column (1/(1 − R_j²) with the other columns of the model, centred where there is an
   * intercept); NaN for the intercept itself. Length p.
   */
  readonly vif: Float64Array;
  /** Largest condition index: columns scaled to unit length, not centred. */
  readonly conditionNumber: number;
  /**
   * Which union columns lie in the span of this candidate's columns: bit j % 32 of word j >> 5. Candidate S is
   * nested in L when S's mask of its own columns is a subset of L's span and S has fewer columns.
   */
  readonly span: Uint32Array;
  /** Bits of the candidate's own kept columns, laid out as `span`. */
  readonly own: Uint32Array;
  readonly arithmetic: Arithmetic;
}

export interface DependentColumn {
  /** Index in the union of columns. */
  readonly column: number;
  /** "`total` equals `laden` + `empty` in these rows" */
  readonly sentence: string;
}

/** What a criterion reads of a fit: no inverse, no spans. */
export type LeanFit = Pick<
  Fit,
  | 'candidate'
  | 'rowCount'
  | 'columns'
  | 'residualSumOfSquares'
  | 'totalSumOfSquares'
  | 'degreesOfFreedom'
  | 'exact'
  | 'logLikelihood'
>;

/** Errors on rows that a fit did not see, as cross-validation found them. */
export interface HeldOutErrors {
  /** By fit; null where it has none. */
  readonly figures: readonly ({
    readonly meanSquaredError: number;
    /** Null with fewer than two folds. */
    readonly standardError: number | null;
  } | null)[];
  /** By fit: why it has none, as a clause. */
  readonly whyNot: readonly (string | null)[];
}

/** What the criteria read. */
export interface CriterionContext {
  readonly fits: readonly LeanFit[];
  /** Σ (e_i/(1 − h_i))² per fit; null with a reason where it was not worked out or a leverage is 1. */
  readonly press: readonly (number | null)[];
  readonly pressOmitted: string | null;
  /** s² of the union of all terms, by response column; null with a reason where it leaves no degrees of freedom. */
  readonly fullModelVariance: readonly (number | null)[];
  /** Absent where candidates are not cross-validated. */
  readonly validation?: HeldOutErrors | undefined;
}

/**
 * The covariance of the estimates of a fit, as V = variance · root · root′, so that an error √(c′Vc) is the length of a
 * vector and keeps its digits where columns are nearly dependent.
 */
export interface Covariance {
  readonly kind: StandardErrorsPlan['kind'];
  /** p × p, column-major. */
  readonly root: Float64Array;
  /** R⁻¹, the root of the classical covariance: the measure of what is rounding. */
  readonly classicalRoot: Float64Array;
  /** s². */
  readonly variance: number;
  /** Degrees of freedom of t, and of the denominator of F. */
  readonly df: number;
  /** Lags of a HAC covariance, clusters of a clustered one; null for the rest. */
  readonly lags: number | null;
  readonly clusters: { readonly by: string; readonly count: number } | null;
  /** Positions in the sample of rows with a leverage of 1, for which HC2 to HC4 are not defined; at most a few. */
  readonly undefinedRows: readonly number[];
  readonly undefinedCount: number;
}

/** What the ranking needs beside the fits; from the factor or from one more pass over the rows. */
export interface FitContext extends CriterionContext {
  readonly fits: readonly Fit[];
  readonly columnNames: readonly string[];
  /** The declared covariance of each fit's estimates, null where it has none; absent: the classical one. */
  readonly covariances?: readonly (Covariance | null)[];
}
