import type { RecordEarlierCriterion, StudyRecord } from '../record/record.ts';
import type { ComparedCriterion, ComparedModel, Comparison } from './comparison.ts';

/**
 * The later study's criteria that only an earlier record can judge. A value that cannot be told misses its limit, so
 * that rows that were not kept never make a run pass; without a new row there is nothing to judge about new rows.
 */
export function acceptanceAgainst(
  later: StudyRecord,
  { rows, models, new_rows: newRows }: Pick<Comparison, 'rows' | 'models' | 'new_rows'>,
): ComparedCriterion[] {
  const model = models.find(({ chosen }) => chosen !== 'earlier');
  return (later.acceptance_against_earlier ?? []).map((wanted): ComparedCriterion => {
    const { criterion, of, limit } = wanted;
    const value =
      criterion === 'new_rows_inside' ? (newRows?.share_inside ?? null) : change(of, model, later);
    const idle = criterion === 'new_rows_inside' && rows?.added === 0;
    return {
      criterion,
      ...(of === undefined ? {} : { of }),
      limit,
      value,
      passed: idle ? null : isKept(value, wanted),
    };
  });
}

function isKept(value: number | null, { at_least: least, at_most: most }: RecordEarlierCriterion): boolean {
  return value !== null && (least === null || value >= least) && (most === null || value <= most);
}

/** |after − before| in earlier standard errors: of one coefficient, by its name or its term's, or the largest. */
function change(of: string | undefined, model: ComparedModel | undefined, later: StudyRecord): number | null {
  if (model === undefined) return null;
  const moved =
    of === undefined
      ? model.largest_change
      : model.coefficients.find(({ name }) => name === coefficientName(of, model, later));
  const errors = moved?.in_standard_errors ?? null;
  return errors === null ? null : Math.abs(errors);
}

function coefficientName(of: string, { candidate, coefficients }: ComparedModel, later: StudyRecord): string {
  if (coefficients.some(({ name }) => name === of)) return of;
  const own = later.candidates.find(({ name }) => name === candidate)?.coefficients ?? [];
  const ofTerm = own.filter(({ term }) => term === of);
  return ofTerm.length === 1 ? ofTerm[0]!.name : of;
}
