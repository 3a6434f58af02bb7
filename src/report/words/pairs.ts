import { count, percent, pPhrase } from '../numbers.ts';
import type { RecordTerm } from '../record-type.ts';
import { effectPhrase } from './effect.ts';
import { counted, type Lexicon } from './lexicon.ts';

/** What the pairs come to, in a sentence; null where fewer than three are compared, since the baseline's say it. */
export function pairsSentence(lexicon: Lexicon, { level_means: found }: RecordTerm): string | null {
  const pairs = found?.comparisons?.pairs ?? [];
  if (pairs.length < 3) return null;
  // As the intervals beside it: those of 90 % leave 0 out where p is below 0.1.
  const level = 1 - lexicon.confidence;
  const apart = pairs.filter((pair) => pair.adjusted_p_value < level);
  const all = `${counted(pairs.length, 'pair')} of levels`;
  if (apart.length === 0)
    return `Compared all together, none of the ${all} can be told apart (at ${percent(level)}).`;
  const largest = [...apart].sort((a, b) => Math.abs(b.estimate) - Math.abs(a.estimate))[0]!;
  const which = apart.length === pairs.length ? `all ${all}` : `${count(apart.length)} of the ${all}`;
  return `Compared all together, ${which} can be told apart (at ${percent(level)}); ${largest.level} and ${largest.other} differ most, ${effectPhrase(lexicon, largest)} at ${largest.level} (adjusted ${pPhrase(largest.adjusted_p_value)}).`;
}
