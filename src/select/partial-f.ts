import type { Fit } from '../engine/fit.ts';
import type { FTest } from './f-test.ts';
import { isNested, partialFTest } from './nesting.ts';
import { counted } from './words.ts';

/** Two candidates by index, the columns of the first inside the space of the second. */
export interface NestedPair {
  readonly smaller: number;
  readonly larger: number;
}

export interface PartialFRow extends NestedPair, FTest {
  /** Whether the choice rests on it. */
  readonly decided: boolean;
}

export interface PartialFTable {
  /** In the order of the smaller candidate's declaration, then the larger's. */
  readonly rows: readonly PartialFRow[];
  /** Why not every nested pair is listed, as a sentence; null where all are. */
  readonly omitted: string | null;
}

/** Up to this many candidates, every nested pair is listed. */
export const ALL_PAIRS_UP_TO = 60;

/**
 * Partial F of nested candidates: all pairs up to 60 candidates; beyond that the pairs that involve the chosen
 * one and those that decided, and the others are only counted.
 */
export function partialFTable(
  fits: readonly Fit[],
  chosen: number | null,
  decisive: readonly NestedPair[],
): PartialFTable {
  const all = fits.length <= ALL_PAIRS_UP_TO;
  const decided = new Set(decisive.map(({ smaller, larger }) => smaller * fits.length + larger));
  const rows: PartialFRow[] = [];
  let omitted = 0;
  for (let smaller = 0; smaller < fits.length; smaller++) {
    for (let larger = 0; larger < fits.length; larger++) {
      if (!isNested(fits[smaller]!, fits[larger]!)) continue;
      const didDecide = decided.has(smaller * fits.length + larger);
      if (all || didDecide || smaller === chosen || larger === chosen) {
        rows.push({ smaller, larger, ...partialFTest(fits[smaller]!, fits[larger]!), decided: didDecide });
      } else omitted++;
    }
  }
  return { rows, omitted: omitted === 0 ? null : omission(omitted, fits.length, rows, chosen) };
}

function omission(
  omitted: number,
  candidates: number,
  rows: readonly PartialFRow[],
  chosen: number | null,
): string {
  const beside = rows.some(
    ({ decided, smaller, larger }) => decided && smaller !== chosen && larger !== chosen,
  );
  const listed =
    chosen === null
      ? 'no pair is listed because none was chosen'
      : `only those that involve the chosen candidate${beside ? ' or decided the choice' : ''} are listed`;
  return `With ${candidates} candidates ${listed}; ${counted(omitted, 'other nested pair is', 'other nested pairs are')} left out.`;
}
