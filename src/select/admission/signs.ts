import type { Fit, FitContext } from '../../engine/fit.ts';
import { nearest } from '../../expression/nearest.ts';
import type { Report } from '../../problem.ts';
import type { Study } from '../../study/study.ts';
import type { AdmissionRule } from '../admission-rule.ts';
import { listedUpTo, significant } from '../words.ts';

/** A rule applies to the candidates that contain its name: a coefficient, or a term of one column. */
export const signs: AdmissionRule = {
  name: 'signs',
  sentences: ({ signs: rules }) =>
    [...rules].map(([name, sign]) => `The coefficient of ${name} must be ${sign} where a candidate has it.`),
  refusals: ({ signs: rules }, index, { fits, columnNames }) => {
    const fit = fits[index]!;
    return [...rules].flatMap(([name, sign]) => {
      const column = columnNamed(name, fit, columnNames);
      if (column === null) return [];
      const at = fit.columns.indexOf(column);
      if (at < 0) {
        return [
          `${name} has no coefficient of its own here, because it depends on other columns; it must be ${sign}.`,
        ];
      }
      const estimate = fit.estimates[at]!;
      if (sign === 'positive' ? estimate > 0 : estimate < 0) return [];
      return [`The coefficient of ${name} is ${significant(estimate, 3)}, and must be ${sign}.`];
    });
  },
};

/** Reports the names of coefficients, in rules of admission and acceptance, that no candidate has. */
export function checkSignNames(study: Study, { fits, columnNames }: FitContext, report: Report): void {
  const named = [...study.selection.admit.signs.keys()].map((name) => ['selection', 'admit', 'signs', name]);
  for (const plan of study.acceptance) {
    if (plan.criterion === 'sign') named.push(['acceptance', 'signs', plan.of]);
    if (plan.criterion === 'coefficient') named.push(['acceptance', 'coefficients', plan.of]);
    if (plan.criterion === 'coefficient_change' && plan.of !== null) {
      named.push(['acceptance', 'coefficient_change', 'of', plan.of]);
    }
  }
  for (const path of named) {
    const name = path.at(-1)!;
    const rule = path.slice(0, -1).join('.');
    if (fits.some((fit) => columnNamed(name, fit, columnNames) !== null)) continue;
    // A coefficient of a family of which no model found has it.
    if (study.families.length > 0 && columnNames.includes(name)) continue;
    const term = fits.flatMap((fit) => fit.candidate.terms).find((each) => each.name === name);
    const place = study.keyPlaceOf(path);
    if (term !== undefined) {
      const columns = term.columns.map((column) => `"${columnNames[column]}"`);
      report({
        code: 'sign_name_unknown',
        severity: 'error',
        place,
        message: `${rule} names "${name}", a term of ${term.columns.length} columns, which has no one ${rule.endsWith('signs') ? 'sign' : 'value'}.`,
        hint: `Name a single coefficient of it: ${listedUpTo(columns, 5)}.`,
      });
      continue;
    }
    const known = knownNames(fits, columnNames);
    const meant = nearest(name, known);
    report({
      code: 'sign_name_unknown',
      severity: 'error',
      place,
      message: `${rule} names "${name}", which is neither a coefficient nor a term of one column in any candidate.`,
      hint:
        meant === null
          ? `The names are ${listedUpTo(
              known.map((each) => `"${each}"`),
              8,
            )}.`
          : `Did you mean ${meant}?`,
    });
  }
}

/** The union column that a sign rule's name stands for in a candidate, or null. */
function columnNamed(name: string, fit: Fit, columnNames: readonly string[]): number | null {
  const own = fit.candidate.columns.find((column) => columnNames[column] === name);
  if (own !== undefined) return own;
  return (
    fit.candidate.terms.find((term) => term.name === name && term.columns.length === 1)?.columns[0] ?? null
  );
}

function knownNames(fits: readonly Fit[], columnNames: readonly string[]): string[] {
  const names = new Set<string>();
  for (const { candidate } of fits) {
    for (const term of candidate.terms) if (term.columns.length === 1) names.add(term.name);
    for (const column of candidate.columns) names.add(columnNames[column]!);
  }
  return [...names];
}
