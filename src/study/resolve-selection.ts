import { didYouMean } from './names.ts';
import { listed, quote, showPath } from './path.ts';
import { fault, type Loose, type Reading } from './reading.ts';
import { scaleText } from './resolve-scale.ts';
import { checkRange } from './resolve-variables.ts';
import type {
  AcceptanceFigure,
  AcceptancePlan,
  AdmitPlan,
  CandidatePlan,
  RankBy,
  SelectionPlan,
} from './study.ts';
import { STUDY_DEFAULTS } from './study-defaults.generated.ts';
import type { LimitsInFile } from './study-file.generated.ts';

/** Criteria in units of the fitted response: they say nothing across response scales. */
const ONE_SCALE_ONLY: readonly RankBy[] = ['adjusted_r_squared', 'mallows_cp', 'press', 'partial_f'];

export function resolveSelection(reading: Reading, candidates: readonly CandidatePlan[]): SelectionPlan {
  const written = reading.file.selection;
  const rankBy = written?.rank_by ?? STUDY_DEFAULTS['selection.rank_by'];
  const scales = [...new Set(candidates.map(({ scale }) => scaleText(scale)))];
  if (ONE_SCALE_ONLY.includes(rankBy) && scales.length > 1) {
    const message = `selection.rank_by is ${rankBy}, which cannot rank candidates across response scales (${listed(scales, 'and')}).`;
    const hint = 'Rank by aic, aicc or bic, or give all candidates one scale.';
    fault(reading, 'criterion_across_scales', ['selection', 'rank_by'], message, hint);
  }
  return {
    rankBy,
    preferSmallerWithin: written?.prefer_smaller_within ?? STUDY_DEFAULTS['selection.prefer_smaller_within'],
    significance: written?.significance ?? STUDY_DEFAULTS['selection.significance'],
    admit: resolveAdmit(reading),
  };
}

function resolveAdmit(reading: Reading): AdmitPlan {
  const written = reading.file.selection?.admit;
  const atMost = (limit: { readonly at_most?: number | undefined } | undefined) =>
    limit?.at_most === undefined ? null : { atMost: limit.at_most };
  const atLeast = (limit: { readonly at_least?: number | undefined } | undefined) =>
    limit?.at_least === undefined ? null : { atLeast: limit.at_least };
  const signs = Object.entries(written?.signs ?? {});
  return {
    vif: atMost(written?.vif),
    pValue: atMost(written?.p_value),
    signs: new Map(signs.flatMap(([name, sign]) => (sign === undefined ? [] : [[name, sign]]))),
    rowsPerCoefficient: atLeast(written?.rows_per_coefficient),
    adjustedRSquared: atLeast(written?.adjusted_r_squared),
  };
}

/** The values that a figure can take; a limit outside can never be missed or never be met. */
const FIGURES: Readonly<
  Record<AcceptanceFigure, { readonly least: number | null; readonly most: number | null }>
> = {
  r_squared: { least: null, most: 1 },
  adjusted_r_squared: { least: null, most: 1 },
  predicted_r_squared: { least: null, most: 1 },
  residual_standard_error: { least: 0, most: null },
  largest_vif: { least: 1, most: null },
  condition_number: { least: 1, most: null },
  rows_used: { least: 1, most: null },
};

export function resolveAcceptance(
  reading: Reading,
  candidates: readonly string[],
): readonly AcceptancePlan[] {
  const written = reading.file.acceptance ?? {};
  const plans: AcceptancePlan[] = [];
  for (const criterion of reading.written.keysAt(['acceptance'])) {
    if (criterion === 'chosen') {
      const names = written.chosen?.filter((name) => name !== undefined) ?? [];
      checkChosen(reading, candidates);
      if (names.length > 0) plans.push({ criterion, names });
    } else if (Object.hasOwn(FIGURES, criterion)) {
      const figure = criterion as AcceptanceFigure;
      const limits = written[figure];
      if (limits === undefined) continue;
      checkFigure(reading, figure, limits);
      plans.push({ criterion: figure, atLeast: limits.at_least ?? null, atMost: limits.at_most ?? null });
    }
  }
  return plans;
}

function checkChosen(reading: Reading, candidates: readonly string[]): void {
  const chosen = reading.file.acceptance?.chosen;
  chosen?.forEach((name, index) => {
    if (name === undefined || candidates.includes(name)) return;
    const path = ['acceptance', 'chosen', index];
    const message = `${showPath(path)} names ${quote(name)}, which is not a candidate.`;
    fault(reading, 'name_unknown', path, message, didYouMean(name, candidates));
  });
}

function checkFigure(reading: Reading, figure: AcceptanceFigure, limits: Loose<LimitsInFile>): void {
  const path = ['acceptance', figure];
  const { least, most } = FIGURES[figure];
  checkRange(reading, limits.at_least ?? null, limits.at_most ?? null, path);
  if (most !== null && limits.at_least !== undefined && limits.at_least > most) {
    const message = `${showPath([...path, 'at_least'])} is ${limits.at_least}, but ${figure} is never above ${most}.`;
    fault(reading, 'limit_nonsense', [...path, 'at_least'], message);
  }
  if (least !== null && limits.at_most !== undefined && limits.at_most < least) {
    const message = `${showPath([...path, 'at_most'])} is ${limits.at_most}, but ${figure} is never below ${least}.`;
    fault(reading, 'limit_nonsense', [...path, 'at_most'], message);
  }
}
