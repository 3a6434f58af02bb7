import { randomUUID } from 'node:crypto';
import { createWriteStream } from 'node:fs';
import { mkdir, open, readdir, rename, rm, rmdir, stat } from 'node:fs/promises';
import { dirname, join, resolve } from 'node:path';
import { pipeline } from 'node:stream/promises';
import type { Report } from '../problem.ts';

/** One file of the results: its name relative to the output folder ("tables/candidates.csv") and its text or bytes. */
export interface ResultFile {
  readonly name: string;
  readonly content: string | Iterable<string | Uint8Array> | AsyncIterable<string | Uint8Array>;
}

/**
 * Writes the files of a run into the folder `out`, all or none, and says whether it did. The folder and
 * its parents are made where absent. Files of the same names are replaced, those named in `obsolete`
 * and not written now are removed (a report of an earlier run must not lie beside a newer record), and
 * whatever else lies in the folder is left alone.
 *
 * Everything is first written to a hidden folder beside its place, on the same file system. If `out` is
 * new, one rename makes it appear complete. If it exists, earlier files are moved aside and new ones moved
 * in, one rename each; a failure moves the earlier ones back. A run that is killed while it computes or
 * writes therefore leaves the earlier results as they were, and a hidden folder `.plumbrule-…` that can be
 * deleted. Only a kill within the few milliseconds of the last renames can leave new files among earlier
 * ones: file systems offer no way to replace several files at once. The record is moved in last, so a folder
 * whose record.json is new is complete. Two runs into one folder move their files in one after the other, so that
 * what stays is the whole of the one that came last.
 *
 * Any failure is reported as `output_unwritable`, with the earlier results untouched.
 */
export async function writeResults(
  out: string,
  files: readonly ResultFile[],
  report: Report,
  obsolete: readonly string[] = [],
): Promise<boolean> {
  const folder = resolve(out);
  let made: string | undefined;
  let staging: string | null = null;
  try {
    const existed = await isFolder(folder);
    const parent = existed ? folder : dirname(folder);
    made = await mkdir(parent, { recursive: true });
    staging = join(parent, `.plumbrule-${randomUUID()}`);
    await mkdir(staging);
    for (const file of files) await writeFile(join(staging, 'new', file.name), file.content);
    if (existed || !(await appear(join(staging, 'new'), folder))) {
      const unlock = await lock(folder);
      try {
        await moveIn(folder, staging, files, obsolete);
      } finally {
        await unlock();
      }
    }
    await remove(staging);
    return true;
  } catch (fault) {
    if (staging !== null && !(fault instanceof NotRestored)) await remove(staging);
    if (made !== undefined) await removeEmptyFolders(dirname(folder), made);
    if (!isSystemFault(fault)) throw fault;
    report({
      code: 'output_unwritable',
      severity: 'error',
      place: { kind: 'file', file: out },
      message: `The results cannot be written to "${out}": ${reason(fault)}. Earlier results are untouched.`,
      hint: 'Name another folder with --out.',
    });
    return false;
  }
}

/** Makes the finished folder appear in its place; false where another run has made one there meanwhile. */
async function appear(finished: string, folder: string): Promise<boolean> {
  try {
    await rename(finished, folder);
    return true;
  } catch (fault) {
    if (isSystemFault(fault) && (fault.code === 'ENOTEMPTY' || fault.code === 'EEXIST')) return false;
    throw fault;
  }
}

const LOCK = '.plumbrule-lock';
/** Moving files in takes milliseconds: a lock as old as this, in milliseconds, was left by a run that was killed. */
const STALE = 5000;
const PAUSE = 10;

/** Waits until no other run is moving files into the folder; gives what ends its own turn. */
async function lock(folder: string): Promise<() => Promise<void>> {
  const path = join(folder, LOCK);
  for (;;) {
    try {
      await (await open(path, 'wx')).close();
      return () => remove(path);
    } catch (fault) {
      if (!isSystemFault(fault) || fault.code !== 'EEXIST') throw fault;
    }
    const age = await ageOf(path);
    if (age !== null && age > STALE) await remove(path);
    else await new Promise((resolve) => setTimeout(resolve, PAUSE));
  }
}

/** Milliseconds since a file was made; null where it is gone. */
async function ageOf(path: string): Promise<number | null> {
  try {
    return Date.now() - (await stat(path)).mtimeMs;
  } catch (fault) {
    if (isSystemFault(fault) && fault.code === 'ENOENT') return null;
    throw fault;
  }
}

/** Every file that a run of a study may write, in the order in which they are moved in: the record last. */
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

async function writeFile(path: string, content: ResultFile['content']) {
  await mkdir(dirname(path), { recursive: true });
  await pipeline(typeof content === 'string' ? [content] : content, createWriteStream(path, 'utf8'));
}

/** Moves the new files in; on a failure moves everything back and throws it. */
async function moveIn(
  folder: string,
  staging: string,
  files: readonly ResultFile[],
  obsolete: readonly string[],
) {
  const names = [...files.map((file) => file.name)].sort((a, b) => movedAt(a) - movedAt(b));
  const gone = obsolete.filter((name) => !names.includes(name));
  const moves: { readonly from: string; readonly to: string }[] = [];
  const move = async (from: string, to: string) => {
    await mkdir(dirname(to), { recursive: true });
    await rename(from, to);
    moves.push({ from, to });
  };
  try {
    for (const name of [...gone, ...names]) {
      const place = join(folder, name);
      if (await exists(place)) await move(place, join(staging, 'earlier', name));
      if (!gone.includes(name)) await move(join(staging, 'new', name), place);
    }
  } catch (fault) {
    try {
      for (const { from, to } of moves.reverse()) await rename(to, from);
    } catch (second) {
      throw new NotRestored(join(staging, 'earlier'), second);
    }
    throw fault;
  }
}

/** The file system failed twice: the only case in which earlier results are not where they were. */
class NotRestored extends Error {
  constructor(folder: string, cause: unknown) {
    super(`The file system refused to move earlier results back. They are in "${folder}".`, { cause });
  }
}

/** The record goes last; other files as they come. */
function movedAt(name: string): number {
  return name === 'record.json' ? 1 : 0;
}

async function isFolder(path: string): Promise<boolean> {
  try {
    const found = await stat(path);
    if (!found.isDirectory()) {
      throw systemFault('ENOTDIR');
    }
    return true;
  } catch (fault) {
    if (isSystemFault(fault) && fault.code === 'ENOENT') return false;
    throw fault;
  }
}

async function exists(path: string): Promise<boolean> {
  try {
    // A folder where a file of ours belongs is someone else's: refuse rather than move it.
    if ((await stat(path)).isDirectory()) throw systemFault('EISDIR');
    return true;
  } catch (fault) {
    if (isSystemFault(fault) && fault.code === 'ENOENT') return false;
    throw fault;
  }
}

async function remove(path: string) {
  await rm(path, { recursive: true, force: true });
}

/** Takes back folders that were made for nothing, from the innermost up to `outermost`. */
async function removeEmptyFolders(innermost: string, outermost: string) {
  for (let path = innermost; path.startsWith(outermost); path = dirname(path)) {
    try {
      if ((await readdir(path)).length > 0) return;
      await rmdir(path);
    } catch {
      return;
    }
  }
}

interface SystemFault extends Error {
  readonly code: string;
  readonly errno: number;
}

function systemFault(code: string): SystemFault {
  return Object.assign(new Error(code), { code, errno: 0 });
}

function isSystemFault(fault: unknown): fault is SystemFault {
  return fault instanceof Error && typeof (fault as Partial<SystemFault>).errno === 'number';
}

const REASONS: { readonly [code: string]: string } = {
  EACCES: 'permission is denied',
  EPERM: 'permission is denied',
  EROFS: 'the file system is read-only',
  ENOSPC: 'there is no space left',
  EDQUOT: 'there is no space left in your quota',
  ENOTDIR: 'a part of this path is a file, not a folder',
  EEXIST: 'a part of this path is a file, not a folder',
  EISDIR: 'a folder stands where one of the files belongs',
  ENAMETOOLONG: 'the name is too long',
};

function reason(fault: SystemFault): string {
  return REASONS[fault.code] ?? `the system says ${fault.code}`;
}
