import type { Loose } from './reading.ts';
import type { FamilyPlan } from './study.ts';
import type {
  BackwardFamilyInFile,
  CandidateInFile,
  ForwardFamilyInFile,
  SubsetFamilyInFile,
  TermInFile,
} from './study-file.generated.ts';

/** A family as written. */
export type WrittenFamily = Loose<SubsetFamilyInFile | BackwardFamilyInFile | ForwardFamilyInFile>;

type WrittenTerms = readonly (Loose<TermInFile> | undefined)[];

/** Whether an element of the list of candidates is a family. */
export function isFamily(written: Loose<CandidateInFile> | WrittenFamily): written is WrittenFamily {
  return 'subsets_of' in written || 'eliminate_from' in written || 'add_from' in written;
}

export function isSubsetFamily(written: WrittenFamily): written is Loose<SubsetFamilyInFile> {
  return 'subsets_of' in written;
}

/** The list of terms that a family chooses from, with its key. */
export function listOf(written: WrittenFamily): {
  readonly key: string;
  readonly terms: WrittenTerms | undefined;
} {
  if ('subsets_of' in written) return { key: 'subsets_of', terms: written.subsets_of };
  if ('eliminate_from' in written) return { key: 'eliminate_from', terms: written.eliminate_from };
  return { key: 'add_from', terms: 'add_from' in written ? written.add_from : undefined };
}

/** Whether a model that a search finds for the family could have this name: "Loads 4a" of Loads. */
export function isFoundName({ kind, name }: Pick<FamilyPlan, 'kind' | 'name'>, candidate: string): boolean {
  const rest = candidate.startsWith(`${name} `) ? candidate.slice(name.length + 1) : '';
  return kind === 'subsets' && /^\d+[a-z]+$/.test(rest);
}

/** All terms of a named candidate or a family, as written. */
export function writtenTerms(written: Loose<CandidateInFile> | WrittenFamily): unknown[] {
  return isFamily(written) ? [written.always, listOf(written).terms] : [written.terms];
}
