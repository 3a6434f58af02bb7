import type { Names } from './names.ts';
import { listed } from './path.ts';
import { fault, type Reading } from './reading.ts';
import { scaleText } from './resolve-scale.ts';
import { resolveValidation } from './resolve-validation.ts';
import type { AdmitPlan, RankBy, Scale, SelectionPlan } from './study.ts';
import { STUDY_DEFAULTS } from './study-defaults.generated.ts';

/** Criteria in units of the fitted response: they say nothing across response scales. */
const ONE_SCALE_ONLY: readonly RankBy[] = ['adjusted_r_squared', 'mallows_cp', 'press', 'partial_f'];

export function resolveSelection(
  reading: Reading,
  names: Names,
  scalesOfAll: readonly Scale[],
): SelectionPlan {
  const written = reading.file.selection;
  const rankBy = written?.rank_by ?? STUDY_DEFAULTS['selection.rank_by'];
  const scales = [...new Set(scalesOfAll.map(scaleText))];
  if (ONE_SCALE_ONLY.includes(rankBy) && scales.length > 1) {
    const message = `selection.rank_by is ${rankBy}, which cannot rank candidates across response scales (${listed(scales, 'and')}).`;
    const hint = 'Rank by aic, aicc, bic or cross_validation, or give all candidates one scale.';
    fault(reading, 'criterion_across_scales', ['selection', 'rank_by'], message, hint);
  }
  return {
    rankBy,
    preferSmallerWithin: written?.prefer_smaller_within ?? STUDY_DEFAULTS['selection.prefer_smaller_within'],
    significance: written?.significance ?? STUDY_DEFAULTS['selection.significance'],
    ...resolveValidation(reading, names, rankBy, scales.length),
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
