import { type Factor, factorExtended, factorRows, mergeFactors } from '../engine/factor.ts';
import type { Fit, FitContext } from '../engine/fit.ts';
import type { FittedAll } from '../engine/fit-all.ts';
import { fitCandidate, type RowFacts } from '../engine/fit-candidate.ts';
import { FULL_LEVERAGE, press } from '../engine/row-figures.ts';
import { rowsAt } from '../engine/rows-at.ts';
import type { Design } from '../model/design.ts';
import { type DesignRows, numbersOf } from '../model/design-rows.ts';
import { logJacobian } from '../model/response-scale.ts';
import { choose } from '../select/choose.ts';
import type { RankBy } from '../study/study.ts';
import { type Chosen, cooksDistance, deletedDeviation } from './chosen.ts';
import { largest } from './largest.ts';

/** The rows with the largest Cook’s distance, and what the study would say without each of them. */
export interface WithoutRows {
  /** Most influential first. */
  readonly rows: readonly WithoutRow[];
  /** Why the choice was not made again, as a sentence; null where it was. */
  readonly choiceOmitted: string | null;
  /** Names of the candidates. */
  readonly candidates: readonly string[];
}

export interface WithoutRow {
  /** Position in the sample. */
  readonly row: number;
  /** By coefficient of the chosen model, without the row. */
  readonly coefficients: readonly {
    readonly estimate: number;
    readonly standardError: number | null;
    /** DFBETAS: how far it moves, in standard errors; null where s_(i) is 0. */
    readonly shift: number | null;
  }[];
  /** Index of the candidate that the declared rule would choose, null for none; absent where it was not made again. */
  readonly chosen?: number | null;
}

/** What was fitted and chosen among, beside the chosen model. */
export interface Around {
  readonly design: Design;
  readonly rows: DesignRows;
  readonly fitted: FittedAll;
}

const MOST_ROWS = 10;
/** Rows × columns² up to which the factors without single rows are worked out in double-double. */
const EXTENDED_WORK = 1e6;
/** Candidates × rows × columns³ up to which every candidate is fitted again. */
const REFIT_WORK = 1e9;
/** Rows × columns², over candidates and rows left out, up to which PRESS is worked out again. */
const PRESS_WORK = 5e8;

/** Criteria whose every figure follows from the factor of the rows that are left. */
const FROM_FACTOR: readonly RankBy[] = [
  'adjusted_r_squared',
  'aic',
  'aicc',
  'bic',
  'mallows_cp',
  'press',
  'partial_f',
];

/**
 * What each coefficient and the choice of candidate become without each of the most influential rows, exactly and
 * without fitting anything to all rows again. Coefficients: b_(i) = b − (X′WX)⁻¹x w e/(1 − h) (Belsley, Kuh & Welsch
 * 1980). The choice: the rows between the ones left out have a factor each, from one pass; merged in all combinations
 * they give the factor without each row, and from it every candidate’s fit, all its criteria and admission rules.
 */
export function withoutRows(chosen: Chosen, around: Around, extendedWork = EXTENDED_WORK): WithoutRows {
  const distances = Float64Array.from(
    { length: chosen.sample.rowCount },
    (_, i) => cooksDistance(chosen, i) ?? Number.NaN,
  );
  const rows = largest(distances, MOST_ROWS);
  const omitted = rows.length === 0 ? null : whyNoChoice(chosen, around, rows.length);
  const choices =
    omitted !== null || rows.length === 0 ? null : choicesWithout(chosen, around, rows, extendedWork);
  return {
    rows: rows.map((row, k) => ({
      row,
      coefficients: coefficientsWithout(chosen, around.rows, row),
      ...(choices === null ? {} : { chosen: choices[k]! }),
    })),
    choiceOmitted: omitted,
    candidates: around.fitted.fits.map((fit) => fit.candidate.name),
  };
}

function coefficientsWithout(chosen: Chosen, rows: DesignRows, row: number): WithoutRow['coefficients'] {
  const { fit, residuals, leverages } = chosen;
  const p = fit.columns.length;
  const h = leverages[row]!;
  if (h > FULL_LEVERAGE) return [];
  const x = new Float64Array(p);
  rows.fill(fit.columns, row, row + 1, 1, x, null);
  for (let j = 0; j < p; j++) x[j]! /= rows.scales[fit.columns[j]!]!;
  // c = R⁻¹(R⁻ᵀx): through the root, which keeps the digits that its square would lose.
  const q = new Float64Array(p);
  for (let j = 0; j < p; j++) for (let k = 0; k <= j; k++) q[j]! += fit.rootInverse[j * p + k]! * x[k]!;
  const spread = deletedDeviation(chosen, row);
  return Array.from({ length: p }, (_, j) => {
    let c = 0;
    for (let k = j; k < p; k++) c += fit.rootInverse[k * p + j]! * q[k]!;
    const change = (c * residuals[row]!) / (1 - h);
    const unit = fit.inverse[j * p + j]!;
    return {
      estimate: fit.estimates[j]! - change,
      standardError: spread === null ? null : spread * Math.sqrt(unit + (c * c) / (1 - h)),
      shift: spread === null || !(spread > 0) ? null : change / (spread * Math.sqrt(unit)),
    };
  });
}

function whyNoChoice({ study, sample }: Chosen, { rows, fitted }: Around, count: number): string | null {
  const { rankBy, admit } = study.selection;
  const candidates = fitted.fits.length;
  if (candidates === 1) return 'There is only one candidate to choose.';
  if (study.selection.splitSample !== null) return 'The choice was made on other rows than these.';
  if (!FROM_FACTOR.includes(rankBy)) return `The choice by ${rankBy} is not made again without single rows.`;
  if (admit.pValue !== null && study.inference.standardErrors.kind !== 'classical')
    return 'The choice is not made again without single rows: p-values with the declared standard errors would need all rows for each candidate.';
  const columns = fitted.fits.reduce((sum, fit) => sum + fit.columns.length ** 2, 0);
  if (
    candidates * count * rows.width ** 3 > REFIT_WORK ||
    (rankBy === 'press' && sample.rowCount * columns * count > PRESS_WORK)
  )
    return `The choice is not made again without single rows: with ${candidates} candidates it would take too long.`;
  return null;
}

/** The candidate chosen without each row; null where none would be admitted. */
function choicesWithout(
  chosen: Chosen,
  around: Around,
  rows: readonly number[],
  extendedWork: number,
): (number | null)[] {
  const factors = factorsWithout(around.rows, rows, extendedWork);
  const silent = () => {};
  return rows.map(
    (row, k) => choose(chosen.study, contextWithout(chosen, around, row, factors[k]!), silent).chosen,
  );
}

/** The factor of all rows but one, for each of some rows. */
function factorsWithout(rows: DesignRows, left: readonly number[], extendedWork: number): Factor[] {
  const n = rows.rowCount;
  const cuts = [...left].sort((a, b) => a - b);
  if (n * rows.width ** 2 <= extendedWork) {
    const common = factorExtended(allBut(rows, cuts));
    return left.map((row) =>
      factorExtended(
        theseRows(
          rows,
          cuts.filter((cut) => cut !== row),
        ),
        common,
      ),
    );
  }
  const between = [-1, ...cuts].map((cut, k) => factorRows(rows, cut + 1, cuts[k] ?? n));
  const single = new Map(cuts.map((cut) => [cut, factorRows(rows, cut, cut + 1)]));
  const common = between.reduce(mergeFactors);
  return left.map((row) =>
    cuts.reduce((all, cut) => (cut === row ? all : mergeFactors(all, single.get(cut)!)), common),
  );
}

function allBut(rows: DesignRows, left: readonly number[]): DesignRows {
  const gone = new Set(left);
  return theseRows(
    rows,
    Array.from({ length: rows.rowCount }, (_, i) => i).filter((i) => !gone.has(i)),
  );
}

function theseRows(rows: DesignRows, index: readonly number[]): DesignRows {
  return rowsAt(rows, Int32Array.from(index), null);
}

function contextWithout(
  chosen: Chosen,
  { design, rows, fitted }: Around,
  row: number,
  factor: Factor,
): FitContext {
  const y = numbersOf(chosen.sample, chosen.study.response.variable).subarray(row, row + 1);
  const root = rows.rootWeights === null ? 1 : rows.rootWeights[row]!;
  const facts: RowFacts = {
    ...fitted.facts,
    logWeights: fitted.facts.logWeights - 2 * Math.log(root),
    logJacobians: fitted.facts.logJacobians.map((sum, k) => sum - logJacobian(y, design.responses[k]!.scale)),
  };
  const fits = fitted.fits.map((fit) => fitCandidate(factor, fit.candidate, facts, 'no condition number'));
  const { rankBy } = chosen.study.selection;
  const kept = rankBy === 'press' ? allBut(rows, [row]) : null;
  return {
    fits,
    press: fits.map((fit) => (kept === null || fit.degreesOfFreedom < 1 ? null : press(fit, kept))),
    pressOmitted: kept === null ? 'not worked out' : null,
    fullModelVariance:
      rankBy === 'mallows_cp' ? fullVariances(factor, design, facts) : design.responses.map(() => null),
    columnNames: fitted.columnNames,
  };
}

/** s² of all candidates’ columns together, on each response. */
function fullVariances(factor: Factor, design: Design, facts: RowFacts): (number | null)[] {
  const used = [...new Set(design.candidates.flatMap((candidate) => candidate.columns))].sort(
    (a, b) => a - b,
  );
  return design.responses.map((response, responseColumn): number | null => {
    const fit: Fit = fitCandidate(
      factor,
      { name: '', response, intercept: used[0] === 0, terms: [], columns: used, responseColumn },
      facts,
    );
    return fit.degreesOfFreedom < 1 || fit.exact ? null : fit.residualSumOfSquares / fit.degreesOfFreedom;
  });
}
