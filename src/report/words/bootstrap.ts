import type { TwoIntervals } from '../chart/bootstrap.ts';
import { count, percent, significant } from '../numbers.ts';
import type { RecordExamination } from '../record-type.ts';
import { counted, stopped } from './lexicon.ts';

type Bootstrap = NonNullable<RecordExamination['bootstrap']>;

/** Widths within this of each other are much the same. */
const SAME = 1.15;

/** How the intervals drawn from the rows compare with the declared ones. */
export function bootstrapFinding(all: readonly TwoIntervals[]): string {
  if (all.length === 0) return 'No intervals could be drawn from the rows.';
  const sorted = [...all].sort((a, b) => a.ratio - b.ratio);
  const [low, high] = [sorted[0]!, sorted.at(-1)!];
  if (high.ratio <= SAME && low.ratio >= 1 / SAME)
    return 'Drawn from the rows again, the intervals are as wide as the declared ones, give or take a seventh.';
  const times = (ratio: number): string => `${significant(ratio, 2)}\u00a0times as wide`;
  if (all.length === 1)
    return `Drawn from the rows again, the interval of ${high.name} is ${times(high.ratio)}.`;
  return `Drawn from the rows again, intervals are between ${times(low.ratio)} as the declared ones (${low.name}) and ${times(high.ratio)} (${high.name}).`;
}

/** How it was done. */
export function bootstrapMethod(bootstrap: Bootstrap): string {
  const what = {
    rows: 'Rows were',
    residuals: 'Residuals were',
    blocks: `Blocks of ${counted(bootstrap.block_length ?? 0, 'row')} that follow one another in time were`,
  }[bootstrap.by];
  const lost =
    bootstrap.used < bootstrap.repetitions
      ? `; ${count(bootstrap.repetitions - bootstrap.used)} of them could not be used`
      : '';
  const note = bootstrap.note === null ? '' : ` ${stopped(bootstrap.note)}`;
  return `${what} drawn with replacement ${count(bootstrap.repetitions)}\u00a0times (seed ${bootstrap.seed})${lost}; an interval holds the middle ${percent(bootstrap.confidence)} of the estimates (Efron & Tibshirani 1993).${note}`;
}
