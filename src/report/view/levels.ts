import { count, pValue, rangeWithUnit, rounded, roundingOfInterval, withUnit } from '../numbers.ts';
import type { RecordTerm } from '../record-type.ts';
import type { LevelsView } from '../view.ts';
import { type Lexicon, labelOf, raised, stopped } from '../words/lexicon.ts';
import { fittedUnit, percentOfLog, scaleKind } from '../words/scale.ts';

/** Pairs beyond this are left to the record. */
const PAIRS = 60;

/** Level means and pairs of levels of a category; null for other terms. */
export function levelsView(lexicon: Lexicon, term: RecordTerm): LevelsView | null {
  const found = term.level_means;
  if (found === null || found === undefined || found.means.length === 0) return null;
  const { response } = lexicon;
  const pairs = found.comparisons?.pairs ?? [];
  const natural = scaleKind(response.scale) === 'natural';
  return {
    heading: `${raised(labelOf(lexicon, found.variable))}: each level, and each pair of levels`,
    quantity: natural
      ? response.unit === null
        ? response.label
        : `${response.label} in ${response.unit}`
      : `${response.label}, taken back to ${response.unit ?? 'the scale of the data'}`,
    held: stopped(found.held),
    means: found.means.map((mean) => {
      const own = natural ? mean : mean.own;
      const known = own?.estimate ?? null;
      if (own === null || known === null)
        return { level: mean.level, rows: count(mean.rows), estimate: '–', interval: '–' };
      const rounding = roundingOfInterval(known, own.lower, own.upper);
      return {
        level: mean.level,
        rows: count(mean.rows),
        estimate: withUnit(rounded(known, rounding), response.unit),
        interval: rangeWithUnit(own.lower, own.upper, rounding, response.unit),
      };
    }),
    method: found.comparisons === null ? null : stopped(found.comparisons.sentence),
    pairs: pairs.slice(0, PAIRS).map((pair) => ({
      level: pair.level,
      other: pair.other,
      ...difference(lexicon, pair),
      pValue: pValue(pair.adjusted_p_value),
    })),
    pairsNote:
      found.comparisons?.omitted ??
      (pairs.length > PAIRS ? `${count(pairs.length - PAIRS)} further pairs are in the record.` : null),
  };
}

type Pair = NonNullable<NonNullable<RecordTerm['level_means']>['comparisons']>['pairs'][number];

function difference(
  lexicon: Lexicon,
  { estimate, lower, upper }: Pair,
): { readonly estimate: string; readonly interval: string } {
  const log = scaleKind(lexicon.response.scale) === 'log';
  const back = (x: number): number => (log ? percentOfLog(x) : x);
  const unit = log ? '%' : fittedUnit(lexicon.response);
  const rounding = roundingOfInterval(back(estimate), back(lower), back(upper));
  return {
    estimate: withUnit(rounded(back(estimate), rounding), unit),
    interval: rangeWithUnit(back(lower), back(upper), rounding, unit),
  };
}
