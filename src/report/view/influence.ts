import { fixed, rounded, roundingFor, significant } from '../numbers.ts';
import type { RecordCoefficient, StudyRecord } from '../record-type.ts';
import type { TrustView } from '../view.ts';
import { choiceWithout, movesMost, rowWord } from '../words/influence.ts';
import { type Lexicon, raised } from '../words/lexicon.ts';
import { scaleKind, scaleName } from '../words/scale.ts';

const ROWS = 5;

/** The rows that move the coefficients most, and what would be without them. */
export function influenceView(
  record: StudyRecord,
  { response }: Lexicon,
  coefficients: readonly RecordCoefficient[],
): Pick<TrustView, 'rows' | 'rowsNote' | 'rowsScale'> {
  const rows = (record.examination?.influential_rows ?? []).slice(0, ROWS);
  const s = record.model?.residual_standard_error ?? null;
  return {
    rows: rows.map((row) => {
      const rounding = roundingFor(row.observed, s);
      return {
        row: String(row.row),
        name: row.id === null ? raised(rowWord(row)) : row.id,
        identified: row.id !== null,
        observed: rounded(row.observed, rounding),
        fitted: rounded(row.fitted, rounding),
        residual: fixed(row.standardised_residual, 2),
        leverage: significant(row.leverage, 2),
        distance: significant(row.cooks_distance, 2),
        moves: movesMost(row, coefficients),
      };
    }),
    rowsNote: choiceWithout(record, rows),
    rowsScale: scaleKind(response.scale) === 'natural' ? null : scaleName(response.scale),
  };
}
