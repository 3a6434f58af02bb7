import { type Chosen, cooksDistance, standardisedResidual } from '../examine/chosen.ts';
import type { ResidualColumns } from './tables.ts';

/** Figures of every row of the chosen model, for a table; residuals unweighted, on the fitted scale. */
export function residualColumns(chosen: Chosen): ResidualColumns {
  const n = chosen.sample.rowCount;
  const column = (of: (row: number) => number | null): Float64Array =>
    Float64Array.from({ length: n }, (_, i) => of(i) ?? Number.NaN);
  return {
    row: chosen.sample.lines,
    id: chosen.sample.ids,
    observed: chosen.observed,
    fitted: chosen.fitted,
    residual: column((i) => chosen.observed[i]! - chosen.fitted[i]!),
    standardised_residual: column((i) => standardisedResidual(chosen, i)),
    leverage: chosen.leverages,
    cooks_distance: column((i) => cooksDistance(chosen, i)),
  };
}
