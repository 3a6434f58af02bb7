import { realpathSync, renameSync, rmSync, statSync } from 'node:fs';
import { dirname, resolve } from 'node:path';
import type { Report } from '../problem.ts';
import { hiddenPath, tidy } from '../record/hidden-files.ts';
import { makeFolder } from '../record/make-folder.ts';
import { isSystemFault, reason } from '../record/system-fault.ts';
import { writePieces } from '../record/write-results.ts';

/**
 * Writes one file beside the results, whole or not at all; a failure is reported. Says whether it is written. Through a
 * link, the file that it leads to is written; a device or a pipe is written to as it is.
 */
export async function writeText(
  path: string,
  content: string | Iterable<string>,
  report: Report,
): Promise<boolean> {
  let beside: string | null = null;
  try {
    const found = statSync(path, { throwIfNoEntry: false });
    if (found !== undefined && !found.isFile() && !found.isDirectory()) {
      writePieces(path, content);
      return true;
    }
    const place = found === undefined ? path : realpathSync(path);
    makeFolder(resolve(dirname(place)));
    beside = hiddenPath(dirname(place));
    writePieces(beside, content);
    renameSync(beside, place);
    tidy(dirname(place));
    return true;
  } catch (fault) {
    if (beside !== null) rmSync(beside, { force: true });
    if (!isSystemFault(fault)) throw fault;
    report({
      code: 'output_unwritable',
      severity: 'error',
      place: { kind: 'file', file: path },
      message: `"${path}" cannot be written: ${reason(fault)}.`,
    });
    return false;
  }
}
