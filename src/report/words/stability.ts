import { count, percent } from '../numbers.ts';
import type { StudyRecord } from '../record-type.ts';
import { counted, raised } from './lexicon.ts';

type Stability = NonNullable<StudyRecord['selection']['stability']>;

/** How often what was chosen would be chosen from rows drawn anew: the finding, then how it was done. */
export function stabilitySentences(stability: Stability, chosen: string | null): string[] {
  const { repetitions, none_admitted: none, by, group, block_length: length, seed, units } = stability;
  const own = stability.candidates.find(({ candidate }) => candidate === chosen);
  const other = stability.candidates.find(({ candidate }) => candidate !== chosen);
  const share = (n: number): string => percent(n / repetitions);
  const rival = other === undefined ? '' : `; next comes ${other.candidate}, in ${share(other.chosen)}`;
  const finding =
    chosen === null
      ? other === undefined
        ? 'From rows drawn anew, no candidate would be admitted either.'
        : `From rows drawn anew, ${other.candidate} would be chosen most often, in ${share(other.chosen)} of the cases.`
      : `From rows drawn anew, ${chosen} would be chosen in ${share(own?.chosen ?? 0)} of the cases${rival}.`;
  const nothing = none === 0 ? '' : ` In ${share(none)} no candidate was admitted.`;
  const what = {
    rows: `${counted(units, 'row', 'rows', count)} were`,
    group: `${counted(units, 'group', 'groups', count)}${group === null ? '' : ` by ${group}`} were`,
    blocks: `blocks of ${counted(length ?? 1, 'row')} that follow one another in time were`,
  }[by];
  return [
    `${finding}${nothing}`,
    `${raised(what)} drawn with replacement ${count(repetitions)}\u00a0times (seed ${seed}), and each time the declared rule chose again.`,
  ];
}

/** Whether something else than what was chosen would be chosen more often than not. */
export function unsettled(stability: Stability, chosen: string | null): boolean {
  const own = stability.candidates.find(({ candidate }) => candidate === chosen);
  return chosen !== null && (own?.share ?? 0) < 0.5;
}
