import { randomUUID } from 'node:crypto';
import { existsSync, readdirSync, renameSync, rmSync, statSync } from 'node:fs';
import { basename, dirname, join } from 'node:path';
import { withoutFault } from './system-fault.ts';

/** What we write beside results and remove again has names that begin so. */
export const HIDDEN = '.plumbrule-';
/** What nobody needs any more: whoever comes across it may remove it. */
const TRASH = `${HIDDEN}trash-`;

/** In a hidden folder, says that its move is decided and which way it goes: towards the new files, or back. */
export const FORWARD = 'forward.json';
export const BACK = 'back.json';

/** Hidden files as old as this, in milliseconds, were left by a run that was killed. */
const ABANDONED = 3_600_000;

/** A name of our own in a folder, for what is written there before it is moved to its place. */
export function hiddenPath(folder: string): string {
  return join(folder, `${HIDDEN}${randomUUID()}`);
}

/** Whether files are being moved between a hidden folder and the one around it, or were when a run was killed. */
export function isMarked(staging: string): boolean {
  return existsSync(join(staging, FORWARD)) || existsSync(join(staging, BACK));
}

/**
 * Gives a hidden file or folder a name that says that it is not needed, at one stroke, and gives its path: a run that is
 * killed while it removes it, file by file, leaves nothing that looks whole.
 */
export function toTrash(path: string): string {
  const trash = join(dirname(path), `${TRASH}${randomUUID()}`);
  renameSync(path, trash);
  return trash;
}

/** Removes what can be removed; a later run removes the rest. */
export function discard(path: string): void {
  withoutFault(() => {
    rmSync(basename(path).startsWith(TRASH) ? path : toTrash(path), { recursive: true, force: true });
  });
}

/**
 * Removes from a folder what runs that were killed have left in it: trash, and hidden files that nobody has written to
 * for an hour. Moves that were interrupted are left alone: they are to be finished.
 */
export function tidy(folder: string): void {
  withoutFault(() => {
    for (const name of readdirSync(folder)) {
      if (!name.startsWith(HIDDEN)) continue;
      const path = join(folder, name);
      const old = () => Date.now() - lastWritten(path) > ABANDONED;
      if (name.startsWith(TRASH) || (!isMarked(path) && old())) discard(path);
    }
  });
}

/** Milliseconds since 1970, of whatever lies in a folder too. */
function lastWritten(path: string): number {
  const found = statSync(path, { throwIfNoEntry: false });
  if (found === undefined) return Number.NEGATIVE_INFINITY;
  const within = found.isDirectory() ? readdirSync(path).map((name) => lastWritten(join(path, name))) : [];
  return Math.max(found.mtimeMs, ...within);
}
