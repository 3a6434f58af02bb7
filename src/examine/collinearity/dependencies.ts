import { classicalCovariance, coefficientError } from '../../engine/covariance.ts';
import type { FittedAll } from '../../engine/fit-all.ts';
import { fitCandidate } from '../../engine/fit-candidate.ts';
import { listed, listedUpTo, significant } from '../../select/words.ts';
import type { Chosen } from '../chosen.ts';
import type { Condition } from './condition.ts';

/** An index above this, with two or more proportions above the other, points at a dependency (Belsley, Kuh & Welsch 1980). */
export const INDEX_MARK = 30;
export const PROPORTION_MARK = 0.5;

/** Columns that nearly depend on one another, and what each would be without its partners. */
export interface NearDependency {
  readonly index: number;
  readonly columns: { readonly name: string; readonly proportion: number }[];
  /** Whether the columns are of one variable, powers of it for example, and go together by construction. */
  readonly by_construction: boolean;
  readonly sentence: string;
  /** For each column but the intercept: the other coefficients with the model fitted again without it. */
  readonly without: Without[];
}

export interface Without {
  readonly left_out: string;
  readonly residual_standard_error: number | null;
  /** The partners: with all columns and without the one left out; standard errors are the classical ones. */
  readonly coefficients: {
    readonly name: string;
    readonly estimate: number;
    readonly standard_error: number | null;
    readonly estimate_without: number;
    readonly standard_error_without: number | null;
  }[];
}

/** Of a dependency of many columns, how many are left out in turn. */
const MOST_LEFT_OUT = 8;

/**
 * Every dependency that an index points at, most serious first. Refits come from the union's factor, without a pass over
 * the rows.
 */
export function nearDependencies(chosen: Chosen, condition: Condition, fitted: FittedAll): NearDependency[] {
  const { fit, columns } = chosen;
  return condition.indices
    .map((index, k) => ({ index, proportions: condition.proportions[k]! }))
    .filter(
      ({ index, proportions }) =>
        index > INDEX_MARK && proportions.filter((share) => share > PROPORTION_MARK).length >= 2,
    )
    .reverse()
    .map(({ index, proportions }) => {
      const carriers = fit.columns
        .map((column, j) => ({ column, j, proportion: proportions[j]! }))
        .filter(({ proportion }) => proportion > PROPORTION_MARK);
      const variables = new Set(
        carriers.flatMap(({ column }) => columns[column]!.pieces.map((piece) => piece.variable)),
      );
      const byConstruction = variables.size === 1 && carriers.filter(({ column }) => column !== 0).length > 1;
      const removable = carriers.filter(({ column }) => column !== 0);
      return {
        index,
        columns: carriers.map(({ column, proportion }) => ({ name: columns[column]!.name, proportion })),
        by_construction: byConstruction,
        sentence: sentenceOf(chosen, index, carriers, byConstruction),
        without: removable.slice(0, MOST_LEFT_OUT).map(({ column }) =>
          fittedWithout(
            chosen,
            column,
            removable.map(({ j }) => j),
            fitted,
          ),
        ),
      };
    });
}

function sentenceOf(
  { columns }: Chosen,
  index: number,
  carriers: readonly { column: number }[],
  byConstruction: boolean,
): string {
  const others = carriers.filter(({ column }) => column !== 0).map(({ column }) => columns[column]!.name);
  const intercept = carriers.some(({ column }) => column === 0);
  const mark = `condition index ${significant(index, 3)}`;
  if (byConstruction) {
    return `${listedUpTo(others, 6)} are made of the same variable and go together by construction (${mark}): read them as one curve.`;
  }
  if (intercept && others.length === 1) {
    return `${others[0]} varies little beside its size, so that it and the intercept can hardly be told apart (${mark}): the intercept lies far outside the data, and counting ${others[0]} from a value inside it would end this.`;
  }
  const names = listed(others.length > 7 ? [...others.slice(0, 6), `${others.length - 6} more`] : others);
  return `${names}${intercept ? ', and the intercept with them,' : ''} nearly depend on one another in these rows (${mark}): what one of them does can hardly be told from what the others do.`;
}

function fittedWithout(
  chosen: Chosen,
  leftOut: number,
  partners: readonly number[],
  { factor, facts }: FittedAll,
): Without {
  const { fit, columns } = chosen;
  const kept = fit.columns.filter((column) => column !== leftOut);
  const again = fitCandidate(factor, { ...fit.candidate, columns: kept }, facts);
  const before = classicalCovariance(fit);
  const after = classicalCovariance(again);
  return {
    left_out: columns[leftOut]!.name,
    residual_standard_error: after === null ? null : Math.sqrt(after.variance),
    coefficients: partners.flatMap((j) => {
      const column = fit.columns[j]!;
      const there = again.columns.indexOf(column);
      if (column === leftOut || there < 0) return [];
      return [
        {
          name: columns[column]!.name,
          estimate: fit.estimates[j]!,
          standard_error: before === null ? null : coefficientError(before, j),
          estimate_without: again.estimates[there]!,
          standard_error_without: after === null ? null : coefficientError(after, there),
        },
      ];
    }),
  };
}
