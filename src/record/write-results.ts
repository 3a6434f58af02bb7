import {
  closeSync,
  mkdirSync,
  openSync,
  readdirSync,
  renameSync,
  rmdirSync,
  statSync,
  writeFileSync,
} from 'node:fs';
import { basename, dirname, join, resolve } from 'node:path';
import type { Report } from '../problem.ts';
import { discard, hiddenPath, isMarked, tidy } from './hidden-files.ts';
import { makeFolder } from './make-folder.ts';
import { MoveStuck, makeFolders, moveIn, NEW } from './move-results.ts';
import { isSystemFault, reason, systemFault } from './system-fault.ts';

/** One file of the results: its name relative to the output folder ("tables/candidates.csv") and its text or bytes. */
export interface ResultFile {
  readonly name: string;
  readonly content: string | Iterable<string | Uint8Array>;
}

/** Every file that a run of a study may write. */
export const RESULT_FILES = [
  'report.html',
  'report.md',
  'tables/candidates.csv',
  'tables/coefficients.csv',
  'tables/residuals.csv',
  'tables/predictions.csv',
  'comparison.html',
  'comparison.md',
  'comparison.json',
  'sample.csv.gz',
  'record.json',
] as const;

/**
 * Writes the files of a run into the folder `out`, all or none, and says whether it did. The folder and
 * its parents are made where absent. Files of the same names are replaced, those named in `obsolete`
 * and not written now are removed (a report of an earlier run must not lie beside a newer record), and
 * whatever else lies in the folder is left alone.
 *
 * Everything is first written to a hidden folder `.plumbrule-…` on the same file system, beside `out` where that is new:
 * then one rename makes it appear complete. Where it exists, the hidden folder is within it, and its files are moved in
 * as `moveIn` says. A run that is killed before that leaves the earlier results as they were, one that is killed while
 * files are moved leaves a part of the earlier files or of the new ones, never some of both, and the move is finished by
 * the next run that writes there or reads the record. Two runs into one folder move their files in one after the other,
 * so that what stays is the whole of the one that came last. What killed runs leave is removed by later ones, hidden
 * folders that nothing was decided of after an hour.
 *
 * This holds against the end of a process, not of the machine: nothing is forced to the disk, which would take longer
 * than all the rest.
 *
 * What is made from files in `out`, as a report is from its record, must not be moved in beside others that have come
 * meanwhile: `obstacle` says so when its turn has come (see `moveIn`).
 *
 * Any failure is reported as `output_unwritable`, with the earlier results untouched.
 */
export async function writeResults(
  out: string,
  files: readonly ResultFile[],
  report: Report,
  obsolete: readonly string[] = [],
  obstacle: () => string | null = () => null,
): Promise<boolean> {
  const folder = resolve(out);
  let made: string | undefined;
  let staging: string | null = null;
  try {
    const existed = isFolder(folder);
    const parent = existed ? folder : dirname(folder);
    made = makeFolder(parent);
    staging = hiddenPath(parent);
    mkdirSync(staging);
    stage(join(staging, NEW), files);
    if (!existed && appear(join(staging, NEW), folder)) {
      discard(staging);
    } else {
      if (!existed) staging = renamed(staging, join(folder, basename(staging)));
      const coming = files.map((file) => file.name);
      const gone = obsolete.filter((name) => !coming.includes(name));
      await moveIn(folder, staging, { coming, gone }, obstacle);
    }
    // Runs that were killed before `out` appeared left their hidden folders beside it.
    tidy(dirname(folder));
    return true;
  } catch (fault) {
    if (staging !== null && !isMarked(staging)) discard(staging);
    if (made !== undefined) removeEmptyFolders(dirname(folder), made);
    const why = whyNot(fault);
    if (why === null) throw fault;
    report({
      code: 'output_unwritable',
      severity: 'error',
      place: { kind: 'file', file: out },
      message: `The results cannot be written to "${out}": ${why}`,
      hint: 'Name another folder with --out.',
    });
    return false;
  }
}

/** The end of a sentence; null for a fault of the program. */
function whyNot(fault: unknown): string | null {
  if (fault instanceof MoveStuck) return `${fault.message}.`;
  return isSystemFault(fault) ? `${reason(fault)}. Earlier results are untouched.` : null;
}

function stage(folder: string, files: readonly ResultFile[]): void {
  mkdirSync(folder);
  makeFolders(
    folder,
    files.map(({ name }) => name),
  );
  for (const { name, content } of files) writePieces(join(folder, name), content);
}

/** Where there is nothing else to do meanwhile, plain writing takes a tenth of the time of a stream. */
export function writePieces(path: string, content: ResultFile['content']): void {
  const file = openSync(path, 'w');
  try {
    for (const piece of typeof content === 'string' ? [content] : content) writeFileSync(file, piece);
  } finally {
    closeSync(file);
  }
}

/** Makes the finished folder appear in its place; false where another run has made one there meanwhile. */
function appear(finished: string, folder: string): boolean {
  try {
    renameSync(finished, folder);
    return true;
  } catch (fault) {
    if (isFolder(folder)) return false;
    throw fault;
  }
}

function renamed(from: string, to: string): string {
  renameSync(from, to);
  return to;
}

function isFolder(path: string): boolean {
  const found = statSync(path, { throwIfNoEntry: false });
  if (found !== undefined && !found.isDirectory()) throw systemFault('ENOTDIR');
  return found !== undefined;
}

/** Takes back folders that were made for nothing, from the innermost up to `outermost`. */
function removeEmptyFolders(innermost: string, outermost: string) {
  for (let path = innermost; path.startsWith(outermost); path = dirname(path)) {
    try {
      if (readdirSync(path).length > 0) return;
      rmdirSync(path);
    } catch {
      return;
    }
  }
}
