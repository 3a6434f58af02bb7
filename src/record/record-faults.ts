import type { ErrorObject } from 'ajv';
import { checkStudyRecord } from './check-study-record.generated.ts';
import type { StudyRecord } from './record.ts';

/**
 * What keeps a value from being a record, as sentences; empty where it is one. First its shape, against
 * the schema (keys that it does not know are passed over: a later version may have added them); where that
 * is right, whether its parts fit together.
 */
export function recordFaults(value: unknown): string[] {
  if (!checkStudyRecord(value)) {
    const faults = (checkStudyRecord.errors ?? []).filter((error) => !isNoise(error));
    if (faults.length > 0) return [...new Set(faults.map(sentence))];
  }
  return contradictions(value as StudyRecord);
}

/** Unknown keys, and what says only that the other alternative, null, is not what stands there. */
function isNoise(error: ErrorObject): boolean {
  return (
    error.keyword === 'additionalProperties' ||
    error.keyword === 'anyOf' ||
    error.schemaPath.endsWith('/anyOf/1/type')
  );
}

/** "candidates[0].rows must be integer." */
function sentence(error: ErrorObject): string {
  const path = error.instancePath
    .split('/')
    .slice(1)
    .map((part) => part.replaceAll('~1', '/').replaceAll('~0', '~'))
    .map((part) => (/^\d+$/.test(part) ? `[${part}]` : `.${part}`))
    .join('')
    .replace(/^\./, '');
  const subject = path === '' ? 'The record' : path;
  if (error.keyword === 'required') {
    return `${subject} has no ${String((error.params as { missingProperty: string }).missingProperty)}.`;
  }
  if (error.keyword === 'enum') {
    const allowed = (error.params as { allowedValues: unknown[] }).allowedValues;
    return `${subject} must be one of ${allowed.map((entry) => JSON.stringify(entry)).join(', ')}.`;
  }
  if (error.keyword === 'const') {
    return `${subject} must be ${JSON.stringify((error.params as { allowedValue: unknown }).allowedValue)}.`;
  }
  return `${subject} ${error.message ?? 'is not as the schema says'}.`;
}

function contradictions(record: StudyRecord): string[] {
  const names = new Set(record.candidates.map((candidate) => candidate.name));
  const { chosen, ranking } = record.selection;
  const faults: string[] = [];
  for (const { candidate } of ranking) {
    if (!names.has(candidate)) faults.push(`selection.ranking names "${candidate}", which is no candidate.`);
  }
  if (chosen !== null && !names.has(chosen)) {
    faults.push(`selection.chosen names "${chosen}", which is no candidate.`);
  }
  if ((record.model?.candidate ?? null) !== chosen) faults.push('model is not that of selection.chosen.');
  if ((record.examination === null) !== (record.model === null)) {
    faults.push('model and examination must both be there, or neither.');
  }
  if (record.model !== null) {
    const p = record.model.columns.length;
    const square = record.model.inverse.length === p && record.model.inverse.every((row) => row.length === p);
    if (!square) faults.push(`model.inverse must be ${p} × ${p}, as model.columns.`);
  }
  for (const term of record.model?.terms ?? []) {
    const { curve } = term;
    if (curve !== null && !sameLength([curve.x, curve.y, curve.lower, curve.upper])) {
      faults.push(`The curve of term "${term.name}" has lists of unequal length.`);
    }
  }
  if (record.examination !== null) {
    const { points } = record.examination;
    const lists = [
      points.row,
      points.id,
      points.fitted,
      points.observed,
      points.residual,
      points.standardised_residual,
      points.leverage,
      points.cooks_distance,
      points.time_position,
      ...points.values.flatMap((value) => [value.numbers, value.texts]),
    ];
    if (!sameLength(lists)) faults.push('examination.points has lists of unequal length.');
  }
  return faults;
}

function sameLength(lists: readonly (readonly unknown[] | null)[]): boolean {
  return new Set(lists.flatMap((list) => (list === null ? [] : [list.length]))).size <= 1;
}
