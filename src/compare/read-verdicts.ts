import { readFile } from 'node:fs/promises';
import { dirname, join } from 'node:path';
import type { Report } from '../problem.ts';
import type { StudyRecord } from '../record/record.ts';
import { recordSha256 } from '../record/record-text.ts';
import type { ComparedCriterion } from './comparison.ts';

/**
 * What came of the criteria that only an earlier record can judge, from the comparison.json that lies beside a record.
 * Null where the study declares none, where there is no such file, and where it is of another record; one that is damaged
 * is a warning.
 *
 * @param path of the record
 */
export async function readVerdicts(
  path: string,
  record: StudyRecord,
  report: Report,
): Promise<readonly ComparedCriterion[] | null> {
  if ((record.acceptance_against_earlier ?? []).length === 0) return null;
  const file = join(dirname(path), 'comparison.json');
  let text: string;
  try {
    text = await readFile(file, 'utf8');
  } catch {
    return null;
  }
  const found = comparisonIn(text);
  if (found === null) {
    report({
      code: 'record_unreadable',
      severity: 'warning',
      place: { kind: 'file', file },
      message:
        'The comparison beside the record is damaged, so that what came of the criteria against the earlier record is not shown.',
      hint: 'Make it again with plumbrule compare.',
    });
    return null;
  }
  return found.recordSha256 === recordSha256(record) ? found.acceptance : null;
}

interface Found {
  readonly recordSha256: unknown;
  readonly acceptance: readonly ComparedCriterion[];
}

function comparisonIn(text: string): Found | null {
  let value: unknown;
  try {
    value = JSON.parse(text);
  } catch {
    return null;
  }
  if (!isObject(value) || value.format !== 'plumbrule-comparison/1' || !isObject(value.later)) return null;
  const { acceptance } = value;
  if (!Array.isArray(acceptance) || !acceptance.every(isCriterion)) return null;
  return { recordSha256: value.later.record_sha256, acceptance };
}

function isCriterion(value: unknown): value is ComparedCriterion {
  return (
    isObject(value) &&
    (value.criterion === 'coefficient_change' || value.criterion === 'new_rows_inside') &&
    (value.of === undefined || typeof value.of === 'string') &&
    typeof value.limit === 'string' &&
    (value.value === null || typeof value.value === 'number') &&
    (value.passed === null || typeof value.passed === 'boolean')
  );
}

function isObject(value: unknown): value is Readonly<Record<string, unknown>> {
  return typeof value === 'object' && value !== null;
}
