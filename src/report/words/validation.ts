import { count } from '../numbers.ts';
import type { StudyRecord } from '../record-type.ts';
import { counted, listed } from './lexicon.ts';

type Selection = StudyRecord['selection'];
type Validation = NonNullable<Selection['validation']>;

/** What cross-validation and the honest error have in common: how rows are held out. */
export type Parts = Pick<Validation, 'by' | 'folds' | 'repeats' | 'seed' | 'group' | 'start' | 'horizon'>;

const LOSSES = 3;

/** "each of 10 parts of the rows, drawn at random 3 times (seed 1)" */
export function partsPhrase({ by, folds, repeats, seed, group, start, horizon }: Parts): string {
  const times = repeats > 1 ? ` ${count(repeats)}\u00a0times` : '';
  const drawn = seed === null ? '' : ` (seed ${seed})`;
  switch (by) {
    case 'leave_one_out':
      return `each of the ${counted(folds, 'row', 'rows', count)}`;
    case 'rows':
      return `each of ${counted(folds, 'part', 'parts', count)} of the rows, drawn at random${times}${drawn}`;
    case 'group':
      return `each of ${counted(folds, 'part', 'parts', count)}, ${group === null ? 'groups' : `groups by ${group}`} kept together${times}${drawn}`;
    case 'time': {
      const ahead =
        horizon === 1 ? 'the time that follows' : `the ${count(horizon ?? 1)}\u00a0times that follow`;
      const from = start === null ? '' : `, the first ${count(start)} never held out`;
      return `${ahead} each of ${counted(folds, 'origin', 'origins', count)}, predicted from all before${from}`;
    }
  }
}

/** How every candidate was held against rows that it was not fitted on, and what that cost; nothing where none was. */
export function validationSentences({ validation, one_standard_error: one }: Selection): string[] {
  if (validation === undefined) return [];
  const left =
    validation.rows_left_out === 0
      ? []
      : [
          `${counted(validation.rows_left_out, 'held-out row', 'held-out rows', count)} could not be predicted and ${validation.rows_left_out === 1 ? 'counts' : 'count'} for no candidate.`,
        ];
  const losses = validation.losses.slice(0, LOSSES).map(({ coefficient, folds, rows, candidates }) => {
    const what = coefficient === null ? 'A row that is fitted by itself alone' : `${coefficient}`;
    return `${what} cannot be estimated without ${folds.length === 1 ? `part ${folds[0]}` : counted(folds.length, 'part')}, which takes ${counted(rows, 'row', 'rows', count)} from ${candidates.length > 2 ? counted(candidates.length, 'candidate') : listed(candidates)}.`;
  });
  return [
    `Each candidate was also fitted without ${partsPhrase(validation)}, and held against what was left out: “error on rows held out” is the root mean squared error of that.`,
    ...(one === true
      ? [
          'Of the candidates within one standard error of the best such error, the one with the fewest coefficients is taken.',
        ]
      : []),
    ...left,
    ...losses,
  ];
}
