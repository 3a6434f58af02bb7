import type { Fit } from '../engine/fit.ts';
import type { SelectionPlan } from '../study/study.ts';
import type { FTest } from './f-test.ts';
import { isNested, partialFTest } from './nesting.ts';
import type { NestedPair } from './partial-f.ts';
import { adjustedRSquared } from './r-squared.ts';
import type { Ranked } from './rank.ts';
import { counted, limitText, named, probability, significant } from './words.ts';

export interface PartialFPick {
  /** Null where none is admitted. */
  readonly chosen: number | null;
  /** Sentences: why this one, and which comparisons decided. */
  readonly because: readonly string[];
  readonly ranking: readonly Ranked[];
  /** The comparisons that the choice rests on. */
  readonly decisive: readonly NestedPair[];
}

/** Comparisons told in the sentences; the table has them all. */
const MOST_TOLD = 3;

/**
 * Among admitted candidates, the one with fewest coefficients that no admitted candidate nesting it improves on
 * at the declared significance; ties by adjusted R², then by order of declaration.
 *
 * The ranking has no values: a comparison belongs to a pair. Its order: the chosen one; the other admitted
 * candidates that none improves on, fewest coefficients first; then the admitted ones that are improved on,
 * and last those not admitted, both by adjusted R².
 *
 * Each candidate is held against the larger ones only until one improves on it, and no table of pairs is kept.
 * @param admitted indexes in the order of declaration, each with degrees of freedom and none of them exact
 */
export function chooseByPartialF(
  plan: SelectionPlan,
  fits: readonly Fit[],
  admitted: readonly number[],
): PartialFPick {
  const adjusted = fits.map(comparableFit);
  const byFit = (a: number, b: number) => adjusted[b]! - adjusted[a]! || a - b;
  const bySize = (a: number, b: number) => fits[a]!.columns.length - fits[b]!.columns.length || byFit(a, b);

  // The best fitting first: the likeliest to improve on another.
  const rivals = [...admitted].sort(byFit);
  const improvedBy = new Map<number, number>();
  for (const index of admitted) {
    const rival = rivals.find((other) => isNested(fits[index]!, fits[other]!) && improves(index, other));
    if (rival !== undefined) improvedBy.set(index, rival);
  }
  const ordered = [...admitted].sort(bySize);
  const standing = ordered.filter((index) => !improvedBy.has(index));
  const improved = rivals.filter((index) => improvedBy.has(index));
  const isAdmitted = new Set(admitted);
  const refused = [...fits.keys()].filter((index) => !isAdmitted.has(index)).sort(byFit);
  const ranking = [...standing, ...improved, ...refused].map((candidate, k) => ({
    rank: k + 1,
    candidate,
    value: null,
    difference: null,
    evidence: null,
  }));
  const chosen = standing[0];
  if (chosen === undefined) return { chosen: null, because: [], ranking, decisive: [] };

  const containing = rivals.filter((other) => isNested(fits[chosen]!, fits[other]!));
  const passedOver = ordered.slice(0, ordered.indexOf(chosen));
  const decisive = [
    ...passedOver.map((smaller) => ({ smaller, larger: improvedBy.get(smaller)! })),
    ...containing.map((larger) => ({ smaller: chosen, larger })),
  ];
  return {
    chosen,
    because: [mainSentence(chosen), ...against(chosen), ...past(), ...tie(chosen)],
    ranking,
    decisive,
  };

  function improves(smaller: number, larger: number): boolean {
    const { p_value: p } = partialFTest(fits[smaller]!, fits[larger]!);
    return p !== null && p <= plan.significance;
  }

  function mainSentence(winner: number): string {
    if (fits.length === 1) return `${name(winner)} is the only candidate.`;
    if (admitted.length === 1)
      return `${name(winner)} is the only one admitted of ${fits.length} candidates.`;
    return `${name(winner)} has the fewest coefficients (${fits[winner]!.columns.length}) of the admitted candidates that no admitted candidate containing them improves on at a significance of ${limitText(plan.significance)}.`;
  }

  function against(winner: number): string[] {
    if (containing.length === 0)
      return admitted.length === 1
        ? []
        : ['No admitted candidate contains it, so none was tested against it.'];
    const tests = containing
      .map((larger) => ({ larger, test: partialFTest(fits[winner]!, fits[larger]!) }))
      .sort((a, b) => (a.test.p_value ?? 1) - (b.test.p_value ?? 1));
    const told = tests
      .slice(0, MOST_TOLD)
      .map(
        ({ larger, test }) => `${name(larger)} contains it and does not improve on it (${figures(test)}).`,
      );
    return tests.length > MOST_TOLD
      ? [
          ...told,
          `Nor ${tests.length - MOST_TOLD === 1 ? 'does' : 'do'} ${counted(tests.length - MOST_TOLD, 'other')}.`,
        ]
      : told;
  }

  function past(): string[] {
    const told = passedOver.slice(-MOST_TOLD).map((smaller) => {
      const larger = improvedBy.get(smaller)!;
      const how =
        fits[smaller]!.columns.length < fits[chosen!]!.columns.length ? 'is smaller' : 'is as small';
      return `${name(smaller)} ${how}, but ${name(larger)} improves on it (${figures(partialFTest(fits[smaller]!, fits[larger]!))}).`;
    });
    const rest = passedOver.length - told.length;
    return rest > 0 ? [...told, `The same holds for ${counted(rest, 'other')}.`] : told;
  }

  function tie(winner: number): string[] {
    const next = standing[1];
    if (next === undefined || fits[next]!.columns.length !== fits[winner]!.columns.length) return [];
    const why = adjusted[winner]! > adjusted[next]! ? 'has a lower adjusted R²' : 'is declared later';
    return [`${name(next)} has as few coefficients and stands as well, but ${why}.`];
  }

  function name(index: number): string {
    return named(fits[index]!.candidate.name);
  }
}

function figures({ statistic, df1, df2, p_value: p }: FTest): string {
  if (statistic === null || p === null) return 'F is not defined';
  return `F ${significant(statistic, 3)} on ${df1} and ${df2}, p-value ${probability(p)}`;
}

/** Adjusted R² without its last digits, which are rounding; lowest where it is not defined. */
function comparableFit(fit: Fit): number {
  const value = adjustedRSquared(fit);
  return value === null ? -Number.MAX_VALUE : Math.round(value * 1e12) / 1e12;
}
