import type { KeptRows } from '../record/read-sample.ts';
import { quartilesOf } from '../stats/quartiles.ts';
import { cellOf, type MatchedRows } from './match-rows.ts';

/** Fewer revised values than this could lie on a line by chance. */
const FEWEST = 5;
/** A value follows the line where it misses it by no more than this share of a typical revision (rounding). */
const ROUNDING = 0.02;
/** And this share is what arithmetic alone leaves. */
const EXACT = 1e-9;
/** At least this share of the revised values follows the line. */
const MOST = 0.9;

/** Later values as a line of the earlier ones: later = offset + factor × earlier. */
export interface Rescaled {
  readonly offset: number;
  readonly factor: number;
  /** Revised values that follow the line, and all revised values. */
  readonly following: number;
  readonly revised: number;
}

/**
 * Whether the revised values of a variable are its earlier ones in another unit: a multiple of them, or shifted, or both.
 * Null where they are not, where rows are not matched by identity, or where there are too few to tell. The thresholds are
 * our own judgement, no source.
 */
export function rescaled(
  variable: string,
  earlier: KeptRows,
  later: KeptRows,
  matched: MatchedRows,
): Rescaled | null {
  const before = earlier.columns.get(variable);
  const now = later.columns.get(variable);
  if (matched.by !== 'row_id' || before?.kind !== 'number' || now?.kind !== 'number') return null;
  const pairs: (readonly [x: number, y: number])[] = [];
  for (let k = 0; k < matched.keptEarlier.length; k++) {
    const x = cellOf(before, matched.keptEarlier[k]!);
    const y = cellOf(now, matched.keptLater[k]!);
    if (typeof x === 'number' && typeof y === 'number' && x !== y) pairs.push([x, y]);
  }
  if (pairs.length < FEWEST || new Set(pairs.map(([x]) => x)).size < FEWEST) return null;
  const typical = median(pairs.map(([x, y]) => Math.abs(y - x)));
  const tried = lines(pairs).map(([offset, factor]) => {
    const misses = pairs.map(([x, y]) => Math.abs(y - (offset + factor * x)));
    const following = misses.filter((miss) => miss <= ROUNDING * typical).length;
    return { offset, factor, following, miss: median(misses) };
  });
  // The plainest of those that are about as close as the closest.
  const closest = Math.min(...tried.map(({ miss }) => miss));
  const plainest = tried.find(({ miss }) => miss <= 3 * closest + EXACT * typical)!;
  if (plainest.following < MOST * pairs.length) return null;
  const { offset, factor, following } = plainest;
  return { offset, factor, following, revised: pairs.length };
}

/** A multiple, a shift, and the line through the smallest and the largest: the plainest first. */
function lines(pairs: readonly (readonly [number, number])[]): (readonly [number, number])[] {
  const ratios = pairs.filter(([x]) => x !== 0).map(([x, y]) => y / x);
  const sorted = [...pairs].sort(([a], [b]) => a - b);
  const [[x0, y0], [x1, y1]] = [sorted[0]!, sorted.at(-1)!];
  const slope = (y1 - y0) / (x1 - x0);
  return [
    [0, median(ratios)],
    [median(pairs.map(([x, y]) => y - x)), 1],
    [y0 - slope * x0, slope],
  ];
}

function median(values: readonly number[]): number {
  return quartilesOf(Float64Array.from(values)).median;
}
