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
  /** "more", "less", or null for a multiple, which needs neither. */
  readonly direction: 'more' | 'less' | null;
  /** What stands behind it: "fuel burned", "in the square root of fuel burned", "the fuel burned". */
  readonly of: string;
}

/** Beyond a fourfold change, per cent are hard to take in and a multiple says it better. */
const MULTIPLE_FROM = Math.log(4);

function mannerOf({ response }: Lexicon, difference: Difference): Manner {
  const kind = scaleKind(response.scale);
  const direction = difference.estimate < 0 ? 'less' : 'more';
  if (kind === 'log') {
    return Math.abs(difference.estimate) > MULTIPLE_FROM
      ? manner(difference, Math.exp, 'times', null, `the ${response.label}`)
      : manner(difference, percentOfLog, '%', direction, response.label);
  }
  const of = kind === 'natural' ? response.label : `in ${fittedQuantity(response)}`;
  return manner(difference, (x) => x, fittedUnit(response), direction, of);
}

function manner(
  { estimate, lower, upper }: Difference,
  say: (x: number) => number,
  unit: string | null,
  direction: Manner['direction'],
  of: string,
): Manner {
  const b = say(estimate);
  const low = lower === null ? null : say(lower);
  const high = upper === null ? null : say(upper);
  return {
    estimate: b,
    lower: low,
    upper: high,
    rounding: roundingOfInterval(b, low, high),
    unit,
    direction,
    of,
  };
}

/** "1.93 L more", "6.9 times". */
function sizePhrase({ estimate, rounding, unit, direction }: Manner): string {
  const size = withUnit(rounded(Math.abs(estimate), rounding), unit);
  return direction === null ? size : `${size} ${direction}`;
}

/** "1.93 L more fuel burned (95 % interval 1.64 to 2.22 L)": a difference in words, with its interval. */
export function effectPhrase(lexicon: Lexicon, difference: Difference): string {
  const said = mannerOf(lexicon, difference);
  const main = `${sizePhrase(said)} ${said.of}`;
  const interval = intervalPhrase(lexicon, said);
  return interval === null ? main : `${main} (${interval})`;
}

/** "112 L more": the difference alone, where the response is named beside it. */
export function shortEffect(lexicon: Lexicon, difference: Difference): string {
  return sizePhrase(mannerOf(lexicon, difference));
}

/** "112 L more fuel burned", without the interval. */
export function effectOf(lexicon: Lexicon, difference: Difference): string {
  const said = mannerOf(lexicon, difference);
  return `${sizePhrase(said)} ${said.of}`;
}

/** "111.9 L more, 95 % interval 104.9 to 118.8 L": where the response has just been named. */
export function briefEffect(lexicon: Lexicon, difference: Difference): string {
  const said = mannerOf(lexicon, difference);
  const interval = intervalPhrase(lexicon, said);
  return interval === null ? sizePhrase(said) : `${sizePhrase(said)}, ${interval}`;
}

function intervalPhrase(
  lexicon: Lexicon,
  { estimate, lower, upper, rounding, unit, direction }: Manner,
): string | null {
  if (lower === null || upper === null) return null;
  const name = `${percent(lexicon.confidence)} interval`;
  if (direction !== null && lower < 0 && upper > 0) {
    return `${name} ${withUnit(rounded(-lower, rounding), unit)} less to ${withUnit(rounded(upper, rounding), unit)} more`;
  }
  const [from, to] = direction !== null && estimate < 0 ? [-upper, -lower] : [lower, upper];
  return `${name} ${rangeWithUnit(from, to, rounding, unit)}`;
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
