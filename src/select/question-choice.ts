import type { FittedAll } from '../engine/fit-all.ts';
import type { Report } from '../problem.ts';
import type { Study } from '../study/study.ts';
import { type Averaged, averaged } from './average.ts';
import type { Choice } from './choose.ts';
import { drawFolds, type Folds } from './folds.ts';
import { type HonestError, honestError } from './honest-error.ts';
import type { Ground } from './material.ts';
import { declaredProcedure, type Search } from './procedure.ts';
import { type Stability, stability } from './stability.ts';
import type { Progress } from './validate-candidates.ts';

/** How far the choice can be trusted, as far as the study asks. */
export interface ChoiceTrust {
  readonly honest: { readonly folds: Folds; readonly error: HonestError | null } | null;
  readonly stability: Stability | null;
  readonly averaged: Averaged | null;
}

/** Makes the choice again from other rows: without each fold (honest error), and from rows drawn anew (stability). */
export function questionChoice(
  study: Study,
  ground: Ground,
  fitted: FittedAll,
  choice: Choice,
  search: Search | null,
  report: Report,
  onProgress: Progress,
): ChoiceTrust {
  const { selection } = study;
  const procedure = declaredProcedure(study, ground.design, search);
  const winner = choice.chosen === null ? null : fitted.fits[choice.chosen]!;
  const folds =
    selection.honestError === null ? null : drawFolds(selection.honestError, study, ground.sample, report);
  return {
    honest: folds === null ? null : { folds, error: honest(folds) },
    stability:
      selection.stability === null
        ? null
        : stability({
            plan: selection.stability,
            ground,
            procedure,
            onProgress: (done, total) => onProgress?.('choosing from rows drawn anew', done, total),
          }),
    averaged: selection.average
      ? averaged(selection, fitted, choice.ranking, choice.admissions, study.inference.confidence)
      : null,
  };

  function honest(without: Folds): HonestError | null {
    const error = honestError({
      ground,
      folds: without,
      procedure,
      winner,
      onProgress: (done, total) => onProgress?.('choosing without each fold', done, total),
    });
    if (error === null) {
      report({
        code: 'fold_unpredictable',
        severity: 'warning',
        place: study.placeOf(without.plan.path),
        message:
          'The error of the whole procedure cannot be told: what it chooses has no finite prediction of the held-out rows.',
        hint: 'Hold out fewer rows at a time, or declare smaller candidates.',
      });
    }
    return error;
  }
}
