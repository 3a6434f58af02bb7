import { percent, range, rangeWithUnit, rounded, roundingOfInterval, THIN, withUnit } from '../numbers.ts';
import type { RecordTerm } from '../record-type.ts';
import { type Lexicon, labelOf, listed } from './lexicon.ts';
import { scaleKind } from './scale.ts';

type OwnScale = NonNullable<RecordTerm['own_scale']>;
type Effect = OwnScale['effects'][number];

/** More effects of a term than this are told by the first and the last. */
const EFFECTS_IN_WORDS = 3;

/**
 * What a term says of the response on its own scale where the sentences about its coefficient do not: an elasticity, per cent
 * where the response is itself a logarithm in the data, a difference on the scale of the data. From the record as it stands.
 */
export function ownScaleSentences(lexicon: Lexicon, term: RecordTerm): string[] {
  const own = term.own_scale;
  const [first] = own?.effects ?? [];
  if (own === null || own === undefined || first === undefined) return [];
  switch (own.kind) {
    case 'elasticity':
      return [
        `In per cent of both: 1${THIN}% more ${labelOf(lexicon, first.of)} goes with ${inPerCent(lexicon, first)}.`,
      ];
    case 'percent':
      // On the log scale the sentence about the coefficient is in per cent already.
      return scaleKind(lexicon.response.scale) === 'log'
        ? []
        : [
            `In per cent of what its logarithm is taken of: ${several(own.effects, (e) => `${inPerCent(lexicon, e)} for ${e.of}`)}.`,
          ];
    case 'per_doubling':
      return [];
    case 'difference':
      return [
        `On the scale of the data: ${several(own.effects, (e) => `${inUnits(lexicon, e)} for ${e.of}`)}, the other variables at their averages.`,
      ];
  }
}

function several(effects: readonly Effect[], say: (effect: Effect) => string): string {
  const shown = effects.length <= EFFECTS_IN_WORDS ? effects : [effects[0]!, effects.at(-1)!];
  const more = effects.length - shown.length;
  return `${listed(shown.map(say), more > 0 ? 'to' : 'and')}`;
}

function inPerCent(lexicon: Lexicon, { estimate, lower, upper }: Effect): string {
  const rounding = roundingOfInterval(estimate, lower, upper);
  const interval =
    lower === null || upper === null
      ? ''
      : ` (${percent(lexicon.confidence)} interval ${range(lower, upper, rounding)}${THIN}%)`;
  return `${signed(rounded(Math.abs(estimate), rounding), estimate)}${interval}`;
}

function signed(size: string, estimate: number): string {
  return `${size}${THIN}% ${estimate < 0 ? 'less' : 'more'}`;
}

function inUnits(lexicon: Lexicon, { estimate, lower, upper }: Effect): string {
  const { unit, label } = lexicon.response;
  const rounding = roundingOfInterval(estimate, lower, upper);
  const size = withUnit(rounded(Math.abs(estimate), rounding), unit);
  const interval =
    lower === null || upper === null
      ? ''
      : ` (${percent(lexicon.confidence)} interval ${rangeWithUnit(lower, upper, rounding, unit)})`;
  return `${size} ${estimate < 0 ? 'less' : 'more'} ${label}${interval}`;
}

/** The difference per doubling that the record gives where the variable alone is a logarithm; null elsewhere. */
export function perDoubling(term: RecordTerm): Effect | null {
  return term.own_scale?.kind === 'per_doubling' ? (term.own_scale.effects[0] ?? null) : null;
}
