import type { FittedAll } from '../engine/fit-all.ts';
import type { Report } from '../problem.ts';
import type { Study } from '../study/study.ts';
import { crossValidate } from './cross-validate.ts';
import { drawFolds, type Folds } from './folds.ts';
import type { Ground } from './material.ts';
import type { Validation } from './validation.ts';
import { counted, listedUpTo, named } from './words.ts';

/** Told of long work: the stage in words, how much is done, and of how much. */
export type Progress = ((stage: string, done: number, total: number) => void) | undefined;

/** How candidates were cross-validated, and what came of it. */
export interface Validated {
  readonly folds: Folds;
  readonly validation: Validation;
}

/** Cross-validates every candidate as the study declares; null where it does not, or where folds cannot be drawn (reported). */
export function validateCandidates(
  study: Study,
  ground: Omit<Ground, 'folds'>,
  fitted: FittedAll,
  report: Report,
  onProgress: Progress,
): Validated | null {
  const plan = study.selection.validation;
  if (plan === null) return null;
  const folds = drawFolds(plan, study, ground.sample, report);
  if (folds === null) return null;
  const validation = crossValidate({
    rows: ground.rows,
    own: ground.own,
    fits: fitted.fits,
    folds,
    ranks: study.selection.rankBy === 'cross_validation',
    onProgress: (done, total) => onProgress?.('cross-validating candidates', done, total),
  });
  reportLosses(study, fitted, validation, report);
  return { folds, validation };
}

/** Says of each column that could not be estimated without a fold where that was, and what was done. */
function reportLosses(
  study: Study,
  { fits, columnNames }: FittedAll,
  validation: Validation,
  report: Report,
): void {
  const place = study.placeOf(study.selection.validation!.path);
  for (const { column, folds, rows, candidates } of validation.losses) {
    const names = listedUpTo(
      candidates.map((index) => named(fits[index]!.candidate.name)),
      2,
    );
    const without = candidates.filter((index) => validation.figures[index] === null);
    const done =
      without.length === candidates.length
        ? `${without.length === 1 ? 'it has' : 'they have'} no cross-validated error`
        : without.length === 0
          ? 'they count in no candidate’s cross-validated error'
          : 'candidates that can predict too few have no cross-validated error, and the others do without these rows';
    report({
      code: 'fold_unpredictable',
      severity: 'warning',
      place,
      message:
        column === null
          ? `Held out, ${listedUpTo(folds, 3)} cannot be predicted from the other rows by ${names}: ${done}.`
          : `Without ${listedUpTo(folds, 3)} the coefficient of ${columnNames[column]} cannot be estimated, so that ${counted(rows, 'held-out row')} cannot be predicted by ${names}: ${done}.`,
      hint: 'Hold out fewer rows at a time, or join rare levels.',
    });
  }
}
