import { count, pPhrase, significant, value } from '../numbers.ts';
import type { RecordFamily } from '../record-type.ts';
import { counted, listed, stopped } from './lexicon.ts';
import { modelsPhrase } from './models.ts';

/** What a search covered and how, in sentences. */
export function familySentences(family: RecordFamily): string[] {
  const always = family.terms.filter((term) => term.always).map(({ name }) => name);
  const free = family.terms.length - always.length;
  const fixed = always.length === 0 ? '' : `; every model has ${listed(always)}`;
  const order = family.hierarchy
    ? ' No interaction or higher power stands without what it contains.'
    : ' Interactions and higher powers may stand without what they contain.';
  const looked = modelsPhrase({ count: family.searched, exact: family.searched_exactly, searched: true });
  const first = {
    subsets: `All subsets of ${counted(free, 'term')}${sizes(family)} were searched, ${looked}, and the best ${family.keep === 1 ? 'one' : count(family.keep ?? 1)} of each number of coefficients kept${fixed}. ${exactness(family)}`,
    backward: `From all ${counted(free, 'term')}, the one with the largest p-value left, as long as that was above ${value(family.leave_at)}${returns(family)}${fixed}.`,
    forward: `Of ${counted(free, 'term')}, the one with the smallest p-value entered, as long as that was at most ${value(family.enter_at)}${leaves(family)}${fixed}.`,
  }[family.kind];
  return [
    `${first.trim()}${order}`,
    ...(family.ended_because === null ? [] : [stopped(family.ended_because)]),
    ...(family.idle_terms.length === 0
      ? []
      : [
          `${listed(family.idle_terms)} ${family.idle_terms.length === 1 ? 'is' : 'are'} in no model: in these rows ${family.idle_terms.length === 1 ? 'it says' : 'they say'} nothing beside what ${family.idle_terms.length === 1 ? 'it needs' : 'they need'}.`,
        ]),
    ...(family.note === null ? [] : [stopped(family.note)]),
  ];
}

function sizes({ at_least: least, at_most: most, terms }: RecordFamily): string {
  const low = least !== null && least > 0;
  const high = most !== null && most < terms.length;
  if (low && high) return ` (${count(least)} to ${count(most)} at a time)`;
  if (low) return ` (at least ${count(least)} at a time)`;
  return high ? ` (at most ${count(most)} at a time)` : '';
}

function exactness({ exact_for: exact, visited }: RecordFamily): string {
  const by = `by bounds, with ${counted(visited, 'place', 'places', count)} of the search looked at`;
  return exact === 'every size'
    ? `The best of every size is exact (${by}).`
    : exact === 'the choice'
      ? `What could be chosen is exact (${by}); sizes that could not be were left aside.`
      : '';
}

function returns({ enter_at: at }: RecordFamily): string {
  return at === null ? '' : `; one that had left returned where its p-value was at most ${value(at)}`;
}

function leaves({ leave_at: at }: RecordFamily): string {
  return at === null ? '' : `; one that had entered left again where its p-value was above ${value(at)}`;
}

/** "cars leaves: F = 0.194 on 1 and 236 degrees of freedom, p = 0.66." */
export function stepEvidence(step: RecordFamily['path'][number]): string {
  if (step.statistic === null || step.df1 === null || step.df2 === null || step.p_value === null)
    return 'no column beside the others';
  return `F\u00a0=\u00a0${significant(step.statistic, 3)} on ${count(step.df1)} and ${count(step.df2)}, ${pPhrase(step.p_value)}`;
}
