import { count } from '../numbers.ts';
import type { StudyRecord } from '../record-type.ts';
import { raised } from './lexicon.ts';
import { modelsLookedAt, modelsPhrase } from './models.ts';

/**
 * How many models were looked at before this one, beside its p-values; null where none was. Rows that had no part in the
 * choice owe it nothing.
 */
export function lookedSentence(record: StudyRecord): string | null {
  const split = record.selection.split_sample;
  if (split !== undefined)
    return `These figures are of the ${count(split.rows_estimating)}\u00a0rows that had no part in the choice, so they owe nothing to it.`;
  const looked = modelsLookedAt(record);
  return looked.count < 2
    ? null
    : `${raised(modelsPhrase(looked))} were looked at and this one was chosen on the same rows: its p-values are smaller, and its intervals shorter, than they would be had it been the only one.`;
}
