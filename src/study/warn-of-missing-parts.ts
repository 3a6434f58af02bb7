import type { Names } from './names.ts';
import { listed, type Path, showPath } from './path.ts';
import { type Reading, warning } from './reading.ts';
import { termVariables } from './resolve-terms.ts';
import type { TermPlan } from './study.ts';

type Member = Exclude<TermPlan, { kind: 'interaction' }>;

/**
 * Warns of interactions of which a part is no term of the candidate, and says what that forces: the part makes no
 * difference where the other members are 0 or at their baseline (the principle of marginality, Nelder 1977). A
 * part counts as present in any form of the same variable. `terms` is null where a term is faulty.
 */
export function warnOfMissingParts(
  reading: Reading,
  names: Names,
  terms: readonly (TermPlan | null)[],
  path: Path,
): void {
  const present = new Set(
    terms.flatMap((term) => (term === null ? [] : [variablesKey(termVariables(term))])),
  );
  terms.forEach((term, index) => {
    if (term?.kind !== 'interaction') return;
    const members = term.of.filter((member): member is Member => member.kind !== 'interaction');
    const absent = smallestAbsent(members, present);
    const [first] = absent;
    if (first === undefined) return;
    const at = [...path, index];
    const absentNames = absent.map(joined);
    const [are, each] =
      absent.length === 1 ? ['is no term of its own', 'It is'] : ['are no terms of their own', 'Each is'];
    const others = members.filter((member) => !first.includes(member));
    const where =
      absent.length === 1
        ? listed(
            others.map((member) => zeroOf(member, names)),
            'or',
          )
        : members.length === 2
          ? 'the other is 0 or at its baseline'
          : 'the others are 0 or at their baseline';
    const intercept = absent.length === 1 && meetInOnePoint(first, others, names);
    const effect = `${each} then held to make no difference where ${where}${intercept ? ', which is one common intercept for all its levels' : ''}`;
    warning(
      reading,
      'term_without_parts',
      reading.written.placeOf(at),
      `${showPath(at)} is the interaction ${joined(members)}, but ${listed(absentNames, 'and')} ${are}. ${effect}.`,
      `This is allowed; add ${listed(absentNames, 'and')} to the terms unless it is what you mean.`,
    );
  });
}

/**
 * Warns of a category in a candidate without an intercept: its levels are set against the baseline, which the fit
 * then holds at zero.
 */
export function warnOfBaselineAtZero(
  reading: Reading,
  names: Names,
  terms: readonly (TermPlan | null)[],
  path: Path,
): void {
  terms.forEach((term, index) => {
    if (term?.kind !== 'variable' || names.get(term.variable)?.type !== 'category') return;
    const at = [...path, index];
    warning(
      reading,
      'term_without_parts',
      reading.written.placeOf(at),
      `${showPath(at)} is the category ${term.variable} in a candidate without an intercept. Its baseline is then held at a response of zero where the other terms are 0.`,
      'This is allowed; keep the intercept unless it is what you mean.',
    );
  });
}

/** The parts with fewest members that no term is made of: single variables, else pairs and so on. */
function smallestAbsent(members: readonly Member[], present: ReadonlySet<string>): (readonly Member[])[] {
  for (let size = 1; size < members.length; size++) {
    const absent = partsOf(members, size).filter(
      (part) => !present.has(variablesKey(part.map(({ variable }) => variable))),
    );
    if (absent.length > 0) return absent;
  }
  return [];
}

function partsOf<T>(items: readonly T[], size: number): (readonly T[])[] {
  if (size === 0) return [[]];
  return items.flatMap((item, index) =>
    partsOf(items.slice(index + 1), size - 1).map((rest) => [item, ...rest]),
  );
}

function variablesKey(variables: readonly string[]): string {
  return JSON.stringify([...variables].sort());
}

function joined(members: readonly Member[]): string {
  return members.map(({ variable }) => variable).join(' × ');
}

/** Where the columns of a member are 0, in words. */
function zeroOf(member: Member, names: Names): string {
  const { variable } = member;
  if (member.kind === 'bend') {
    return `${variable} is ${member.side === 'above' ? 'at most' : 'at least'} ${member.at}`;
  }
  if (names.get(variable)?.type === 'category') return `${variable} is at its baseline`;
  return names.get(variable)?.type === 'flag' ? `${variable} is coded 0` : `${variable} is 0`;
}

/** Whether the lines of all levels of the part are held to meet where the numbers are 0. */
function meetInOnePoint(part: readonly Member[], others: readonly Member[], names: Names): boolean {
  const isNumber = ({ variable }: Member) => {
    const type = names.get(variable)?.type;
    return type !== 'category' && type !== 'flag';
  };
  return part.length === 1 && !part.some(isNumber) && others.every(isNumber);
}
