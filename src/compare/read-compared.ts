import { stat } from 'node:fs/promises';
import { join } from 'node:path';
import { hasError, type Problem, type Report } from '../problem.ts';
import { readRecord } from '../record/read-record.ts';
import { readSample } from '../record/read-sample.ts';
import type { ComparedSide } from './compare.ts';

/**
 * Reads a record and the rows kept beside it. `path` is the record or the folder of its results. Null, with errors
 * reported, where one of them cannot be used; without the rows, and with a warning, where they were not kept.
 */
export async function readCompared(path: string, report: Report): Promise<ComparedSide | null> {
  const file = (await isFolder(path)) ? join(path, 'record.json') : path;
  const record = await readRecord(file, report);
  if (record === null) return null;
  const found: Problem[] = [];
  const rows = await readSample(file, record, (problem) => found.push(problem));
  found.forEach(report);
  return hasError(found) ? null : { record, rows, file };
}

async function isFolder(path: string): Promise<boolean> {
  try {
    return (await stat(path)).isDirectory();
  } catch {
    return false;
  }
}
