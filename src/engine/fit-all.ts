import type { Design } from '../model/design.ts';
import type { DesignRows } from '../model/design-rows.ts';
import { logJacobian } from '../model/response-scale.ts';
import { wholeNumber } from '../numerals.ts';
import { EXTENDED_BUDGET, type Factor, factorExtended, factorRows } from './factor.ts';
import type { Fit, FitContext } from './fit.ts';
import { fitCandidate, type RowFacts } from './fit-candidate.ts';
import { refineFit } from './refine.ts';
import { press } from './row-figures.ts';

/** Elements (rows × columns, summed over candidates) up to which every candidate is refined. */
const REFINE_BUDGET = 1e7;
/** Beyond that budget, a candidate is refined where its condition number says that digits are at stake … */
const REFINE_CONDITION = 1e6;
/** … while this many elements last. */
const REFINE_MOST = 2e8;
/** Multiplications (rows × columns², summed) up to which PRESS is worked out although it does not rank. */
const PRESS_BUDGET = 1e8;

export interface FitOptions {
  /** PRESS is needed for every candidate, whatever it costs. */
  readonly pressRanks: boolean;
  readonly onProgress?: (done: number, total: number) => void;
}

/** Everything the ranking needs, and the factor and facts for what comes after it. */
export interface FittedAll extends FitContext {
  readonly factor: Factor;
  readonly facts: RowFacts;
}

/** The one pass over the rows, and what goes with it. */
export interface Factored {
  readonly factor: Factor;
  readonly facts: RowFacts;
}

/** What the likelihoods and sentences need beside the factor. */
export function rowFacts(
  design: Pick<Design, 'columns' | 'responses'>,
  rows: DesignRows,
  ownResponse: Float64Array,
): RowFacts {
  let logWeights = 0;
  if (rows.rootWeights !== null) for (const root of rows.rootWeights) logWeights += 2 * Math.log(root);
  return {
    logWeights,
    logJacobians: design.responses.map(({ scale }) => logJacobian(ownResponse, scale)),
    columnNames: design.columns.map((column) => column.name),
    columnVariables: design.columns.map((column) => [
      ...new Set(column.pieces.map((piece) => piece.variable)),
    ]),
  };
}

/**
 * The factor of all columns of a design, in double-double where the work is small.
 * @param ownResponse the response on its own scale, length n
 */
export function factorAll(
  design: Pick<Design, 'columns' | 'responses'>,
  rows: DesignRows,
  ownResponse: Float64Array,
  onProgress?: FitOptions['onProgress'],
): Factored {
  const facts = rowFacts(design, rows, ownResponse);
  const n = rows.rowCount;
  const extended = n * rows.width * rows.width <= EXTENDED_BUDGET;
  const factor = extended ? factorExtended(rows) : factorRows(rows, 0, n, (done) => onProgress?.(done, n));
  return { factor, facts };
}

/**
 * Fits every candidate: one pass for the factor, then each from the triangle, refined by the budget.
 * @param ownResponse the response on its own scale, length n
 * @param factored the factor, where it is made already
 */
export function fitAll(
  design: Design,
  rows: DesignRows,
  ownResponse: Float64Array,
  options: FitOptions,
  factored: Factored = factorAll(design, rows, ownResponse, options.onProgress),
): FittedAll {
  const { factor, facts } = factored;
  const extended = factor.triangle.lo !== null;
  const plain = design.candidates.map((candidate) => fitCandidate(factor, candidate, facts));
  const fits = extended ? plain : refineByBudget(plain, rows, facts);
  return {
    fits,
    ...pressByBudget(fits, rows, options),
    fullModelVariance: fullVariance(factor, design, facts),
    columnNames: facts.columnNames,
    factor,
    facts,
  };
}

function refineByBudget(fits: readonly Fit[], rows: DesignRows, facts: RowFacts): Fit[] {
  const cost = (fit: Fit) => rows.rowCount * fit.columns.length;
  const all = fits.reduce((sum, fit) => sum + cost(fit), 0) <= REFINE_BUDGET;
  let spent = 0;
  return fits.map((fit) => {
    if (!all && (fit.conditionNumber < REFINE_CONDITION || spent + cost(fit) > REFINE_MOST)) return fit;
    spent += cost(fit);
    return refineFit(fit, rows, facts);
  });
}

function pressByBudget(
  fits: readonly Fit[],
  rows: DesignRows,
  options: FitOptions,
): Pick<FitContext, 'press' | 'pressOmitted'> {
  const cost = fits.reduce((sum, fit) => sum + rows.rowCount * fit.columns.length ** 2, 0);
  if (!options.pressRanks && cost > PRESS_BUDGET) {
    return {
      press: fits.map(() => null),
      pressOmitted: `not worked out: it needs another pass over ${wholeNumber(rows.rowCount)} rows for each of ${wholeNumber(fits.length)} candidates, and does not rank them`,
    };
  }
  return {
    press: fits.map((fit, k) => {
      options.onProgress?.(k, fits.length);
      return fit.degreesOfFreedom < 1 ? null : press(fit, rows);
    }),
    pressOmitted: null,
  };
}

/** s² of the model with all columns of all candidates and families on each response; null without degrees of freedom. */
export function fullVariance(factor: Factor, design: Design, facts: RowFacts): (number | null)[] {
  const inFamilies = design.families.flatMap(({ plan, terms }) => [
    ...(plan.intercept ? [0] : []),
    ...terms.flatMap(({ columns }) => columns),
  ]);
  const named = design.candidates.flatMap((candidate) => candidate.columns);
  const used = [...new Set([...named, ...inFamilies])].sort((a, b) => a - b);
  return design.responses.map((response, responseColumn) => {
    const fit = fitCandidate(
      factor,
      { name: '', response, intercept: used[0] === 0, terms: [], columns: used, responseColumn },
      facts,
    );
    return fit.degreesOfFreedom < 1 || fit.exact ? null : fit.residualSumOfSquares / fit.degreesOfFreedom;
  });
}
