import { quotedCell } from '../record/quoted-cell.ts';
import { type OverviewEntry, sharedCoefficients } from '../report/overview.ts';

/**
 * The overview as CSV: a row for each run, the figures at full precision, then estimate and standard error of each
 * coefficient that runs share, an empty cell where a run does not have it.
 */
export function overviewTable(entries: readonly OverviewEntry[]): string {
  const shared = [...new Set(sharedCoefficients(entries).flatMap(({ names }) => names))];
  const header = [
    'run',
    'outcome',
    'why',
    'chosen',
    'rows_read',
    'rows_used',
    'adjusted_r_squared',
    'residual_standard_error',
    'criteria',
    'criteria_met',
    'concerns',
    'coefficients_for',
    ...shared.flatMap((name) => [`estimate of ${name}`, `standard error of ${name}`]),
    'results',
  ];
  const rows = entries.map((entry) => {
    const coefficients = new Map(entry.coefficients.map((each) => [each.name, each]));
    return [
      entry.name,
      entry.outcome,
      entry.why,
      entry.chosen,
      entry.rowsRead,
      entry.rowsUsed,
      entry.adjustedRSquared,
      entry.residualStandardError,
      entry.criteria,
      entry.criteriaMet,
      entry.concerns,
      entry.quantity,
      ...shared.flatMap((name) => {
        const found = coefficients.get(name);
        return [found?.estimate ?? null, found?.standardError ?? null];
      }),
      entry.link,
    ];
  });
  return `${[header, ...rows].map((row) => row.map(cell).join(',')).join('\n')}\n`;
}

function cell(value: string | number | null): string {
  if (value === null) return '';
  return typeof value === 'number' ? String(value) : quotedCell(value);
}
