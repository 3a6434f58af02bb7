import { declaredTerms } from '../study/declared-terms.ts';
import type { Study, TermPlan } from '../study/study.ts';
import { baseVariables } from './derive.ts';

/**
 * The variables that a row must have to be fitted, in order of declaration, derived ones last: those of every
 * candidate's terms, the response, the weights, the time, the clusters and the groups. A derived variable stands for what it is made of.
 */
export function neededVariables(study: Study): readonly string[] {
  const needed = new Set<string>([study.response.variable]);
  for (const term of declaredTerms(study)) {
    for (const name of termVariables(term)) needed.add(name);
  }
  if (study.weights !== null) needed.add(study.weights);
  if (study.data.time !== null) needed.add(study.data.time);
  const { standardErrors } = study.inference;
  if (standardErrors.kind === 'clustered') needed.add(standardErrors.by);
  const { validation, honestError, stability } = study.selection;
  for (const plan of [validation, honestError, stability]) {
    if (plan !== null && plan.group !== null) needed.add(plan.group);
  }
  return inOrder(study, needed);
}

/**
 * The needed variables, those that the derived ones among them rest on, and the one that splits the rows, which may
 * be missing in a row that is fitted; in order of declaration.
 */
export function sampleVariables(study: Study, needed: readonly string[]): readonly string[] {
  const all = new Set(needed);
  if (study.examination.splitAt !== null) all.add(study.examination.splitAt.variable);
  for (const name of needed) {
    for (const base of baseVariables(name, study.derive)) all.add(base);
  }
  return inOrder(study, all);
}

/** The variables of a term, each once. */
export function termVariables(term: TermPlan): readonly string[] {
  if (term.kind !== 'interaction') return [term.variable];
  return [...new Set(term.of.flatMap(termVariables))];
}

function inOrder(study: Study, names: ReadonlySet<string>): readonly string[] {
  const declared = [...study.data.variables, ...study.derive].map((variable) => variable.name);
  return declared.filter((name) => names.has(name));
}
