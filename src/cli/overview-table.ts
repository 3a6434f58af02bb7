import { quotedCell } from '../record/quoted-cell.ts';
import { type GoneRun, type Overview, type OverviewEntry, sharedCoefficients } from '../report/overview.ts';
import { GONE } from '../report/words/overview.ts';

type Cell = string | number | null;

const FIGURES: readonly (readonly [string, (entry: OverviewEntry) => Cell])[] = [
  ['run', ({ name }) => name],
  ['outcome', ({ outcome }) => outcome],
  ['why', ({ why }) => why],
  ['chosen', ({ chosen }) => chosen],
  ['rows_read', ({ rowsRead }) => rowsRead],
  ['rows_used', ({ rowsUsed }) => rowsUsed],
  ['adjusted_r_squared', ({ adjustedRSquared }) => adjustedRSquared],
  ['residual_standard_error', ({ residualStandardError }) => residualStandardError],
  ['criteria', ({ criteria }) => criteria],
  ['criteria_met', ({ criteriaMet }) => criteriaMet],
  ['concerns', ({ concerns }) => concerns],
  ['coefficients_for', ({ quantity }) => quantity],
];

/** Where runs were held against earlier records. */
const CHANGES: readonly (readonly [string, (entry: OverviewEntry) => Cell])[] = [
  ['against_earlier', againstWord],
  ['chosen_before', ({ change }) => change?.choice.from ?? null],
  ['largest_move_of', ({ change }) => change?.largest?.name ?? null],
  ['largest_move', ({ change }) => change?.largest?.inStandardErrors ?? null],
  ['new_rows', ({ change }) => change?.newRows ?? null],
  ['new_rows_predicted', ({ change }) => change?.inside?.of ?? null],
  ['new_rows_inside', ({ change }) => change?.inside?.rows ?? null],
  ['criteria_against_earlier', ({ change }) => change?.criteria ?? null],
  ['criteria_against_earlier_met', ({ change }) => change?.criteriaMet ?? null],
  ['comparison', ({ change }) => change?.link ?? null],
];

/**
 * The overview as CSV: a row for each run, in the order of the runs, the figures at full precision, then, where they were
 * held against earlier records, what changed, and estimate and standard error of each coefficient that runs share, an empty
 * cell where a run does not have it. Earlier records that no run stands for any more have a row at the end.
 */
export function overviewTable({ runs, compared, gone }: Overview): string {
  const shared = [...new Set(sharedCoefficients(runs).flatMap(({ names }) => names))];
  const figures = compared ? [...FIGURES, ...CHANGES] : FIGURES;
  const header = [
    ...figures.map(([name]) => name),
    ...shared.flatMap((name) => [`estimate of ${name}`, `standard error of ${name}`]),
    'results',
  ];
  const rows = runs.map((entry) => {
    const coefficients = new Map(entry.coefficients.map((each) => [each.name, each]));
    return [
      ...figures.map(([, figure]) => figure(entry)),
      ...shared.flatMap((name) => {
        const found = coefficients.get(name);
        return [found?.estimate ?? null, found?.standardError ?? null];
      }),
      entry.link,
    ];
  });
  const lost = gone.map((each) => header.map((name) => goneCell(each, name)));
  return `${[header, ...rows, ...lost].map((row) => row.map(cell).join(',')).join('\n')}\n`;
}

function againstWord({ change, hasEarlier }: OverviewEntry): string {
  if (hasEarlier === false) return 'new';
  if (change === null) return 'not compared';
  return change.choice.changed ? 'choice changed' : 'choice kept';
}

function goneCell({ name, chosen }: GoneRun, column: string): Cell {
  if (column === 'run') return name;
  if (column === 'outcome' || column === 'against_earlier') return GONE;
  return column === 'chosen_before' ? chosen : null;
}

function cell(value: Cell): string {
  if (value === null) return '';
  return typeof value === 'number' ? String(value) : quotedCell(value);
}
