import { readFileSync } from 'node:fs';
import { dirname, resolve } from 'node:path';
import type { StudyRecord } from './record.ts';
import { isSystemFault } from './system-fault.ts';

/** A record and the file that it was read from. */
export interface RecordAt {
  readonly file: string;
  readonly record: StudyRecord;
}

/**
 * For `writeResults`: an obstacle where one of the records that the files were made from lay in the folder `out` and is
 * not there any more, or is another's now.
 */
export function replacedRecord(out: string, records: readonly RecordAt[]): () => string | null {
  const beside = records.filter(({ file }) => resolve(dirname(file)) === resolve(out));
  return () =>
    beside.every(isUnchanged)
      ? null
      : 'another run has replaced the record in this folder meanwhile, and its results are left as they are';
}

function isUnchanged({ file, record }: RecordAt): boolean {
  try {
    return JSON.stringify(JSON.parse(readFileSync(file, 'utf8'))) === JSON.stringify(record);
  } catch (fault) {
    if (isSystemFault(fault) || fault instanceof SyntaxError) return false;
    throw fault;
  }
}
