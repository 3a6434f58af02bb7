import papaparse from 'papaparse';
import { figureTexts } from './figure-texts.ts';
import type { StudyRecord } from './record.ts';

/**
 * The tables beside a record, as CSV text: comma, line feed, full-precision numbers, an empty cell
 * where a figure is not defined. Texts that a spreadsheet would take for a formula get a leading
 * apostrophe; numbers are never touched.
 */

/** Every candidate with its figures, in the order of the ranking, those without a place last. */
export function candidatesTable(record: StudyRecord): string {
  const place = new Map(record.selection.ranking.map((entry) => [entry.candidate, entry]));
  const ranked = [...record.candidates].sort(
    (a, b) => (place.get(a.name)?.rank ?? Number.MAX_VALUE) - (place.get(b.name)?.rank ?? Number.MAX_VALUE),
  );
  const rows = ranked.map((candidate) => [
    place.get(candidate.name)?.rank ?? null,
    candidate.name,
    candidate.name === record.selection.chosen,
    candidate.admitted,
    candidate.refused_because.join(' '),
    place.get(candidate.name)?.difference ?? null,
    candidate.terms.join('; '),
    candidate.scale,
    ...CANDIDATE_FIGURES.map((figure) => candidate[figure]),
    candidate.overall_f?.statistic ?? null,
    candidate.overall_f?.df1 ?? null,
    candidate.overall_f?.df2 ?? null,
    candidate.overall_f?.p_value ?? null,
  ]);
  return csv(
    [
      'rank',
      'candidate',
      'chosen',
      'admitted',
      'refused_because',
      'difference',
      'terms',
      'scale',
      ...CANDIDATE_FIGURES,
      'overall_f',
      'overall_f_df1',
      'overall_f_df2',
      'overall_f_p_value',
    ],
    rows,
  );
}

const CANDIDATE_FIGURES = [
  'rows',
  'coefficient_count',
  'degrees_of_freedom',
  'r_squared',
  'adjusted_r_squared',
  'predicted_r_squared',
  'residual_standard_error',
  'residual_sum_of_squares',
  'log_likelihood',
  'aic',
  'aicc',
  'bic',
  'mallows_cp',
  'press',
  'largest_vif',
  'condition_number',
] as const;

/** Every coefficient of every candidate, in the order declared. */
export function coefficientsTable(record: StudyRecord): string {
  const figures = ['estimate', 'standard_error', 't', 'p_value', 'lower', 'upper', 'vif'] as const;
  // Of the chosen candidate those that the model has, also where it is estimated from other rows than it was chosen on.
  const estimated = record.selection.split_sample?.estimated ?? null;
  const candidates = record.candidates.map((one) => (one.name === estimated?.name ? estimated : one));
  const rows = candidates.flatMap((candidate) =>
    candidate.coefficients.map((coefficient) => [
      candidate.name,
      candidate.name === record.selection.chosen,
      coefficient.term,
      coefficient.name,
      ...figures.map((figure) => coefficient[figure]),
    ]),
  );
  return csv(['candidate', 'chosen', 'term', 'coefficient', ...figures], rows);
}

/** Every prediction with the values it was made at, one column per variable. */
export function predictionsTable(record: StudyRecord): string {
  const figures = ['estimate', 'lower', 'upper', 'mean_lower', 'mean_upper', 'mean', 'leverage'] as const;
  const variables = [
    ...new Set(record.predictions.flatMap((row) => row.values.map((value) => value.variable))),
  ];
  const rows = record.predictions.map((row) => {
    const values = new Map(row.values.map((value) => [value.variable, value.value]));
    return [
      row.label,
      ...figures.map((figure) => row[figure]),
      row.outside.join(' '),
      ...variables.map((variable) => values.get(variable) ?? null),
    ];
  });
  return csv(['label', ...figures, 'outside', ...variables], rows);
}

/** Rows used, in file order, as columns of equal length; NaN where a figure is not defined. On the response's fitted scale. */
export interface ResidualColumns {
  /** Line in the data file of each row, as a person counts it. */
  readonly row: ArrayLike<number>;
  /** Null where the study declares no row identity. */
  readonly id: readonly string[] | null;
  readonly observed: Float64Array;
  readonly fitted: Float64Array;
  readonly residual: Float64Array;
  readonly standardised_residual: Float64Array;
  readonly leverage: Float64Array;
  readonly cooks_distance: Float64Array;
}

/** Rows written at a time: about 0.6 MB of text. */
const BLOCK = 4096;

/** Residuals of the chosen model, block by block, so that a million rows are never held as one text. */
export function* residualsTable(columns: ResidualColumns): Generator<string> {
  const figures = [
    columns.observed,
    columns.fitted,
    columns.residual,
    columns.standardised_residual,
    columns.leverage,
    columns.cooks_distance,
  ];
  yield csv(
    [
      'row',
      ...(columns.id === null ? [] : ['id']),
      'observed',
      'fitted',
      'residual',
      'standardised_residual',
      'leverage',
      'cooks_distance',
    ],
    [],
  );
  for (let start = 0; start < columns.row.length; start += BLOCK) {
    const end = Math.min(start + BLOCK, columns.row.length);
    const texts = figureTexts(
      figures,
      Array.from({ length: end - start }, (_, i) => start + i),
    );
    let text = '';
    for (let i = start; i < end; i++) {
      const id = columns.id === null ? '' : `${cell(columns.id[i] ?? '')},`;
      text += `${columns.row[i]},${id}${texts[i - start]}\n`;
    }
    yield text;
  }
}

/** What a spreadsheet may take for a formula (OWASP, "CSV injection"). */
const FORMULA = /^[=+\-@\t\r]/;

type Cell = string | number | boolean | null;

function csv(header: readonly string[], rows: readonly (readonly Cell[])[]): string {
  const text = papaparse.unparse([[...header], ...rows.map((row) => [...row])], {
    newline: '\n',
    escapeFormulae: FORMULA,
  });
  return `${text}\n`;
}

/** One text as a CSV cell (RFC 4180), as papaparse writes it. */
export function cell(text: string): string {
  const safe = FORMULA.test(text) ? `'${text}` : text;
  return /[",\n\r]|^\s|\s$|^\ufeff/.test(safe) ? `"${safe.replaceAll('"', '""')}"` : safe;
}
