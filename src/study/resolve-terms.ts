import { lookUp, lookUpOfType, type Names, TYPE_WORDS } from './names.ts';
import { type Path, quote, showPath } from './path.ts';
import { fault, type Loose, type Reading } from './reading.ts';
import type { TermPlan, VariableType } from './study.ts';
import type { MemberInFile, TermInFile } from './study-file.generated.ts';

const NUMERIC: readonly VariableType[] = ['number', 'integer'];

/** A term with its names looked up, or null where something in it is wrong, which is reported. */
export function resolveTerm(
  reading: Reading,
  names: Names,
  term: Loose<TermInFile>,
  path: Path,
): TermPlan | null {
  if (typeof term === 'string') return variableTerm(reading, names, term, path);
  if ('interaction' in term) return interaction(reading, names, term.interaction ?? [], path);
  if ('polynomial' in term) {
    const variable = numeric(reading, names, term.polynomial, [...path, 'polynomial'], 'a polynomial');
    if (variable === null || term.degree === undefined) return null;
    return { kind: 'polynomial', variable, degree: term.degree };
  }
  if ('power' in term) {
    const variable = numeric(reading, names, term.power, [...path, 'power'], 'a power');
    return variable === null || term.to === undefined ? null : { kind: 'power', variable, to: term.to };
  }
  if ('bend' in term) {
    const variable = numeric(reading, names, term.bend, [...path, 'bend'], 'a bend');
    if (variable === null || term.at === undefined) return null;
    return { kind: 'bend', variable, at: term.at, side: term.side ?? 'above' };
  }
  if ('spline' in term) return spline(reading, names, term.spline, term.knots ?? [], path);
  return null;
}

function variableTerm(reading: Reading, names: Names, name: string, path: Path): TermPlan | null {
  const hint = names.has(name) ? undefined : calculationHint(name, names);
  if (hint !== undefined) {
    fault(reading, 'name_unknown', path, `${showPath(path)} is ${quote(name)}; a term is one name.`, hint);
    return null;
  }
  const named = lookUp(reading, names, name, path);
  if (named === null || named.type === null) return null;
  const { type } = named;
  if (type === 'date') {
    const message = `${showPath(path)} names ${name}, which is a date; a term is a number, a category or a flag.`;
    const hint = `Derive a number from it, such as days_between("2020-01-01", ${name}), month(${name}) or year(${name}).`;
    fault(reading, 'type_unsuited', path, message, hint);
    return null;
  }
  if (type === 'text' || type === 'identifier') {
    const message = `${showPath(path)} names ${name}, which is ${TYPE_WORDS[type]}; a term is a number, a category or a flag.`;
    fault(reading, 'type_unsuited', path, message, `Declare ${name} as a category if its values are levels.`);
    return null;
  }
  return { kind: 'variable', variable: name };
}

/** How to write a term that is a calculation with known names; undefined where it is none. */
function calculationHint(text: string, names: Names): string | undefined {
  if (text.includes('~'))
    return 'Terms are given as a list of names; the response is named once, under response.';
  const parts = text.split(/\s*[-+*/:×^()]+\s*/).filter((part) => part !== '');
  const known = (part: string) => names.has(part);
  const calculated = (part: string) => known(part) || /^[\d.]+$/.test(part) || text.includes(`${part}(`);
  if (parts.length < 2 || !parts.some(known) || !parts.every(calculated)) return undefined;
  const allKnown = parts.every(known);
  if (allKnown && /^[^-+/^()]+$/.test(text)) {
    return `An interaction is written { interaction: [${parts.join(', ')}] }, beside its parts as terms of their own.`;
  }
  if (allKnown && /^[^-*/:×^()]+$/.test(text)) return `Terms stand in a list: [${parts.join(', ')}].`;
  const [base, to] = parts;
  if (parts.length === 2 && names.has(base!) && /^\d+(\.\d+)?$/.test(to!) && /\^|\*\*/.test(text)) {
    return `A power is written { power: ${base}, to: ${to} }.`;
  }
  return 'What is worked out from variables is given a name under derive, and that is the term.';
}

function numeric(
  reading: Reading,
  names: Names,
  name: string | undefined,
  path: Path,
  what: string,
): string | null {
  if (name === undefined) return null;
  const purpose = `${what} needs a number`;
  return lookUpOfType(reading, names, name, path, NUMERIC, purpose)?.name ?? null;
}

function spline(
  reading: Reading,
  names: Names,
  name: string | undefined,
  knots: readonly (number | undefined)[],
  path: Path,
): TermPlan | null {
  const variable = numeric(reading, names, name, [...path, 'spline'], 'a spline');
  const known = knots.filter((knot) => knot !== undefined);
  const fallen = knots.findIndex((knot, index) => index > 0 && !(Number(knot) > Number(knots[index - 1])));
  if (known.length === knots.length && fallen > 0) {
    const message = `${showPath([...path, 'knots'])} must increase, but ${knots[fallen]} follows ${knots[fallen - 1]}.`;
    fault(reading, 'limit_nonsense', [...path, 'knots', fallen], message);
    return null;
  }
  if (variable === null || known.length < 3 || known.length < knots.length) return null;
  return { kind: 'spline', variable, knots: known };
}

function interaction(
  reading: Reading,
  names: Names,
  members: readonly (Loose<MemberInFile> | undefined)[],
  path: Path,
): TermPlan | null {
  const plans = members.map((member, index) =>
    member === undefined ? null : resolveTerm(reading, names, member, [...path, 'interaction', index]),
  );
  const seen = new Set<string>();
  let sound = true;
  plans.forEach((plan, index) => {
    const variable = plan === null || plan.kind === 'interaction' ? null : plan.variable;
    if (variable === null) return;
    if (seen.has(variable)) {
      sound = false;
      const at = [...path, 'interaction', index];
      const isNumber = NUMERIC.some((type) => type === names.get(variable)?.type);
      const hint = isNumber
        ? `For a curve use { polynomial: ${variable}, degree: 2 } or { power: ${variable}, to: 2 }.`
        : 'Each member is of a variable of its own.';
      fault(
        reading,
        'name_twice',
        at,
        `${showPath(path)} is an interaction of ${variable} with itself.`,
        hint,
      );
    }
    seen.add(variable);
  });
  const of = plans.filter((plan) => plan !== null);
  return sound && of.length === plans.length && of.length >= 2 ? { kind: 'interaction', of } : null;
}

/** Variables that a term reads, each once. */
export function termVariables(term: TermPlan): readonly string[] {
  return term.kind === 'interaction' ? [...new Set(term.of.flatMap(termVariables))] : [term.variable];
}

/** Equal for terms that mean the same, whatever the order of an interaction's members. */
export function termKey(term: TermPlan): string {
  switch (term.kind) {
    case 'interaction':
      return JSON.stringify(['interaction', ...term.of.map(termKey).sort()]);
    case 'polynomial':
      return term.degree === 1
        ? termKey({ kind: 'variable', variable: term.variable })
        : JSON.stringify(['polynomial', term.variable, term.degree]);
    case 'variable':
      return JSON.stringify(['variable', term.variable]);
    case 'power':
      return JSON.stringify(['power', term.variable, term.to]);
    case 'bend':
      return JSON.stringify(['bend', term.variable, term.at, term.side]);
    case 'spline':
      return JSON.stringify(['spline', term.variable, ...term.knots]);
  }
}

/** The plain powers of one variable that a term brings in: two terms of a candidate must not share one. */
export function termPowers(term: TermPlan): readonly number[] {
  switch (term.kind) {
    case 'variable':
    case 'spline':
      return [1];
    case 'polynomial':
      return Array.from({ length: term.degree }, (_, index) => index + 1);
    case 'power':
      return [term.to];
    default:
      return [];
  }
}
