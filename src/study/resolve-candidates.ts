import { isFamily, isFoundName } from './family-keys.ts';
import type { Names } from './names.ts';
import { type Path, quote, showPath } from './path.ts';
import { fault, type Loose, type Reading, warning } from './reading.ts';
import { resolveFamily } from './resolve-families.ts';
import { resolveScale } from './resolve-scale.ts';
import { resolveTerm, termKey, termPowers, termVariables } from './resolve-terms.ts';
import type { CandidatePlan, FamilyPlan, ResponsePlan, TermPlan } from './study.ts';
import type { CandidateInFile } from './study-file.generated.ts';
import { warnOfBaselineAtZero, warnOfMissingParts } from './warn-of-missing-parts.ts';

export interface ResolvedCandidates {
  readonly candidates: readonly CandidatePlan[];
  readonly families: readonly FamilyPlan[];
}

/**
 * The candidates, named ones and families. `response` is null where it could not be resolved; `derivedFrom` gives the declared variables
 * that a variable rests on.
 */
export function resolveCandidates(
  reading: Reading,
  names: Names,
  response: ResponsePlan | null,
  derivedFrom: (name: string) => ReadonlySet<string>,
): ResolvedCandidates {
  const plans: CandidatePlan[] = [];
  const families: FamilyPlan[] = [];
  const byName = new Map<string, number>();
  const byContent = new Map<string, string>();
  reading.file.candidates?.forEach((written, index) => {
    if (written === undefined) return;
    const path = ['candidates', index];
    if (isFamily(written)) {
      checkName(written.name, index);
      const family = resolveFamily(reading, names, written, index, response, (term, at) =>
        checkResponse(reading, term, at, response, derivedFrom),
      );
      if (family !== null) families.push(family);
      return;
    }
    const terms = resolveTerms(reading, names, written, [...path, 'terms']);
    for (const [at, term] of terms.entries()) {
      if (term !== null) checkResponse(reading, term, [...path, 'terms', at], response, derivedFrom);
    }
    if (!terms.includes(null)) warnOfMissingParts(reading, names, terms, [...path, 'terms']);
    if (written.intercept === false) warnOfBaselineAtZero(reading, names, terms, [...path, 'terms']);
    const name = written.name;
    if (name === undefined) return;
    const isTwice = checkName(name, index);

    const sound = terms.filter((term) => term !== null);
    if (sound.length < terms.length || written.terms === undefined) return;
    const scale = resolveScale(written.scale) ?? response?.scale ?? { kind: 'natural' };
    const intercept = written.intercept ?? true;
    if (sound.length === 0 && !intercept) {
      const message = `${showPath(path)} has neither a term nor an intercept, so that there is nothing to fit.`;
      fault(reading, 'limit_nonsense', [...path, 'terms'], message);
    }
    const content = JSON.stringify([sound.map(termKey).sort(), scale, intercept]);
    const same = byContent.get(content);
    if (same !== undefined && !isTwice) {
      const message = `${showPath(path)} has the same terms, scale and intercept as ${quote(same)}.`;
      fault(reading, 'candidate_twice', path, message, 'Remove one of the two.');
    } else byContent.set(content, name);
    plans.push({ name, terms: sound, scale, intercept, position: index });
  });
  for (const { name, position = 0 } of plans) {
    const family = families.find((each) => isFoundName(each, name));
    if (family === undefined) continue;
    const path = ['candidates', position, 'name'];
    const message = `${showPath(path)} is ${quote(name)}, as a model found for ${quote(family.name)} could be called.`;
    fault(reading, 'candidate_twice', path, message, 'Give it another name.');
  }
  return { candidates: plans, families };

  function checkName(name: string | undefined, index: number): boolean {
    if (name === undefined) return false;
    const earlier = byName.get(name);
    if (earlier === undefined) {
      byName.set(name, index);
      return false;
    }
    const path = ['candidates', index, 'name'];
    const message = `${showPath(path)} is ${quote(name)}, the name of candidates[${earlier}] already.`;
    fault(reading, 'candidate_twice', path, message, 'Give each candidate a name of its own.');
    return true;
  }
}

function resolveTerms(
  reading: Reading,
  names: Names,
  written: Loose<CandidateInFile>,
  path: Path,
): readonly (TermPlan | null)[] {
  const keys = new Map<string, number>();
  const powers = new Map<string, number>();
  return (written.terms ?? []).map((term, index) => {
    const at = [...path, index];
    const plan = term === undefined ? null : resolveTerm(reading, names, term, at);
    if (plan === null) return null;
    const key = termKey(plan);
    const same = keys.get(key);
    if (same !== undefined) {
      const message = `${showPath(at)} is the same term as ${showPath([...path, same])}.`;
      fault(reading, 'name_twice', at, message, 'Keep one of them.');
      return plan;
    }
    keys.set(key, index);
    const shared = termPowers(plan).find((power) => powers.has(powerKey(plan, power)));
    if (shared !== undefined) {
      const other = showPath([...path, powers.get(powerKey(plan, shared))!]);
      const [variable] = termVariables(plan);
      const what = shared === 1 ? `${variable} itself` : `${variable} to the power ${shared}`;
      fault(
        reading,
        'name_twice',
        at,
        `${showPath(at)} brings in ${what}, as does ${other}.`,
        'Keep one of them.',
      );
    }
    for (const power of termPowers(plan)) powers.set(powerKey(plan, power), index);
    return plan;
  });
}

function powerKey(term: TermPlan, power: number): string {
  return `${power} ${termVariables(term)[0]}`;
}

/** The response cannot explain itself, and what is derived from it is not known where it is to be predicted. */
function checkResponse(
  reading: Reading,
  term: TermPlan,
  path: Path,
  response: ResponsePlan | null,
  derivedFrom: (name: string) => ReadonlySet<string>,
): void {
  for (const variable of response === null ? [] : termVariables(term)) {
    if (variable === response?.variable) {
      const message = `${showPath(path)} is of ${variable}, which is the response.`;
      fault(reading, 'type_unsuited', path, message, 'The response cannot be among its own terms.');
    } else if (response !== null && derivedFrom(variable).has(response.variable)) {
      const message = `${showPath(path)} is of ${variable}, which is derived from the response ${response.variable}.`;
      const hint = 'It is not known where the response is to be predicted, and the fit flatters itself.';
      warning(reading, 'type_unsuited', reading.written.placeOf(path), message, hint);
    }
  }
}
