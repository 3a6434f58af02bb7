import { listOf, type WrittenFamily } from './family-keys.ts';
import type { Names } from './names.ts';
import { type Path, showPath } from './path.ts';
import { fault, type Reading } from './reading.ts';
import { resolveTerm } from './resolve-terms.ts';
import type { FamilyTermPlan, TermPlan } from './study.ts';
import { partsOf, productKey, productName, termProducts } from './term-products.ts';

/** Checks a term of a candidate against the response. */
export type CheckTerm = (term: TermPlan, path: Path) => void;

interface Member {
  readonly term: TermPlan;
  readonly always: boolean;
  readonly path: Path;
}

/**
 * The terms of a family, those that are always in first, each with the others that it contains. Null where a
 * term is wrong, two bring in the same column, or the hierarchy cannot be kept; all of it is reported.
 */
export function familyMembers(
  reading: Reading,
  names: Names,
  written: WrittenFamily,
  path: Path,
  hierarchy: boolean,
  checkTerm: CheckTerm,
): readonly FamilyTermPlan[] | null {
  const { key, terms: choice } = listOf(written);
  let isSound = choice !== undefined;
  const members: Member[] = [];
  for (const [list, terms] of [
    ['always', written.always],
    [key, choice],
  ] as const) {
    terms?.forEach((term, index) => {
      const at = [...path, list, index];
      const plan = term === undefined ? null : resolveTerm(reading, names, term, at);
      if (plan === null) isSound = false;
      else {
        checkTerm(plan, at);
        members.push({ term: plan, always: list === 'always', path: at });
      }
    });
  }
  const owners = ownersOf(reading, members);
  if (!isSound || owners === null) return null;
  const needs = members.map((member) => (hierarchy ? needsOf(reading, member, members, owners, key) : []));
  return needs.some((each) => each === null)
    ? null
    : members.map((member, index) => ({ ...member, needs: needs[index]! }));
}

/** Which member brings in each product; null where two bring in the same, which is reported. */
function ownersOf(reading: Reading, members: readonly Member[]): ReadonlyMap<string, number> | null {
  const owners = new Map<string, number>();
  let isSound = true;
  members.forEach(({ term, path, always }, index) => {
    const products = termProducts(term);
    const shared = products.find((product) => owners.has(productKey(product)));
    if (shared !== undefined) {
      isSound = false;
      const other = members[owners.get(productKey(shared))!]!;
      const isSame = products.every((product) => owners.has(productKey(product)));
      const what = isSame
        ? `is the same term as ${showPath(other.path)}`
        : `brings in ${productName(shared)}${shared.length === 1 && shared[0]!.power === 1 ? ' itself' : ''}, as does ${showPath(other.path)}`;
      const hint =
        always === other.always
          ? 'Keep one of them.'
          : 'A term is either always in or to be chosen: keep one of them.';
      fault(reading, 'name_twice', path, `${showPath(path)} ${what}.`, hint);
      return;
    }
    for (const product of products) owners.set(productKey(product), index);
  });
  return isSound ? owners : null;
}

/** The members that a member contains; null where one is missing or could be left out while this one stays. */
function needsOf(
  reading: Reading,
  member: Member,
  members: readonly Member[],
  owners: ReadonlyMap<string, number>,
  key: string,
): readonly number[] | null {
  const own = termProducts(member.term);
  const ownKeys = new Set(own.map(productKey));
  const needs = new Set<number>();
  for (const part of own.flatMap(partsOf)) {
    if (ownKeys.has(productKey(part))) continue;
    const owner = owners.get(productKey(part));
    const contains = `${showPath(member.path)} contains ${productName(part)}`;
    if (owner === undefined) {
      const message = `${contains}, which is no term of this family: no model could have the one with the other.`;
      const hint = `Add it to ${key}, or write hierarchy: false.`;
      fault(reading, 'hierarchy_impossible', member.path, message, hint);
      return null;
    }
    if (member.always && !members[owner]!.always) {
      const message = `${contains}, which ${showPath(members[owner]!.path)} lets be left out.`;
      const hint = 'Put it under always too, or write hierarchy: false.';
      fault(reading, 'hierarchy_impossible', member.path, message, hint);
      return null;
    }
    needs.add(owner);
  }
  return [...needs].sort((a, b) => a - b);
}
