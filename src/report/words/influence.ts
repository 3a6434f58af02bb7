import { rounded, roundingFor, significant } from '../numbers.ts';
import type { RecordCoefficient, RecordExamination, StudyRecord } from '../record-type.ts';
import { counted, listed } from './lexicon.ts';

export type InfluentialRow = RecordExamination['influential_rows'][number];

/** What a sentence calls a row: its identity, else its line in the data file. */
export function rowWord({ id, row }: Pick<InfluentialRow, 'id' | 'row'>): string {
  return id ?? `row ${row}`;
}

/**
 * "deck_weight from 1.48 to 1.72, 1.8 standard errors": the coefficient that the row moves most, as it is and without the
 * row. Null where the record does not say.
 */
export function movesMost(row: InfluentialRow, coefficients: readonly RecordCoefficient[]): string | null {
  const most = (row.without?.coefficients ?? []).reduce<
    NonNullable<InfluentialRow['without']>['coefficients'][number] | null
  >((best, one) => (Math.abs(one.dfbetas ?? 0) > Math.abs(best?.dfbetas ?? 0) ? one : best), null);
  const own = coefficients.find(({ name }) => name === most?.name);
  if (most === null || most.dfbetas === null || own === undefined) return null;
  const rounding = roundingFor(own.estimate, own.standard_error ?? most.standard_error);
  return `${most.name} from ${rounded(own.estimate, rounding)} to ${rounded(most.estimate, rounding)}, ${significant(Math.abs(most.dfbetas), 2)}\u00a0standard errors`;
}

/** What the declared rule would choose without each of the rows shown, as a sentence; null where it was not asked again. */
export function choiceWithout(
  { selection, examination }: StudyRecord,
  rows: readonly InfluentialRow[],
): string | null {
  if (examination === null || examination.choice_omitted !== null || rows.length === 0) return null;
  const others = rows.filter(({ without }) => without !== undefined && without.chosen !== selection.chosen);
  if (others.length === 0)
    return rows.length === 1
      ? 'Without it, the rule would make the same choice.'
      : `Without any one of these ${counted(rows.length, 'row')}, the rule would make the same choice.`;
  const said = others.map(
    (row) => `without ${rowWord(row)}, it would choose ${row.without!.chosen ?? 'none of the candidates'}`,
  );
  return `The choice rests on single rows: ${listed(said)}.`;
}
