import type { CandidateModel, Design } from '../model/design.ts';

/**
 * What a candidate chosen from other rows is called: the name of the study's candidate with the same columns; else, of one that a
 * search found only there, its terms. The name that the search gave it belongs to those rows alone.
 */
export function namesOfChosen(design: Pick<Design, 'candidates'>): (candidate: CandidateModel) => string {
  const names = new Map<string, string>();
  for (const candidate of design.candidates) {
    const key = keyOf(candidate);
    if (!names.has(key)) names.set(key, candidate.name);
  }
  return (candidate) =>
    names.get(keyOf(candidate)) ??
    (candidate.terms.length === 0 ? 'the mean alone' : candidate.terms.map(({ name }) => name).join(', '));
}

function keyOf({ columns, responseColumn }: CandidateModel): string {
  return `${responseColumn} ${[...columns].sort((a, b) => a - b).join(' ')}`;
}
