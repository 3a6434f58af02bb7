import { count, longDate, percent } from '../numbers.ts';
import type { StudyRecord } from '../record-type.ts';
import { counted, listed, raised } from './lexicon.ts';

type Data = StudyRecord['data'];

/** "240 of 259 rows read were used." */
export function rowsSentence(data: Data): string {
  const lost = data.rows_read - data.rows_used;
  if (lost === 0) return `All ${counted(data.rows_read, 'row', 'rows', count)} read were used.`;
  const share = percent(lost / Math.max(1, data.rows_read));
  const others =
    lost === 1
      ? `the other one (${share}) is counted below, under its reason`
      : `the other ${count(lost)} (${share}) are counted below, each under one reason`;
  return `${count(data.rows_used)} of the ${counted(data.rows_read, 'row', 'rows', count)} read ${data.rows_used === 1 ? 'was' : 'were'} used; ${others}.`;
}

/** What one loss says: its reason, with how many rows lack the variable where some of them are counted under another. */
export function lossReason(loss: Data['left_out'][number]): string {
  const also =
    loss.missing_any !== null && loss.missing_any > loss.rows
      ? ` (${count(loss.missing_any)} with those that lack something else as well and are counted above)`
      : '';
  return raised(loss.because) + also;
}

/** "4 January 2023 to 27 February 2024", or null without a time variable. */
export function dateRange(data: Data): string | null {
  if (data.time === null) return null;
  const { first, last } = data.time;
  return first === last ? longDate(first) : `${longDate(first)} to ${longDate(last)}`;
}

/** Study, data and date range in one line. */
export function studyLine(record: StudyRecord): string {
  const dates = dateRange(record.data);
  const parts = [
    `Study ${record.study.file}`,
    `data ${record.data.file}`,
    `${count(record.data.rows_used)} of ${counted(record.data.rows_read, 'row', 'rows', count)}`,
    ...(dates === null ? [] : [dates]),
  ];
  return parts.join(' · ');
}

/** What broke the declared contract, or that nothing did. */
export function contractSentence(data: Data): string {
  if (data.bad_value_count === 0) return 'No value broke the declared contract.';
  const shown =
    data.bad_values.length < data.bad_value_count
      ? `; ${count(data.bad_values.length)} of them ${data.bad_values.length === 1 ? 'is' : 'are'} listed`
      : '';
  return `${counted(data.bad_value_count, 'value', 'values', count)} broke the declared contract${shown}.`;
}

/** Columns of the file that the study does not use; null where there are none. */
export function ignoredSentence(data: Data): string | null {
  const names = data.columns_ignored;
  if (names.length === 0) return null;
  const shown = names.slice(0, 12);
  const more = names.length - shown.length;
  const list = more > 0 ? `${shown.join(', ')} and ${more} more` : listed(shown);
  return `Not used by the study: ${list}.`;
}
