import { countBetween, countSubsets } from '../stats/count-subsets.ts';
import { isSubsetFamily, type WrittenFamily } from './family-keys.ts';
import { type CheckTerm, familyMembers } from './family-members.ts';
import type { Names } from './names.ts';
import { type Path, showPath } from './path.ts';
import { fault, type Loose, type Reading } from './reading.ts';
import { resolveScale } from './resolve-scale.ts';
import type { FamilyPlan, FamilyTermPlan, ResponsePlan } from './study.ts';
import type { SubsetFamilyInFile } from './study-file.generated.ts';

/** More subsets than this cannot be searched, whatever the data: about 2^60. */
const MOST_SUBSETS = 1e18;
/** Terms of which all subsets are fewer. */
const MOST_TERMS = 59;
const KEEP = 3;

/** A family with its names looked up; null where something in it is wrong, which is reported. */
export function resolveFamily(
  reading: Reading,
  names: Names,
  written: WrittenFamily,
  position: number,
  response: ResponsePlan | null,
  checkTerm: CheckTerm,
): FamilyPlan | null {
  const path = ['candidates', position];
  const hierarchy = written.hierarchy ?? true;
  const terms = familyMembers(reading, names, written, path, hierarchy, checkTerm);
  const limits = limitsOf(reading, written, path, terms);
  const { name } = written;
  if (terms === null || name === undefined || limits === null) return null;
  const intercept = written.intercept ?? true;
  return {
    name,
    terms,
    hierarchy,
    scale: resolveScale(written.scale) ?? response?.scale ?? { kind: 'natural' },
    intercept,
    position,
    ...limits,
  };
}

type Limits =
  | { readonly kind: 'subsets'; readonly atLeast: number; readonly atMost: number; readonly keep: number }
  | {
      readonly kind: 'backward' | 'forward';
      readonly leaveAt: number | null;
      readonly enterAt: number | null;
    };

function limitsOf(
  reading: Reading,
  written: WrittenFamily,
  path: Path,
  terms: readonly FamilyTermPlan[] | null,
): Limits | null {
  if (isSubsetFamily(written)) return subsetLimits(reading, written, path, terms);
  const { leave_at: leaveAt = null, enter_at: enterAt = null } = written;
  if (leaveAt !== null && enterAt !== null && enterAt > leaveAt) {
    const message = `${showPath([...path, 'enter_at'])} is ${enterAt}, above leave_at (${leaveAt}): a term could enter and leave without end.`;
    fault(reading, 'limit_nonsense', [...path, 'enter_at'], message, 'Let terms leave at a larger p-value.');
    return null;
  }
  const kind = 'eliminate_from' in written ? 'backward' : 'forward';
  if ((kind === 'backward' ? leaveAt : enterAt) === null) return null;
  return { kind, leaveAt, enterAt };
}

function subsetLimits(
  reading: Reading,
  written: Loose<SubsetFamilyInFile>,
  path: Path,
  terms: readonly FamilyTermPlan[] | null,
): Limits | null {
  const always = written.always?.length ?? 0;
  const all = always + (written.subsets_of?.length ?? 0);
  const atLeast = written.at_least ?? null;
  const atMost = written.at_most ?? null;
  const wrong = (key: 'at_least' | 'at_most', message: string, hint?: string): null => {
    const at = [...path, key];
    fault(reading, 'limit_nonsense', at, `${showPath(at)} is ${written[key]}, but ${message}`, hint);
    return null;
  };
  if (atMost !== null && atMost < always) {
    return wrong(
      'at_most',
      `always has ${always} terms, which are counted.`,
      'Raise it, or shorten the list under always.',
    );
  }
  if (atMost !== null && atLeast !== null && atLeast > atMost)
    return wrong('at_least', `at_most is ${atMost}.`);
  if (atLeast !== null && atLeast > all)
    return wrong('at_least', `the family has only ${all} ${all === 1 ? 'term' : 'terms'}.`);
  if (terms === null) return null;
  const limits = {
    kind: 'subsets' as const,
    atLeast: Math.max(always, atLeast ?? 0),
    atMost: Math.min(all, atMost ?? all),
    keep: written.keep ?? KEEP,
  };
  return canBeSearched(reading, path, terms, limits) ? limits : null;
}

function canBeSearched(
  reading: Reading,
  path: Path,
  terms: readonly FamilyTermPlan[],
  limits: { readonly atLeast: number; readonly atMost: number },
): boolean {
  const optional = terms.flatMap(({ always }, index) => (always ? [] : [index]));
  const always = terms.length - optional.length;
  const counts = countSubsets(
    optional.map((index) => ({
      weight: 0,
      needs: terms[index]!.needs.flatMap((need) => (terms[need]!.always ? [] : [optional.indexOf(need)])),
    })),
  );
  const upTo = (most: number) => countBetween(counts, limits.atLeast - always, most - always);
  const count = upTo(limits.atMost);
  if (count <= MOST_SUBSETS) return true;
  let most = limits.atMost;
  while (most > limits.atLeast && upTo(most) > MOST_SUBSETS) most--;
  const message = `${showPath(path)} stands for ${roughly(count)} subsets of ${optional.length} terms, more than can be searched.`;
  const hint = `Write at_most: ${most}, or choose from no more than ${MOST_TERMS} terms.`;
  fault(reading, 'subsets_too_many', path, message, hint);
  return false;
}

/** "4.6 × 10^18" */
function roughly(count: number): string {
  const [mantissa, exponent] = count.toExponential(1).split('e+') as [string, string];
  return `${mantissa} × 10^${exponent}`;
}
