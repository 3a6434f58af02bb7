import type { Design } from '../model/design.ts';
import { wholeNumber } from '../numerals.ts';
import type { Sample } from '../prepare/sample.ts';
import type { Report } from '../problem.ts';
import type { Study } from '../study/study.ts';
import type { DependentColumn, Fit } from './fit.ts';

/**
 * What the fits say about the declaration: responses and predictors that do not vary, columns that depend on
 * one another, fewer rows than coefficients. Each is said once, with the candidates it touches, at the term that
 * brings it in.
 */
export function checkFits(
  study: Study,
  sample: Sample,
  design: Design,
  fits: readonly Fit[],
  report: Report,
): void {
  const place = study.placeOf(['response']);
  if (isConstant(sample, study.response.variable)) {
    report({
      code: 'response_constant',
      severity: 'error',
      place,
      message: `${study.response.variable} has the same value in all ${wholeNumber(sample.rowCount)} rows used, so there is nothing to explain.`,
    });
    return;
  }
  reportTooFewRows(study, fits, report);
  reportNothingLeft(study, fits, report);
  reportExactFits(study, fits, report);
  reportDependencies(study, design, fits, report);
}

function isConstant(sample: Sample, variable: string): boolean {
  const column = sample.columns.get(variable);
  if (column === undefined || column.kind === 'category' || column.kind === 'text') return false;
  return sample.rowCount > 1 && column.values.every((value) => value === column.values[0]);
}

function reportTooFewRows(study: Study, fits: readonly Fit[], report: Report): void {
  const crowded = fits.flatMap((fit, index) => (isCrowded(fit) ? [index] : []));
  const none = crowded.length === fits.length;
  for (const index of crowded) {
    const { rowCount, candidate } = fits[index]!;
    const wanted = candidate.columns.length;
    report({
      code: 'rows_too_few',
      severity: none ? 'error' : 'warning',
      place: study.placeOf(placeInFile(fits, index)),
      message: `${candidate.name} has ${wanted} coefficients for ${wholeNumber(rowCount)} ${rowCount === 1 ? 'row' : 'rows'}: ${
        wanted === rowCount ? 'it fits them exactly, whatever they are' : 'there is no one answer'
      }, and nothing can be tested.`,
      hint: 'Take terms out, or wait for more rows.',
    });
  }
}

/** Columns that depend on others are left out first; what is left may yet be fewer than the rows. */
function isCrowded(fit: Fit): boolean {
  return fit.degreesOfFreedom < 1;
}

/** Without an intercept, terms that are 0 in every row leave no column at all. */
function reportNothingLeft(study: Study, fits: readonly Fit[], report: Report): void {
  fits.forEach(({ candidate, columns, rowCount }, index) => {
    if (columns.length > 0) return;
    report({
      code: 'predictor_constant',
      severity: 'error',
      place: study.placeOf(placeInFile(fits, index)),
      message: `${candidate.name} has no intercept, and its terms are 0 in all ${wholeNumber(rowCount)} rows used, so there is nothing to fit.`,
      hint: 'Take the candidate out.',
    });
  });
}

function reportExactFits(study: Study, fits: readonly Fit[], report: Report): void {
  const exact = fits.flatMap((fit, index) =>
    fit.exact && !isCrowded(fit) && fit.columns.length > 0 ? [index] : [],
  );
  const [first] = exact;
  if (first === undefined) return;
  const response = study.response.variable;
  report({
    code: 'fit_exact',
    severity: 'warning',
    place: study.placeOf(placeInFile(fits, first)),
    message: `But for rounding, ${response} is fitted exactly in all ${fits[first]!.rowCount} rows used by ${namesOf(exact, fits)}: nothing can be tested there, and there are no intervals.`,
    hint: `Is ${response} worked out from these terms? Measurements hardly ever fit so.`,
  });
}

/** The first three, and how many more. */
function namesOf(indexes: readonly number[], fits: readonly Fit[]): string {
  const names = indexes
    .slice(0, 3)
    .map((index) => fits[index]!.candidate.name)
    .join(', ');
  return indexes.length > 3 ? `${names} and ${indexes.length - 3} more` : names;
}

function reportDependencies(study: Study, design: Design, fits: readonly Fit[], report: Report): void {
  const told = new Map<string, { dependent: DependentColumn; near: boolean; candidates: number[] }>();
  fits.forEach((fit, index) => {
    if (isCrowded(fit)) return;
    const note = (dependent: DependentColumn, near: boolean) => {
      const entry = told.get(dependent.sentence) ?? { dependent, near, candidates: [] };
      entry.candidates.push(index);
      told.set(dependent.sentence, entry);
    };
    for (const dependent of fit.dropped) note(dependent, false);
    for (const dependent of fit.nearlyDependent) note(dependent, true);
  });
  for (const { dependent, near, candidates } of told.values()) {
    const [first] = candidates;
    const term = fits[first!]!.candidate.terms.findIndex((one) => one.columns.includes(dependent.column));
    const place = study.placeOf([...placeInFile(fits, first!), 'terms', Math.max(0, term)]);
    const names = namesOf(candidates, fits);
    if (near) {
      report({
        code: 'columns_nearly_dependent',
        severity: 'warning',
        place,
        message: `${dependent.sentence}: their coefficients can hardly be told apart in ${names}.`,
      });
      continue;
    }
    const constant = dependent.sentence.endsWith('in every row used') && !isProduct(design, dependent.column);
    const stop = study.inference.dependentColumns === 'stop';
    report({
      code: constant ? 'predictor_constant' : 'columns_dependent',
      severity: stop ? 'error' : 'warning',
      place,
      message: `${dependent.sentence}${stop ? '' : `, so ${design.columns[dependent.column]!.name} is left out of ${names}`}.`,
      hint: stop
        ? 'Take it out, or let the fit go on without it by inference.dependent_columns: drop.'
        : 'Take it out of the candidate: it can say nothing of its own in these rows.',
    });
  }
}

function isProduct(design: Design, column: number): boolean {
  return design.columns[column]!.pieces.length > 1;
}

/** Where a candidate stands in the study file; one that a search found, where its family does. */
function placeInFile(fits: readonly Fit[], index: number): (string | number)[] {
  return ['candidates', fits[index]!.candidate.position ?? index];
}
