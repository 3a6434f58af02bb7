import { lookUpOfType, type Names } from './names.ts';
import { type Path, quote, showPath } from './path.ts';
import { fault, type Loose, type Reading, warning } from './reading.ts';
import { resolveTerm, termKey, termPowers, termVariables } from './resolve-terms.ts';
import type { CandidatePlan, ResponsePlan, Scale, TermPlan } from './study.ts';
import type { CandidateInFile, ScaleInFile } from './study-file.generated.ts';

export function resolveResponse(reading: Reading, names: Names): ResponsePlan | null {
  const written = reading.file.response;
  if (written === undefined) return null;
  const isName = typeof written === 'string';
  const name = isName ? written : written.variable;
  if (name === undefined) return null;
  const path = isName ? ['response'] : ['response', 'variable'];
  const named = lookUpOfType(reading, names, name, path, ['number', 'integer'], 'a response is a number');
  if (named === null) return null;
  return { variable: name, scale: resolveScale(isName ? undefined : written.scale) ?? { kind: 'natural' } };
}

function resolveScale(written: Loose<ScaleInFile> | undefined): Scale | null {
  if (written === undefined) return null;
  if (typeof written === 'string') return { kind: written };
  return written.box_cox === undefined ? null : { kind: 'box_cox', lambda: written.box_cox };
}

/** "log", "box_cox 0.5" */
export function scaleText(scale: Scale): string {
  return scale.kind === 'box_cox' ? `box_cox ${scale.lambda}` : scale.kind;
}

/**
 * The candidates. `response` is null where it could not be resolved; `derivedFrom` gives the declared variables
 * that a variable rests on.
 */
export function resolveCandidates(
  reading: Reading,
  names: Names,
  response: ResponsePlan | null,
  derivedFrom: (name: string) => ReadonlySet<string>,
): readonly CandidatePlan[] {
  const plans: CandidatePlan[] = [];
  const byName = new Map<string, number>();
  const byContent = new Map<string, string>();
  reading.file.candidates?.forEach((written, index) => {
    if (written === undefined) return;
    const path = ['candidates', index];
    const terms = resolveTerms(reading, names, written, [...path, 'terms']);
    for (const [at, term] of terms.entries()) {
      if (term !== null) checkResponse(reading, term, [...path, 'terms', at], response, derivedFrom);
    }
    const name = written.name;
    if (name === undefined) return;
    const earlier = byName.get(name);
    if (earlier !== undefined) {
      const message = `${showPath([...path, 'name'])} is ${quote(name)}, the name of candidates[${earlier}] already.`;
      fault(reading, 'candidate_twice', [...path, 'name'], message, 'Give each candidate a name of its own.');
    } else byName.set(name, index);

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
    if (same !== undefined && earlier === undefined) {
      const message = `${showPath(path)} has the same terms, scale and intercept as ${quote(same)}.`;
      fault(reading, 'candidate_twice', path, message, 'Remove one of the two.');
    } else byContent.set(content, name);
    plans.push({ name, terms: sound, scale, intercept });
  });
  return plans;
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

/** A weight is a number. */
export function resolveWeights(reading: Reading, names: Names): string | null {
  const name = reading.file.weights;
  if (name === undefined || name === null) return null;
  const purpose = 'a weight is a number';
  return lookUpOfType(reading, names, name, ['weights'], ['number', 'integer'], purpose)?.name ?? null;
}

/** Row identity and time order. */
export function resolveRowRoles(
  reading: Reading,
  names: Names,
): { readonly rowId: string | null; readonly time: string | null } {
  const { row_id: rowId = null, time = null } = reading.file.data ?? {};
  if (rowId !== null) {
    const path = ['data', 'row_id'];
    const purpose = 'rows are identified by an identifier, a text or an integer';
    const suited = ['identifier', 'text', 'integer'] as const;
    const named = lookUpOfType(reading, names, rowId, path, suited, purpose);
    if (named?.derived === true) {
      fault(
        reading,
        'type_unsuited',
        path,
        `data.row_id names ${rowId}, which is derived; ${purpose} in the data.`,
      );
    }
  }
  if (time !== null) {
    const purpose = 'rows are put in order by a date or a number';
    lookUpOfType(reading, names, time, ['data', 'time'], ['date', 'number', 'integer'], purpose);
  }
  return { rowId, time };
}

/** Reports names of derived variables that nothing uses. */
export function warnOfUnused(reading: Reading, derived: readonly string[], used: ReadonlySet<string>): void {
  for (const name of derived) {
    if (used.has(name)) continue;
    const place = reading.written.keyPlaceOf(['derive', name]);
    const message = `${showPath(['derive', name])} is derived, but nothing uses it.`;
    warning(reading, 'name_unused', place, message, 'Remove it, or add it to a candidate.');
  }
}
