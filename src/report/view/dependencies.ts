import { dependenciesChart } from '../chart/dependencies.ts';
import { rounded, roundingFor } from '../numbers.ts';
import type { RecordExamination } from '../record-type.ts';
import type { DependenciesView } from '../view.ts';
import { stopped } from '../words/lexicon.ts';

const SENTENCES = 4;
const ROWS = 24;

/** Columns that nearly depend on one another; null where none do but powers and products of one variable. */
export function dependenciesView(examination: RecordExamination): DependenciesView | null {
  const { collinearity } = examination;
  const found = (collinearity?.dependencies ?? []).filter((one) => !one.by_construction);
  if (collinearity === undefined || found.length === 0) return null;
  return {
    sentences: found.slice(0, SENTENCES).map(({ sentence }) => stopped(sentence)),
    chart: dependenciesChart(collinearity),
    rows: found
      .flatMap(({ without }) =>
        without.flatMap(({ left_out, coefficients }) =>
          coefficients.map((one) => {
            const rounding = roundingFor(one.estimate, one.standard_error);
            const other = roundingFor(one.estimate_without, one.standard_error_without);
            return {
              leftOut: left_out,
              name: one.name,
              estimate: rounded(one.estimate, rounding),
              standardError: rounded(one.standard_error, rounding),
              estimateWithout: rounded(one.estimate_without, other),
              standardErrorWithout: rounded(one.standard_error_without, other),
            };
          }),
        ),
      )
      .slice(0, ROWS),
  };
}
