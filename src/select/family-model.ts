import type { CandidateModel, FamilyModel } from '../model/design.ts';

/** The model of a family that has these of its terms, by index and in ascending order. */
export function familyCandidate(family: FamilyModel, terms: readonly number[], name: string): CandidateModel {
  const { plan, response, responseColumn } = family;
  const own = terms.map((index) => family.terms[index]!);
  const columns = [...new Set(own.flatMap((term) => term.columns))];
  return {
    name,
    position: plan.position,
    response,
    intercept: plan.intercept,
    terms: own,
    columns: plan.intercept ? [0, ...columns] : columns,
    responseColumn,
  };
}

/** Equal for models with the same columns on the same response. */
export function contentKey({ responseColumn, columns }: CandidateModel): string {
  return `${responseColumn}: ${[...columns].sort((a, b) => a - b).join()}`;
}

/** "a" for 0, "z" for 25, "aa" for 26. */
export function letter(index: number): string {
  const last = String.fromCharCode(97 + (index % 26));
  return index < 26 ? last : letter(Math.floor(index / 26) - 1) + last;
}
