import { percent, type Rounding, rangeWithUnit, rounded, roundingOfInterval, withUnit } from '../numbers.ts';
import type { Lexicon } from './lexicon.ts';
import { fittedQuantity, fittedUnit, percentOfLog, scaleKind } from './scale.ts';

/** A difference on the fitted scale with its interval; limits are null where nothing can be tested. */
export interface Difference {
  readonly estimate: number;
  readonly lower: number | null;
  readonly upper: number | null;
}

/** How a difference is said: in a unit, in per cent, or as a multiple. */
interface Manner {
  readonly estimate: number;
  readonly lower: number | null;
  readonly upper: number | null;
  readonly rounding: Rounding;
  readonly unit: string | null;
  /** What stands behind "more": "fuel burned", "in the square root of fuel burned". */
  readonly of: string;
}

function mannerOf(lexicon: Lexicon, difference: Difference): Manner {
  const { estimate, lower, upper } = difference;
  const kind = scaleKind(lexicon.response.scale);
  if (kind === 'log') {
    const b = percentOfLog(estimate);
    const low = lower === null ? null : percentOfLog(lower);
    const high = upper === null ? null : percentOfLog(upper);
    return {
      estimate: b,
      lower: low,
      upper: high,
      rounding: roundingOfInterval(b, low, high),
      unit: '%',
      of: lexicon.response.label,
    };
  }
  return {
    estimate,
    lower,
    upper,
    rounding: roundingOfInterval(estimate, lower, upper),
    unit: fittedUnit(lexicon.response),
    of: kind === 'natural' ? lexicon.response.label : `in ${fittedQuantity(lexicon.response)}`,
  };
}

/** Beyond a fourfold change, per cent are hard to take in and a multiple says it better. */
const MULTIPLE_FROM = Math.log(4);

/** "1.93 L more fuel burned (95 % interval 1.64 to 2.22 L)": a difference in words, with its interval. */
export function effectPhrase(lexicon: Lexicon, difference: Difference): string {
  const { estimate, lower, upper } = difference;
  if (scaleKind(lexicon.response.scale) === 'log' && Math.abs(estimate) > MULTIPLE_FROM) {
    return multiplePhrase(lexicon, difference);
  }
  const manner = mannerOf(lexicon, difference);
  const size = withUnit(rounded(Math.abs(manner.estimate), manner.rounding), manner.unit);
  const direction = estimate < 0 ? 'less' : 'more';
  const main = `${size} ${direction} ${manner.of}`;
  if (lower === null || upper === null) return main;
  return `${main} (${intervalPhrase(lexicon, manner)})`;
}

/** "112 L more": the difference alone, for labels and captions. */
export function shortEffect(lexicon: Lexicon, difference: Difference): string {
  const manner = mannerOf(lexicon, difference);
  const size = withUnit(rounded(Math.abs(manner.estimate), manner.rounding), manner.unit);
  return `${size} ${difference.estimate < 0 ? 'less' : 'more'}`;
}

/** "111.9 L more, 95 % interval 104.9 to 118.8 L": where the response has just been named. */
export function briefEffect(lexicon: Lexicon, difference: Difference): string {
  const { lower, upper } = difference;
  const main = shortEffect(lexicon, difference);
  return lower === null || upper === null
    ? main
    : `${main}, ${intervalPhrase(lexicon, mannerOf(lexicon, difference))}`;
}

function intervalPhrase(lexicon: Lexicon, manner: Manner): string {
  const name = `${percent(lexicon.confidence)} interval`;
  const low = manner.lower as number;
  const high = manner.upper as number;
  if (low < 0 && high > 0) {
    const less = withUnit(rounded(-low, manner.rounding), manner.unit);
    const more = withUnit(rounded(high, manner.rounding), manner.unit);
    return `${name} ${less} less to ${more} more`;
  }
  const [from, to] = manner.estimate < 0 ? [-high, -low] : [low, high];
  return `${name} ${rangeWithUnit(from, to, manner.rounding, manner.unit)}`;
}

function multiplePhrase(lexicon: Lexicon, { estimate, lower, upper }: Difference): string {
  const times = Math.exp(estimate);
  const low = lower === null ? null : Math.exp(lower);
  const high = upper === null ? null : Math.exp(upper);
  const rounding = roundingOfInterval(times, low, high);
  const main = `${rounded(times, rounding)} times the ${lexicon.response.label}`;
  if (low === null || high === null) return main;
  return `${main} (${percent(lexicon.confidence)} interval ${rangeWithUnit(low, high, rounding, null)} times)`;
}

/** Whether the interval leaves the direction open; false where there is no interval. */
export function directionOpen({ lower, upper }: Difference): boolean {
  return lower !== null && upper !== null && lower <= 0 && upper >= 0;
}

/** What to add where the direction is open, else an empty string. */
export function openSentence(difference: Difference): string {
  return directionOpen(difference)
    ? ' The interval includes no difference at all, so the direction is not settled.'
    : '';
}
